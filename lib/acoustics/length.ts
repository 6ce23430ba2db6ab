import type { Design } from "@/lib/document/schema";
import { pieceLength } from "./airway";
import type { Note } from "./answer";
import { InputError } from "./input-error";
import { tuningOf } from "./tuning";

export interface LengthAnswer {
  tube_length_m: number;
  overall_length_m: number;
  tuning_hz: number;
  notes: Note[];
}

/** Length of the first tube that brings the whole system to a tuning, all else as it stands. */
export function lengthForTuning(
  design: Design,
  ventIndex: number,
  tuning_hz: number,
  options: { vent_losses: boolean } = { vent_losses: true },
): LengthAnswer {
  const vent = design.vents[ventIndex];
  const path = `design.vents[${ventIndex}]`;
  if (!vent)
    throw new InputError(
      "no_such_vent",
      "vent",
      `There is no vent ${ventIndex}.`,
      `0 to ${design.vents.length - 1}`,
    );
  if ("lumped" in vent)
    throw new InputError("vent_is_lumped", path, "A vent given as bare elements has no length.");
  const at = vent.pieces.findIndex((piece) => piece.kind === "tube");
  const tube = vent.pieces[at];
  if (!tube || tube.kind !== "tube")
    throw new InputError(
      "no_tube",
      `${path}.pieces`,
      "This vent has no tube whose length could be found.",
    );
  const withLength = (length_m: number): Design => ({
    ...design,
    vents: design.vents.map((old, i) =>
      i === ventIndex
        ? {
            ...vent,
            pieces: vent.pieces.map((piece, j) => (j === at ? { ...tube, length_m } : piece)),
          }
        : old,
    ),
  });
  const overallRest = vent.pieces.reduce(
    (sum, piece, j) => sum + (j === at ? 0 : pieceLength(piece, vent.bore)),
    0,
  );
  const flares = vent.outer_end.flare_radius_m + vent.inner_end.flare_radius_m;
  let lo = Math.max(0, flares - overallRest + 1e-9);
  if (lo + overallRest <= 0) lo = 1e-4;
  const room =
    design.enclosure.inside_m && vent.clearance_m === null
      ? design.enclosure.inside_m.depth +
        design.enclosure.panel_thickness_m +
        vent.outer_end.proud_m -
        overallRest -
        1e-6
      : 10;
  let hi = Math.max(lo, Math.min(10, room));
  const f = (length: number) => tuningOf(withLength(length), options) ?? 0;
  let flo = f(lo),
    fhi = f(hi);
  if (!(tuning_hz <= flo && tuning_hz >= fhi))
    throw new InputError(
      "tuning_out_of_reach",
      "tuning_hz",
      `No length of the tube brings the tuning to ${tuning_hz} Hz.`,
      `${Math.min(flo, fhi).toFixed(2)} to ${Math.max(flo, fhi).toFixed(2)} Hz`,
    );
  let found = lo;
  for (let i = 0; i < 80 && hi - lo > 1e-9; i++) {
    // f is nearly proportional to L^-1/2: interpolate 1/f²
    const t = (1 / tuning_hz ** 2 - 1 / flo ** 2) / (1 / fhi ** 2 - 1 / flo ** 2);
    const guess =
      i % 3 === 2 ? (lo + hi) / 2 : lo + Math.min(0.999, Math.max(0.001, t)) * (hi - lo);
    const value = f(guess);
    found = guess;
    if (Math.abs(value - tuning_hz) < 1e-9 * tuning_hz) break;
    if (value > tuning_hz) {
      lo = guess;
      flo = value;
    } else {
      hi = guess;
      fhi = value;
    }
  }
  return {
    tube_length_m: found,
    overall_length_m: found + overallRest,
    tuning_hz: f(found),
    notes: [],
  };
}
