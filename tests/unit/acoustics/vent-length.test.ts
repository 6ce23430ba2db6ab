import { describe, expect, test } from "vitest";
import { evaluate } from "@/lib/acoustics";
import { lengthForTuning } from "@/lib/acoustics/length";
import { tuningOf } from "@/lib/acoustics/tuning";
import { designSchema, type DesignInput } from "@/lib/document/schema";

type Vent = NonNullable<DesignInput["vents"]>[number];

const designWith = (vent: Vent) =>
  designSchema.parse({
    format: 1,
    enclosure: {
      net_volume_m3: 0.0684,
      inside_m: { width: 0.52, height: 0.5, depth: 0.3 },
      panel_thickness_m: 0.036,
    },
    vents: [vent],
  });

describe("a length for a tuning", () => {
  const bent = {
    bore: { shape: "round", diameter_m: 0.101 },
    clearance_m: 0.15,
    pieces: [
      { kind: "tube", length_m: 0.1, outer_diameter_m: 0.107 },
      { kind: "bend", angle_deg: 90, centre_radius_m: 0.12 },
      { kind: "plate", thickness_m: 0.018, outer_diameter_m: 0.2, glue_line_m: 0.0002 },
    ],
  } satisfies Vent;

  test("counts a bend's centreline into the overall length", () => {
    const answer = lengthForTuning(designWith(bent), 0, 30);
    const rest = (Math.PI / 2) * 0.12 + 0.0182;
    expect(answer.overall_length_m).toBeCloseTo(answer.tube_length_m + rest, 12);
  });

  test("brings the vent to the tuning when the length is put back", () => {
    const { tube_length_m } = lengthForTuning(designWith(bent), 0, 30);
    const pieces = bent.pieces.map((piece) =>
      piece.kind === "tube" ? { ...piece, length_m: tube_length_m } : piece,
    );
    expect(tuningOf(designWith({ ...bent, pieces }))).toBeCloseTo(30, 6);
  });
});

describe("a resonance that friction drowns", () => {
  /** Im Y has no mass left: R² C > M everywhere, so the susceptances never cancel. */
  const drowned = designWith({
    lumped: { inertance_kg_m4: 50, resistance_pa_s_m3: 1e6, area_m2: 0.008 },
  });

  test("has no tuning, and says so", () => {
    expect(tuningOf(drowned)).toBeNull();
    const answer = evaluate(drowned);
    expect(answer.tuning_hz).toBeNull();
    expect(answer.notes.map(({ code }) => code)).toContain("no_tuning");
  });

  test("comes back with less resistance", () => {
    const free = designWith({
      lumped: { inertance_kg_m4: 50, resistance_pa_s_m3: 100, area_m2: 0.008 },
    });
    expect(tuningOf(free)).toBeGreaterThan(1);
  });
});
