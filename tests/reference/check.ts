/**
 * One check of the library against a value from outside. The source stands beside it; the error is
 * kept for the table that ends the run.
 */
import { appendFileSync } from "node:fs";
import { expect, test } from "vitest";

/** How a value is known: read in the source, secondary, from memory, computed by a program not ours, or trade habit. */
export type Mark =
  "read" | "secondary" | "from memory" | "computed" | "common practice, no source" | "exact";

export type Tolerance = { relative: number } | { absolute: number } | { digits: number };

export interface Check {
  topic: string;
  name: string;
  source: string;
  mark: Mark;
  actual: () => number;
  expected: number;
  tolerance: Tolerance;
}

/** Where the run's errors are collected for the summary; one JSON line each. */
export const RECORD = process.env.VENTWRIGHT_REFERENCE_RECORD;

/** The tolerance as a difference that may not be passed. `digits` is half of the last printed decimal. */
export function allowedDifference(expected: number, tolerance: Tolerance): number {
  if ("relative" in tolerance) return tolerance.relative * Math.abs(expected);
  if ("absolute" in tolerance) return tolerance.absolute;
  return 0.5 * 10 ** -tolerance.digits * (1 + 1e-9);
}

/** Declares a check as a test. A tolerance that an answer of zero would meet is refused. */
export function check(subject: Check): void {
  const { topic, name, source, mark, expected, tolerance } = subject;
  test(`${topic}: ${name} (${source}; ${mark})`, () => {
    const allowed = allowedDifference(expected, tolerance);
    if (!(allowed > 0) || allowed >= Math.abs(expected))
      throw new Error(`Zero would pass ${name}: ${expected} ± ${allowed}.`);
    const actual = subject.actual();
    const error = Math.abs(actual - expected);
    if (RECORD)
      appendFileSync(
        RECORD,
        `${JSON.stringify({ topic, name, relative: error / Math.abs(expected), share: error / allowed })}\n`,
      );
    expect(error, `${name}: ${actual} against ${expected} ± ${allowed}`).toBeLessThanOrEqual(
      allowed,
    );
  });
}

/** Many rows of one table. */
export function checkRows(
  shared: Omit<Check, "name" | "actual" | "expected">,
  rows: readonly { name: string; actual: () => number; expected: number; tolerance?: Tolerance }[],
): void {
  for (const row of rows) check({ ...shared, ...row });
}
