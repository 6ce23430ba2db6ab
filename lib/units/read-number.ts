/** A number as written by hand: decimal point or comma, or a fraction, whole and mixed. */

export type NumberRead =
  | { ok: true; value: number }
  /** Two readings are possible, or none. */
  | { ok: false; reason: "not-a-number" | "division-by-zero" | "ambiguous"; readings?: string[] };

const DECIMAL = /^\d+$|^\d*[.,]\d+$|^\d+[.,]$/;
const GROUPED =
  /^\d{1,3}(?:,\d{3})+\.\d+$|^\d{1,3}(?:\.\d{3})+,\d+$|^\d{1,3}(?:[ ]\d{3})+(?:[.,]\d+)?$/;
const FRACTION = /^(?:(\d+)(?: |-| - | ?\+ ?))?(\d+) ?\/ ?(\d+)$/;

/**
 * Reads an unsigned number. A comma is a decimal comma; only where it could as well part the
 * thousands (`1,234`) is it asked about instead of guessed.
 *
 * @example readNumber("1-1/2") // { ok: true, value: 1.5 }
 */
export function readNumber(text: string): NumberRead {
  const fraction = FRACTION.exec(text);
  if (fraction) {
    const [, whole = "0", numerator = "0", denominator = "1"] = fraction;
    if (Number(denominator) === 0) return { ok: false, reason: "division-by-zero" };
    return { ok: true, value: Number(whole) + Number(numerator) / Number(denominator) };
  }
  if (/^[1-9]\d{0,2},\d{3}$/.test(text))
    return {
      ok: false,
      reason: "ambiguous",
      readings: [text.replace(",", "."), text.replace(",", "")],
    };
  if (GROUPED.test(text)) {
    const point = Math.max(text.lastIndexOf("."), text.lastIndexOf(","));
    const [whole, rest] = point < 0 ? [text, ""] : [text.slice(0, point), text.slice(point + 1)];
    return { ok: true, value: Number(`${whole.replace(/[ .,]/g, "")}.${rest}`) };
  }
  if (/^\d*[.,]?\d+e[-+]?\d+$/i.test(text))
    return { ok: true, value: Number(text.replace(",", ".")) };
  if (!DECIMAL.test(text)) return { ok: false, reason: "not-a-number" };
  return { ok: true, value: Number(text.replace(",", ".")) };
}
