import { describe, expect, it } from "vitest";
import { InputError } from "@/lib/acoustics/input-error";
import { jigCard, type JigRequest } from "@/lib/workshop/jig";

const ring: JigRequest = { bore_m: 0.102, outer_diameter_m: 0.152, bit_diameter_m: 0.008 };

describe("jigCard", () => {
  it("says nothing where nothing is amiss", () => {
    const card = jigCard(ring);
    expect(card.warnings).toEqual([]);
    expect(card.round_over).toBeNull();
    expect(card.inside.bushing_template_diameter_m).toBeNull();
    expect(card.outside.bushing_template_diameter_m).toBeNull();
  });

  it("refuses a ring without a wall and says what it would take", () => {
    expect(() => jigCard({ ...ring, outer_diameter_m: 0.1 })).toThrow(InputError);
    try {
      jigCard({ ...ring, outer_diameter_m: 0.1 });
    } catch (error) {
      expect(error).toMatchObject({
        code: "ring_without_wall",
        path: "outer_diameter_m",
        allowed: "more than 102 mm",
      });
    }
  });

  it("warns of a bit wider than the bore", () => {
    const card = jigCard({ bore_m: 0.01, outer_diameter_m: 0.06, bit_diameter_m: 0.0127 });
    expect(card.warnings.join(" ")).toMatch(/bit \(12\.7 mm\).*cannot cut this hole/);
  });

  it("warns of a pivot under the base, a thin wall and a bushing that does not clear the bit", () => {
    expect(jigCard({ ...ring, bore_m: 0.05 }).warnings.join(" ")).toMatch(
      /under the router's base/,
    );
    expect(jigCard({ ...ring, bore_m: 0.134 }).warnings.join(" ")).toMatch(/below 10 mm/);
    expect(jigCard({ ...ring, bore_m: 0.13 }).warnings.join(" ")).toMatch(/12 mm or more/);
    expect(jigCard({ ...ring, bushing_diameter_m: 0.008 }).warnings.join(" ")).toMatch(
      /no wider than the bit/,
    );
  });

  it("finds a round-over that reaches the outside not feasible", () => {
    const card = jigCard({ ...ring, round_over_radius_m: 0.0254, stack_depth_m: 0.053 });
    expect(card.round_over?.feasible).toBe(false);
    expect(card.warnings.join(" ")).toMatch(/leaves no edge/);
  });

  it("does not hold an unknown stack depth against a round-over, but asks for it", () => {
    const card = jigCard({ ...ring, round_over_radius_m: 0.0127 });
    expect(card.round_over?.feasible).toBe(true);
    expect(card.warnings.join(" ")).toMatch(/at least 19\.1 mm/);
  });

  it("takes the bearing's own diameter where it is given", () => {
    const card = jigCard({ ...ring, round_over_radius_m: 0.0127, bearing_diameter_m: 0.016 });
    expect(card.round_over?.bore_needed_m).toBeCloseTo(0.0287, 9);
  });
});
