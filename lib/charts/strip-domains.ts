/** The vertical domains of all strips at once, each kept as long as it serves. */
import type { Curves } from "@/lib/acoustics/answer";
import type { UnitPreferences } from "@/lib/units/preferences";
import { extentOf } from "./domain";
import type { Domain } from "./scale";
import type { CurveLimits, StripId } from "./strips";
import { STRIP_IDS, stripDefinition } from "./strips";

export type StripDomains = Record<StripId, Domain>;

/**
 * @param previous - the domains in use, or null for fresh ones
 * @param shown - every set of curves that stands in the strips
 * @param range - the frequency axis: what lies outside does not stretch a strip [Hz]
 * @returns `previous` itself where every domain is kept
 */
export function stripDomains(
  previous: StripDomains | null,
  shown: readonly Curves[],
  limits: CurveLimits,
  preferences: UnitPreferences,
  range: Domain,
): StripDomains {
  const windows = shown.map((curves) => indexWindow(curves.frequency_hz, range));
  let changed = previous === null;
  const entries = STRIP_IDS.map((id): [StripId, Domain] => {
    const definition = stripDefinition(id);
    const factor = definition.unit(preferences).factor;
    const series = shown.flatMap((curves, n) =>
      definition.series(curves, []).map(({ values }) => {
        const [from, to] = windows[n] ?? [0, values.length];
        return from === 0 && to >= values.length ? values : values.slice(from, to);
      }),
    );
    const extent = extentOf(series, factor) ?? { low: 0, high: 0 };
    const limit = definition.limit(limits)?.value;
    const before = previous?.[id] ?? null;
    const domain = definition.domain(before, extent, limit === undefined ? null : limit * factor);
    const kept = before && before[0] === domain[0] && before[1] === domain[1] ? before : domain;
    if (kept !== before) changed = true;
    return [id, kept];
  });
  return changed || !previous ? (Object.fromEntries(entries) as StripDomains) : previous;
}

function indexWindow(frequency_hz: readonly number[], range: Domain): [number, number] {
  const from = frequency_hz.findIndex((hz) => hz >= range[0] * (1 - 1e-9));
  const after = frequency_hz.findIndex((hz) => hz > range[1] * (1 + 1e-9));
  return [Math.max(0, from), after < 0 ? frequency_hz.length : after];
}
