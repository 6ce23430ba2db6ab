/** Which mixes of rings come near a length: enumeration over counts of each sheet. */
import type { Mix } from "./ring-request";

/** Length one ring of each sheet adds, its glue line included [m]. */
export type Steps = readonly number[];

export interface RankedMix {
  mix: Mix;
  length_m: number;
  rings: number;
  /** How many of the sheets are used. */
  kinds: number;
}

/** Above this many mixes a plan uses at most three of the sheets: more is no shop's practice. */
const FULL_SEARCH = 2e6;
const KINDS_OF_A_LARGE_SEARCH = 3;

/** The best of many, kept in order; `before` says which of two stands first. */
export class Shortlist {
  readonly best: RankedMix[] = [];
  constructor(
    private readonly size: number,
    private readonly before: (a: RankedMix, b: RankedMix) => number,
  ) {}

  offer(counts: readonly number[], length_m: number): void {
    let rings = 0;
    let kinds = 0;
    for (const count of counts) {
      rings += count;
      if (count > 0) kinds++;
    }
    const candidate: RankedMix = { mix: counts, length_m, rings, kinds };
    const last = this.best.at(-1);
    if (this.best.length >= this.size && last && this.before(candidate, last) >= 0) return;
    const at = this.best.findIndex((other) => this.before(candidate, other) < 0);
    this.best.splice(at < 0 ? this.best.length : at, 0, { ...candidate, mix: [...counts] });
    if (this.best.length > this.size) this.best.pop();
  }
}

/**
 * Visits every mix that can be nearest to a wanted length or the first beyond it: all counts of
 * all sheets but the thinnest are tried, and of the thinnest the two counts on either side.
 *
 * @param steps - what one ring of each sheet adds [m]
 * @param wanted_m - the length to come near to [m]
 * @param maxRings - at most this many rings in all
 * @param visit - told counts (its array is used again) and their length
 */
export function visitMixes(
  steps: Steps,
  wanted_m: number,
  maxRings: number,
  visit: (counts: readonly number[], length_m: number) => void,
): void {
  const order = steps.map((_, i) => i).sort((a, b) => steps[b]! - steps[a]!);
  const counts = steps.map(() => 0);
  for (const chosen of subsets(order, maxRings)) {
    counts.fill(0);
    visitOrdered(chosen, 0, 0, maxRings);
  }

  function visitOrdered(chosen: number[], depth: number, length_m: number, left: number): void {
    const sheet = chosen[depth];
    if (sheet === undefined) return visit(counts, length_m);
    const step = steps[sheet]!;
    const exact = (wanted_m - length_m) / step;
    const upTo = Math.max(0, Math.min(left, Math.ceil(exact - 1e-9)));
    if (depth === chosen.length - 1) {
      for (let count = Math.max(0, Math.min(left, Math.floor(exact))); count <= upTo; count++) {
        counts[sheet] = count;
        visit(counts, length_m + count * step);
      }
    } else
      for (let count = 0; count <= upTo; count++) {
        counts[sheet] = count;
        visitOrdered(chosen, depth + 1, length_m + count * step, left - count);
      }
    counts[sheet] = 0;
  }
}

/** All sheets at once, or, where that would be too many mixes, every choice of three of them. */
function subsets(order: number[], maxRings: number): number[][] {
  let mixes = 1;
  for (let i = 1; i < order.length; i++) mixes *= (maxRings + i) / i;
  if (mixes <= FULL_SEARCH || order.length <= KINDS_OF_A_LARGE_SEARCH) return [order];
  const chosen: number[][] = [];
  for (let a = 0; a < order.length; a++)
    for (let b = a + 1; b < order.length; b++)
      for (let c = b + 1; c < order.length; c++) chosen.push([order[a]!, order[b]!, order[c]!]);
  return chosen;
}
