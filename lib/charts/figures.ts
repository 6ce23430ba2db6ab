/** The table twin of the strips: every curve at the third-octave frequencies inside the axis. */
import type { Curves } from "@/lib/acoustics/answer";
import type { UnitPreferences } from "@/lib/units/preferences";
import { intervalAt, valueAt } from "./cursor";
import { limitWords, reading } from "./readings";
import type { Domain } from "./scale";
import type { StripId } from "./strips";
import { stripDefinition } from "./strips";

/** Nominal third-octave mid-band frequencies of one decade (ISO 266). */
const THIRD_OCTAVES = [1, 1.25, 1.6, 2, 2.5, 3.15, 4, 5, 6.3, 8] as const;

/** Third-octave frequencies inside a range, ascending [Hz]. */
export function thirdOctaves(range: Domain): number[] {
  const frequencies: number[] = [];
  for (let decade = Math.floor(Math.log10(range[0])); 10 ** decade <= range[1]; decade++)
    for (const mantissa of THIRD_OCTAVES) {
      const hz = Number((mantissa * 10 ** decade).toPrecision(3));
      if (hz >= range[0] * (1 - 1e-9) && hz <= range[1] * (1 + 1e-9)) frequencies.push(hz);
    }
  return frequencies;
}

export interface FiguresTable {
  columns: { key: string; name: string; unit: string; words: boolean }[];
  rows: { frequency_hz: number; cells: string[] }[];
}

export function figuresTable(
  curves: Curves,
  strips: readonly StripId[],
  preferences: UnitPreferences,
  ventNames: readonly string[],
  range: Domain,
): FiguresTable {
  const columns: FiguresTable["columns"] = [];
  const readers: ((hz: number) => string)[] = [];
  for (const id of strips) {
    const definition = stripDefinition(id);
    const unit = definition.unit(preferences);
    definition.series(curves, ventNames).forEach((series, n) => {
      const name = series.label ? `${definition.name}, ${series.label}` : definition.name;
      columns.push({ key: `${id}-${n}`, name, unit: unit.name, words: false });
      readers.push((hz) => reading(valueAt(curves.frequency_hz, series.values, hz), unit));
    });
    if (id === "level") {
      columns.push({ key: "limit", name: "Held", unit: "", words: true });
      readers.push((hz) => limitWords(limitAt(curves, hz)) || "–");
    }
  }
  const rows = thirdOctaves(range).map((hz) => ({
    frequency_hz: hz,
    cells: readers.map((read) => read(hz)),
  }));
  return { columns, rows };
}

/** What sets the largest clean level at a frequency. */
export function limitAt(curves: Curves, hz: number): Curves["max_spl_limit"][number] {
  const index = intervalAt(curves.frequency_hz, hz);
  return curves.max_spl_limit[index] ?? null;
}
