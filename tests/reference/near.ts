/** Comparisons inside a test, where one answer of the library stands against a whole row of a source. */
import { appendFileSync } from "node:fs";
import { expect } from "vitest";
import { RECORD } from "./check";

/** `digit` is one unit in the last printed place: half of it is allowed, and a source's own rounding. */
export type Allowed = { absolute: number } | { relative: number } | { digit: number };

/** Sources that rounded twice are off by up to this share of their last digit. */
const LAST_DIGIT = 0.56;

/**
 * A comparison whose error goes into the table that ends the run. It refuses a tolerance that zero
 * would meet, unless zero is what is expected.
 */
export function near(topic: string) {
  return function expectNear(name: string, got: number, expected: number, allowed: Allowed): void {
    const tolerance = differenceOf(expected, allowed);
    if (expected !== 0 && tolerance >= Math.abs(expected))
      throw new Error(`${name}: a tolerance that zero would meet.`);
    const error = Math.abs(got - expected);
    // A value printed to under 1 % says too little of an error to stand in the table.
    if (RECORD && tolerance < 0.01 * Math.abs(expected)) {
      const relative = error / Math.abs(expected);
      const line = { topic, name, relative, share: error / tolerance };
      appendFileSync(RECORD, `${JSON.stringify(line)}\n`);
    }
    expect(error, `${name}: got ${got}, expected ${expected} ± ${tolerance}`).toBeLessThanOrEqual(
      tolerance * (1 + 1e-9),
    );
  };
}

function differenceOf(expected: number, allowed: Allowed): number {
  if ("absolute" in allowed) return allowed.absolute;
  if ("relative" in allowed) return allowed.relative * Math.abs(expected);
  return LAST_DIGIT * allowed.digit;
}
