/** One strip of the bore map made ready to be drawn. Pure data. */
import type { UnitPreferences } from "@/lib/units/preferences";
import { shownUnits } from "@/lib/units/shown-units";
import type { MapLines, BoreQuantity } from "./bore-map";
import { boreValue, isClear } from "./bore-map";
import { valueAt } from "./cursor";
import { zeroDomain } from "./domain";
import type { PlacedLabel } from "./labels";
import { placeLabels } from "./labels";
import type { Domain, PixelMap, Scale } from "./scale";
import { linearScale, pixelMap } from "./scale";
import type { StripUnit } from "./strips";
import { niceStep } from "./ticks";

export interface BorePlot {
  quantity: BoreQuantity;
  name: string;
  unit: StripUnit;
  domain: Domain;
  map: PixelMap;
  /** In the shown units: bore in b, each count's value in fitN, what is too long for it in longN. */
  rows: Record<string, number | null>[];
  /** Corners of the part that is too long for the box, "x,y x,y …"; "" where all fits. */
  tooLong: string;
  labels: PlacedLabel[];
}

export interface BorePlotInput {
  series: MapLines;
  preferences: UnitPreferences;
  /** SI: the limit's line in this strip, and the chosen vent's value. */
  limit: number | null;
  chosen: number | null;
}

const NAMES: Record<BoreQuantity, string> = {
  "air-speed": "Air speed",
  length: "Length",
  pipe: "First pipe resonance",
};

export function boreUnit(quantity: BoreQuantity, { system }: UnitPreferences): StripUnit {
  const kinds = { "air-speed": "speed", length: "length", pipe: "frequency" } as const;
  const { unit, per } = shownUnits[kinds[quantity]][system];
  const digits = quantity === "air-speed" ? 1 : quantity === "length" && unit === "in" ? 1 : 0;
  return { name: unit, factor: 1 / per, digits };
}

/** Bore axis in the shown length: from the smallest to the largest worth showing, by round steps. */
export function boreDomain(series: MapLines, factor: number, cap: number | null): Domain {
  let low = Infinity;
  let high = 0;
  for (const { points } of series) {
    const lastFit = points.findLast(isClear)?.diameter_m ?? points[0]?.diameter_m ?? 0;
    for (const point of points) {
      const inside =
        cap === null || point.peak_air_speed_m_s === null || point.peak_air_speed_m_s <= cap;
      if (inside && point.diameter_m <= lastFit * 1.25) {
        low = Math.min(low, point.diameter_m * factor);
        high = Math.max(high, point.diameter_m * factor);
      }
    }
  }
  if (!(high > low)) return [0, high > 0 ? high : 1];
  const step = niceStep(high - low, 8);
  return [Math.floor(low / step + 1e-9) * step, Math.ceil(high / step - 1e-9) * step];
}

/** Pipe resonances above this are out of every band a vented box plays [Hz]. */
const PIPE_CAP = 1200;

/** Air speeds above this are not shown: no vent is built there [m/s]. */
export function airSpeedCap(limit: number | null, chosen: number | null): number {
  return Math.max(2 * (limit ?? 17), 1.15 * (chosen ?? 0));
}

export function borePlot(
  quantity: BoreQuantity,
  input: BorePlotInput,
  previous: Domain | null,
  x: Scale,
  height: { top: number; bottom: number },
  boreFactor: number,
): BorePlot {
  const unit = boreUnit(quantity, input.preferences);
  const caps = {
    "air-speed": airSpeedCap(input.limit, input.chosen),
    length: Infinity,
    pipe: PIPE_CAP,
  };
  const cap = caps[quantity];
  let high = Math.max(input.limit ?? 0, input.chosen ?? 0);
  for (const { points } of input.series)
    for (const point of points) {
      const value = boreValue(point, quantity);
      const bore = point.diameter_m * boreFactor;
      if (
        value !== null &&
        bore >= x.domain[0] &&
        bore <= x.domain[1] &&
        (point.fits || quantity === "air-speed")
      )
        high = Math.max(high, Math.min(value, cap));
    }
  const extent = { low: 0, high: Math.min(high, cap) * unit.factor };
  const domain = zeroDomain(previous, extent);
  const map = pixelMap(linearScale(domain, [height.bottom, height.top]), unit.factor);
  return {
    quantity,
    name: NAMES[quantity],
    unit,
    domain,
    map,
    rows: rowsOf(quantity, input.series, unit.factor, boreFactor),
    tooLong:
      quantity === "air-speed" ? tooLongCorners(input.series, quantity, x, map, boreFactor) : "",
    labels: labelsOf(quantity, input, x, map, boreFactor),
  };
}

