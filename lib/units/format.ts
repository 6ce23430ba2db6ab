/** Numbers as a person reads them: their system, their tape, and the other system at hand. */
import { tapeFraction } from "./fraction";
import type { QuantityKind, UnitPreferences } from "./preferences";
import { fromShown, shownUnits, toShown, type ShownUnit } from "./shown-units";

export interface QuantityOptions {
  /** Decimal places, instead of the kind's own. On a tape: 2 or more asks for decimal inches. */
  digits?: number;
  /** Writes + before what is above zero. */
  signed?: boolean;
}

export interface ShownQuantity {
  value: string;
  unit: string;
  /** Value and unit. */
  text: string;
  /** The same in the other system; empty where both use one unit. */
  other: string;
  /** Shown less true, in the value's own unit: what rounding to the tape or the places moved. */
  rounding: number;
}

/** Stands where no number can: not known, or not finite. */
export const NO_FIGURE = "–";

/**
 * A quantity in the person's units.
 *
 * Metric lengths show tenths of a millimetre, imperial ones the nearest mark of the tape; below
 * half a mark, thousandths of an inch, so that nothing small reads as nothing. Zero has no sign.
 *
 * @param value_si - SI; °C, degrees and dB where the design document writes those
 * @param kind - what the number means
 * @param preferences - the person's system and tape
 * @example formatQuantity(0.2085, "length", { system: "metric", tape: 32 }).text // "208.5 mm"
 */
export function formatQuantity(
  value_si: number,
  kind: QuantityKind,
  preferences: UnitPreferences,
  options: QuantityOptions = {},
): ShownQuantity {
  const { system, tape } = preferences;
  const shown = shownUnits[kind][system];
  const elsewhere = shownUnits[kind][system === "metric" ? "imperial" : "metric"];
  if (!Number.isFinite(value_si))
    return { value: NO_FIGURE, unit: shown.unit, text: NO_FIGURE, other: "", rounding: 0 };
  const here = write(value_si, kind, shown, tape, options);
  return {
    value: here.value,
    unit: shown.unit,
    text: joined(here.value, shown),
    other:
      elsewhere === shown
        ? ""
        : joined(write(value_si, kind, elsewhere, tape, options).value, elsewhere),
    rounding: fromShown(here.figure, shown) - value_si,
  };
}

function joined(value: string, { unit, tight }: ShownUnit): string {
  return unit === "" ? value : tight ? value + unit : `${value} ${unit}`;
}

function write(
  value: number,
  kind: QuantityKind,
  shown: ShownUnit,
  tape: number,
  { digits, signed = false }: QuantityOptions,
): { value: string; figure: number } {
  const figure = toShown(value, shown);
  const onTape = kind === "length" && shown.unit === "in" && (digits ?? 0) < 2;
  if (onTape && (figure === 0 || Math.abs(figure) * tape >= 0.5)) {
    const { words, inches } = tapeFraction(figure, tape);
    return { value: sign(inches, signed) + words, figure: inches };
  }
  const inInches = kind === "length" && shown.unit === "in";
  const places =
    digits === undefined || onTape ? shown.places(Math.abs(figure)) : digits + (inInches ? 1 : 0);
  const plain = Math.abs(figure).toFixed(places);
  const rounded = Math.sign(figure) * Number(plain);
  const words = (shown.trim && digits === undefined) || figure === 0 ? trimmed(plain) : plain;
  return { value: sign(rounded, signed) + words, figure: rounded };
}

/** True minus for what is below zero as shown; never one before a zero. */
function sign(figure: number, signed: boolean): string {
  return figure < 0 ? "−" : signed && figure > 0 ? "+" : "";
}

/** Without the zeros that end a decimal fraction. */
export function trimmed(plain: string): string {
  return plain.includes(".") ? plain.replace(/\.?0+$/, "") : plain;
}
