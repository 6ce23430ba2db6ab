/**
 * The names people write units with, per kind: what one of them is in the value's own unit.
 * Factors are exact by definition where a definition exists (inch, foot, mile, pound, ounce,
 * atmosphere); inches of mercury by the conventional 3386.389 Pa.
 */
import type { QuantityKind } from "./preferences";

export interface NamedUnit {
  names: readonly string[];
  per: number;
  offset?: number;
}

const INCH = 0.0254;
const FOOT = 0.3048;
const POUND = 0.45359237;

const named = (per: number, ...names: string[]): NamedUnit => ({ names, per });

const degree = Math.PI / 180;

export const unitNames: Record<QuantityKind, readonly NamedUnit[]> = {
  length: [
    named(1e-3, "mm", "millimetre", "millimetres", "millimeter", "millimeters"),
    named(1e-2, "cm", "centimetre", "centimetres", "centimeter", "centimeters"),
    named(1, "m", "metre", "metres", "meter", "meters"),
    named(1e-6, "µm", "um"),
    named(INCH, "in", "inch", "inches", '"'),
    named(FOOT, "ft", "foot", "feet", "'"),
  ],
  area: [
    named(1e-4, "cm2", "cm^2", "sq cm"),
    named(1e-6, "mm2", "mm^2", "sq mm"),
    named(1, "m2", "m^2", "sq m"),
    named(INCH ** 2, "in2", "in^2", "sq in", "sqin", "square inch", "square inches"),
    named(FOOT ** 2, "ft2", "ft^2", "sq ft", "sqft", "square foot", "square feet"),
  ],
  volume: [
    named(1e-3, "l", "litre", "litres", "liter", "liters", "dm3", "dm^3"),
    named(1e-6, "ml", "cc", "cm3", "cm^3", "cu cm"),
    named(1e-9, "mm3", "mm^3"),
    named(1, "m3", "m^3", "cu m"),
    named(FOOT ** 3, "ft3", "ft^3", "cu ft", "cuft", "cubic foot", "cubic feet"),
    named(INCH ** 3, "in3", "in^3", "cu in", "cuin", "cubic inch", "cubic inches"),
  ],
  speed: [
    named(1, "m/s", "mps"),
    named(FOOT, "ft/s", "fps"),
    named(1 / 3.6, "km/h", "kph", "kmh"),
    named(1609.344 / 3600, "mph", "mi/h"),
  ],
  frequency: [named(1, "hz", "hertz", "1/s"), named(1e3, "khz")],
  resistance: [named(1, "Ω", "ohm", "ohms"), named(1e-3, "mΩ", "mohm"), named(1e3, "kΩ", "kohm")],
  voltage: [named(1, "v", "volt", "volts"), named(1e-3, "mv"), named(1e3, "kv")],
  power: [named(1, "w", "watt", "watts"), named(1e-3, "mw"), named(1e3, "kw")],
  temperature: [
    named(1, "°c", "c", "celsius", "degc", "deg c"),
    { names: ["°f", "f", "fahrenheit", "degf", "deg f"], per: 5 / 9, offset: -160 / 9 },
    { names: ["k", "kelvin"], per: 1, offset: -273.15 },
  ],
  pressure: [
    named(100, "hpa", "mbar", "millibar"),
    named(1, "pa"),
    named(1e3, "kpa"),
    named(1e5, "bar"),
    named(101_325, "atm"),
    named(3386.389, "inhg", "in hg"),
  ],
  humidity: [named(0.01, "%", "percent", "% rh")],
  mass: [
    named(1e-3, "g", "gram", "grams"),
    named(1e-6, "mg"),
    named(1, "kg"),
    named(POUND, "lb", "lbs", "pound", "pounds"),
    named(POUND / 16, "oz", "ounce", "ounces"),
  ],
  inductance: [named(1e-3, "mh"), named(1, "h", "henry"), named(1e-6, "µh", "uh")],
  time: [named(1e-3, "ms"), named(1, "s", "sec"), named(1e-6, "µs", "us")],
  level: [named(1, "db")],
  ratio: [named(0.01, "%", "percent")],
  angle: [named(1, "°", "deg", "degree", "degrees"), named(1 / degree, "rad")],
  count: [],
};

/** The unit a person wrote, or null: case as written first (mΩ), then without regard to it. */
export function findUnit(kind: QuantityKind, name: string): NamedUnit | null {
  const wanted = name.replace(/\./g, "").replace(/\s+/g, " ").trim();
  const units = unitNames[kind];
  return (
    units.find(({ names }) => names.includes(wanted)) ??
    units.find(({ names }) => names.some((one) => one.toLowerCase() === wanted.toLowerCase())) ??
    null
  );
}
