import { describe } from "vitest";
import { airProperties } from "@/lib/acoustics/air";
import { tuningOf } from "@/lib/acoustics/tuning";
import { modelVent } from "@/lib/acoustics/vent";
import { designSchema, type DesignInput } from "@/lib/document/schema";
import { check } from "../check";

type Vents = NonNullable<DesignInput["vents"]>;

/** A round cavity of 0.45 m stands as the square box of equal cross-section. */
const SIDE = Math.sqrt(Math.PI) * 0.225;

const shell = { form: "shell", wall_m: 0.003 } as const;
const cases: {
  name: string;
  net_l: number;
  f_hz: number;
  pipe_hz: number;
  displaced_l: number;
  vent: Vents[number];
}[] = [
  {
    name: "E1, straight",
    net_l: 58.8351,
    f_hz: 42.531,
    pipe_hz: 782.12,
    displaced_l: 1.1649,
    vent: {
      bore: { shape: "round", diameter_m: 0.1 },
      pieces: [{ kind: "tube", length_m: 0.15, outer_diameter_m: 0.106 }],
    },
  },
  {
    name: "E2, flared at both ends",
    net_l: 58.7699,
    f_hz: 44.064,
    pipe_hz: 808.53,
    displaced_l: 1.2301,
    vent: {
      bore: { shape: "round", diameter_m: 0.1 },
      outer_end: { flare_radius_m: 0.025 },
      inner_end: { flare_radius_m: 0.025, ...shell },
      pieces: [{ kind: "tube", length_m: 0.15, outer_diameter_m: 0.106 }],
    },
  },
  {
    name: "E3, narrow and long, flared",
    net_l: 58.7747,
    f_hz: 27.648,
    pipe_hz: 591.78,
    displaced_l: 1.2253,
    vent: {
      bore: { shape: "round", diameter_m: 0.075 },
      outer_end: { flare_radius_m: 0.019 },
      inner_end: { flare_radius_m: 0.019, ...shell },
      pieces: [{ kind: "tube", length_m: 0.25, outer_diameter_m: 0.081 }],
    },
  },
  {
    name: "E4, tube and four rings",
    net_l: 57.8287,
    f_hz: 40.561,
    pipe_hz: 700.07,
    displaced_l: 2.1713,
    vent: {
      bore: { shape: "round", diameter_m: 0.1 },
      pieces: [
        { kind: "tube", length_m: 0.1, outer_diameter_m: 0.106 },
        { kind: "rings", count: 4, thickness_m: 0.018, outer_diameter_m: 0.16 },
      ],
    },
  },
];

describe("whole resonators against field solutions", () => {
  for (const { name, net_l, f_hz, pipe_hz, displaced_l, vent } of cases) {
    const design = designSchema.parse({
      format: 1,
      air: { density_kg_m3: 1.2041, speed_of_sound_m_s: 343.2 },
      enclosure: {
        net_volume_m3: net_l / 1000,
        inside_m: { width: SIDE, height: SIDE, depth: 0.377256 },
        panel_thickness_m: 0.018,
      },
      vents: [vent],
    });
    const source = "finite-element poles of the whole resonator, lossless";
    const figures = () =>
      modelVent(
        design.vents[0]!,
        design.enclosure,
        airProperties(design.air),
        { vent_losses: false },
        "design.vents[0]",
      ).figures;
    check({
      topic: "resonators, tuning",
      name,
      source,
      mark: "computed",
      actual: () => tuningOf(design, { vent_losses: false })!,
      expected: f_hz,
      tolerance: { relative: 0.005 },
    });
    check({
      topic: "resonators, pipe mode",
      name,
      source,
      mark: "computed",
      actual: () => figures().pipe_resonances_hz[0]!,
      expected: pipe_hz,
      tolerance: { relative: 0.02 },
    });
    check({
      topic: "resonators, displaced volume",
      name,
      source: "geometry of the same models",
      mark: "computed",
      actual: () => 1000 * figures().displaced_volume_m3,
      expected: displaced_l,
      tolerance: { relative: 0.002 },
    });
  }
});
