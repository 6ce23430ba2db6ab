import { create, unitDependencies, type MathJsInstance } from "mathjs";
import { describe, expect, it } from "vitest";
import { parseQuantity } from "@/lib/units/parse";
import type { QuantityKind, UnitPreferences } from "@/lib/units/preferences";

const metric: UnitPreferences = { system: "metric", tape: 32 };
const imperial: UnitPreferences = { system: "imperial", tape: 16 };

function value(text: string, kind: QuantityKind, preferences = metric): number {
  const parsed = parseQuantity(text, kind, preferences);
  if (!parsed.ok) throw new Error(parsed.message);
  return parsed.value;
}

function refusal(text: string, kind: QuantityKind): string {
  const parsed = parseQuantity(text, kind, metric);
  return parsed.ok ? `read as ${parsed.value}` : parsed.message;
}

describe("lengths as people write them", () => {
  // Inch 25.4 mm, foot 304.8 mm: exact by definition.
  it.each([
    ["3/4 in", 0.01905],
    ['1 1/2"', 0.0381],
    ["1-1/2 in", 0.0381],
    ["1½″", 0.0381],
    ["½ in", 0.0127],
    ["18 mm", 0.018],
    ["18mm", 0.018],
    ["18", 0.018],
    ["1,5 mm", 0.0015],
    [".5 in", 0.0127],
    ["1,234.5 mm", 1.2345],
    ["5' 2\"", 1.5748],
    ["5′ 2½″", 1.5875],
    ["5 ft 2 in", 1.5748],
    ["2 ft", 0.6096],
    ["12 cm", 0.12],
    ["−3 mm", -0.003],
    ["0.75 inches", 0.01905],
  ])("%s", (text, expected) => {
    expect(value(text, "length")).toBeCloseTo(expected, 12);
  });

  it("reads a plain number in the person's own unit", () => {
    expect(value("18", "length", metric)).toBe(0.018);
    expect(value("18", "length", imperial)).toBe(0.4572);
    expect(value("2", "volume", imperial)).toBeCloseTo(0.056633693184, 12);
    expect(value("68", "temperature", imperial)).toBe(20);
  });

  it("leaves no noise of the conversion", () => {
    expect(value("18 mm", "length")).toBe(0.018);
    expect(value("17.7", "length")).toBe(0.0177);
    expect(value("1 1/2 in", "length")).toBe(0.0381);
  });
});

describe("other kinds", () => {
  it.each([
    ["60 L", "volume", 0.06],
    ["60 l", "volume", 0.06],
    ["2.1 ft3", "volume", 0.0594653778432],
    ["2.1 cu ft", "volume", 0.0594653778432],
    ["2.1 cu. ft.", "volume", 0.0594653778432],
    ["2.1 ft³", "volume", 0.0594653778432],
    ["346 cm²", "area", 0.0346],
    ["40 Hz", "frequency", 40],
    ["1.2 kHz", "frequency", 1200],
    ["35 V", "voltage", 35],
    ["17 m/s", "speed", 17],
    ["55 ft/s", "speed", 16.764],
    ["68 F", "temperature", 20],
    ["20 °C", "temperature", 20],
    ["293.15 K", "temperature", 20],
    ["1013.25 hPa", "pressure", 101_325],
    ["50", "humidity", 0.5],
    ["50 %", "humidity", 0.5],
    ["0,45", "ratio", 0.45],
    ["3.6 Ω", "resistance", 3.6],
    ["250 mΩ", "resistance", 0.25],
    ["1.6 mH", "inductance", 0.0016],
    ["4", "count", 4],
    ["400 watts", "power", 400],
  ] as const)("%s", (text, kind, expected) => {
    expect(Math.abs(value(text, kind) / expected - 1)).toBeLessThan(1e-11);
  });
});

describe("what is not understood", () => {
  it("says what, and gives an example", () => {
    expect(refusal("abc", "length")).toBe('“abc” is not understood. Type 18 mm, 3/4 in or 1 1/2".');
    expect(refusal("12 V", "length")).toContain("“V” is not a unit of length.");
    expect(refusal("3 foo", "volume")).toContain("The unit “foo” is not known. Type 60 L");
    expect(refusal("3/0 in", "length")).toBe("“3/0” divides by zero.");
    expect(refusal("", "frequency")).toBe("Nothing typed. Type 32.5 Hz.");
    expect(refusal("12..3", "length")).toContain("not understood");
    expect(refusal("1e999", "length")).toContain("not understood");
  });

  it("asks where a comma can be read two ways", () => {
    expect(refusal("1,234", "length")).toBe("“1,234” can be read two ways. Type 1.234 or 1234.");
    expect(value("0,125", "length")).toBe(0.000125);
  });
});

describe("against the unit tables of an independent program", () => {
  const math = create(unitDependencies!) as Pick<MathJsInstance, "unit">;
  it.each([
    ["3.7 mm", "length", "3.7 mm", "m"],
    ["3.7 in", "length", "3.7 inch", "m"],
    ["3.7 ft", "length", "3.7 ft", "m"],
    ["3.7 L", "volume", "3.7 L", "m^3"],
    ["3.7 ml", "volume", "3.7 ml", "m^3"],
    ["3.7 ft3", "volume", "3.7 ft^3", "m^3"],
    ["3.7 in3", "volume", "3.7 inch^3", "m^3"],
    ["3.7 in2", "area", "3.7 inch^2", "m^2"],
    ["3.7 cm2", "area", "3.7 cm^2", "m^2"],
    ["3.7 ft/s", "speed", "3.7 ft/s", "m/s"],
    ["3.7 mph", "speed", "3.7 mi/hour", "m/s"],
    ["3.7 km/h", "speed", "3.7 km/hour", "m/s"],
    ["3.7 °F", "temperature", "3.7 degF", "degC"],
    ["3.7 lb", "mass", "3.7 lbm", "kg"],
    ["3.7 oz", "mass", "3.7 oz", "kg"],
    ["3.7 atm", "pressure", "3.7 atm", "Pa"],
    ["3.7 bar", "pressure", "3.7 bar", "Pa"],
    ["3.7 mH", "inductance", "3.7 mH", "H"],
    ["3.7 kW", "power", "3.7 kW", "W"],
  ] as const)("%s", (text, kind, theirs, unit) => {
    const expected = math.unit(theirs).toNumber(unit);
    expect(Math.abs(value(text, kind) / expected - 1)).toBeLessThan(1e-9);
  });
});
