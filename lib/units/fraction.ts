/** Inches as a tape reads them: a whole number and a fraction in lowest terms. */

/**
 * Rounds inches to the nearest mark of a tape and writes them as `8 3/16`.
 *
 * @param inches - any finite number [in]
 * @param tape - parts of an inch on the tape: a power of two
 * @returns the words without sign, and the inches they stand for (same sign as given)
 * @example tapeFraction(8.19, 16) // { words: "8 3/16", inches: 8.1875 }
 */
export function tapeFraction(inches: number, tape: number): { words: string; inches: number } {
  const marks = Math.round(Math.abs(inches) * tape);
  const whole = Math.floor(marks / tape);
  let numerator = marks % tape;
  let denominator = tape;
  while (numerator > 0 && numerator % 2 === 0) {
    numerator /= 2;
    denominator /= 2;
  }
  const fraction = numerator > 0 ? `${numerator}/${denominator}` : "";
  const words = [whole > 0 || !fraction ? String(whole) : "", fraction].filter(Boolean).join(" ");
  return { words, inches: (Math.sign(inches) * marks) / tape };
}
