"use client";

import { useMemo, useState } from "react";
import type { Curves } from "@/lib/acoustics/answer";
import type { StripLayout } from "@/lib/charts/layout";
import { stripLayout } from "@/lib/charts/layout";
import type { Domain, Scale } from "@/lib/charts/scale";
import { logScale } from "@/lib/charts/scale";
import type { StripDomains } from "@/lib/charts/strip-domains";
import { stripDomains } from "@/lib/charts/strip-domains";
import type { SheetInput, StripPlot } from "@/lib/charts/strip-plot";
import { stripPlot } from "@/lib/charts/strip-plot";
import type { StripId } from "@/lib/charts/strips";

export interface StripSheet {
  layout: StripLayout;
  /** Of the plots [px]. */
  width: number;
  x: Scale;
  plots: StripPlot[];
  domains: StripDomains;
}

/**
 * The strips made ready for a width, with domains that stand still as long as they serve.
 * @param live - curves in motion that have outgrown the settled domains
 */
export function useStripSheet(
  input: SheetInput,
  strips: readonly StripId[],
  range_hz: Domain,
  width_px: number,
  live: Curves | null,
): StripSheet {
  const { curves, previous, saved, limits, preferences, ventNames } = input;
  const [held, setHeld] = useState<StripDomains | null>(null);
  const domains = useMemo(
    () =>
      stripDomains(held, shownCurves(curves, previous, saved, live), limits, preferences, range_hz),
    [held, curves, previous, saved, live, limits, preferences, range_hz],
  );
  if (domains !== held) setHeld(domains);
  const layout = stripLayout(width_px);
  const width = Math.max(1, width_px - layout.gutterLeft - layout.gutterRight);
  const x = useMemo(() => logScale(range_hz, [0, width]), [range_hz, width]);
  const plots = useMemo(() => {
    const sheet = { curves, previous, saved, limits, preferences, ventNames };
    return strips.map((id, n) => stripPlot(id, sheet, domains[id], x, layout, n === 0));
  }, [curves, previous, saved, limits, preferences, ventNames, strips, domains, x, layout]);
  return { layout, width, x, plots, domains };
}

/** Everything that must fit in the strips. */
export function shownCurves(
  curves: Curves,
  previous: Curves | null,
  saved: SheetInput["saved"],
  live: Curves | null,
): Curves[] {
  const others = [previous, live].filter((one) => one !== null);
  return [curves, ...others, ...saved.map((tuning) => tuning.curves)];
}
