/**
 * Arithmetic with units: `18 mm + 3/8 in`, `2 * 17.7 mm`. Only this module knows mathjs, and only
 * loads it when someone types more than one number.
 */
import type { Unit } from "mathjs";
import { notUnderstood, parseQuantity, withoutNoise, type Parsed } from "./parse";
import { plainText } from "./plain-text";
import type { QuantityKind, UnitPreferences } from "./preferences";
import { shownUnits } from "./shown-units";

/** Kinds that arithmetic makes sense for, and the unit mathjs answers them in. */
const asked: Partial<Record<QuantityKind, string>> = {
  length: "m",
  area: "m^2",
  volume: "m^3",
  speed: "m/s",
  frequency: "Hz",
  resistance: "ohm",
  voltage: "V",
  power: "W",
  pressure: "Pa",
  mass: "kg",
  inductance: "H",
  time: "s",
};

/** How people write units, as mathjs writes them; longer ones first. */
const spellings: [RegExp, string][] = [
  [/(\d+)(?: |-)(\d+) ?\/ ?(\d+)/g, "($1+$2/$3)"],
  [/\b(?:cu\.? ?ft|cubic (?:feet|foot)|ft3)(?![a-z\d])/gi, "ft^3"],
  [/\b(?:cu\.? ?in|cubic inch(?:es)?|in3)(?![a-z\d])/gi, "inch^3"],
  [/\b(?:sq\.? ?ft|square (?:feet|foot)|ft2)(?![a-z\d])/gi, "ft^2"],
  [/\b(?:sq\.? ?in|square inch(?:es)?|in2)(?![a-z\d])/gi, "inch^2"],
  [/(?<![a-z])(mm|cm|dm|m)([23])(?![a-z\d])/gi, "$1^$2"],
  [/"/g, " inch"],
  [/'/g, " ft"],
  [/(?<![a-z])(?:in\.|inches|inch|in)(?![a-z])/gi, "inch"],
  [/(?<![a-z])(?:feet|foot|ft\.)(?![a-z])/gi, "ft"],
  [/(?<![a-z])(?:lit(?:re|er)s?|l)(?![a-z])/gi, "L"],
  [/(?<![a-z])cc(?![a-z])/gi, "cm^3"],
  [/Ω/g, "ohm"],
  [/ohms/gi, "ohm"],
  [/hz(?![a-z])/gi, "Hz"],
  [/,/g, "."],
];

const KNOWN =
  /^(?:mm|cm|dm|m|um|inch|ft|L|mL|ml|s|ms|Hz|kHz|khz|ohm|V|mV|W|kW|Pa|hPa|kPa|g|kg|mg|lb|oz|H|mH)$/;

/** More than one number with something between: worth loading the arithmetic for. */
export function looksLikeExpression(text: string): boolean {
  return /\d[^\d]*[-+*/()][^\d]*\d/.test(plainText(text)) || /[()]/.test(text);
}

/**
 * Reads what `parseQuantity` cannot: sums, products, brackets, mixed units. Numbers without any
 * unit in the whole expression are in the person's own unit.
 */
export async function parseExpression(
  text: string,
  kind: QuantityKind,
  preferences: UnitPreferences,
): Promise<Parsed> {
  const simple = parseQuantity(text, kind, preferences);
  if (simple.ok || !looksLikeExpression(text)) return simple;
  const spelt = spellings.reduce(
    (current, [pattern, name]) => current.replace(pattern, name),
    plainText(text),
  );
  const words = spelt.match(/[a-zA-Zµ°%]+/g) ?? [];
  const strange = words.find((word) => !KNOWN.test(word));
  if (strange) return { ok: false, message: `The unit “${strange}” is not known here.` };
  if (!/^[\d.\s+\-*/^()a-zA-Z]+$/.test(spelt))
    return { ok: false, message: notUnderstood(text, kind) };
  try {
    const { evaluateExpression } = await import("./expression-engine");
    return inKind(evaluateExpression(spelt), text, kind, preferences);
  } catch (error) {
    return { ok: false, message: reasonOf(error, text, kind) };
  }
}

function inKind(
  result: number | Unit,
  text: string,
  kind: QuantityKind,
  { system }: UnitPreferences,
): Parsed {
  const { per, offset = 0 } = shownUnits[kind][system];
  const unit = asked[kind];
  const value =
    typeof result === "number" ? result * per + offset : unit ? result.toNumber(unit) : Number.NaN;
  return Number.isFinite(value)
    ? { ok: true, value: withoutNoise(value) }
    : { ok: false, message: notUnderstood(text, kind) };
}

function reasonOf(error: unknown, text: string, kind: QuantityKind): string {
  const message = error instanceof Error ? error.message : "";
  if (/units do not match|unit/i.test(message))
    return `“${text.trim()}” mixes units that do not make a ${kind}.`;
  return notUnderstood(text, kind);
}