function rowsOf(quantity: BoreQuantity, series: MapLines, factor: number, boreFactor: number) {
  const rows = new Map<number, Record<string, number | null>>();
  for (const { count, points } of series)
    points.forEach((point, n) => {
      const value = boreValue(point, quantity);
      const row = rows.get(point.diameter_m) ?? { b: point.diameter_m * boreFactor };
      const shown = value === null ? null : value * factor;
      const clear = isClear(point);
      const joins = !clear && [points[n - 1], points[n + 1]].some((next) => next && isClear(next));
      // The first point that no longer stands clear belongs to both parts, so that they meet.
      row[`fit${count}`] = clear || joins ? shown : null;
      row[`long${count}`] = clear ? null : shown;
      rows.set(point.diameter_m, row);
    });
  return [...rows.values()].sort((a, b) => (a.b ?? 0) - (b.b ?? 0));
}

/**
 * The part of the plot that is too long for the box: below the line through the points at which
 * each count comes too near the wall, and to the right of them.
 */
export function tooLongCorners(
  series: MapLines,
  quantity: BoreQuantity,
  x: Scale,
  map: PixelMap,
  boreFactor: number,
): string {
  const ends = series.flatMap(({ points }) => {
    const last = points.findLastIndex(isClear);
    const end = points[Math.max(0, last)];
    const value = end ? boreValue(end, quantity) : null;
    if (!end || value === null || last === points.length - 1) return [];
    const y = Math.min(map.bottom, Math.max(map.top, map.offset + map.gain * value));
    return [{ x: x.toPixel(end.diameter_m * boreFactor), y }];
  });
  const first = ends.sort((a, b) => a.x - b.x)[0];
  const last = ends.at(-1);
  if (!first || !last) return "";
  const corners = [
    { x: first.x, y: map.bottom },
    ...ends,
    { x: x.range[1], y: last.y },
    { x: x.range[1], y: map.bottom },
  ];
  const kept = (pixel: number) => Math.min(x.range[1], Math.max(x.range[0], pixel));
  return corners.map((corner) => `${kept(corner.x).toFixed(1)},${corner.y.toFixed(1)}`).join(" ");
}

function labelsOf(
  quantity: BoreQuantity,
  { series, limit }: BorePlotInput,
  x: Scale,
  map: PixelMap,
  boreFactor: number,
): PlacedLabel[] {
  const places: number[] = [];
  for (let at = x.range[1] - 8; at > x.range[0] + 8; at -= 8) places.push(at);
  const curves = series.map(({ count, points }) => {
    const bores = points.map((point) => point.diameter_m * boreFactor);
    const values = points.map((point) => boreValue(point, quantity));
    const y = places.map((pixel) => {
      const value = valueAt(bores, values, x.toValue(pixel));
      const at = value === null ? NaN : map.offset + map.gain * value;
      return at >= map.top && at <= map.bottom ? at : null;
    });
    return { text: COUNT_LABELS[count] ?? String(count), y };
  });
  const box = { top: map.top, bottom: map.bottom, left: x.range[0], right: x.range[1] };
  const line = limit === null ? null : map.offset + map.gain * limit;
  return placeLabels(places, curves, [places.map(() => line)], { ...box, letter: 5.6, line: 12 });
}

const COUNT_LABELS: Record<number, string> = { 1: "one vent", 2: "two", 3: "three", 4: "four" };
