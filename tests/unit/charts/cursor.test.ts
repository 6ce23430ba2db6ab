import { describe, expect, it } from "vitest";
import { clampCursor, nearestIndex, resample, stepCursor, valueAt } from "@/lib/charts/cursor";

const frequency = [10, 20, 40, 80];

describe("the cursor", () => {
  it("finds the nearest point by ratio, not by difference", () => {
    expect(nearestIndex(frequency, 14)).toBe(0);
    expect(nearestIndex(frequency, 14.5)).toBe(1);
    expect(nearestIndex(frequency, 29)).toBe(2);
    expect(nearestIndex(frequency, 500)).toBe(3);
    expect(nearestIndex(frequency, 1)).toBe(0);
  });

  it("reads between points in proportion to the logarithm", () => {
    const values = [0, 1, 3, null];
    expect(valueAt(frequency, values, 20)).toBe(1);
    expect(valueAt(frequency, values, 20 * Math.SQRT2)).toBeCloseTo(2, 12);
    expect(valueAt(frequency, values, 40)).toBe(3);
    expect(valueAt(frequency, values, 50)).toBeNull();
    expect(valueAt(frequency, values, 9)).toBeNull();
    expect(valueAt([], [], 9)).toBeNull();
  });

  it("reads a curve at the frequencies of another", () => {
    expect(resample(frequency, [0, 1, 2, 3], [5, 20, 80])).toEqual([null, 1, 3]);
  });

  it("steps by a forty-eighth of an octave and stays on the axis", () => {
    expect(stepCursor(20, 48, [10, 500])).toBe(40);
    expect(stepCursor(20, 1, [10, 500])).toBe(20.29);
    expect(stepCursor(20, -480, [10, 500])).toBe(10);
    expect(clampCursor(28.41234, [10, 500])).toBe(28.41);
    expect(clampCursor(900, [10, 500])).toBe(500);
  });
});
