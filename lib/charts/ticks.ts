/** Ticks for the shared frequency axis and for the linear axes of the strips. */
import type { Domain } from "./scale";
import { logScale } from "./scale";

/** Mantissas of the frequency grid: 10, 15, 20, 30, 40, 50, 70, 100, 150 … */
const MANTISSAS = [1, 1.5, 2, 3, 4, 5, 7] as const;
/** Which of them keep their label first when the axis is short. */
const PRIORITY = [1, 2, 5, 3, 1.5, 4, 7] as const;

/** Every grid frequency inside the domain, ascending [Hz]. */
export function frequencyGrid(domain: Domain): number[] {
  return gridOf(MANTISSAS, domain).sort((a, b) => a - b);
}

/**
 * The grid frequencies that carry a label: as many as stand at least `gap` pixels apart, the
 * rounder ones first.
 */
export function frequencyTicks(domain: Domain, width_px: number, gap_px = 34): number[] {
  const scale = logScale(domain, [0, width_px]);
  const kept: number[] = [];
  for (const mantissa of PRIORITY)
    for (const tick of gridOf([mantissa], domain)) {
      const at = scale.toPixel(tick);
      if (kept.every((other) => Math.abs(scale.toPixel(other) - at) >= gap_px)) kept.push(tick);
    }
  return kept.sort((a, b) => a - b);
}

function gridOf(mantissas: readonly number[], domain: Domain): number[] {
  const [low, high] = domain;
  if (!(low > 0) || !(high > low)) return [];
  const ticks: number[] = [];
  for (let decade = Math.floor(Math.log10(low)); decade <= Math.ceil(Math.log10(high)); decade++)
    for (const mantissa of mantissas) {
      const tick = Number((mantissa * 10 ** decade).toPrecision(3));
      if (tick >= low * (1 - 1e-9) && tick <= high * (1 + 1e-9)) ticks.push(tick);
    }
  return ticks;
}

/** The smallest step of 1, 2 or 5 × 10ⁿ that divides `span` into at most `count` parts. */
export function niceStep(span: number, count: number): number {
  const rough = span / Math.max(1, count);
  const power = 10 ** Math.floor(Math.log10(rough));
  const mantissa = [1, 2, 5, 10].find((candidate) => candidate * power >= rough * (1 - 1e-9)) ?? 10;
  return Number((mantissa * power).toPrecision(6));
}

/** Multiples of a nice step inside the domain, ends included, at most `count` intervals. */
export function linearTicks(domain: Domain, count: number): number[] {
  const [low, high] = domain;
  if (!(high > low) || !Number.isFinite(high - low)) return [];
  const step = niceStep(high - low, count);
  const ticks: number[] = [];
  for (let n = Math.ceil(low / step - 1e-9); n * step <= high + step * 1e-9; n++)
    ticks.push(Number((n * step).toPrecision(12)));
  return ticks;
}

/** The smallest of 1, 1.2, 1.5, 2, 2.5, 3, 4, 5, 6, 8, 10 × 10ⁿ that is not below `value`. */
export function niceCeiling(value: number): number {
  if (!(value > 0)) return 0;
  const power = 10 ** Math.floor(Math.log10(value));
  const steps = [1, 1.2, 1.5, 2, 2.5, 3, 4, 5, 6, 8, 10];
  const mantissa = steps.find((step) => step * power >= value * (1 - 1e-9)) ?? 10;
  return Number((mantissa * power).toPrecision(6));
}
