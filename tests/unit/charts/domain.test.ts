import { describe, expect, it } from "vitest";
import { extentOf, windowDomain, zeroDomain } from "@/lib/charts/domain";
import { stripDomains } from "@/lib/charts/strip-domains";
import { plainCurves } from "./curves.data";

const metric = { system: "metric", tape: 32 } as const;

describe("domains", () => {
  it("skips gaps and what is not finite", () => {
    expect(
      extentOf(
        [
          [null, 3, NaN],
          [-2, Infinity],
        ],
        2,
      ),
    ).toEqual({ low: -4, high: 6 });
    expect(extentOf([[null], []])).toBeNull();
  });

  it("stands still while the curve fits and fills a fair part", () => {
    const first = zeroDomain(null, { low: 0, high: 17.2 });
    expect(first).toEqual([0, 20]);
    expect(zeroDomain(first, { low: 0, high: 19.9 })).toBe(first);
    expect(zeroDomain(first, { low: 0, high: 9.5 })).toBe(first);
    expect(zeroDomain(first, { low: 0, high: 20.1 })).toEqual([0, 25]);
    expect(zeroDomain(first, { low: 0, high: 8 })).toEqual([0, 10]);
  });

  it("opens below zero only where the values go there", () => {
    expect(zeroDomain(null, { low: -3.5, high: 9 })).toEqual([-4, 10]);
    expect(zeroDomain(null, { low: 0, high: 0 })).toEqual([0, 1]);
  });

  it("keeps a window of decibels until its top is passed or far away", () => {
    const first = windowDomain(null, 108.1, 40, 5);
    expect(first).toEqual([70, 110]);
    expect(windowDomain(first, 109.9, 40, 5)).toBe(first);
    expect(windowDomain(first, 99, 40, 5)).toBe(first);
    expect(windowDomain(first, 111, 40, 5)).toEqual([75, 115]);
    expect(windowDomain(first, 95, 40, 5)).toEqual([60, 100]);
  });

  it("keeps the whole set of strips when nothing outgrows it", () => {
    const curves = plainCurves();
    const limits = { xmax_m: 0.012, air_speed_m_s: 17 };
    const first = stripDomains(null, [curves], limits, metric, [10, 500]);
    // Excursion reaches 24 mm at 10 Hz; with x max at 12 mm the strip ends at 1.6 x max, rounded up.
    expect(first.excursion).toEqual([0, 25]);
    expect(first["air-speed"]).toEqual([0, 25]);
    expect(stripDomains(first, [curves], limits, metric, [10, 500])).toBe(first);
    const imperial = stripDomains(
      first,
      [curves],
      limits,
      { ...metric, system: "imperial" },
      [10, 500],
    );
    expect(imperial["air-speed"]).toEqual([0, 80]);
  });

  it("does not let values off the axis stretch a strip", () => {
    const curves = plainCurves();
    const near = stripDomains(null, [curves], {}, metric, [20, 200]);
    expect(near.excursion).toEqual([0, 15]);
  });
});
