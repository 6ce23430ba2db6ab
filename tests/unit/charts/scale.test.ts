import { describe, expect, it } from "vitest";
import { linearScale, logScale, pixelMap } from "@/lib/charts/scale";

describe("scales", () => {
  it("puts the geometric mean in the middle of a logarithmic axis", () => {
    const scale = logScale([10, 1000], [40, 440]);
    expect(scale.toPixel(10)).toBeCloseTo(40, 9);
    expect(scale.toPixel(100)).toBeCloseTo(240, 9);
    expect(scale.toPixel(1000)).toBeCloseTo(440, 9);
    expect(scale.toPixel(1)).toBeCloseTo(-160, 9);
    expect(scale.toValue(340)).toBeCloseTo(316.2278, 3);
  });

  it("runs upwards when its range does", () => {
    const scale = linearScale([-5, 20], [105, 5]);
    expect(scale.toPixel(-5)).toBe(105);
    expect(scale.toPixel(0)).toBe(85);
    expect(scale.toValue(25)).toBe(15);
  });

  it("folds the unit into the map from SI to pixels", () => {
    // 0 to 15 mm over 75 px: a metre is 1000 mm, 5 px each.
    const map = pixelMap(linearScale([0, 15], [82, 7]), 1000);
    expect(map.offset + map.gain * 0.012).toBeCloseTo(22, 9);
    expect([map.top, map.bottom]).toEqual([7, 82]);
  });
});
