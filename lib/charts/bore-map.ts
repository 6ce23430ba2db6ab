/**
 * The bore map as data: for each number of vents, peak air speed, length and pipe resonance over
 * the vent's diameter, each point already solved for the tuning. What can be asked of it without
 * drawing: the nearest point, the next one, a sentence about it.
 */
import { formatQuantity } from "@/lib/units/format";
import type { UnitPreferences } from "@/lib/units/preferences";

export interface BoreMapPoint {
  /** Diameter, or that of the circle of equal area. */
  bore_m: number;
  /** Peak, at the set drive; null without a driver. */
  air_speed_m_s: number | null;
  /** Overall, solved for the tuning. */
  length_m: number;
  /** Inner mouth to the wall it faces. */
  clearance_m: number;
  /** First pipe resonance; null where it is not known. */
  pipe_hz: number | null;
  fits: boolean;
}

export type BoreMapSeries<P extends BoreMapPoint = BoreMapPoint> = readonly {
  /** Number of vents alike. */
  count: number;
  /** Ascending bore. */
  points: readonly P[];
}[];

/** A point somebody chose: a candidate and the number of vents it is for. */
export type BoreMapPick<P extends BoreMapPoint = BoreMapPoint> = P & { count: number };

/** Where the person's probe stands: a curve and a point of it. */
export interface Probe {
  series: number;
  point: number;
}

export const BORE_QUANTITIES = ["air-speed", "length", "pipe"] as const;
export type BoreQuantity = (typeof BORE_QUANTITIES)[number];

/** SI. */
export function boreValue(point: BoreMapPoint, quantity: BoreQuantity): number | null {
  if (quantity === "air-speed") return point.air_speed_m_s;
  return quantity === "length" ? point.length_m : point.pipe_hz;
}

const COUNT_WORDS = ["no", "one", "two", "three", "four", "five", "six", "seven", "eight"] as const;

/** "one vent", "two vents"; figures above eight. */
export function countWords(count: number): string {
  return `${COUNT_WORDS[count] ?? count} ${count === 1 ? "vent" : "vents"}`;
}

/** The pick at a probe; null where the probe points at nothing. */
export function pickAt<P extends BoreMapPoint>(
  series: BoreMapSeries<P>,
  probe: Probe | null,
): BoreMapPick<P> | null {
  if (!probe) return null;
  const curve = series[probe.series];
  const point = curve?.points[probe.point];
  return curve && point ? { ...point, count: curve.count } : null;
}

/** The probe on a curve at the diameter nearest to the wanted one; null for an unknown count. */
export function probeNear(series: BoreMapSeries, count: number, bore_m: number): Probe | null {
  const index = series.findIndex((curve) => curve.count === count);
  const points = series[index]?.points ?? [];
  let best: Probe | null = null;
  let least = Infinity;
  points.forEach((point, n) => {
    const off = Math.abs(point.bore_m - bore_m);
    if (off < least) {
      least = off;
      best = { series: index, point: n };
    }
  });
  return best;
}

/** The probe nearest to a place in the plot, measured in pixels. */
export function probeAtPixel(
  series: BoreMapSeries,
  quantity: BoreQuantity,
  toX: (bore_m: number) => number,
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
      const off = (toX(point.bore_m) - x) ** 2 + (toY(value) - y) ** 2;
      if (off < least) {
        least = off;
        best = { series: s, point: n };
      }
    }),
  );
  return best;
}

/** The probe moved along its curve, kept inside it. */
export function stepAlong(series: BoreMapSeries, probe: Probe, steps: number): Probe {
  const last = (series[probe.series]?.points.length ?? 1) - 1;
  return { ...probe, point: Math.min(last, Math.max(0, probe.point + steps)) };
}

/** The probe moved to the curve of more (+1) or fewer (−1) vents, at the nearest diameter. */
export function stepCount(series: BoreMapSeries, probe: Probe, by: -1 | 1): Probe {
  const from = series[probe.series];
  const bore_m = from?.points[probe.point]?.bore_m;
  if (!from || bore_m === undefined) return probe;
  const counts = series
    .map((curve) => curve.count)
    .filter((count) => (count - from.count) * by > 0);
  if (counts.length === 0) return probe;
  const next = by > 0 ? Math.min(...counts) : Math.max(...counts);
  return probeNear(series, next, bore_m) ?? probe;
}

/** One candidate in words: "two vents, 101.0 mm: 15.6 m/s, 208.5 mm long, first pipe resonance 512 Hz". */
export function describePick(pick: BoreMapPick, preferences: UnitPreferences): string {
  const length = (value: number) => formatQuantity(value, "length", preferences).text;
  const parts = [
    pick.air_speed_m_s === null
      ? ""
      : formatQuantity(pick.air_speed_m_s, "speed", preferences).text,
    `${length(pick.length_m)} long`,
    pick.pipe_hz === null
      ? ""
      : `first pipe resonance ${formatQuantity(pick.pipe_hz, "frequency", preferences).text}`,
    pick.fits ? "fits" : "too long for the box",
  ];
  return `${countWords(pick.count)}, ${length(pick.bore_m)}: ${parts.filter(Boolean).join(", ")}`;
}

/** Smallest bore of each count that fits and stays inside the air-speed limit, in a sentence. */
export function boreMapSummary(
  series: BoreMapSeries,
  airSpeedLimit_m_s: number | null,
  preferences: UnitPreferences,
): string {
  const sentences = series.map(({ count, points }) => {
    const fitting = points.filter((point) => point.fits);
    if (fitting.length === 0) return `${countWords(count)}: none fits`;
    const quiet = fitting.find(
      ({ air_speed_m_s }) =>
        airSpeedLimit_m_s !== null && air_speed_m_s !== null && air_speed_m_s <= airSpeedLimit_m_s,
    );
    if (quiet) return `inside the limit from ${describePick({ ...quiet, count }, preferences)}`;
    const widest = fitting[fitting.length - 1];
    return widest ? `widest that fits: ${describePick({ ...widest, count }, preferences)}` : "";
  });
  return `Bore map. ${sentences.filter(Boolean).join(". ")}.`;
}
