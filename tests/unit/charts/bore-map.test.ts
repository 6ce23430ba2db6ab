import { describe, expect, it } from "vitest";
import type { MapLines, MapPoint } from "@/lib/charts/bore-map";
import {
  boreMapSummary,
  describePick,
  pointBetween,
  probeAtPixel,
  probeNear,
  roomWords,
  stepAlong,
  stepCount,
} from "@/lib/charts/bore-map";
import { boreDomain, tooLongCorners } from "@/lib/charts/bore-plot";
import { linearScale, pixelMap } from "@/lib/charts/scale";

const metric = { system: "metric", tape: 32 } as const;

/** Made up: two vents of a bore are twice as long as one; over 400 mm is too long. */
const lines: MapLines = [1, 2].map((count) => ({
  count,
  points: [0.06, 0.08, 0.1, 0.12, 0.14].map((diameter_m): MapPoint => {
    const overall_length_m = 30 * count * diameter_m ** 2;
    return {
      count,
      diameter_m,
      peak_air_speed_m_s: 0.16 / (count * diameter_m ** 2),
      overall_length_m,
      clearance_m: 0.5 - overall_length_m,
      pipe_resonance_hz: 171.6 / overall_length_m,
      fits: overall_length_m <= 0.4,
    };
  }),
}));

describe("the bore map", () => {
  it("finds the candidate nearest to a bore", () => {
    expect(probeNear(lines, 2, 0.101)).toEqual({ series: 1, point: 2 });
    expect(probeNear(lines, 3, 0.101)).toBeNull();
  });

  it("reads between candidates, and says too long where either is", () => {
    const between = pointBetween(lines, 1, 0.09);
    expect(between?.overall_length_m).toBeCloseTo((0.192 + 0.3) / 2, 12);
    expect(between?.fits).toBe(true);
    expect(pointBetween(lines, 1, 0.11)?.fits).toBe(false);
    expect(pointBetween(lines, 1, 0.2)).toBeNull();
  });

  it("moves along a curve and between counts, never off them", () => {
    const probe = { series: 0, point: 3 };
    expect(stepAlong(lines, probe, 10)).toEqual({ series: 0, point: 4 });
    expect(stepAlong(lines, probe, -Infinity)).toEqual({ series: 0, point: 0 });
    expect(stepCount(lines, probe, 1)).toEqual({ series: 1, point: 3 });
    expect(stepCount(lines, probe, -1)).toBe(probe);
  });

  it("picks the nearest place in pixels", () => {
    const toX = (bore: number) => bore * 1000;
    const toY = (speed: number) => 200 - 4 * speed;
    // One vent of 100 mm: 16 m/s, at (100, 136).
    expect(probeAtPixel(lines, "air-speed", toX, toY, 103, 131)).toEqual({ series: 0, point: 2 });
  });

  it("describes a candidate in the person's units", () => {
    const pick = lines[0]?.points[2];
    if (!pick) throw new Error("the test's own data has this point");
    expect(describePick(pick, metric).replace(/\s/g, " ")).toBe(
      "one vent, 100.0 mm: 16.0 m/s, 300.0 mm long, first pipe resonance 572 Hz, fits",
    );
  });

  it("tells a near wall from a box that is too short", () => {
    const base = { ...lines[0]!.points[2]!, diameter_m: 0.1 };
    expect(roomWords({ ...base, clearance_m: 0.1 })).toBe("fits");
    expect(roomWords({ ...base, clearance_m: 0.099 })).toBe("fits, but near the wall");
    expect(roomWords({ ...base, clearance_m: 0.2, fits: false })).toBe("too long for the box");
  });

  it("sums up from which bore each count is quiet enough", () => {
    const text = boreMapSummary(lines, 15, metric).replace(/\s/g, " ");
    expect(text).toContain("widest that fits: one vent, 100.0 mm");
    expect(text).toContain("inside the limit from two vents, 80.0 mm: 12.5 m/s");
  });

  it("spans the bores worth showing", () => {
    // Fitting ends at 100 mm; a quarter more is shown, in round steps.
    expect(boreDomain(lines, 1000, null)).toEqual([60, 120]);
  });

  it("shades what is too long below the line through the last that fit", () => {
    const x = linearScale([60, 140], [0, 80]);
    const map = pixelMap(linearScale([0, 40], [160, 0]), 1);
    // Two vents end at 80 mm, 12.5 m/s; one vent at 100 mm, 16 m/s.
    expect(tooLongCorners(lines, "air-speed", x, map, 1000)).toBe(
      "20.0,160.0 20.0,110.0 40.0,96.0 80.0,96.0 80.0,160.0",
    );
  });
});
