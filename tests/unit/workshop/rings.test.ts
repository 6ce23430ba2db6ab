import { describe, expect, it } from "vitest";
import { InputError } from "@/lib/acoustics/input-error";
import { tuningOf } from "@/lib/acoustics/tuning";
import { denSub, hallTwelve, ventOnly } from "@/lib/document/samples";
import { designSchema, type Design, type DesignInput, type Piece } from "@/lib/document/schema";
import { oneMoreOneLess } from "@/lib/workshop/ring-neighbours";
import { planRings, type RingPlan, type RingRequest } from "@/lib/workshop/rings";

const sheets = [
  { name: "eighteen", thickness_m: 0.0177, thickness_sd_m: 0.00012, within_sheet_sd_m: 0.0001 },
  { name: "twelve", thickness_m: 0.012, thickness_sd_m: 0.0001, within_sheet_sd_m: 0.00008 },
  { name: "nine", thickness_m: 0.0092, thickness_sd_m: 0.00011 },
];

function request(input: DesignInput, changes: Partial<RingRequest> = {}): RingRequest {
  const design = designSchema.parse(input);
  return {
    design,
    vent: 0,
    tuning_hz: design.target.tuning_hz ?? 30,
    sheets,
    ring_outer_diameter_m: 0.17,
    glue_line_m: 0.0001,
    glue_line_sd_m: 0.00003,
    max_rings: 9,
    may_trim_tube: true,
    trim_loss_m: 0.001,
    ...changes,
  };
}

/** The finished vent of a plan, put together here by the contract's words. */
function built(
  asked: RingRequest,
  rings: RingPlan["rings"],
  trim_m: number,
  stretch_m = 0,
): Design {
  const vent = asked.design.vents[asked.vent]!;
  if ("lumped" in vent) throw new Error("An airway was expected.");
  const kept = vent.pieces.filter((piece) => piece.kind !== "rings");
  const stacks = rings.map(({ sheet, count }, i): Piece => ({
    kind: "rings",
    count,
    thickness_m:
      sheets.find(({ name }) => name === sheet)!.thickness_m + (i === 0 ? stretch_m / count : 0),
    outer_diameter_m: asked.ring_outer_diameter_m,
    glue_line_m: asked.glue_line_m,
  }));
  const pieces = kept.flatMap((piece): Piece[] =>
    piece.kind === "tube" ? [{ ...piece, length_m: piece.length_m - trim_m }, ...stacks] : [piece],
  );
  return {
    ...asked.design,
    vents: asked.design.vents.map((old, i) => (i === asked.vent ? { ...vent, pieces } : old)),
  };
}

/** Every mix there is, tried one by one. */
function bruteForce(asked: RingRequest): { miss: number; rings: number } {
  let best = { miss: Infinity, rings: 0 };
  for (let a = 0; a <= asked.max_rings; a++)
    for (let b = 0; a + b <= asked.max_rings; b++)
      for (let c = 0; a + b + c <= asked.max_rings; c++) {
        const rings = [a, b, c]
          .map((count, i) => ({ sheet: sheets[i]!.name, count }))
          .filter(({ count }) => count > 0);
        try {
          const miss = Math.abs(tuningOf(built(asked, rings, 0))! - asked.tuning_hz);
          if (miss < best.miss) best = { miss, rings: a + b + c };
        } catch (error) {
          if (!(error instanceof InputError)) throw error;
        }
      }
  return best;
}

