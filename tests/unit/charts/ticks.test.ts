import { describe, expect, it } from "vitest";
import { frequencyGrid, frequencyTicks, linearTicks, niceCeiling } from "@/lib/charts/ticks";
import { thirdOctaves } from "@/lib/charts/figures";

describe("ticks", () => {
  it("rules the frequency axis in the recorder's steps", () => {
    expect(frequencyGrid([10, 500])).toEqual([
      10, 15, 20, 30, 40, 50, 70, 100, 150, 200, 300, 400, 500,
    ]);
    expect(frequencyGrid([12, 33])).toEqual([15, 20, 30]);
    expect(frequencyGrid([0, 100])).toEqual([]);
  });

  it("drops the less round labels first where there is little room", () => {
    expect(frequencyTicks([10, 500], 120)).toEqual([10, 100, 500]);
    expect(frequencyTicks([10, 500], 200)).toEqual([10, 20, 50, 100, 200, 500]);
    const wide = frequencyTicks([10, 500], 2000);
    expect(wide).toEqual(frequencyGrid([10, 500]));
  });

  it("steps linear axes by 1, 2 or 5", () => {
    expect(linearTicks([0, 20], 4)).toEqual([0, 5, 10, 15, 20]);
    expect(linearTicks([72, 112], 4)).toEqual([80, 90, 100, 110]);
    expect(linearTicks([0, 0.6], 3)).toEqual([0, 0.2, 0.4, 0.6]);
    expect(linearTicks([3, 3], 4)).toEqual([]);
  });

  it("rounds the top of an axis up, never down", () => {
    expect(niceCeiling(18.02)).toBe(20);
    expect(niceCeiling(0.011)).toBe(0.012);
    expect(niceCeiling(25)).toBe(25);
    expect(niceCeiling(0)).toBe(0);
  });

  it("tabulates at the nominal third octaves of ISO 266", () => {
    expect(thirdOctaves([10, 100])).toEqual([10, 12.5, 16, 20, 25, 31.5, 40, 50, 63, 80, 100]);
    expect(thirdOctaves([300, 500])).toEqual([315, 400, 500]);
  });
});
