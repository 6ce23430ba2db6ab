/** A quantity as it stands in a field: all that was typed, none of the noise of conversion. */
import { NO_FIGURE, trimmed } from "./format";
import { tapeFraction } from "./fraction";
import type { QuantityKind, UnitPreferences } from "./preferences";
import { shownUnits, toShown } from "./shown-units";

/** Figures that a field keeps: finer than any caliper, too coarse for the noise of conversion. */
const SIGNIFICANT = 6;
/** How far from a mark of the tape a length still counts as on it [in]. */
const ON_THE_MARK = 5e-4;

/**
 * The text of a field, without its unit. Inches on a mark of the tape are written as a fraction,
 * others as decimal inches, as calipers read. Everything else has the kind's own places: more where
 * the value was typed with more, one more where it comes from the other system.
 */
export function editableQuantity(
  value: number,
  kind: QuantityKind,
  { system, tape }: UnitPreferences,
): string {
  if (!Number.isFinite(value)) return NO_FIGURE;
  const shown = shownUnits[kind][system];
  const figure = toShown(value, shown);
  const sign = figure < 0 ? "−" : "";
  if (kind === "length" && system === "imperial") {
    const { words, inches } = tapeFraction(figure, tape);
    const near = Math.abs(figure - inches) < ON_THE_MARK && (inches !== 0 || figure === 0);
    if (near) return (inches === 0 ? "" : sign) + words;
    return sign + trimmed(Math.abs(figure).toFixed(4));
  }
  const size = Math.abs(figure);
  const usual = shown.places(size);
  const whole = size >= 1 ? Math.floor(Math.log10(size)) + 1 : 0;
  const most = Math.min(Math.max(usual, SIGNIFICANT - whole), usual + 3);
  const typed = Math.abs(Number(size.toFixed(most)) - size) <= 1e-9 * size;
  const exact = trimmed(size.toFixed(typed ? most : Math.min(most, usual + 1)));
  const places = exact.split(".")[1]?.length ?? 0;
  const plain = shown.trim || figure === 0 || places > usual ? exact : size.toFixed(usual);
  return (Number(plain) === 0 ? "" : sign) + plain;
}
