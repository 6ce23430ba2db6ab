import { describe, expect, it } from "vitest";
import { rangeMessage } from "@/lib/units/range";
import { stepped } from "@/lib/units/step";
import type { UnitPreferences } from "@/lib/units/preferences";

const metric: UnitPreferences = { system: "metric", tape: 32 };
const tape16: UnitPreferences = { system: "imperial", tape: 16 };
const bore = { kind: "length" as const, min: 0.005, max: 2, step: 0.0005 };

describe("stepped", () => {
  it("takes the step given in metric", () => {
    expect(stepped(0.101, 1, bore, metric)).toBeCloseTo(0.1015, 12);
    expect(stepped(0.101, -10, bore, metric)).toBeCloseTo(0.096, 12);
  });

  it("goes from mark to mark on a tape", () => {
    // 101 mm is 3.976 in: between 3 15/16 in (100.0125 mm) and 4 in (101.6 mm).
    expect(stepped(0.101, 1, bore, tape16)).toBeCloseTo(0.1016, 12);
    expect(stepped(0.101, -1, bore, tape16)).toBeCloseTo(0.1000125, 12);
    expect(stepped(0.1016, 1, bore, tape16)).toBeCloseTo(0.1031875, 12);
  });

  it("takes thousandths of an inch where a caliper measures", () => {
    const sheet = { ...bore, min: 0, step: 0.0001 };
    expect(stepped(0.0127, 1, sheet, tape16)).toBeCloseTo(0.0127254, 12);
  });

  it("takes round steps in other units", () => {
    // Half a litre is 0.0177 ft³; the nearest round step is 0.02 ft³.
    const volume = { kind: "volume" as const, min: 0, max: 10, step: 0.0005 };
    expect(stepped(0.028316846592, 1, volume, tape16)).toBeCloseTo(0.02888318352384, 12);
  });

  it("stops at the ends of the range", () => {
    expect(stepped(0.0052, -1, bore, metric)).toBe(0.005);
    expect(stepped(1.9999, 10, bore, metric)).toBe(2);
  });
});

describe("rangeMessage", () => {
  it("names the field, the value and the range in the person's unit", () => {
    expect(rangeMessage("Bore", 0.003, bore, metric)).toBe(
      "Bore: 3.0 mm is not allowed. It can be 5 to 2000 mm.",
    );
    expect(rangeMessage("Bore", 0.00254, bore, tape16)).toBe(
      "Bore: 0.1 in is not allowed. It can be 0.1969 to 78.7402 in.",
    );
    expect(rangeMessage("Bore", 0.1, bore, metric)).toBeNull();
  });
});
