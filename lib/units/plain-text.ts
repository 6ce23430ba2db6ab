/** What keyboards, word processors and phones put in place of plain characters, put back. */

const fractions: Record<string, string> = {
  "¼": "1/4",
  "½": "1/2",
  "¾": "3/4",
  "⅛": "1/8",
  "⅜": "3/8",
  "⅝": "5/8",
  "⅞": "7/8",
  "⅓": "1/3",
  "⅔": "2/3",
  "⅕": "1/5",
  "⅖": "2/5",
  "⅗": "3/5",
  "⅘": "4/5",
  "⅙": "1/6",
  "⅚": "5/6",
};

const replacements: [pattern: RegExp, plain: string][] = [
  [/''|[″”“„‶]/g, '"'],
  [/[′’‘‵]/g, "'"],
  [/[−–—‒]/g, "-"],
  [/⁄/g, "/"],
  [/[×·]/g, "*"],
  [/(?<=[\d)"' ])[xX](?= ?[\d(])/g, "*"],
  [/÷/g, "/"],
  [/²/g, "2"],
  [/³/g, "3"],
  [/μ/g, "µ"],
  [/Ω/gu, "Ω"],
  [/℃/g, "°C"],
  [/℉/g, "°F"],
  [/\s+/g, " "],
];

/**
 * Unicode fractions, primes, curly quotes, true minus, multiplication signs, superscripts and
 * unusual spaces as plain text. `1½″` becomes `1 1/2"`.
 */
export function plainText(text: string): string {
  const spelt = text.replace(
    /(\d?)([¼½¾⅛⅜⅝⅞⅓⅔⅕⅖⅗⅘⅙⅚])/g,
    (_, before: string, sign: string) => `${before}${before ? " " : ""}${fractions[sign] ?? ""}`,
  );
  return replacements
    .reduce((current, [pattern, plain]) => current.replace(pattern, plain), spelt)
    .trim();
}
