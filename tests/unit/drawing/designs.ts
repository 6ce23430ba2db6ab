import fc from "fast-check";
import { designSchema, type AirwayVent, type Design } from "@/lib/document/schema";

/** A design whose one vent is given; a box of middle size. */
export function designWith(vent: object, enclosure: object = {}): Design {
  return designSchema.parse({
    format: 1,
    enclosure: {
      net_volume_m3: 0.06,
      inside_m: { width: 0.4, height: 0.5, depth: 0.45 },
      panel_thickness_m: 0.036,
      ...enclosure,
    },
    vents: [vent],
  });
}

/** The vent the tests begin with: tube, five rings and a plate. */
export const stackedVent = {
  bore: { shape: "round", diameter_m: 0.1 },
  outer_end: { flare_radius_m: 0.02 },
  pieces: [
    { kind: "tube", length_m: 0.2, outer_diameter_m: 0.106 },
    { kind: "rings", count: 5, thickness_m: 0.018, outer_diameter_m: 0.16, glue_line_m: 0.0001 },
    { kind: "plate", thickness_m: 0.018, outer_diameter_m: 0.24, glue_line_m: 0.0001 },
  ],
  inner_end: { flare_radius_m: 0.012 },
};

export function airway(design: Design): AirwayVent {
  const vent = design.vents[0];
  if (!vent || "lumped" in vent) throw new Error("The test's design has an airway.");
  return vent;
}

const metres = (min: number, max: number) =>
  fc.double({ min, max, noNaN: true, noDefaultInfinity: true });

const piece = fc.oneof(
  fc.record({
    kind: fc.constant("tube"),
    length_m: metres(0.003, 2),
    outer_diameter_m: fc.option(metres(0.02, 0.4), { nil: undefined }),
  }),
  fc.record({
    kind: fc.constant("rings"),
    count: fc.integer({ min: 0, max: 25 }),
    thickness_m: metres(0.003, 0.04),
    outer_diameter_m: metres(0.02, 0.5),
    glue_line_m: metres(0, 0.001),
  }),
  fc.record({
    kind: fc.constant("plate"),
    thickness_m: metres(0.003, 0.04),
    outer_diameter_m: metres(0.02, 0.6),
  }),
  fc.record({ kind: fc.constant("bend"), angle_deg: metres(10, 90) }),
);

/** Designs of every kind, sound and unsound: what a person may have half typed. */
export const anyDesign = fc
  .record({
    bore: fc.oneof(
      fc.record({ shape: fc.constant("round"), diameter_m: metres(0.005, 0.3) }),
      fc.record({
        shape: fc.constant("slot"),
        width_m: metres(0.05, 0.6),
        height_m: metres(0.01, 0.1),
        shared_walls: fc.integer({ min: 0, max: 4 }),
      }),
    ),
    outer_end: fc.record({ flare_radius_m: metres(0, 0.06), proud_m: metres(0, 0.02) }),
    inner_end: fc.record({
      flare_radius_m: metres(0, 0.06),
      form: fc.constantFrom("cut", "shell"),
    }),
    pieces: fc.array(piece, { minLength: 1, maxLength: 4 }),
    depth: fc.option(metres(0.05, 3), { nil: null }),
    panel: metres(0.006, 0.06),
  })
  .map(({ depth, panel, ...vent }) =>
    designWith(vent, {
      panel_thickness_m: panel,
      inside_m: depth === null ? null : { width: 0.5, height: 0.6, depth },
    }),
  );
