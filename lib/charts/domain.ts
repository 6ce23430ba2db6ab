/**
 * Domains that stand still. An axis that rescales under the hand makes a change of the design
 * unreadable, so a domain is kept as long as the curves fit in it and fill a fair part of it.
 */
import type { Domain } from "./scale";
import { niceCeiling } from "./ticks";

export interface Extent {
  low: number;
  high: number;
}

/** Lowest and highest finite value of some series; null where there is none. */
export function extentOf(series: Iterable<ArrayLike<number | null>>, factor = 1): Extent | null {
  let low = Infinity;
  let high = -Infinity;
  for (const values of series)
    for (let i = 0; i < values.length; i++) {
      const value = values[i];
      if (value === null || value === undefined || !Number.isFinite(value)) continue;
      if (value < low) low = value;
      if (value > high) high = value;
    }
  return low <= high ? { low: low * factor, high: high * factor } : null;
}

/** Share of a kept domain that the curves must fill; below it the axis closes in. */
const FILL = 0.45;
/** Room left above the highest value of a fresh domain. */
const HEADROOM = 1.06;

/**
 * Domain from zero (or from below it where the values go there) to a round figure.
 * @param previous - the domain in use; kept while `extent` fits in it and fills 45 % of it.
 */
export function zeroDomain(previous: Domain | null, extent: Extent): Domain {
  const high = Math.max(extent.high, 0);
  const low = Math.min(extent.low, 0);
  if (previous && high <= previous[1] && low >= previous[0]) {
    const span = previous[1] - previous[0];
    if (high - low >= FILL * span) return previous;
  }
  const top = niceCeiling(high * HEADROOM);
  const bottom = low < 0 ? -niceCeiling(-low * HEADROOM) : 0;
  return top > bottom ? [bottom, top] : [0, 1];
}

/**
 * A window of fixed height below the highest value, for levels in decibels: the top is a multiple
 * of `step`, the bottom `span` below it.
 * @param previous - kept while the highest value stays between its top and 0.3 spans below.
 */
export function windowDomain(
  previous: Domain | null,
  high: number,
  span: number,
  step: number,
): Domain {
  if (previous && high <= previous[1] && high >= previous[1] - 0.3 * span) return previous;
  const top = Math.ceil((high + 0.04 * span) / step) * step;
  return [top - span, top];
}
