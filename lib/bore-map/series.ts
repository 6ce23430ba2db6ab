/** The field as the bore map draws it: one line per count, diameter against air speed. */
import type { Design } from "@/lib/document/schema";
import { candidateAt, type BoreCandidate } from "./apply";
import type { FlareChoice, VentForm } from "./candidate";
import type { BoreField } from "./field";

export interface BoreMapPoint extends BoreCandidate {
  /** Whether the vent finds room in the box. */
  fits: boolean;
}

export interface BoreMapLine {
  count: number;
  flare: FlareChoice;
  form: VentForm;
  /** As in "2 vents". */
  name: string;
  /** By growing diameter; only candidates with figures. */
  points: BoreMapPoint[];
}

export interface BoreMapSeries {
  tuning_hz: number;
  /** False without a driver: there are lengths and clearances, but no air speeds. */
  hasDriver: boolean;
  air_speed_limit_m_s: number | null;
  /** Bores the map runs over [m]. */
  from_m: number;
  to_m: number;
  /** One per count, for the flares and the form chosen (0: the vent's own). */
  lines: BoreMapLine[];
  flares: FlareChoice[];
  forms: VentForm[];
}

/** Points drawn along a line: about three for each pixel-wide step of a small map. */
const POINTS_PER_LINE = 125;

/** The lines of a field for one choice of flares and form. */
export function boreMapSeries(
  field: BoreField,
  design: Design,
  choice: { flare?: number; form?: number } = {},
): BoreMapSeries {
  const { counts, flares, forms, diameters_m } = field;
  const many = diameters_m.length;
  const flareAt = choice.flare ?? 0;
  const formAt = choice.form ?? 0;
  const step = Math.max(1, Math.floor(many / POINTS_PER_LINE));
  const lines = counts.map((count, countAt): BoreMapLine => {
    const first = ((formAt * flares.length + flareAt) * counts.length + countAt) * many;
    const points: BoreMapPoint[] = [];
    for (let i = 0; i < many; i += step) {
      const candidate = candidateAt(field, first + i);
      if (candidate.state === "fits" || candidate.state === "too long")
        points.push({ ...candidate, fits: candidate.state === "fits" });
    }
    return {
      count,
      flare: flares[flareAt]!,
      form: forms[formAt]!,
      name: count === 1 ? "1 vent" : `${count} vents`,
      points,
    };
  });
  return {
    tuning_hz: field.tuning_hz,
    hasDriver: field.hasDriver,
    air_speed_limit_m_s: design.target.air_speed_limit_m_s,
    from_m: diameters_m[0]!,
    to_m: diameters_m[many - 1]!,
    lines,
    flares,
    forms,
  };
}
