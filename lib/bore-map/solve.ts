/** One candidate worked out exactly: its length for the tuning, its clearance, resonance and speed. */
import { InputError } from "@/lib/acoustics/input-error";
import { modelVent } from "@/lib/acoustics/vent";
import type { AirProperties, VentModel } from "@/lib/acoustics/vent-model";
import type { AirwayVent, Design } from "@/lib/document/schema";
import { pieceLength } from "@/lib/acoustics/airway";
import { candidateVent, widestOutside, type CandidateBase, type CandidateShape } from "./candidate";
import { peakSearch, peakSpeed, type PeakSearch } from "./network";
import { airProperties } from "@/lib/acoustics/air";

const TAU = 2 * Math.PI;

export interface Solved {
  /** Index into candidateStates. */
  state: number;
  tube_length_m: number;
  overall_length_m: number;
  clearance_m: number;
  pipe_resonance_hz: number;
  /** 0 without a driver. */
  peak_air_speed_m_s: number;
  peak_frequency_hz: number;
}

/** Everything the candidates of one map share while they are solved. */
export interface SolveContext {
  design: Design;
  base: CandidateBase;
  air: AirProperties;
  options: { vent_losses: boolean };
  tuning_hz: number;
  /** Null without a driver or a drive: there is no level then. */
  peak: PeakSearch | null;
  /** What one vent's inner end must let through at the tuning, times count [m³/(s·Pa)]. */
  susceptance: number;
}

/** A design's shared part; `others` are all vents but the one the map is of. */
export function solveContext(
  design: Design,
  ventIndex: number,
  base: CandidateBase,
  tuning_hz: number,
  options: { vent_losses: boolean },
): SolveContext {
  const air = airProperties(design.air);
  const others: VentModel[] = design.vents
    .map((vent, i) => ({ vent, i }))
    .filter(({ i }) => i !== ventIndex)
    .map(({ vent, i }) => modelVent(vent, design.enclosure, air, options, `design.vents[${i}]`));
  const w = TAU * tuning_hz;
  let susceptance = (w * design.enclosure.net_volume_m3) / (air.density * air.speedOfSound ** 2);
  for (const model of others)
    susceptance += model.count * model.respond(Float64Array.of(w)).innerIm[0]!;
  if (susceptance <= 0)
    throw new InputError(
      "tuning_out_of_reach",
      "design.target.tuning_hz",
      `The other vents alone tune the enclosure above ${tuning_hz} Hz.`,
      "a higher tuning, or fewer other vents",
    );
  return {
    design,
    base,
    air,
    options,
    tuning_hz,
    susceptance,
    peak:
      design.driver && design.drive.voltage_v > 0
        ? peakSearch(design, design.driver, air, others, tuning_hz, 1 / (w * susceptance))
        : null,
  };
}

const FITS = 0;
const TOO_LONG = 1;
const TOO_SHORT = 2;
const TOO_WIDE = 3;
const NOT_BUILDABLE = 4;
/** Nearer than this share of the bore's radius to the wall a vent counts as too long. */
const LEAST_CLEARANCE = 0.1;

const nothing = (state: number): Solved => ({
  state,
  tube_length_m: 0,
  overall_length_m: 0,
  clearance_m: 0,
  pipe_resonance_hz: 0,
  peak_air_speed_m_s: 0,
  peak_frequency_hz: 0,
});

/**
 * Solves the first tube's length so that the susceptances at the tuning cancel. The vent's reactance
 * is nearly proportional to its length, so it is put right in units of length; a wall close behind
 * is met by bisection. What is too long is solved as in a box that leaves one bore's width behind it.
 *
 * @param guess_m - overall length to begin from [m]; 0 for none
 */
export function solveCandidate(
  context: SolveContext,
  shape: CandidateShape,
  guess_m: number,
): Solved {
  const { design, base } = context;
  const inside = design.enclosure.inside_m;
  const outside = widestOutside(base, shape);
  if (inside && outside * Math.min(shape.count, 2) > Math.max(inside.width, inside.height))
    return nothing(TOO_WIDE);
  if (inside && outside > Math.min(inside.width, inside.height)) return nothing(TOO_WIDE);
  if (base.vent.spacing_m !== null && shape.count > 1 && outside > base.vent.spacing_m)
    return nothing(TOO_WIDE);
  try {
    return solveLength(context, shape, guess_m);
  } catch (error) {
    if (error instanceof InputError) return nothing(NOT_BUILDABLE);
    throw error;
  }
}

