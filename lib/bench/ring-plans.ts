/** From the Bench to the ring planner and back: the request a design makes, and a plan put into it. */
import type { Design, Piece } from "@/lib/document/schema";
import { airwayAt, firstPiece, replaceRings, setTubeLength, type PieceOf } from "./edits";
import type { RingHabits } from "./sheets";

export interface RingPlan {
  rings: { sheet: string; count: number }[];
  added_length_m: number;
  trim_tube_m: number;
  overall_length_m: number;
  tuning_hz: number;
  tuning_sd_hz: number;
  error_hz: number;
  reason: string;
}

/** Outer diameter of the rings there are, or one that leaves a 25 mm wall. */
export function ringOutside(design: Design, ventIndex: number): number {
  const vent = airwayAt(design, ventIndex);
  const stack = vent?.pieces.find((piece): piece is PieceOf<"rings"> => piece.kind === "rings");
  if (stack) return stack.outer_diameter_m;
  const bore = vent && vent.bore.shape === "round" ? vent.bore.diameter_m : 0.1;
  return Math.round((bore + 0.05) * 1000) / 1000;
}

/** The request, or null where there is nothing to plan: no tube, no target, no sheet. */
export function ringRequest(design: Design, ventIndex: number, habits: RingHabits) {
  const vent = airwayAt(design, ventIndex);
  const sheets = habits.sheets.filter((sheet) => sheet.use);
  const tuning_hz = design.target.tuning_hz;
  if (!vent || vent.bore.shape !== "round" || firstPiece(vent, "tube") < 0) return null;
  if (tuning_hz === null || sheets.length === 0) return null;
  return {
    design,
    vent: ventIndex,
    tuning_hz,
    sheets: sheets.map(({ name, thickness_m, thickness_sd_m, within_sheet_sd_m }) => ({
      name,
      thickness_m,
      thickness_sd_m,
      within_sheet_sd_m,
    })),
    ring_outer_diameter_m: ringOutside(design, ventIndex),
    glue_line_m: habits.glueLine_m,
    glue_line_sd_m: habits.glueLineSd_m,
    max_rings: habits.maxRings,
    may_trim_tube: habits.mayTrimTube,
    trim_loss_m: habits.trimLoss_m,
  };
}

/** Puts a plan into a design: its rings in place of the old ones, the tube trimmed. */
export function applyRingPlan(
  design: Design,
  ventIndex: number,
  plan: RingPlan,
  habits: RingHabits,
): Design {
  const vent = airwayAt(design, ventIndex);
  if (!vent) return design;
  const outer_diameter_m = ringOutside(design, ventIndex);
  const stacks = plan.rings.map(({ sheet, count }): PieceOf<"rings"> => {
    const found = habits.sheets.find(({ name }) => name === sheet);
    if (!found) throw new Error(`No sheet is called ${sheet}.`);
    return {
      kind: "rings",
      count,
      thickness_m: found.thickness_m,
      outer_diameter_m,
      glue_line_m: habits.glueLine_m,
    };
  });
  const tube = vent.pieces[firstPiece(vent, "tube")] as Piece | undefined;
  const ringed = replaceRings(design, ventIndex, stacks);
  return tube?.kind === "tube" && plan.trim_tube_m > 0
    ? setTubeLength(ringed, ventIndex, tube.length_m - plan.trim_tube_m)
    : ringed;
}
