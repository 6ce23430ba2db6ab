/**
 * The field of candidates of the bore map: diameters × counts × flares × forms, each with the
 * length that meets the tuning, what is left behind it, its first pipe resonance and its peak air
 * speed. Along each line of diameters some candidates are solved exactly; the others follow by
 * interpolating what hardly changes with diameter, wherever a solved midpoint shows that it may be.
 */
import { InputError } from "@/lib/acoustics/input-error";
import { tuningOf } from "@/lib/acoustics/tuning";
import type { Design } from "@/lib/document/schema";
import {
  candidateBase,
  presentForm,
  type CandidateShape,
  type FlareChoice,
  type VentForm,
} from "./candidate";
import { solveCandidate, solveContext, type SolveContext, type Solved } from "./solve";

export interface BoreFieldOptions {
  /** How many diameters, in equal ratios. */
  diameters?: number;
  from_m?: number;
  to_m?: number;
  counts?: readonly number[];
  flares?: readonly FlareChoice[];
  forms?: readonly VentForm[];
  vent_losses?: boolean;
}

/**
 * Struct of arrays. Candidate index = ((form · flares + flare) · counts + count) · diameters + diameter.
 * Figures are zero where `state` (index into candidateStates) says there are none.
 */
export interface BoreField {
  ventIndex: number;
  tuning_hz: number;
  size: number;
  /** Whether there is a driver and a drive, so that there are air speeds. */
  hasDriver: boolean;
  diameters_m: Float64Array;
  counts: number[];
  flares: FlareChoice[];
  forms: VentForm[];
  state: Uint8Array;
  tube_length_m: Float32Array;
  overall_length_m: Float32Array;
  clearance_m: Float32Array;
  pipe_resonance_hz: Float32Array;
  peak_air_speed_m_s: Float32Array;
  peak_frequency_hz: Float32Array;
  /** How many candidates were solved exactly. */
  solved: number;
}

/** Usual round-over radii beside the vent's own flares and none [m]. */
const usualFlares: FlareChoice[] = [
  { outer_m: 0, inner_m: 0 },
  { outer_m: 0.0127, inner_m: 0 },
  { outer_m: 0.01905, inner_m: 0.0127 },
  { outer_m: 0.0254, inner_m: 0.01905 },
];
/** Candidates between two exact ones on a line, at first. */
const STRIDE = 64;
/** Largest error of a straight line at a solved midpoint that still lets the curve through it stand. */
const STRAIGHT_ENOUGH = 0.004;

/** The field of one vent of a design; the tuning is the target's, or the present one where there is none. */
export function boreField(
  design: Design,
  ventIndex: number,
  options: BoreFieldOptions = {},
): BoreField {
  const vent = design.vents[ventIndex];
  const path = `design.vents[${ventIndex}]`;
  if (!vent) throw new InputError("no_such_vent", "vent", `There is no vent ${ventIndex}.`);
  if ("lumped" in vent)
    throw new InputError(
      "vent_is_lumped",
      path,
      "A vent given as bare elements has no bore to map.",
    );
  const losses = { vent_losses: options.vent_losses ?? true };
  const tuning = design.target.tuning_hz ?? tuningOf(design, losses);
  if (tuning === null)
    throw new InputError("no_tuning", "design.target.tuning_hz", "There is no tuning to map for.");
  const base = candidateBase(vent, design);
  const own = { outer_m: vent.outer_end.flare_radius_m, inner_m: vent.inner_end.flare_radius_m };
  const flares = [
    ...(options.flares ?? [
      own,
      ...usualFlares.filter((f) => f.outer_m !== own.outer_m || f.inner_m !== own.inner_m),
    ]),
  ];
  const form = presentForm(vent);
  const otherForm: VentForm = form === "plain" ? "ringed" : "plain";
  const forms: VentForm[] = options.forms
    ? [...options.forms]
    : vent.bore.shape === "round"
      ? [form, otherForm]
      : ["plain"];
  const counts = [...(options.counts ?? [1, 2, 3, 4])];
  const many = options.diameters ?? 500;
  const from = options.from_m ?? Math.max(0.012, base.diameter_m / 4);
  const to = options.to_m ?? Math.min(1.5, base.diameter_m * 3);
  const diameters_m = Float64Array.from(
    { length: many },
    (_, i) => from * (to / from) ** (many === 1 ? 0 : i / (many - 1)),
  );
  const size = forms.length * flares.length * counts.length * many;
  const figures = () => new Float32Array(size);
  const field: BoreField = {
    ventIndex,
    tuning_hz: tuning,
    size,
    hasDriver: design.driver !== null && design.drive.voltage_v > 0,
    diameters_m,
    counts,
    flares,
    forms,
    state: new Uint8Array(size),
    tube_length_m: figures(),
    overall_length_m: figures(),
    clearance_m: figures(),
    pipe_resonance_hz: figures(),
    peak_air_speed_m_s: figures(),
    peak_frequency_hz: figures(),
    solved: 0,
  };
  const context = solveContext(design, ventIndex, base, tuning, losses);
  let offset = 0;
  for (const formOfLine of forms)
    for (const flare of flares)
      for (const count of counts) {
        fillLine(field, context, offset, { count, flare, form: formOfLine });
        offset += many;
      }
  return field;
}

/**
 * What hardly changes along a line, to interpolate in log d: the end corrections in diameters, those
 * of the pipe resonance likewise, the volume velocity, and the frequency of the peak.
 */
