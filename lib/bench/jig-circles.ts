/** The circles of a vent that are cut on a jig: rings, plates and the panel's cut-out. */
import type { Design } from "@/lib/document/schema";
import { airwayAt } from "./edits";

export interface JigCircle {
  name: string;
  bore_m: number;
  outer_diameter_m: number;
  /** Whether the outside is cut as well; a cut-out has none. */
  hasOutside: boolean;
  /** 0 where no edge of it is rounded over. */
  round_over_radius_m: number;
  stack_depth_m: number;
}

/** Every different circle of a round vent, from the mouth inwards; none for a slot or a bare vent. */
export function jigCircles(design: Design, ventIndex: number): JigCircle[] {
  const vent = airwayAt(design, ventIndex);
  if (!vent || vent.bore.shape !== "round") return [];
  const bore = vent.bore.diameter_m;
  const circles: JigCircle[] = [];
  const through = vent.pieces[0];
  if (through?.outer_diameter_m !== undefined)
    circles.push({
      name: "Panel cut-out",
      bore_m: through.outer_diameter_m,
      outer_diameter_m: through.outer_diameter_m + 0.06,
      hasOutside: false,
      round_over_radius_m: 0,
      stack_depth_m: design.enclosure.panel_thickness_m,
    });
  vent.pieces.forEach((piece, index) => {
    if (piece.kind !== "rings" && piece.kind !== "plate") return;
    if (piece.kind === "rings" && piece.count === 0) return;
    const last = index === vent.pieces.length - 1;
    const circle: JigCircle = {
      name: piece.kind === "rings" ? "Ring" : "Support plate",
      bore_m: piece.bore_m ?? bore,
      outer_diameter_m: piece.outer_diameter_m,
      hasOutside: true,
      round_over_radius_m:
        last && vent.inner_end.form === "cut" ? vent.inner_end.flare_radius_m : 0,
      stack_depth_m: piece.kind === "rings" ? piece.count * piece.thickness_m : piece.thickness_m,
    };
    const same = circles.some(
      (other) =>
        other.name === circle.name &&
        other.bore_m === circle.bore_m &&
        other.outer_diameter_m === circle.outer_diameter_m,
    );
    if (!same || circle.round_over_radius_m > 0) circles.push(circle);
  });
  return circles;
}
