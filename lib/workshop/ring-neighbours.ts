/** The ring stack as it stands, with one ring less and one more beside it. */
import { layOutAirway } from "@/lib/acoustics/airway";
import { InputError } from "@/lib/acoustics/input-error";
import { tuningOf } from "@/lib/acoustics/tuning";
import { airwayAt, firstPiece, setRingCount } from "@/lib/bench/edits";
import type { Design } from "@/lib/document/schema";

export interface RingNeighbour {
  /** Rings of the first stack. */
  count: number;
  thickness_m: number;
  /** Whether this is the stack as it stands. */
  present: boolean;
  overall_length_m: number;
  tuning_hz: number;
  /** Against the stack as it stands. */
  change_hz: number;
}

/**
 * One ring less, the stack as it stands, one ring more: each with its overall length and tuning.
 * A neighbour that cannot be built (no room behind it, no wood for its flare) is left out; where
 * there is no round airway, or the present one cannot be built, there are none at all.
 */
export function oneMoreOneLess(
  design: Design,
  ventIndex: number,
  options: { vent_losses: boolean } = { vent_losses: true },
): RingNeighbour[] {
  const vent = airwayAt(design, ventIndex);
  if (!vent || vent.bore.shape !== "round") return [];
  const stack = vent.pieces[firstPiece(vent, "rings")];
  const present = stack?.kind === "rings" ? stack.count : 0;
  const now = tuningAndLength(design, ventIndex, options);
  if (!now) return [];
  const rows: RingNeighbour[] = [];
  for (const count of [present - 1, present, present + 1]) {
    if (count < 0 || count > 100) continue;
    const changed = count === present ? design : setRingCount(design, ventIndex, count);
    const found = count === present ? now : tuningAndLength(changed, ventIndex, options);
    if (!found) continue;
    rows.push({
      count,
      thickness_m: stackThickness(changed, ventIndex) ?? stackThickness(design, ventIndex) ?? 0,
      present: count === present,
      ...found,
      change_hz: found.tuning_hz - now.tuning_hz,
    });
  }
  const thickness = rows.find((row) => row.thickness_m > 0)?.thickness_m ?? 0;
  return rows.map((row) => (row.thickness_m > 0 ? row : { ...row, thickness_m: thickness }));
}

function stackThickness(design: Design, ventIndex: number): number | null {
  const vent = airwayAt(design, ventIndex);
  const stack = vent?.pieces[firstPiece(vent, "rings")];
  return stack?.kind === "rings" ? stack.thickness_m : null;
}

function tuningAndLength(
  design: Design,
  ventIndex: number,
  options: { vent_losses: boolean },
): { overall_length_m: number; tuning_hz: number } | null {
  const vent = airwayAt(design, ventIndex);
  if (!vent) return null;
  try {
    const { overallLength_m } = layOutAirway(vent, design.enclosure);
    const tuning_hz = tuningOf(design, options);
    return tuning_hz === null ? null : { overall_length_m: overallLength_m, tuning_hz };
  } catch (error) {
    if (error instanceof InputError) return null;
    throw error;
  }
}
