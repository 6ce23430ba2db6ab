/** Which strips a person has standing, and in what order: kept in the browser. */
import { DEFAULT_STRIPS, STRIP_IDS, type StripId } from "@/lib/charts/strips";

const KEY = "ventwright.strips";

export function readStripChoice(): readonly StripId[] {
  try {
    const kept: unknown = JSON.parse(window.localStorage.getItem(KEY) ?? "null");
    if (!Array.isArray(kept)) return DEFAULT_STRIPS;
    const known = kept.filter((id): id is StripId => STRIP_IDS.some((strip) => strip === id));
    return known.length > 0 ? [...new Set(known)] : DEFAULT_STRIPS;
  } catch {
    return DEFAULT_STRIPS;
  }
}

export function keepStripChoice(strips: readonly StripId[]): void {
  try {
    window.localStorage.setItem(KEY, JSON.stringify(strips));
  } catch {
    // A browser that keeps nothing starts from the usual strips.
  }
}
