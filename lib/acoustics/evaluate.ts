/** Everything the contract's `evaluate` answers, from a design. */
import type { Design, Driver } from "@/lib/document/schema";
import { airProperties } from "./air";
import type { Answer, Curves, EvaluateOptions, Note } from "./answer";
import { curvesOf, USUAL_FREQUENCIES } from "./curves";
import { driverAnswer, referenceAir } from "./driver";
import { peakSpeeds, searchFrequencies, type PeakSpeed } from "./peak-speed";
import { systemOf, type System } from "./system";
import { tuningFrequency } from "./tuning";
import { modelVent } from "./vent";
import type { AirProperties } from "./vent-model";

/**
 * Air, driver, tuning, vents and curves of a design, small-signal and linear.
 *
 * @param options - frequencies (400 from 10 to 500 Hz where none are given), level, solver, losses
 * @returns `driver`, `curves` and the vents' peak air speeds are null without a driver; the curves
 * and the speeds also at a drive of 0 V, where no level can be told
 * @throws InputError where the vent's pieces cannot be
 * @remarks Peak air speed is sought over frequency whatever frequencies the caller asks for.
 * @example evaluate(designSchema.parse(input)).tuning_hz
 */
export function evaluate(design: Design, options: EvaluateOptions = {}): Answer {
  const air = airProperties(design.air);
  const losses = { vent_losses: options.vent_losses ?? true };
  const vents = design.vents.map((vent, i) =>
    modelVent(vent, design.enclosure, air, losses, `design.vents[${i}]`),
  );
  const notes = [...requestNotes(options), ...vents.flatMap((vent) => vent.notes)];
  const tuning_hz = tuningFrequency(design.enclosure, vents, air);
  if (tuning_hz === null && vents.length > 0)
    notes.push({
      code: "no_tuning",
      message: "The vents have no resonance with this enclosure: friction drowns it.",
    });
  let curves: Curves | null = null;
  let peaks: PeakSpeed[] = [];
  if (hasDriver(design) && design.drive.voltage_v > 0) {
    const system = systemOf(design, air, vents, tuning_hz);
    const asked = options.frequency_hz && Float64Array.from(options.frequency_hz);
    curves = curvesOf(design, air, system, asked ?? USUAL_FREQUENCIES);
    if (tuning_hz !== null) peaks = peaksOf(system, tuning_hz, asked ? null : curves);
  } else if (design.driver)
    notes.push({
      code: "drive_is_zero",
      message: "At a drive of 0 V there is no level: the curves and the air speeds are left out.",
    });
  return {
    air: airAnswer(air),
    driver: design.driver ? driverAnswer(design.driver, referenceAir(design.air)) : null,
    tuning_hz,
    vents: vents.map((vent, i) => ({ ...vent.figures, peak_air_speed: peaks[i] ?? null })),
    curves,
    notes,
  };
}

const hasDriver = (design: Design): design is Design & { driver: Driver } => design.driver !== null;

/** Peak air speeds, from the curves where they already lie on the frequencies of the search. */
function peaksOf(system: System, tuning_hz: number, curves: Curves | null): PeakSpeed[] {
  const search = searchFrequencies(tuning_hz);
  const speeds =
    curves && search === USUAL_FREQUENCIES
      ? curves.air_speed_peak_m_s
      : system.respond(search.map((frequency) => 2 * Math.PI * frequency)).airSpeed;
  return peakSpeeds(system, search, speeds);
}

function requestNotes(options: EvaluateOptions): Note[] {
  const notes: Note[] = [];
  if (options.level === "drive")
    notes.push({
      code: "level_not_modelled",
      message: "Level-dependent vent loss is not modelled yet; this is the linear answer.",
    });
  if (options.solver === "field")
    notes.push({
      code: "field_solver_not_landed",
      message: "The field solver is not there yet; this is the fitted answer.",
    });
  return notes;
}

function airAnswer(air: AirProperties): Answer["air"] {
  return {
    density_kg_m3: air.density,
    speed_of_sound_m_s: air.speedOfSound,
    kinematic_viscosity_m2_s: air.kinematicViscosity,
  };
}