function solveLength(context: SolveContext, shape: CandidateShape, guess_m: number): Solved {
  const { design, base, air } = context;
  const { inside_m: inside, panel_thickness_m: panel } = design.enclosure;
  const blank = candidateVent(base, shape, 0);
  const rest = blank.pieces.reduce((sum, piece) => sum + pieceLength(piece, blank.bore), 0);
  const shortest = Math.max(rest, shape.flare.outer_m + shape.flare.inner_m, 1e-4) + 1e-9;
  const room =
    base.vent.clearance_m === null && inside
      ? inside.depth + panel + base.vent.outer_end.proud_m
      : Infinity;
  const longest = room - (LEAST_CLEARANCE * shape.diameter_m) / 2;
  const area = (Math.PI / 4) * shape.diameter_m ** 2;
  const w = TAU * context.tuning_hz;
  const at = Float64Array.of(w);
  const wanted = (w * shape.count * area) / (w * w * air.density * context.susceptance);
  let vent = blank;
  let model!: VentModel;
  /** How much longer the vent acts than it should [m], to first order. */
  const excess = (overall: number, free: boolean): number => {
    vent = candidateVent(base, shape, overall - rest);
    if (free) vent = { ...vent, clearance_m: shape.diameter_m };
    model = modelVent(vent, design.enclosure, air, context.options, "design.vents[0]");
    return -area / (w * air.density * model.respond(at).innerIm[0]!) - wanted;
  };
  if (longest <= shortest) {
    const free = root((x) => excess(x, true), shortest, 20, guess_m || wanted);
    return free === null ? nothing(TOO_SHORT) : figures(context, vent, model, room, TOO_LONG);
  }
  const start = guess_m || wanted - 0.8 * shape.diameter_m;
  if (start < longest || !Number.isFinite(longest)) {
    const met = root((x) => excess(x, false), shortest, Math.min(longest, 20), start);
    if (met !== null) return figures(context, vent, model, room, FITS);
  } else if (excess(longest, false) > 0) {
    const met = root((x) => excess(x, false), shortest, longest, longest);
    if (met !== null) return figures(context, vent, model, room, FITS);
  }
  if (excess(shortest, false) > 0) return nothing(TOO_SHORT);
  const free = root((x) => excess(x, true), shortest, 20, Math.max(start, longest));
  return free === null ? nothing(NOT_BUILDABLE) : figures(context, vent, model, room, TOO_LONG);
}

/** Told where no wall is known behind the vent [m]. */
const FAR_M = 20;

/** Root of a rising function of slope near 1 in [low, high]; null where it is not enclosed. The last call made is at the root. */
function root(f: (x: number) => number, low: number, high: number, start: number): number | null {
  let x = Math.min(high, Math.max(low, start));
  let [a, b] = [low, high];
  let slope = 1;
  let last: [number, number] | null = null;
  for (let i = 0; i < 40; i++) {
    const y = f(x);
    if (Math.abs(y) < 2e-5 * (x + 0.01)) return x;
    if (y > 0 && x <= low) return null;
    if (y < 0 && x >= high) return null;
    if (y > 0) b = Math.min(b, x);
    else a = Math.max(a, x);
    if (last && x !== last[0]) slope = (y - last[1]) / (x - last[0]);
    last = [x, y];
    let next = slope > 0.2 ? x - y / slope : (a + b) / 2;
    if (next <= a) next = a === low && i < 6 ? low : (a + x) / 2;
    if (next >= b) next = b === high && i < 6 ? high : (b + x) / 2;
    if (next === x) next = (a + b) / 2;
    x = next;
  }
  return null;
}

function figures(
  context: SolveContext,
  vent: AirwayVent,
  model: VentModel,
  room: number,
  state: number,
): Solved {
  const overall = model.figures.overall_length_m;
  const tube = vent.pieces.find((piece) => piece.kind === "tube");
  const peak = context.peak ? peakSpeed(context.peak, model) : null;
  return {
    state,
    tube_length_m: tube?.kind === "tube" ? tube.length_m : 0,
    overall_length_m: overall,
    clearance_m:
      state === FITS && vent.clearance_m !== null
        ? vent.clearance_m
        : Math.min(room - overall, FAR_M),
    pipe_resonance_hz: model.figures.pipe_resonances_hz[0] ?? 0,
    peak_air_speed_m_s: peak?.speed_m_s ?? 0,
    peak_frequency_hz: peak?.frequency_hz ?? 0,
  };
}
