import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { editableQuantity } from "@/lib/units/editable";
import { formatQuantity } from "@/lib/units/format";
import { tapeFraction } from "@/lib/units/fraction";
import { parseQuantity } from "@/lib/units/parse";
import type { QuantityKind, UnitPreferences } from "@/lib/units/preferences";

const metric: UnitPreferences = { system: "metric", tape: 32 };
const tape16: UnitPreferences = { system: "imperial", tape: 16 };

describe("formatQuantity", () => {
  it("shows lengths to a tenth of a millimetre, or to the tape", () => {
    expect(formatQuantity(0.2085, "length", metric)).toMatchObject({
      value: "208.5",
      unit: "mm",
      text: "208.5 mm",
      other: "8 7/32 in",
    });
    // 208.5 mm is 8.2087 in; the nearest sixteenth is 8 3/16 in, 207.9625 mm.
    const onTape = formatQuantity(0.2085, "length", tape16);
    expect(onTape).toMatchObject({ text: "8 3/16 in", other: "208.5 mm" });
    expect(onTape.rounding).toBeCloseTo(-0.0005375, 9);
  });

  it("never shows a small thing as nothing", () => {
    expect(formatQuantity(0.0001, "length", metric).text).toBe("0.10 mm");
    expect(formatQuantity(0.0001, "length", tape16).text).toBe("0.004 in");
    expect(formatQuantity(0.0005, "volume", metric).text).toBe("0.500 L");
  });

  it("gives zero no sign", () => {
    expect(formatQuantity(-0, "length", metric).text).toBe("0 mm");
    expect(formatQuantity(-0.04, "level", metric, { signed: true }).text).toBe("0.0 dB");
    expect(formatQuantity(0.04, "level", metric, { signed: true }).text).toBe("0.0 dB");
  });

  it("signs with a true minus", () => {
    expect(formatQuantity(-0.2, "frequency", metric, { signed: true }).text).toBe("−0.20 Hz");
    expect(formatQuantity(1.4, "speed", metric, { signed: true }).text).toBe("+1.4 m/s");
  });

  it("reads decimal inches where finer than a tape is asked for", () => {
    expect(formatQuantity(0.0177, "length", tape16, { digits: 2 }).text).toBe("0.697 in");
  });

  it("says nothing in the other system where there is none", () => {
    expect(formatQuantity(32.8, "frequency", metric).other).toBe("");
    expect(formatQuantity(20, "temperature", metric).other).toBe("68 °F");
  });

  it("lets nothing through that is not a figure", () => {
    expect(formatQuantity(Number.NaN, "length", metric).text).toBe("–");
    expect(formatQuantity(Infinity, "speed", tape16).text).toBe("–");
  });
});

describe("tapeFraction", () => {
  it("is in lowest terms", () => {
    expect(tapeFraction(1.5, 64).words).toBe("1 1/2");
    expect(tapeFraction(8.19, 16)).toEqual({ words: "8 3/16", inches: 8.1875 });
    expect(tapeFraction(0.999, 16).words).toBe("1");
    expect(tapeFraction(0, 32).words).toBe("0");
  });
});

const kinds: QuantityKind[] = ["length", "area", "volume", "speed", "frequency", "temperature"];
const preferences = fc.record({
  system: fc.constantFrom("metric" as const, "imperial" as const),
  tape: fc.constantFrom(16 as const, 32 as const, 64 as const),
});
const sizes = fc.double({ min: 1e-4, max: 50, noNaN: true });

describe("reading back what was shown", () => {
  it("parse(format(x)) is x but for the rounding told", () => {
    fc.assert(
      fc.property(
        sizes,
        fc.boolean(),
        fc.constantFrom(...kinds),
        preferences,
        (x, below, kind, p) => {
          const given = below ? -x : x;
          const { text, rounding } = formatQuantity(given, kind, p);
          const parsed = parseQuantity(text, kind, p);
          expect(parsed.ok && Math.abs(parsed.value - given - rounding)).toBeLessThan(
            1e-9 * Math.max(1, Math.abs(given)),
          );
        },
      ),
    );
  });

  it("a length on a tape is at most half a mark off", () => {
    fc.assert(
      fc.property(sizes, fc.constantFrom(16 as const, 32 as const, 64 as const), (x, tape) => {
        const { rounding } = formatQuantity(x, "length", { system: "imperial", tape });
        expect(Math.abs(rounding)).toBeLessThanOrEqual((0.0254 / tape / 2) * (1 + 1e-9));
      }),
    );
  });

  it("a field left untouched moves nothing a shop could measure", () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-4, max: 3, noNaN: true }), preferences, (x, p) => {
        const parsed = parseQuantity(editableQuantity(x, "length", p), "length", p);
        expect(parsed.ok && Math.abs(parsed.value - x)).toBeLessThan(0.000_015);
      }),
    );
  });

  it("a field keeps what was typed", () => {
    expect(editableQuantity(0.01905, "length", metric)).toBe("19.05");
    expect(editableQuantity(0.01905, "length", tape16)).toBe("3/4");
    expect(editableQuantity(0.0177, "length", tape16)).toBe("0.6969");
    expect(editableQuantity(0.0177, "length", metric)).toBe("17.7");
    expect(editableQuantity(2.83, "voltage", metric)).toBe("2.83");
    expect(editableQuantity(16, "voltage", metric)).toBe("16");
  });
});

describe("a field in the other system", () => {
  it("has one place more, not all the digits of the conversion", () => {
    // 68.4 L / 28.316846592 L per ft³ = 2.41552…
    expect(editableQuantity(0.0684, "volume", tape16)).toBe("2.416");
    expect(editableQuantity(0.0684, "volume", metric)).toBe("68.4");
    expect(editableQuantity(0.01234, "length", metric)).toBe("12.34");
  });
});
