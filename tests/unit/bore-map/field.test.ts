import { describe, expect, it } from "vitest";
import { evaluate } from "@/lib/acoustics/evaluate";
import { InputError } from "@/lib/acoustics/input-error";
import { lengthForTuning } from "@/lib/acoustics/length";
import { layOutAirway } from "@/lib/acoustics/airway";
import { applyCandidate, candidateAt, nearestCandidate } from "@/lib/bore-map/apply";
import { boreField, type BoreField } from "@/lib/bore-map/field";
import { boreMapSeries } from "@/lib/bore-map/series";
import { demoDesigns, denSub, hallTwelve, ventOnly } from "@/lib/document/samples";
import { designSchema, type Design } from "@/lib/document/schema";

/** A small generator with a seed, so that the random fifty are the same on every machine. */
function seeded(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return state / 2 ** 32;
  };
}

function fittingIndices(field: BoreField): number[] {
  return Array.from(field.state.keys()).filter((index) => field.state[index] === 0);
}

/** Largest relative deviation of a candidate's figures from those of the whole library. */
function deviation(design: Design, field: BoreField, index: number): number {
  const candidate = candidateAt(field, index);
  const applied = applyCandidate(design, field.ventIndex, candidate);
  const answer = evaluate(applied);
  const vent = answer.vents[field.ventIndex]!;
  const solved = lengthForTuning(applied, field.ventIndex, field.tuning_hz);
  const ratios = [
    candidate.overall_length_m / solved.overall_length_m,
    candidate.pipe_resonance_hz / vent.pipe_resonances_hz[0]!,
    answer.tuning_hz! / field.tuning_hz,
  ];
  if (candidate.peak_air_speed_m_s !== null)
    ratios.push(candidate.peak_air_speed_m_s / vent.peak_air_speed!.speed_m_s);
  return Math.max(...ratios.map((ratio) => Math.abs(ratio - 1)));
}

describe("boreField", () => {
  it.each(demoDesigns.map((input) => [input.name ?? "", input] as const))(
    "agrees with evaluate and lengthForTuning within 1 % on a random fifty: %s",
    (_, input) => {
      const design = designSchema.parse(input);
      const field = boreField(design, 0);
      const fitting = fittingIndices(field);
      expect(fitting.length).toBeGreaterThan(1000);
      const random = seeded(20261201);
      let worst = 0;
      for (let i = 0; i < 50; i++) {
        const index = fitting[Math.floor(random() * fitting.length)]!;
        worst = Math.max(worst, deviation(design, field, index));
      }
      expect(worst).toBeLessThan(0.01);
    },
  );

  it("tells the clearance that the airway's own layout has", () => {
    const design = designSchema.parse(denSub);
    const field = boreField(design, 0, { diameters: 60 });
    const fitting = fittingIndices(field);
    for (const index of [fitting[7]!, fitting[fitting.length >> 1]!, fitting.at(-3)!]) {
      const candidate = candidateAt(field, index);
      const vent = applyCandidate(design, 0, candidate).vents[0]!;
      if ("lumped" in vent) throw new Error("An airway was expected.");
      const { clearance_m } = layOutAirway(vent, design.enclosure);
      expect(Math.abs(candidate.clearance_m / clearance_m - 1)).toBeLessThan(0.01);
    }
  });

  it("holds 20,000 candidates, of which few are solved one by one", () => {
    const field = boreField(designSchema.parse(denSub), 0);
    expect(field.size).toBe(20_000);
    expect(field.solved).toBeLessThan(field.size / 4);
    for (const values of [
      field.overall_length_m,
      field.pipe_resonance_hz,
      field.peak_air_speed_m_s,
    ])
      expect(values.every(Number.isFinite)).toBe(true);
  });

  it("gives lengths without a driver, and no speeds", () => {
    const field = boreField(designSchema.parse(ventOnly), 0, { diameters: 40 });
    expect(field.hasDriver).toBe(false);
    const first = fittingIndices(field)[0]!;
    expect(candidateAt(field, first).peak_air_speed_m_s).toBeNull();
    expect(candidateAt(field, first).overall_length_m).toBeGreaterThan(0.01);
  });

  it("refuses a bare element and a vent that is not there", () => {
    const design = designSchema.parse({
      ...denSub,
      vents: [{ lumped: { inertance_kg_m4: 46.67, area_m2: 0.00785 } }],
    });
    expect(() => boreField(design, 0)).toThrow(InputError);
    expect(() => boreField(design, 3)).toThrow(InputError);
  });
});

describe("nearestCandidate", () => {
  const design = designSchema.parse(hallTwelve);
  const field = boreField(design, 0, { diameters: 120 });

  it("finds the candidate under a pointer, of the count asked for", () => {
    const found = nearestCandidate(field, 0.11, 15, { count: 2, form: 0 })!;
    expect(found.count).toBe(2);
    expect(found.diameter_m / 0.11).toBeGreaterThan(0.8);
    expect(found.diameter_m / 0.11).toBeLessThan(1.25);
  });

  it("comes back to itself", () => {
    const one = candidateAt(field, fittingIndices(field)[200]!);
    const found = nearestCandidate(field, one.diameter_m, one.peak_air_speed_m_s, {
      count: one.count,
    })!;
    expect(found.diameter_m / one.diameter_m).toBeCloseTo(1, 2);
  });
});

describe("boreMapSeries", () => {
  it("draws one falling line per count for the vent's own flares and form", () => {
    const design = designSchema.parse(denSub);
    const series = boreMapSeries(boreField(design, 0), design);
    expect(series.lines.map((line) => line.count)).toEqual([1, 2, 3, 4]);
    expect(series.air_speed_limit_m_s).toBe(17);
    for (const line of series.lines) {
      expect(line.flare).toEqual({ outer_m: 0.022, inner_m: 0.0127 });
      // What is too long is solved with a bore of free air behind it: the line steps where that begins.
      line.points.forEach((point, i) => {
        const before = line.points[i - 1];
        if (before && before.state === point.state)
          expect(point.peak_air_speed_m_s!).toBeLessThan(before.peak_air_speed_m_s!);
      });
    }
  });
});
