/**
 * The bore map as data: for each number of vents, peak air speed, length and pipe resonance over
 * the vent's diameter, each point already solved for the tuning. What can be asked of it without
 * drawing: the nearest point, the next one, a sentence about it.
 */
import type { BoreMapPoint } from "@/lib/bore-map/series";
import { formatQuantity } from "@/lib/units/format";
import type { UnitPreferences } from "@/lib/units/preferences";

/** What the map needs to know of a candidate; SI. */
export type MapPoint = Pick<
  BoreMapPoint,
  | "count"
  | "diameter_m"
  | "peak_air_speed_m_s"
  | "overall_length_m"
  | "clearance_m"
  | "pipe_resonance_hz"
  | "fits"
>;

/** One curve: a number of vents alike, its points by growing diameter. */
export interface MapLine<P extends MapPoint = MapPoint> {
  count: number;
  points: readonly P[];
}

export type MapLines<P extends MapPoint = MapPoint> = readonly MapLine<P>[];

/** Clearance below which the wall starts to lengthen the vent, in bores: the trade's rule. */
const WANTED_CLEARANCE = 1;

/** Whether a candidate fits and keeps the wanted distance from the wall it faces. */
export function isClear(point: MapPoint): boolean {
  return point.fits && point.clearance_m >= WANTED_CLEARANCE * point.diameter_m;
}

/** How a candidate stands to the box, in words. */
export function roomWords(point: MapPoint): string {
  if (!point.fits) return "too long for the box";
  return isClear(point) ? "fits" : "fits, but near the wall";
}

/** Where the person's probe stands: a curve and a point of it. */
export interface Probe {
  series: number;
  point: number;
}

export const BORE_QUANTITIES = ["air-speed", "length", "pipe"] as const;
export type BoreQuantity = (typeof BORE_QUANTITIES)[number];

/** SI. */
export function boreValue(point: MapPoint, quantity: BoreQuantity): number | null {
  if (quantity === "air-speed") return point.peak_air_speed_m_s;
  if (quantity === "length") return point.overall_length_m;
  return point.pipe_resonance_hz > 0 ? point.pipe_resonance_hz : null;
}

const COUNT_WORDS = ["no", "one", "two", "three", "four", "five", "six", "seven", "eight"] as const;

/** "one vent", "two vents"; figures above eight. */
export function countWords(count: number): string {
  return `${COUNT_WORDS[count] ?? count} ${count === 1 ? "vent" : "vents"}`;
}

/** The pick at a probe; null where the probe points at nothing. */
export function pickAt<P extends MapPoint>(series: MapLines<P>, probe: Probe | null): P | null {
  if (!probe) return null;
  return series[probe.series]?.points[probe.point] ?? null;
}

/** The probe on a curve at the diameter nearest to the wanted one; null for an unknown count. */
export function probeNear(series: MapLines, count: number, diameter_m: number): Probe | null {
  const index = series.findIndex((curve) => curve.count === count);
  const points = series[index]?.points ?? [];
  let best: Probe | null = null;
  let least = Infinity;
  points.forEach((point, n) => {
    const off = Math.abs(point.diameter_m - diameter_m);
    if (off < least) {
      least = off;
      best = { series: index, point: n };
    }
  });
  return best;
}

/** The probe nearest to a place in the plot, measured in pixels. */
export function probeAtPixel(
  series: MapLines,
  quantity: BoreQuantity,
  toX: (diameter_m: number) => number,
  toY: (value_si: number) => number,
  x: number,
  y: number,
): Probe | null {
  let best: Probe | null = null;
  let least = Infinity;
  series.forEach((curve, s) =>
    curve.points.forEach((point, n) => {
      const value = boreValue(point, quantity);
      if (value === null) return;
      const off = (toX(point.diameter_m) - x) ** 2 + (toY(value) - y) ** 2;
      if (off < least) {
        least = off;
        best = { series: s, point: n };
      }
    }),
  );
  return best;
}

