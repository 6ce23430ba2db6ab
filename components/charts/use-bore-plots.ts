"use client";

import { useMemo } from "react";
import type { MapLines, MapPoint } from "@/lib/charts/bore-map";
import { BORE_QUANTITIES } from "@/lib/charts/bore-map";
import type { BorePlot } from "@/lib/charts/bore-plot";
import { airSpeedCap, boreDomain, borePlot, boreUnit } from "@/lib/charts/bore-plot";
import { TICK_WIDTH } from "@/lib/charts/layout";
import type { Scale } from "@/lib/charts/scale";
import { linearScale } from "@/lib/charts/scale";
import type { UnitPreferences } from "@/lib/units/preferences";

export interface ChosenVent {
  count: number;
  diameter_m: number;
  peak_air_speed_m_s: number | null;
}

export interface BoreMapInput<P extends MapPoint> {
  series: MapLines<P>;
  /** Air-speed limit [m/s]. */
  limit: number | null;
  /** Whether there are air speeds at all. */
  driven: boolean;
  chosen: ChosenVent | null;
  preferences: UnitPreferences;
}

export interface BoreSheet<P extends MapPoint> {
  x: Scale;
  plots: BorePlot[];
  /** The points that stand on the axis: those a probe can be moved to. */
  inView: MapLines<P>;
  /** Shown length per metre. */
  boreFactor: number;
}

/** Free space above and below a plot [px]. */
const MARGIN = 8;
const HEIGHTS = { small: [150], large: [280, 110, 110] } as const;

/** The strips of the bore map made ready for a width. Without a driver, length takes the first place. */
export function useBorePlots<P extends MapPoint>(
  { series, limit, driven, chosen, preferences }: BoreMapInput<P>,
  width_px: number,
  size: "small" | "large",
): BoreSheet<P> {
  const width = Math.max(1, width_px - TICK_WIDTH - MARGIN);
  const boreFactor = boreUnit("length", preferences).factor;
  const speed = chosen?.peak_air_speed_m_s ?? null;
  const x = useMemo(() => {
    const cap = driven ? airSpeedCap(limit, speed) : null;
    return linearScale(boreDomain(series, boreFactor, cap), [0, width]);
  }, [series, boreFactor, driven, limit, speed, width]);
  const plots = useMemo(() => {
    const shown = BORE_QUANTITIES.filter((quantity) => driven || quantity !== "air-speed");
    return shown.slice(0, HEIGHTS[size].length).map((quantity, n) => {
      const air = quantity === "air-speed";
      const input = { series, preferences, limit: air ? limit : null, chosen: air ? speed : null };
      const height = { top: MARGIN, bottom: MARGIN + (HEIGHTS[size][n] ?? 110) };
      return borePlot(quantity, input, null, x, height, boreFactor);
    });
  }, [size, driven, series, preferences, limit, speed, x, boreFactor]);
  const inView = useMemo(() => {
    const [low, high] = x.domain;
    const within = (point: P) =>
      point.diameter_m * boreFactor >= low && point.diameter_m * boreFactor <= high;
    return series.map(({ count, points }) => ({ count, points: points.filter(within) }));
  }, [series, boreFactor, x]);
  return { x, plots, inView, boreFactor };
}
