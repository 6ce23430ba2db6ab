/** From the field to one candidate, and from a candidate to the design that has it. */
import type { Design } from "@/lib/document/schema";
import {
  candidateBase,
  candidateStates,
  candidateVent,
  type CandidateShape,
  type CandidateState,
} from "./candidate";
import type { BoreField } from "./field";

/** One candidate with its figures; lengths and speeds are zero where its state has none. */
export interface BoreCandidate extends CandidateShape {
  index: number;
  state: CandidateState;
  tube_length_m: number;
  overall_length_m: number;
  /** Inner mouth to the wall it faces; negative where the vent is too long. */
  clearance_m: number;
  pipe_resonance_hz: number;
  /** Null without a driver. */
  peak_air_speed_m_s: number | null;
  peak_frequency_hz: number | null;
}

/** The candidate at an index of a field. */
export function candidateAt(field: BoreField, index: number): BoreCandidate {
  const many = field.diameters_m.length;
  const line = Math.floor(index / many);
  const perFlare = field.counts.length;
  const perForm = perFlare * field.flares.length;
  const count = field.counts[line % perFlare];
  const flare = field.flares[Math.floor((line % perForm) / perFlare)];
  const form = field.forms[Math.floor(line / perForm)];
  const diameter_m = field.diameters_m[index % many];
  const state = candidateStates[field.state[index] ?? -1];
  if (!count || !flare || !form || !diameter_m || !state)
    throw new RangeError(`There is no candidate ${index} in a field of ${field.size}.`);
  return {
    index,
    diameter_m,
    count,
    flare,
    form,
    state,
    tube_length_m: field.tube_length_m[index]!,
    overall_length_m: field.overall_length_m[index]!,
    clearance_m: field.clearance_m[index]!,
    pipe_resonance_hz: field.pipe_resonance_hz[index]!,
    peak_air_speed_m_s: field.hasDriver ? field.peak_air_speed_m_s[index]! : null,
    peak_frequency_hz: field.hasDriver ? field.peak_frequency_hz[index]! : null,
  };
}

/** What a pointer over the map picks from, besides where it stands. */
export interface CandidateChoice {
  count?: number;
  flare?: number;
  form?: number;
}

/**
 * The candidate with figures nearest to a bore and an air speed, both compared by ratio; null where
 * there is none. Without a driver only the bore counts. Candidates too long for the box are picked
 * only where nothing that fits is near.
 */
export function nearestCandidate(
  field: BoreField,
  diameter_m: number,
  airSpeed_m_s: number | null,
  choice: CandidateChoice = {},
): BoreCandidate | null {
  const many = field.diameters_m.length;
  let best = -1;
  let least = Infinity;
  for (let index = 0; index < field.size; index++) {
    const state = field.state[index]!;
    if (state > 1) continue;
    const line = Math.floor(index / many);
    const perFlare = field.counts.length;
    const perForm = perFlare * field.flares.length;
    if (choice.count !== undefined && field.counts[line % perFlare] !== choice.count) continue;
    if (choice.flare !== undefined && Math.floor((line % perForm) / perFlare) !== choice.flare)
      continue;
    if (choice.form !== undefined && Math.floor(line / perForm) !== choice.form) continue;
    const across = Math.log(field.diameters_m[index % many]! / diameter_m);
    const speed = field.peak_air_speed_m_s[index]!;
    const up = airSpeed_m_s !== null && speed > 0 ? Math.log(speed / airSpeed_m_s) : 0;
    const far = across * across + up * up + (state === 1 ? 0.01 : 0);
    if (far < least) {
      least = far;
      best = index;
    }
  }
  return best < 0 ? null : candidateAt(field, best);
}

/** What a candidate needs for it to become the vent: its shape and the length of its tube. */
export type AppliedCandidate = CandidateShape & { tube_length_m: number };

/** The design with the candidate in place of the vent; a bare or missing vent is left as it is. */
export function applyCandidate(
  design: Design,
  ventIndex: number,
  candidate: AppliedCandidate,
): Design {
  const vent = design.vents[ventIndex];
  if (!vent || "lumped" in vent || candidate.tube_length_m < 0) return design;
  const made = candidateVent(candidateBase(vent, design), candidate, candidate.tube_length_m);
  return { ...design, vents: design.vents.map((old, i) => (i === ventIndex ? made : old)) };
}
