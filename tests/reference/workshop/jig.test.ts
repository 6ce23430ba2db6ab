/**
 * The trade dossier's rows on circles, bushings and round-overs. Marks as there: [C] computed,
 * [S] seen in a source, [M] common practice without one. Tolerance: half the last printed digit.
 */
import { describe, expect, it } from "vitest";
import { jigCard } from "@/lib/workshop/jig";

const MM = 1e-3;
const INCH = 0.0254;

function expectWithin(actual: number, expected: number, tolerance: number) {
  if (tolerance >= Math.abs(expected)) throw new Error("A tolerance that zero would meet.");
  expect(Math.abs(actual - expected)).toBeLessThanOrEqual(tolerance * (1 + 1e-9));
}

describe("pivot to bit centre, dossier 4.1 [C]: ring of 102 inside and 152 outside", () => {
  it.each([
    [6, 48.0, 79.0],
    [6.35, 47.83, 79.17],
    [8, 47.0, 80.0],
    [9.53, 46.24, 80.76],
    [12, 45.0, 82.0],
    [12.7, 44.65, 82.35],
  ])("bit of %s mm", (bit, inside, outside) => {
    const card = jigCard({
      bore_m: 102 * MM,
      outer_diameter_m: 152 * MM,
      bit_diameter_m: bit * MM,
    });
    expectWithin(card.inside.pivot_to_bit_centre_m, inside * MM, 0.005 * MM);
    expectWithin(card.outside.pivot_to_bit_centre_m, outside * MM, 0.005 * MM);
  });
});

describe("bushing templates, dossier 4.2 [C]: 102 hole and 152 disc", () => {
  it.each([
    [7.94, 6.35, 103.59, 150.41],
    [15.88, 6.35, 111.53, 142.47],
    [17, 8, 111.0, 143.0],
    [19.05, 12.7, 108.35, 145.65],
    [30, 12, 120.0, 134.0],
    [30, 12.7, 119.3, 134.7],
  ])("bushing %s, bit %s", (bushing, bit, hole, disc) => {
    const card = jigCard({
      bore_m: 102 * MM,
      outer_diameter_m: 152 * MM,
      bit_diameter_m: bit * MM,
      bushing_diameter_m: bushing * MM,
    });
    expectWithin(card.inside.bushing_template_diameter_m!, hole * MM, 0.005 * MM);
    expectWithin(card.outside.bushing_template_diameter_m!, disc * MM, 0.005 * MM);
  });

  it("golden case 5, dossier 9 [S]: bushing 5/16, bit 1/4, hole 6 in → template 6 1/16 in", () => {
    const card = jigCard({
      bore_m: 6 * INCH,
      outer_diameter_m: 8 * INCH,
      bit_diameter_m: INCH / 4,
      bushing_diameter_m: (5 / 16) * INCH,
    });
    expectWithin(card.inside.bushing_template_diameter_m!, (6 + 1 / 16) * INCH, 1e-9);
  });
});

describe("round-over limits, dossier 4.6 [C]: bearing 12.7 mm, contact 6.4 mm assumed", () => {
  it.each([
    [6.35, 13, 19],
    [9.5, 16, 22],
    [12.7, 19, 25],
    [19.05, 26, 32],
    [25.4, 32, 38],
    [31.75, 38, 45],
    [38.1, 45, 51],
  ])("radius %s mm", (radius, stack, throat) => {
    const card = jigCard({
      bore_m: 0.3,
      outer_diameter_m: 0.45,
      bit_diameter_m: 8 * MM,
      round_over_radius_m: radius * MM,
      stack_depth_m: 60 * MM,
    });
    // Two entries are printed rounded up (25.45 as 26, 44.45 as 45): hence 0.6, not 0.5.
    expectWithin(card.round_over!.stack_depth_needed_m, stack * MM, 0.6 * MM);
    expectWithin(card.round_over!.bore_needed_m, throat * MM, 0.6 * MM);
    expect(card.round_over!.feasible).toBe(true);
  });

  it("a 38.1 mm radius does not go into a 2 in bore", () => {
    const card = jigCard({
      bore_m: 2 * INCH,
      outer_diameter_m: 0.2,
      bit_diameter_m: 8 * MM,
      round_over_radius_m: 38.1 * MM,
      stack_depth_m: 54 * MM,
    });
    expect(card.round_over!.feasible).toBe(false);
  });

  it("a half-inch radius on a single 12 mm ring has nothing for its bearing", () => {
    const card = jigCard({
      bore_m: 102 * MM,
      outer_diameter_m: 152 * MM,
      bit_diameter_m: 8 * MM,
      round_over_radius_m: 12.7 * MM,
      stack_depth_m: 12 * MM,
    });
    expect(card.round_over!.feasible).toBe(false);
    expect(card.warnings.join(" ")).toMatch(/bearing runs on nothing/);
  });
});
