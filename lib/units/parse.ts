/** Quantities as people type them: `3/4 in`, `1 1/2"`, `18 mm`, `2.1 cu ft`, `60 L`, `5' 2"`. */
import { plainText } from "./plain-text";
import type { QuantityKind, UnitPreferences } from "./preferences";
import { readNumber, type NumberRead } from "./read-number";
import { fromShown, shownUnits } from "./shown-units";
import { findUnit, unitNames } from "./unit-names";

export type Parsed = { ok: true; value: number } | { ok: false; message: string };

/** What to type, per kind; the first stands in messages. */
export const examples: Record<QuantityKind, string> = {
  length: '18 mm, 3/4 in or 1 1/2"',
  area: "346 cm2 or 53.6 in2",
  volume: "60 L or 2.1 ft3",
  speed: "17 m/s or 55 ft/s",
  frequency: "32.5 Hz",
  resistance: "3.6 ohm",
  voltage: "35 V",
  power: "400 W",
  temperature: "20 °C or 68 °F",
  pressure: "1013 hPa or 29.92 inHg",
  humidity: "50 %",
  mass: "120 g or 4.2 oz",
  inductance: "1.6 mH",
  time: "10 ms",
  level: "90 dB",
  ratio: "0.45",
  angle: "90",
  count: "4",
};

const SIGN = /^([-+]?)\s*(.*)$/s;
const NUMBER_THEN_UNIT = /^([\d.,/+\- ]*?\d[.,]?(?:e[-+]?\d+)?)\s*([^\d.,/+\- ].*)?$/i;
const FEET_AND_INCHES =
  /^(\d+(?:[.,]\d+)?)\s*(?:'|ft\.?|foot|feet)\s*-?\s*(\d.*?)\s*(?:"|in\.?|inch|inches)?$/i;

/**
 * Reads a quantity. A number without a unit is in the person's own unit for the kind.
 *
 * @returns the value in SI (°C, degrees, dB where the design document writes those), or what was
 * not understood together with an example
 * @example parseQuantity("3/4 in", "length", { system: "metric", tape: 32 }) // value 0.01905
 */
export function parseQuantity(
  text: string,
  kind: QuantityKind,
  preferences: UnitPreferences,
): Parsed {
  const plain = plainText(text);
  if (plain === "") return failed(`Nothing typed. Type ${examples[kind]}.`);
  const [, minus = "", body = ""] = SIGN.exec(plain) ?? [];
  const sign = minus === "-" ? -1 : 1;
  if (kind === "length") {
    const feet = feetAndInches(body);
    if (feet !== null) return finite(sign * feet, text, kind);
  }
  const [, digits, unit] = NUMBER_THEN_UNIT.exec(body) ?? [];
  if (digits === undefined) return failed(notUnderstood(text, kind));
  const number = readNumber(digits.trim());
  if (!number.ok) return failed(numberMessage(number, digits.trim(), text, kind));
  const figure = sign * number.value;
  if (!unit) return finite(fromShown(figure, shownUnits[kind][preferences.system]), text, kind);
  const named = findUnit(kind, unit);
  if (!named) return failed(unitMessage(unit, kind));
  return finite(fromShown(figure, { ...shownUnits[kind].metric, offset: 0, ...named }), text, kind);
}

/** `5' 2 1/2"` in metres; null where it is not feet and inches. */
function feetAndInches(body: string): number | null {
  const match = FEET_AND_INCHES.exec(body);
  if (!match) return null;
  const feet = readNumber(match[1] ?? "");
  const inches = readNumber(match[2] ?? "");
  return feet.ok && inches.ok ? feet.value * 0.3048 + inches.value * 0.0254 : null;
}

/** Twelve figures: below any measure, above the noise of the conversion (18 mm is 0.018). */
export function withoutNoise(value: number): number {
  return Number(value.toPrecision(12));
}

function finite(value: number, text: string, kind: QuantityKind): Parsed {
  return Number.isFinite(value)
    ? { ok: true, value: withoutNoise(value) }
    : failed(notUnderstood(text, kind));
}

const failed = (message: string): Parsed => ({ ok: false, message });

export function notUnderstood(text: string, kind: QuantityKind): string {
  return `“${text.trim()}” is not understood. Type ${examples[kind]}.`;
}

function numberMessage(
  number: Extract<NumberRead, { ok: false }>,
  digits: string,
  text: string,
  kind: QuantityKind,
): string {
  if (number.reason === "ambiguous")
    return `“${digits}” can be read two ways. Type ${number.readings?.join(" or ")}.`;
  if (number.reason === "division-by-zero") return `“${digits}” divides by zero.`;
  return notUnderstood(text, kind);
}

function unitMessage(unit: string, kind: QuantityKind): string {
  const of = kind === "count" || kind === "ratio" ? "a plain number" : kind;
  const elsewhere = Object.values(unitNames).some((units) =>
    units.some(({ names }) => names.some((name) => name.toLowerCase() === unit.toLowerCase())),
  );
  const fault = elsewhere
    ? `“${unit}” is not a unit of ${of}.`
    : `The unit “${unit}” is not known.`;
  return `${fault} Type ${examples[kind]}.`;
}
