/**
 * Each curve in a sentence or two, for those who hear the page instead of seeing it: where it is
 * highest, where it is lowest when that matters, and where it leaves its limit.
 */
import type { Curves } from "@/lib/acoustics/answer";
import type { UnitPreferences } from "@/lib/units/preferences";
import { valueAt } from "./cursor";
import { limitAt } from "./figures";
import { hertz, limitWords, readingWithUnit } from "./readings";
import type { CurveLimits, StripDefinition, StripLimit, StripSeries, StripUnit } from "./strips";

interface Point {
  value: number;
  frequency_hz: number;
}

/** The highest (or lowest) value of a curve and where it stands; null for an empty curve. */
export function extremeOf(
  frequency_hz: readonly number[],
  values: readonly (number | null)[],
  which: "highest" | "lowest",
): Point | null {
  let best: Point | null = null;
  values.forEach((value, i) => {
    const frequency = frequency_hz[i];
    if (value === null || frequency === undefined || !Number.isFinite(value)) return;
    const better = best === null || (which === "highest" ? value > best.value : value < best.value);
    if (better) best = { value, frequency_hz: frequency };
  });
  return best;
}

/** Bands in which a curve is on the unwanted side of a limit, as pairs of frequencies [Hz]. */
export function bandsBeyond(
  frequency_hz: readonly number[],
  values: readonly (number | null)[],
  limit: StripLimit,
): [number, number][] {
  const bands: [number, number][] = [];
  let open: [number, number] | null = null;
  values.forEach((value, i) => {
    const frequency = frequency_hz[i] ?? 0;
    const beyond =
      value !== null && (limit.side === "above" ? value > limit.value : value < limit.value);
    if (beyond && open) open[1] = frequency;
    else if (beyond) bands.push((open = [frequency, frequency]));
    else open = null;
  });
  return bands;
}

/** The text of one strip. */
export function stripSummary(
  definition: StripDefinition,
  curves: Curves,
  limits: CurveLimits,
  preferences: UnitPreferences,
  ventNames: readonly string[] = [],
): string {
  const unit = definition.unit(preferences);
  const series = definition.series(curves, ventNames);
  if (series.length === 0) return `${definition.name}: no vent.`;
  const limit = definition.limit(limits);
  const sentences = series.map((one) =>
    [
      describe(definition, one, curves, unit),
      limit ? againstLimit(one, curves.frequency_hz, limit, unit) : "",
    ]
      .filter(Boolean)
      .join("; "),
  );
  return `${definition.name}: ${sentences.join(". ")}.`;
}

function describe(
  definition: StripDefinition,
  series: StripSeries,
  curves: Curves,
  unit: StripUnit,
): string {
  const { frequency_hz } = curves;
  const name = series.label ? `${series.label}, ` : "";
  const at = (point: Point) =>
    `${readingWithUnit(point.value, unit)} at ${hertz(point.frequency_hz)}`;
  const highest = extremeOf(frequency_hz, series.values, "highest");
  const lowest = extremeOf(frequency_hz, series.values, "lowest");
  if (!highest || !lowest) return `${name}no value`;
  switch (definition.id) {
    case "response": {
      const corner = lowCorner(frequency_hz, series.values, highest, 10);
      return `highest ${at(highest)}${corner ? `, 10 dB lower at ${hertz(corner)}` : ""}`;
    }
    case "impedance":
      return `lowest ${at(lowest)}, highest ${at(highest)}`;
    case "level":
      return levelSteps(curves, unit);
    case "phase":
      return `from ${readingWithUnit(series.values[0] ?? null, unit)} at ${hertz(frequency_hz[0] ?? 0)} to ${readingWithUnit(series.values.at(-1) ?? null, unit)} at ${hertz(frequency_hz.at(-1) ?? 0)}`;
    default:
      return `${name}highest ${at(highest)}`;
  }
}

/** The frequency below the highest value at which the curve has fallen by `drop`. */
function lowCorner(
  frequency_hz: readonly number[],
  values: readonly (number | null)[],
  highest: Point,
  drop: number,
): number | null {
  for (let i = frequency_hz.length - 1; i >= 0; i--) {
    const value = values[i];
    const frequency = frequency_hz[i];
    if (frequency === undefined || frequency > highest.frequency_hz) continue;
    if (value !== null && value !== undefined && value <= highest.value - drop) return frequency;
  }
  return null;
}

function levelSteps(curves: Curves, unit: StripUnit): string {
  const steps = [20, 30, 40, 60, 100].flatMap((hz) => {
    const value = valueAt(curves.frequency_hz, curves.max_spl_db, hz);
    if (value === null) return [];
    const words = limitWords(limitAt(curves, hz));
    return [`${readingWithUnit(value, unit)} at ${hz} Hz${words ? `, held ${words}` : ""}`];
  });
  return steps.length > 0 ? steps.join("; ") : "no limit is known";
}

function againstLimit(
  series: StripSeries,
  frequency_hz: readonly number[],
  limit: StripLimit,
  unit: StripUnit,
): string {
  const bands = bandsBeyond(frequency_hz, series.values, limit);
  const line = `the ${limit.name} (${readingWithUnit(limit.value, unit)})`;
  const side = limit.side === "above" ? "over" : "under";
  if (bands.length === 0) return `never ${side} ${line}`;
  const words = bands.map(([from, to]) =>
    from === to ? `at ${hertz(from)}` : `from ${hertz(from)} to ${hertz(to)}`,
  );
  return `${side} ${line} ${words.join(" and ")}`;
}