describe("planRings", () => {
  it.each([
    ["den sub", denSub, 32],
    ["den sub, a little higher", denSub, 33.3],
    ["hall twelve", hallTwelve, 29.4],
    ["vent only", ventOnly, 35.7],
  ])("finds the whole-ring plan that trying every mix finds: %s", (_, input, tuning_hz) => {
    const asked = request(input, { tuning_hz, may_trim_tube: false });
    const { plans } = planRings(asked);
    const best = bruteForce(asked);
    expect(Math.abs(plans[0]!.error_hz)).toBeCloseTo(best.miss, 7);
    expect(plans.every((plan) => plan.trim_tube_m === 0)).toBe(true);
    for (let i = 1; i < plans.length; i++)
      expect(Math.abs(plans[i]!.error_hz)).toBeGreaterThanOrEqual(
        Math.abs(plans[i - 1]!.error_hz) - 1e-6,
      );
  });

  it("holds exact trims, the best of whole rings and a mixed plan", () => {
    const { plans } = planRings(request(denSub));
    expect(plans.length).toBeLessThanOrEqual(12);
    expect(Math.abs(plans[0]!.error_hz)).toBeLessThan(1e-6);
    expect(plans[0]!.trim_tube_m).toBeGreaterThanOrEqual(0.001);
    const whole = planRings(request(denSub, { may_trim_tube: false })).plans[0]!;
    expect(plans).toContainEqual(whole);
    expect(plans.some((plan) => plan.rings.length > 1)).toBe(true);
  });

  it("tells the tuning and the length of the vent as it is built", () => {
    const asked = request(denSub);
    for (const plan of planRings(asked).plans) {
      const design = built(asked, plan.rings, plan.trim_tube_m);
      expect(plan.tuning_hz / tuningOf(design)!).toBeCloseTo(1, 8);
      const added = plan.rings.reduce(
        (sum, { sheet, count }) =>
          sum + count * (sheets.find(({ name }) => name === sheet)!.thickness_m + 0.0001),
        0,
      );
      expect(plan.added_length_m).toBeCloseTo(added, 9);
      // Tube 220 mm and a plate of 17.7 mm with its glue line.
      expect(plan.overall_length_m).toBeCloseTo(0.22 + 0.0178 + added - plan.trim_tube_m, 9);
      expect(plan.reason.length).toBeGreaterThan(10);
    }
  });

  it("spreads by a sheet's mean together, by its scatter and the glue apart", () => {
    const asked = request(denSub, { may_trim_tube: false });
    const plan = planRings(asked).plans.find(({ rings }) => rings.length > 1)!;
    let variance = 0;
    for (const { sheet, count } of plan.rings) {
      const found = sheets.find(({ name }) => name === sheet)!;
      variance += (count * found.thickness_sd_m) ** 2;
      variance += count * ((found.within_sheet_sd_m ?? 0) ** 2 + 0.00003 ** 2);
    }
    const step = 0.0005;
    const slope =
      (tuningOf(built(asked, plan.rings, 0, step))! -
        tuningOf(built(asked, plan.rings, 0, -step))!) /
      (2 * step);
    expect(plan.tuning_sd_hz / (Math.abs(slope) * Math.sqrt(variance))).toBeCloseTo(1, 4);
  });

  it("never trims less than the saw takes", () => {
    for (const trim_loss_m of [0.001, 0.004, 0.009])
      for (const plan of planRings(request(denSub, { trim_loss_m })).plans)
        if (plan.trim_tube_m !== 0)
          expect(plan.trim_tube_m).toBeGreaterThanOrEqual(trim_loss_m - 1e-9);
  });

  it("trims without rings where the tube is already longer than it has to be", () => {
    const { plans } = planRings(request(denSub, { tuning_hz: 40 }));
    const noRings = plans.find(({ rings, trim_tube_m }) => rings.length === 0 && trim_tube_m > 0);
    expect(Math.abs(noRings!.error_hz)).toBeLessThan(1e-6);
  });

  it("refuses a tuning out of reach and says the range", () => {
    for (const tuning_hz of [10, 300]) {
      const asked = request(denSub, { tuning_hz, may_trim_tube: false });
      expect(() => planRings(asked)).toThrow(InputError);
      try {
        planRings(asked);
      } catch (error) {
        expect(error).toMatchObject({ code: "tuning_out_of_reach", path: "tuning_hz" });
        expect((error as InputError).allowed).toMatch(/^\d+\.\d\d to \d+\.\d\d Hz$/);
      }
    }
  });

  it("checks the inner end on each plan: a flare with no wood is refused", () => {
    const thin = request(ventOnly, { ring_outer_diameter_m: 0.085 });
    expect(() => planRings(thin)).toThrow(InputError);
  });

  it("refuses rings no wider than the bore, a slot and a vent that is not there", () => {
    expect(() => planRings(request(denSub, { ring_outer_diameter_m: 0.1 }))).toThrow(
      /no wider than the bore/,
    );
    expect(() => planRings(request(denSub, { vent: 2 }))).toThrow(/no vent 2/);
  });
});

describe("oneMoreOneLess", () => {
  it("sets one ring less and one more beside the stack", () => {
    const design = designSchema.parse(denSub);
    const rows = oneMoreOneLess(design, 0);
    expect(rows.map(({ count, present }) => [count, present])).toEqual([
      [4, false],
      [5, true],
      [6, false],
    ]);
    expect(rows[2]!.overall_length_m - rows[1]!.overall_length_m).toBeCloseTo(0.0178, 9);
    expect(rows[0]!.change_hz).toBeGreaterThan(0.3);
    expect(rows[1]!.change_hz).toBe(0);
    expect(rows[2]!.change_hz).toBeLessThan(-0.3);
  });

  it("has nothing to say of a vent that is not there", () => {
    expect(oneMoreOneLess(designSchema.parse(denSub), 5)).toEqual([]);
  });
});
