/**
 * The strips of the recorder: what each shows, in which unit, with which domain. Everything that
 * draws, reads out, tabulates or describes a strip goes through these definitions.
 */
import type { Curves } from "@/lib/acoustics/answer";
import type { QuantityKind, UnitPreferences } from "@/lib/units/preferences";
import { shownUnits } from "@/lib/units/shown-units";
import type { Extent } from "./domain";
import { windowDomain, zeroDomain } from "./domain";
import type { Domain } from "./scale";

export const STRIP_IDS = [
  "response",
  "air-speed",
  "excursion",
  "impedance",
  "group-delay",
  "level",
  "phase",
] as const;

export type StripId = (typeof STRIP_IDS)[number];

/** What stands before the person chooses. */
export const DEFAULT_STRIPS: readonly StripId[] = [
  "response",
  "air-speed",
  "excursion",
  "impedance",
];

/** Lines the curves are held against, SI; null or left out where there is none. */
export interface CurveLimits {
  air_speed_m_s?: number | null;
  /** Where the air-speed limit comes from, such as "5 % of c". */
  air_speed_reason?: string;
  xmax_m?: number | null;
  minimum_load_ohm?: number | null;
  tuning_hz?: number | null;
}

/** A unit as a strip shows it: shown = SI × factor. */
export interface StripUnit {
  name: string;
  factor: number;
  /** Decimals of a read-out. */
  digits: number;
}

export interface StripSeries {
  /** Told apart by this, such as a vent's name; null where a strip has one curve. */
  label: string | null;
  /** SI. */
  values: readonly (number | null)[];
}

export interface StripLimit {
  /** SI. */
  value: number;
  name: string;
  /** Whether being above or below the line is what is not wanted. */
  side: "above" | "below";
}

export interface StripDefinition {
  id: StripId;
  name: string;
  /** For the unit line under the name: "m/s peak", "dB at 1 m". */
  suffix: string;
  unit: (preferences: UnitPreferences) => StripUnit;
  series: (curves: Curves, ventNames: readonly string[]) => StripSeries[];
  limit: (limits: CurveLimits) => StripLimit | null;
  /** In the shown unit, where round steps would not be the natural ones. */
  ticks?: readonly number[];
  /** In the shown unit. */
  domain: (previous: Domain | null, extent: Extent, limit: number | null) => Domain;
}

/** The unit people read a kind of quantity in, with the decimals a strip has room for. */
const shownAs =
  (kind: QuantityKind, digits: number, imperialDigits = digits) =>
  ({ system }: UnitPreferences): StripUnit => {
    const { unit, per } = shownUnits[kind][system];
    return { name: unit, factor: 1 / per, digits: system === "metric" ? digits : imperialDigits };
  };

const one = (values: readonly (number | null)[]): StripSeries[] => [{ label: null, values }];
const noLimit = () => null;
const decibels = (previous: Domain | null, extent: Extent) =>
  windowDomain(previous, extent.high, 40, 5);
const fromZero = (previous: Domain | null, extent: Extent) => zeroDomain(previous, extent);
const withLimit = (previous: Domain | null, extent: Extent, limit: number | null) =>
  zeroDomain(previous, { ...extent, high: Math.max(extent.high, (limit ?? 0) * 1.1) });

