import { airwayAt, editEnclosure, setBore } from "@/lib/bench/edits";
import { layOutAirway } from "@/lib/acoustics/airway";
import { InputError } from "@/lib/acoustics/input-error";
import type { Design } from "@/lib/document/schema";
import { CLEARANCE_BORES } from "../checks/clearance";
import { told, type Cure, type Subject } from "../margin";
import { attempt, retuned } from "./attempt";

/** A narrower bore (shorter for the same tuning), or a deeper box of the same volume. */
export function clearanceCures(subject: Subject, vent: number): Cure[] {
  const { design, answer } = subject;
  const shape = airwayAt(design, vent);
  const tuning = design.target.tuning_hz ?? answer.tuning_hz;
  const inside = design.enclosure.inside_m;
  if (!shape || !tuning || shape.bore.shape !== "round") return [];
  const cures: Cure[] = [];
  const bore = shape.bore.diameter_m;
  for (let share = 0.97; share > 0.6; share -= 0.03) {
    const narrower = Math.round(bore * share * 1000) / 1000;
    const apply = (from: Design) => retuned(setBore(from, vent, narrower), vent, tuning) ?? from;
    const changed = apply(design);
    if (changed === design || !roomy(changed, vent)) continue;
    const peak = attempt(changed)?.vents[vent];
    if (!peak) continue;
    const speed = peak.peak_air_speed
      ? `, ${told(subject, peak.peak_air_speed.speed_m_s, "speed")}`
      : "";
    cures.push({
      id: "narrower",
      text: `Narrow the bore to ${told(subject, narrower, "length")}`,
      effect: `overall ${told(subject, peak.overall_length_m, "length")}${speed}`,
      cost: 4,
      apply,
    });
    break;
  }
  if (inside && shape.clearance_m === null) {
    const airway = layOutAirway(shape, design.enclosure);
    const more = Math.ceil((bore * CLEARANCE_BORES - airway.clearance_m) * 1000) / 1000;
    const depth = inside.depth + more;
    const width = Math.round(((inside.width * inside.depth) / depth) * 1000) / 1000;
    cures.push({
      id: "deeper",
      text: `Make the box ${told(subject, more, "length")} deeper and ${told(subject, inside.width - width, "length")} narrower`,
      effect: "the same volume, one bore of free air behind the vent",
      cost: 8,
      apply: (from) => editEnclosure(from, { inside_m: { ...inside, depth, width } }),
    });
  }
  return cures;
}

function roomy(design: Design, vent: number): boolean {
  const shape = airwayAt(design, vent);
  if (!shape || shape.bore.shape !== "round") return false;
  try {
    const { clearance_m } = layOutAirway(shape, design.enclosure);
    return clearance_m >= shape.bore.diameter_m * CLEARANCE_BORES;
  } catch (error) {
    if (error instanceof InputError) return false;
    throw error;
  }
}
