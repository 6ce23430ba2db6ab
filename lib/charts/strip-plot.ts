/**
 * One strip made ready to be drawn: its lines with their marks, its ticks, its limit and its
 * labels, for a given width. Pure data, so the chart, the live writer and the tests share it.
 */
import type { Curves } from "@/lib/acoustics/answer";
import type { UnitPreferences } from "@/lib/units/preferences";
import { resample, valueAt } from "./cursor";
import type { PlacedLabel } from "./labels";
import { placeLabels } from "./labels";
import type { StripLayout } from "./layout";
import type { Mark } from "./marks";
import { BEFORE, presentMark, savedMark } from "./marks";
import { reading } from "./readings";
import type { Domain, PixelMap, Scale } from "./scale";
import { linearScale, pixelMap } from "./scale";
import type { CurveLimits, StripDefinition, StripId, StripUnit } from "./strips";
import { stripDefinition } from "./strips";
import { linearTicks } from "./ticks";

export interface PlotLine {
  key: string;
  kind: "present" | "before" | "saved";
  /** A vent's or a saved tuning's name. */
  label: string | null;
  mark: Mark;
  /** SI, at the sheet's frequencies. */
  values: readonly (number | null)[];
}

export interface StripPlot {
  id: StripId;
  definition: StripDefinition;
  unit: StripUnit;
  domain: Domain;
  ticks: number[];
  map: PixelMap;
  lines: PlotLine[];
  /** In the shown unit; null where there is none inside the domain. */
  limit: number | null;
  labels: (PlacedLabel & { kind: "limit" | "curve"; colour: string })[];
}

export interface SheetInput {
  curves: Curves;
  previous: Curves | null;
  saved: readonly { name: string; curves: Curves }[];
  limits: CurveLimits;
  preferences: UnitPreferences;
  ventNames: readonly string[];
}

/** Distance between the places tried for a label [px]. */
const LABEL_STEP = 14;

/**
 * @param x - the sheet's frequency axis, in pixels of the plot
 * @param labelled - whether saved tunings are named on this strip's curves
 */
export function stripPlot(
  id: StripId,
  input: SheetInput,
  domain: Domain,
  x: Scale,
  layout: StripLayout,
  labelled: boolean,
): StripPlot {
  const definition = stripDefinition(id);
  const unit = definition.unit(input.preferences);
  const y = linearScale(domain, [layout.margin + layout.plot, layout.margin]);
  const map = pixelMap(y, unit.factor);
  const lines = linesOf(definition, input);
  const limit = definition.limit(input.limits);
  const shownLimit = limit ? limit.value * unit.factor : null;
  const inside = shownLimit !== null && shownLimit > domain[0] && shownLimit <= domain[1];
  const limitText = limit && inside ? `${limit.name} ${plain(limit.value, unit)}` : null;
  return {
    id,
    definition,
    unit,
    domain,
    ticks: [...(definition.ticks ?? linearTicks(domain, 4))],
    map,
    lines,
    limit: inside ? shownLimit : null,
    labels: labelsOf(lines, limitText, limit?.value ?? 0, input, x, map, labelled),
  };
}

function linesOf(definition: StripDefinition, input: SheetInput): PlotLine[] {
  const { curves, previous, saved, ventNames } = input;
  const before = previous
    ? definition.series(previous, ventNames).map((series, n): PlotLine => ({
        key: `before-${n}`,
        kind: "before",
        label: series.label,
        mark: BEFORE,
        values: aligned(previous, curves, series.values),
      }))
    : [];
  const kept = saved.flatMap((tuning, s) =>
    definition.series(tuning.curves, []).map((series, n): PlotLine => ({
      key: `saved-${s}-${n}`,
      kind: "saved",
      label: tuning.name,
      mark: savedMark(s),
      values: aligned(tuning.curves, curves, series.values),
    })),
  );
  const present = definition.series(curves, ventNames).map((series, n): PlotLine => ({
    key: `present-${n}`,
    kind: "present",
    label: series.label,
    mark: presentMark(n),
    values: series.values,
  }));
  return [...before, ...kept, ...present];
}

/** Values of another answer at the frequencies of the present one. */
function aligned(from: Curves, to: Curves, values: readonly (number | null)[]) {
  const a = from.frequency_hz;
  const b = to.frequency_hz;
  const middle = a.length >> 1;
  const same =
    a === b ||
    (a.length === b.length && a[0] === b[0] && a[middle] === b[middle] && a.at(-1) === b.at(-1));
  return same ? values : resample(a, values, b);
}

/** A limit's figure without trailing zeros. */
function plain(value_si: number, unit: StripUnit): string {
  return reading(value_si, unit).replace(/\.0+$/, "");
}

function labelsOf(
  lines: readonly PlotLine[],
  limitText: string | null,
  limit_si: number,
  input: SheetInput,
  x: Scale,
  map: PixelMap,
  labelled: boolean,
): StripPlot["labels"] {
  const width = x.range[1];
  const places: number[] = [];
  for (let at = width - LABEL_STEP; at > LABEL_STEP; at -= LABEL_STEP) places.push(at);
  const frequencies = places.map(x.toValue);
  const inPlot = (y: number) => (y >= map.top && y <= map.bottom ? y : null);
  const yOf = (values: readonly (number | null)[]) =>
    frequencies.map((hz) => {
      const value = valueAt(input.curves.frequency_hz, values, hz);
      return value === null ? null : inPlot(map.offset + map.gain * value);
    });
  const box = { top: map.top - 6, bottom: map.bottom + 4, left: 2, right: width - 2 };
  const type = { letter: 5.2, line: 12 };
  const all = lines.map((line) => ({ line, y: yOf(line.values) }));
  const named = all.filter(
    ({ line }) =>
      line.label !== null && line.kind !== "before" && (labelled || line.kind === "present"),
  );
  const limitY = inPlot(map.offset + map.gain * limit_si);
  const curves = named.map(({ line, y }) => ({ text: line.label ?? "", y }));
  const wanted =
    limitText === null ? curves : [{ text: limitText, y: places.map(() => limitY) }, ...curves];
  const obstacles = all.filter((one) => !named.includes(one)).map(({ y }) => y);
  return placeLabels(places, wanted, obstacles, { ...box, ...type }).map((label) => {
    const line = named.find(({ line }) => line.label === label.text)?.line;
    return line
      ? { ...label, kind: "curve" as const, colour: line.mark.colour }
      : { ...label, kind: "limit" as const, colour: "var(--color-near)" };
  });
}
