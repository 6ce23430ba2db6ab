/** Reading curves at the cursor: search, interpolation and steps along the frequency axis. */
import type { Domain } from "./scale";

/**
 * Index i with frequency[i] ≤ hz < frequency[i + 1], kept between 0 and length − 2.
 * @param frequency_hz - ascending [Hz]
 */
export function intervalAt(frequency_hz: ArrayLike<number>, hz: number): number {
  let low = 0;
  let high = frequency_hz.length - 1;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if ((frequency_hz[middle] ?? Infinity) <= hz) low = middle;
    else high = middle;
  }
  return low;
}

/** Index of the point nearest to hz on the logarithmic axis. */
export function nearestIndex(frequency_hz: ArrayLike<number>, hz: number): number {
  const index = intervalAt(frequency_hz, hz);
  const below = frequency_hz[index];
  const above = frequency_hz[index + 1];
  if (below === undefined || above === undefined) return index;
  return hz * hz > below * above ? index + 1 : index;
}

/**
 * Value of a curve at a frequency: linear in the value, logarithmic in the frequency.
 * @returns null outside the curve, or next to a gap in it
 */
export function valueAt(
  frequency_hz: ArrayLike<number>,
  values: ArrayLike<number | null>,
  hz: number,
): number | null {
  const length = frequency_hz.length;
  const first = frequency_hz[0];
  const last = frequency_hz[length - 1];
  if (first === undefined || last === undefined) return null;
  if (!(hz >= first * (1 - 1e-9) && hz <= last * (1 + 1e-9))) return null;
  const index = intervalAt(frequency_hz, hz);
  const f0 = frequency_hz[index] ?? first;
  const f1 = frequency_hz[index + 1];
  const v0 = values[index];
  if (v0 === null || v0 === undefined) return null;
  if (f1 === undefined || hz <= f0) return v0;
  const v1 = values[index + 1];
  if (v1 === null || v1 === undefined) return null;
  const share = Math.min(1, Math.log(hz / f0) / Math.log(f1 / f0));
  return v0 + (v1 - v0) * share;
}

/** The same curve read at other frequencies; null where it does not reach. */
export function resample(
  frequency_hz: ArrayLike<number>,
  values: ArrayLike<number | null>,
  at_hz: ArrayLike<number>,
): (number | null)[] {
  return Array.from(at_hz, (hz) => valueAt(frequency_hz, values, hz));
}

/** Steps of the cursor in an octave; the arrow keys move by one, with shift by ten. */
export const STEPS_PER_OCTAVE = 48;

/** The cursor moved by a number of steps, kept inside the axis. */
export function stepCursor(hz: number, steps: number, domain: Domain): number {
  return clampCursor(hz * 2 ** (steps / STEPS_PER_OCTAVE), domain);
}

/** A cursor frequency to four significant digits, kept inside the axis. */
export function clampCursor(hz: number, domain: Domain): number {
  const kept = Math.min(domain[1], Math.max(domain[0], hz));
  return Math.min(domain[1], Math.max(domain[0], Number(kept.toPrecision(4))));
}
