/**
 * Width of condensed lettering, estimated from a table of the drawing face's advances so that the
 * server and a worker place text without a canvas. Errs wide by a few per cent.
 */
const NARROW = new Set("iljI.,:;'|!()[]");
const WIDE = new Set("mwMW@—");

/** Size of the drawing's lettering [CSS px]; never under 11 on screen. */
export const LETTERING_PX = 12;

/** Estimated width of a text [same unit as size]. */
export function textWidth(text: string, size = LETTERING_PX): number {
  let ems = 0;
  for (const letter of text) ems += advance(letter);
  return ems * size;
}

function advance(letter: string): number {
  if (letter === " ") return 0.22;
  if (letter >= "0" && letter <= "9") return 0.54;
  if (NARROW.has(letter)) return 0.28;
  if (WIDE.has(letter)) return 0.8;
  if (letter === "×" || letter === "=" || letter === "+" || letter === "−" || letter === "±")
    return 0.56;
  if (letter >= "A" && letter <= "Z") return 0.62;
  return letter === "Ø" ? 0.68 : letter === "f" || letter === "r" || letter === "t" ? 0.38 : 0.52;
}