/** A point between those of a curve, each figure read in proportion; null off the curve. */
export function pointBetween(series: MapLines, count: number, diameter_m: number): MapPoint | null {
  const points = series.find((line) => line.count === count)?.points ?? [];
  const above = points.findIndex((point) => point.diameter_m >= diameter_m);
  const next = points[above];
  const before = points[above - 1] ?? next;
  if (!next || !before || diameter_m < before.diameter_m) return null;
  const span = next.diameter_m - before.diameter_m;
  const share = span > 0 ? (diameter_m - before.diameter_m) / span : 0;
  const mix = (a: number, b: number) => a + (b - a) * share;
  return {
    count,
    diameter_m,
    overall_length_m: mix(before.overall_length_m, next.overall_length_m),
    clearance_m: mix(before.clearance_m, next.clearance_m),
    pipe_resonance_hz: mix(before.pipe_resonance_hz, next.pipe_resonance_hz),
    peak_air_speed_m_s:
      before.peak_air_speed_m_s === null || next.peak_air_speed_m_s === null
        ? null
        : mix(before.peak_air_speed_m_s, next.peak_air_speed_m_s),
    fits: before.fits && next.fits,
  };
}

/** The probe moved along its curve, kept inside it. */
export function stepAlong(series: MapLines, probe: Probe, steps: number): Probe {
  const last = (series[probe.series]?.points.length ?? 1) - 1;
  return { ...probe, point: Math.min(last, Math.max(0, probe.point + steps)) };
}

/** The probe moved to the curve of more (+1) or fewer (−1) vents, at the nearest diameter. */
export function stepCount(series: MapLines, probe: Probe, by: -1 | 1): Probe {
  const from = series[probe.series];
  const diameter_m = from?.points[probe.point]?.diameter_m;
  if (!from || diameter_m === undefined) return probe;
  const counts = series
    .map((curve) => curve.count)
    .filter((count) => (count - from.count) * by > 0);
  if (counts.length === 0) return probe;
  const next = by > 0 ? Math.min(...counts) : Math.max(...counts);
  return probeNear(series, next, diameter_m) ?? probe;
}

/** One candidate in words: "two vents, 101.0 mm: 15.6 m/s, 208.5 mm long, first pipe resonance 512 Hz". */
export function describePick(pick: MapPoint, preferences: UnitPreferences): string {
  const length = (value: number) => formatQuantity(value, "length", preferences).text;
  const parts = [
    pick.peak_air_speed_m_s === null
      ? ""
      : formatQuantity(pick.peak_air_speed_m_s, "speed", preferences).text,
    `${length(pick.overall_length_m)} long`,
    pick.pipe_resonance_hz > 0
      ? `first pipe resonance ${formatQuantity(pick.pipe_resonance_hz, "frequency", preferences).text}`
      : "",
    roomWords(pick),
  ];
  return `${countWords(pick.count)}, ${length(pick.diameter_m)}: ${parts.filter(Boolean).join(", ")}`;
}

/** Smallest bore of each count that fits and stays inside the air-speed limit, in a sentence. */
export function boreMapSummary(
  series: MapLines,
  airSpeedLimit_m_s: number | null,
  preferences: UnitPreferences,
): string {
  const sentences = series.map(({ count, points }) => {
    const fitting = points.filter(isClear);
    if (fitting.length === 0) return `${countWords(count)}: none fits`;
    const quiet = fitting.find(
      ({ peak_air_speed_m_s }) =>
        airSpeedLimit_m_s !== null &&
        peak_air_speed_m_s !== null &&
        peak_air_speed_m_s <= airSpeedLimit_m_s,
    );
    if (quiet) return `inside the limit from ${describePick(quiet, preferences)}`;
    const widest = fitting[fitting.length - 1];
    return widest ? `widest that fits: ${describePick(widest, preferences)}` : "";
  });
  return `Bore map. ${sentences.filter(Boolean).join(". ")}.`;
}