const definitions: Record<StripId, StripDefinition> = {
  response: {
    id: "response",
    name: "Response",
    suffix: "at 1 m",
    unit: shownAs("level", 1),
    series: (curves) => one(curves.spl_db),
    limit: noLimit,
    domain: decibels,
  },
  "air-speed": {
    id: "air-speed",
    name: "Air speed",
    suffix: "peak",
    unit: shownAs("speed", 1),
    series: (curves, names) =>
      curves.air_speed_peak_m_s.map((values, vent) => ({
        label: curves.air_speed_peak_m_s.length > 1 ? (names[vent] ?? `Vent ${vent + 1}`) : null,
        values,
      })),
    limit: ({ air_speed_m_s, air_speed_reason }) =>
      air_speed_m_s
        ? {
            value: air_speed_m_s,
            name: air_speed_reason ? `limit, ${air_speed_reason}` : "limit",
            side: "above",
          }
        : null,
    domain: withLimit,
  },
  excursion: {
    id: "excursion",
    name: "Excursion",
    suffix: "peak",
    unit: shownAs("length", 1, 3),
    series: (curves) => one(curves.excursion_peak_m),
    limit: ({ xmax_m }) => (xmax_m ? { value: xmax_m, name: "x max", side: "above" } : null),
    // Below the tuning the cone may run far past x max; the strip keeps its height for the band.
    domain: (previous, extent, limit) =>
      withLimit(
        previous,
        limit ? { ...extent, high: Math.min(extent.high, limit * 1.6) } : extent,
        limit,
      ),
  },
  impedance: {
    id: "impedance",
    name: "Impedance",
    suffix: "",
    unit: shownAs("resistance", 1),
    series: (curves) => one(curves.impedance_ohm),
    limit: ({ minimum_load_ohm }) =>
      minimum_load_ohm ? { value: minimum_load_ohm, name: "minimum load", side: "below" } : null,
    domain: withLimit,
  },
  "group-delay": {
    id: "group-delay",
    name: "Group delay",
    suffix: "",
    unit: shownAs("time", 1),
    series: (curves) => one(curves.group_delay_s),
    limit: noLimit,
    domain: fromZero,
  },
  level: {
    id: "level",
    name: "Clean level",
    suffix: "at 1 m",
    unit: shownAs("level", 1),
    series: (curves) => one(curves.max_spl_db),
    limit: noLimit,
    domain: decibels,
  },
  phase: {
    id: "phase",
    name: "Phase",
    suffix: "",
    unit: shownAs("angle", 0),
    series: (curves) => one(brokenAtWraps(curves.phase_deg)),
    limit: noLimit,
    ticks: [-180, -90, 0, 90, 180],
    domain: () => [-180, 180],
  },
};

export function stripDefinition(id: StripId): StripDefinition {
  return definitions[id];
}

/** A strip's unit line: "m/s peak". */
export function unitLine(definition: StripDefinition, preferences: UnitPreferences): string {
  return `${definition.unit(preferences).name} ${definition.suffix}`.trim();
}

/** Phase turned into ±180°, with a gap where it jumps from one edge to the other. */
export function brokenAtWraps(phase_deg: readonly number[]): (number | null)[] {
  const wrapped = phase_deg.map((phase) => phase - 360 * Math.round(phase / 360));
  return wrapped.map((phase, i) => {
    const before = wrapped[i - 1];
    return before !== undefined && Math.abs(phase - before) > 180 ? null : phase;
  });
}

/** Known strips out of a stored choice, each once; the default where nothing is left. */
export function chosenStrips(stored: readonly string[] | null | undefined): StripId[] {
  const known = (stored ?? []).filter((id): id is StripId =>
    (STRIP_IDS as readonly string[]).includes(id),
  );
  const once = [...new Set(known)];
  return once.length > 0 ? once : [...DEFAULT_STRIPS];
}

/** The order with one strip moved up (−1) or down (+1). */
export function movedStrip(strips: readonly StripId[], id: StripId, by: -1 | 1): StripId[] {
  const from = strips.indexOf(id);
  const to = from + by;
  const other = strips[to];
  if (from < 0 || other === undefined) return [...strips];
  const moved = [...strips];
  moved[from] = other;
  moved[to] = id;
  return moved;
}

/** The order with one strip put at the end, or taken out; the last one stays. */
export function toggledStrip(strips: readonly StripId[], id: StripId): StripId[] {
  if (!strips.includes(id)) return [...strips, id];
  return strips.length > 1 ? strips.filter((strip) => strip !== id) : [...strips];
}
