/** Which strips a person has standing, and in what order: kept in the browser. */

export const stripIds = [
  "response",
  "air-speed",
  "excursion",
  "impedance",
  "group-delay",
  "max-level",
] as const;
export type StripId = (typeof stripIds)[number];

const KEY = "ventwright.strips";
export const usualStrips: StripId[] = ["response", "air-speed", "excursion", "impedance"];

export function readStripChoice(): StripId[] {
  try {
    const kept: unknown = JSON.parse(window.localStorage.getItem(KEY) ?? "null");
    if (!Array.isArray(kept)) return usualStrips;
    const known = kept.filter((id): id is StripId => stripIds.some((strip) => strip === id));
    return known.length > 0 ? [...new Set(known)] : usualStrips;
  } catch {
    return usualStrips;
  }
}

export function keepStripChoice(strips: readonly StripId[]): void {
  try {
    window.localStorage.setItem(KEY, JSON.stringify(strips));
  } catch {
    // A browser that keeps nothing starts from the usual strips.
  }
}
