/** What one press of an arrow key does to a number, in steps the person's system knows. */
import type { UnitPreferences } from "./preferences";
import type { QuantityRange } from "./range";
import { fromShown, shownUnits, toShown } from "./shown-units";

/** Below this a step is finer than a tape: thousandths of an inch then [m]. */
const TAPE_STEP = 2.5e-4;
const THOUSANDTH = 2.54e-5;

/**
 * A value some steps on, within its range. Metric: the step given. Inches: the tape's marks, or
 * thousandths for what a caliper measures. Other imperial units: the nearest round step.
 */
export function stepped(
  from: number,
  steps: number,
  { kind, min, max, step }: QuantityRange & { step: number },
  { system, tape }: UnitPreferences,
): number {
  const bounded = (value: number) => Math.min(max, Math.max(min, value));
  if (system === "metric") return bounded(from + steps * step);
  const shown = shownUnits[kind].imperial;
  if (shown === shownUnits[kind].metric) return bounded(from + steps * step);
  if (kind === "length") {
    const mark = step < TAPE_STEP ? THOUSANDTH : 0.0254 / tape;
    return bounded(along(from / mark, steps) * mark);
  }
  const round = roundStep(step / shown.per);
  const figure = toShown(from, shown);
  return bounded(fromShown(along(figure / round, steps) * round, shown));
}

/** The mark so many steps on; from between two marks, the first step only reaches the next. */
function along(marks: number, steps: number): number {
  const nearest = Math.round(marks);
  if (Math.abs(marks - nearest) < 1e-6) return nearest + steps;
  return (steps > 0 ? Math.floor(marks) : Math.ceil(marks)) + steps;
}

/** The nearest of 1, 2, 5 × 10ⁿ. */
function roundStep(step: number): number {
  const power = 10 ** Math.floor(Math.log10(step));
  const [first = 1] = [1, 2, 5, 10].sort(
    (a, b) => Math.abs(a * power - step) - Math.abs(b * power - step),
  );
  return first * power;
}
