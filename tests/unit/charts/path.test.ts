import { describe, expect, it } from "vitest";
import { curveTracer } from "@/lib/charts/path";
import { linearScale, pixelMap } from "@/lib/charts/scale";

const x = linearScale([0, 10], [0, 100]);
/** 0 to 10 over 100 px, upwards. */
const map = pixelMap(linearScale([0, 10], [100, 0]), 1);

describe("curve paths", () => {
  it("joins points inside the plot", () => {
    expect(curveTracer([0, 5, 10], x).trace([1, 2, 1.234], map)).toBe("M0 90L50 80L100 87.66");
  });

  it("breaks at a gap", () => {
    const tracer = curveTracer([0, 2, 4, 6, 8], x);
    expect(tracer.trace([1, 1, null, 3, 3], map)).toBe("M0 90L20 90M60 70L80 70");
    expect(tracer.trace([1, NaN, 1, Infinity, 1], map)).toBe("M0 90M40 90M80 90");
    expect(tracer.trace([null, null, null, null, null], map)).toBe("");
  });

  it("cuts at the edge of the plot where the curve leaves it", () => {
    // From 8 to 12 over four units: the edge at 10 is reached halfway.
    expect(curveTracer([0, 4], x).trace([8, 12], map)).toBe("M0 20L20 0");
    expect(curveTracer([0, 4], x).trace([12, 8], map)).toBe("M20 0L40 20");
    // Both ends outside, the middle of the segment inside.
    expect(curveTracer([0, 4], x).trace([-10, 20], map)).toBe("M13.33 100L26.67 0");
    expect(curveTracer([0, 4, 8], x).trace([11, 12, 13], map)).toBe("");
  });

  it("leaves out what lies beside the axis", () => {
    expect(curveTracer([-5, 0, 5, 15], x).trace([1, 1, 2, 3], map)).toBe("M0 90L50 80");
  });

  it("thins a long curve but keeps its peaks", () => {
    const at = Array.from({ length: 2001 }, (_, i) => i / 200);
    const values = at.map((_, i) => (i === 777 ? 9 : 1 + i / 1000));
    const path = curveTracer(at, x, 100).trace(values, map);
    const points = path.split(/[ML]/).length - 1;
    expect(points).toBeGreaterThan(95);
    expect(points).toBeLessThan(110);
    expect(path).toContain(" 10L");
    expect(path.startsWith("M0 90")).toBe(true);
    expect(path.endsWith("L100 70")).toBe(true);
  });
});