interface Smooth {
  ends: number;
  pipe: number;
  flow: number;
  at: number;
}

function fillLine(
  field: BoreField,
  context: SolveContext,
  offset: number,
  line: Omit<CandidateShape, "diameter_m">,
): void {
  const { diameters_m: d } = field;
  const { air, susceptance, tuning_hz } = context;
  const many = d.length;
  const w = 2 * Math.PI * tuning_hz;
  /** Effective length over diameter squared that the tuning asks for, lossless [1/m]. */
  const perArea = (Math.PI / 4) * (line.count / (w * air.density * susceptance));
  const known = new Map<number, { solved: Solved; smooth: Smooth }>();
  let lastEnds: number | null = null;

  const solve = (i: number) => {
    const cached = known.get(i);
    if (cached) return cached;
    const di = d[i]!;
    const guess = lastEnds === null ? 0 : perArea * di * di - lastEnds * di;
    const solved = solveCandidate(context, { ...line, diameter_m: di }, Math.max(0, guess));
    field.solved++;
    const smooth: Smooth = {
      ends: (perArea * di * di - solved.overall_length_m) / di,
      pipe:
        (air.speedOfSound / (2 * (solved.pipe_resonance_hz || 1)) - solved.overall_length_m) / di,
      flow: solved.peak_air_speed_m_s * di * di,
      at: solved.peak_frequency_hz,
    };
    if (solved.state <= 1) lastEnds = smooth.ends;
    const entry = { solved, smooth };
    known.set(i, entry);
    store(field, offset + i, solved);
    return entry;
  };

  const between = (from: number, to: number): void => {
    if (to - from < 2) return;
    const a = solve(from);
    const b = solve(to);
    const middle = (from + to) >> 1;
    const m = solve(middle);
    const same = a.solved.state === b.solved.state && m.solved.state === a.solved.state;
    if (same && (a.solved.state > 1 || isStraight(a, m, b, (middle - from) / (to - from)))) {
      interpolate(field, context, offset, perArea, [from, middle, to], [a, m, b]);
      return;
    }
    between(from, middle);
    between(middle, to);
  };
  solve(0);
  for (let from = 0; from < many - 1; from += STRIDE)
    between(from, Math.min(many - 1, from + STRIDE));

  /** Whether straight lines from a to b pass near m, in shares of the figures themselves. */
  function isStraight(a: Entry, m: Entry, b: Entry, t: number): boolean {
    const miss = (key: keyof Smooth) =>
      Math.abs(a.smooth[key] + t * (b.smooth[key] - a.smooth[key]) - m.smooth[key]);
    const length = m.solved.overall_length_m;
    const di = diameterOf(m);
    return (
      miss("ends") * di < STRAIGHT_ENOUGH * length &&
      miss("pipe") * di < STRAIGHT_ENOUGH * length &&
      miss("flow") <= STRAIGHT_ENOUGH * m.smooth.flow
    );
  }
  function diameterOf(entry: Entry): number {
    // L = perArea d² − ends d, solved for d.
    const e = entry.smooth.ends;
    return (e + Math.sqrt(e * e + 4 * perArea * entry.solved.overall_length_m)) / (2 * perArea);
  }
}

type Entry = { solved: Solved; smooth: Smooth };

function store(field: BoreField, at: number, solved: Solved): void {
  field.state[at] = solved.state;
  field.tube_length_m[at] = solved.tube_length_m;
  field.overall_length_m[at] = solved.overall_length_m;
  field.clearance_m[at] = solved.clearance_m;
  field.pipe_resonance_hz[at] = solved.pipe_resonance_hz;
  field.peak_air_speed_m_s[at] = solved.peak_air_speed_m_s;
  field.peak_frequency_hz[at] = solved.peak_frequency_hz;
}

/** Fills the candidates between three solved ones by the parabola through them. */
function interpolate(
  field: BoreField,
  context: SolveContext,
  offset: number,
  perArea: number,
  at: [number, number, number],
  entries: [Entry, Entry, Entry],
): void {
  const [i0, i1, i2] = at;
  const [a, m, b] = entries;
  const rest = a.solved.overall_length_m - a.solved.tube_length_m;
  for (let i = i0 + 1; i < i2; i++) {
    if (i === i1) continue;
    const index = offset + i;
    field.state[index] = a.solved.state;
    if (a.solved.state > 1) continue;
    const d = field.diameters_m[i]!;
    const la = ((i - i1) * (i - i2)) / ((i0 - i1) * (i0 - i2));
    const lm = ((i - i0) * (i - i2)) / ((i1 - i0) * (i1 - i2));
    const lb = ((i - i0) * (i - i1)) / ((i2 - i0) * (i2 - i1));
    const value = (key: keyof Smooth) =>
      la * a.smooth[key] + lm * m.smooth[key] + lb * b.smooth[key];
    const overall = perArea * d * d - value("ends") * d;
    field.overall_length_m[index] = overall;
    field.tube_length_m[index] = overall - rest;
    field.clearance_m[index] =
      a.solved.clearance_m === m.solved.clearance_m
        ? a.solved.clearance_m
        : a.solved.clearance_m + a.solved.overall_length_m - overall;
    field.pipe_resonance_hz[index] = context.air.speedOfSound / (2 * (value("pipe") * d + overall));
    if (field.hasDriver) {
      field.peak_air_speed_m_s[index] = value("flow") / (d * d);
      field.peak_frequency_hz[index] = value("at");
    }
  }
}
