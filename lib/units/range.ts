/** What a field says about a number outside its range. */
import { editableQuantity } from "./editable";
import type { QuantityKind, UnitPreferences } from "./preferences";
import { shownUnits } from "./shown-units";

export interface QuantityRange {
  kind: QuantityKind;
  min: number;
  max: number;
}

/** The range in the person's unit: `5 to 2000 mm`. */
export function rangeWords(
  { kind, min, max }: QuantityRange,
  preferences: UnitPreferences,
): string {
  const { unit, tight } = shownUnits[kind][preferences.system];
  const words = (value: number) => editableQuantity(value, kind, preferences).replace(/\.0+$/, "");
  return `${words(min)} to ${words(max)}${unit && !tight ? " " : ""}${unit}`;
}

/** Names the field, the value and the allowed range; null where the value is inside. */
export function rangeMessage(
  label: string,
  value: number,
  range: QuantityRange,
  preferences: UnitPreferences,
): string | null {
  if (value >= range.min && value <= range.max) return null;
  const { unit } = shownUnits[range.kind][preferences.system];
  const given = `${editableQuantity(value, range.kind, preferences)} ${unit}`.trim();
  return `${label}: ${given} is not allowed. It can be ${rangeWords(range, preferences)}.`;
}
