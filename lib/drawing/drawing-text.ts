/** Numbers as the drawing letters them: without a unit on the sheet (the title block names it), with one where read aloud. */
import { formatQuantity } from "@/lib/units/format";
import type { UnitPreferences } from "@/lib/units/preferences";

export interface DrawingText {
  /** A length in the drawing's unit, bare. */
  bare: (length_m: number) => string;
  /** A sheet's thickness, bare: a caliper reading is not rounded to the tape. */
  sheet: (length_m: number) => string;
  /** A length with its unit. */
  full: (length_m: number) => string;
  /** A length with its sign, bare. */
  signed: (length_m: number) => string;
  frequency: (frequency_hz: number) => string;
  speed: (speed_m_s: number) => string;
  units: string;
  /** What one press of an arrow key moves a length by [m]. */
  step_m: number;
  /** What a dragged length snaps to [m]. */
  snap_m: number;
}

const INCH_M = 0.0254;

export function drawingText(preferences: UnitPreferences): DrawingText {
  const length = (value: number, signed = false) =>
    formatQuantity(value, "length", preferences, { signed });
  const imperial = preferences.system === "imperial";
  const tapeMark = INCH_M / preferences.tape;
  return {
    bare: (value) => length(value).value,
    sheet: (value) =>
      formatQuantity(value, "length", preferences, imperial ? { digits: 2 } : {}).value,
    full: (value) => length(value).text,
    signed: (value) => length(value, true).value,
    frequency: (value) => formatQuantity(value, "frequency", preferences).text,
    speed: (value) => formatQuantity(value, "speed", preferences).text,
    units: imperial ? `in, to 1/${preferences.tape}` : "mm",
    step_m: imperial ? tapeMark : 0.001,
    snap_m: imperial ? tapeMark : 0.0001,
  };
}
