/** Figures as the strips write them. */
import type { LevelLimit } from "@/lib/acoustics/answer";
import type { StripUnit } from "./strips";

/** A figure with a true minus sign; "–" where there is none. */
export function figure(value: number | null, digits: number): string {
  if (value === null || !Number.isFinite(value)) return "–";
  const text = Math.abs(value).toFixed(digits);
  return value < 0 && Number(text) !== 0 ? `−${text}` : text;
}

/** An SI value in the strip's unit, without the unit's name. */
export function reading(value_si: number | null, unit: StripUnit): string {
  return figure(value_si === null ? null : value_si * unit.factor, unit.digits);
}

/** An SI value with its unit: "15.1 m/s", "−42°". */
export function readingWithUnit(value_si: number | null, unit: StripUnit): string {
  const gap = unit.name === "°" ? "" : "\u00a0";
  return `${reading(value_si, unit)}${gap}${unit.name}`;
}

/** A frequency: one decimal below 100 Hz, none above. */
export function hertz(frequency_hz: number): string {
  return `${hertzFigure(frequency_hz)}\u00a0Hz`;
}

export function hertzFigure(frequency_hz: number): string {
  return figure(frequency_hz, frequency_hz < 99.95 ? 1 : 0);
}

const LIMIT_WORDS: Record<LevelLimit, string> = {
  excursion: "x max",
  "air speed": "air speed",
  power: "power",
  voltage: "voltage",
  load: "load",
};

/** What holds the largest clean level down, in the words of the strips. */
export function limitWords(limit: LevelLimit | null | undefined): string {
  return limit ? `by ${LIMIT_WORDS[limit]}` : "";
}

/** Decimals that the figures of an axis need so that neighbours differ. */
export function decimalsOf(ticks: readonly number[]): number {
  const step = Math.abs((ticks[1] ?? 1) - (ticks[0] ?? 0));
  return step >= 1 || step === 0 ? 0 : Math.ceil(-Math.log10(step) - 1e-9);
}
