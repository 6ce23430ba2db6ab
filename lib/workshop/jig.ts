/** The jig card: how a router's pivot, template and bushing are set for one circle and one bit. */
import { InputError } from "@/lib/acoustics/input-error";

export interface JigRequest {
  /** The hole: the ring's bore, or a cut-out. */
  bore_m: number;
  outer_diameter_m: number;
  /** Width the bit cuts, measured in a test groove; not its name. */
  bit_diameter_m: number;
  /** Of the round-over bit. */
  bearing_diameter_m?: number | null;
  /** Outside of the guide bushing's collar. */
  bushing_diameter_m?: number | null;
  round_over_radius_m?: number | null;
  /** Depth of wood glued up under the edge that is rounded over. */
  stack_depth_m?: number | null;
}

export interface JigCut {
  pivot_to_bit_centre_m: number;
  /** Null without a bushing. */
  bushing_template_diameter_m: number | null;
}

export interface RoundOver {
  feasible: boolean;
  stack_depth_needed_m: number;
  /** The bore must be wider than this. */
  bore_needed_m: number;
}

export interface JigCard {
  inside: JigCut;
  outside: JigCut;
  round_over: RoundOver | null;
  warnings: string[];
}

/** Usual bearing of a round-over bit, and the height on which it runs below the arc (dossier of the trade, 4.6: assumed). */
export const USUAL_BEARING_M = 0.0127;
export const BEARING_CONTACT_M = 0.0064;
/** Below this wall a ring is cut from the glued stack, and a glued stack in a box wants this wall (dossier, 4.8: common practice). */
const SINGLE_RING_WALL_M = 0.01;
const STACK_WALL_M = 0.012;
/** Pivot radius at which the pin comes under even a small router's base (common practice). */
const SMALL_BASE_RADIUS_M = 0.04;

/**
 * Pivot to the bit's centre for a hole whose outside is kept: (D − d) / 2 [m].
 *
 * @param diameter_m - wanted diameter D [m]
 * @param bit_m - measured cut width d [m]
 * @source router arithmetic; dossier of the trade, 4.1
 * @example insidePivot(0.102, 0.012) // 0.045
 */
export function insidePivot(diameter_m: number, bit_m: number): number {
  return (diameter_m - bit_m) / 2;
}

/**
 * Pivot to the bit's centre for a disc that is kept: (D + d) / 2 [m].
 *
 * @source router arithmetic; dossier of the trade, 4.1
 * @example outsidePivot(0.152, 0.012) // 0.082
 */
export function outsidePivot(diameter_m: number, bit_m: number): number {
  return (diameter_m + bit_m) / 2;
}

/**
 * Template for a guide bushing: the bit stands back from the collar by o = (B − d) / 2 on each
 * side, so a hole wants a template of D + B − d and a disc one of D − (B − d) [m].
 *
 * @source router arithmetic; dossier of the trade, 4.2
 * @example bushingTemplate("inside", 0.1524, 0.0079375, 0.00635) // 0.1539875: 6 1/16 in for 6 in
 */
export function bushingTemplate(
  side: "inside" | "outside",
  diameter_m: number,
  bushing_m: number,
  bit_m: number,
): number {
  const twice = bushing_m - bit_m;
  return side === "inside" ? diameter_m + twice : diameter_m - twice;
}

/**
 * What a round-over of a bore's edge needs: below the arc there must be wood for the bearing, and
 * the far side of the cutter must clear the opposite wall while the bearing rides this one:
 *
 *     stack ≥ r + 6.4 mm,   bore > r + bearing diameter,   bore + 2 r < outside diameter
 *
 * An unknown stack depth is not held against it. @source dossier of the trade, 4.6 (computed; the
 * contact height and the usual bearing of 12.7 mm are assumed where nothing is given)
 */
export function roundOver(request: JigRequest): RoundOver | null {
  const radius = request.round_over_radius_m ?? 0;
  if (radius <= 0) return null;
  const stack = radius + BEARING_CONTACT_M;
  const bore = radius + (request.bearing_diameter_m ?? USUAL_BEARING_M);
  const deepEnough = request.stack_depth_m == null || request.stack_depth_m >= stack - 1e-9;
  const wideEnough = request.bore_m > bore + 1e-9;
  const leavesWood = request.bore_m + 2 * radius < request.outer_diameter_m;
  return {
    feasible: deepEnough && wideEnough && leavesWood,
    stack_depth_needed_m: stack,
    bore_needed_m: bore,
  };
}

/** Settings for the inside and the outside of one circle, with what to beware of. */
export function jigCard(request: JigRequest): JigCard {
  const { bore_m: bore, outer_diameter_m: outer, bit_diameter_m: bit } = request;
  if (!(outer > bore))
    throw new InputError(
      "ring_without_wall",
      "outer_diameter_m",
      "The outside is no wider than the bore, so there is no ring.",
      `more than ${mm(bore)} mm`,
    );
  const bushing = request.bushing_diameter_m ?? null;
  const template = (side: "inside" | "outside", diameter: number) =>
    bushing === null ? null : bushingTemplate(side, diameter, bushing, bit);
  const card: JigCard = {
    inside: {
      pivot_to_bit_centre_m: insidePivot(bore, bit),
      bushing_template_diameter_m: template("inside", bore),
    },
    outside: {
      pivot_to_bit_centre_m: outsidePivot(outer, bit),
      bushing_template_diameter_m: template("outside", outer),
    },
    round_over: roundOver(request),
    warnings: [],
  };
  card.warnings = [...cutWarnings(request, card), ...roundOverWarnings(request, card.round_over)];
  return card;
}

function cutWarnings(request: JigRequest, card: JigCard): string[] {
  const { bore_m: bore, outer_diameter_m: outer, bit_diameter_m: bit } = request;
  const said: string[] = [];
  if (bit >= bore)
    said.push(
      `The bit (${mm(bit)} mm) is as wide as the bore (${mm(bore)} mm) or wider: it cannot cut this hole on a pivot.`,
    );
  else if (card.inside.pivot_to_bit_centre_m < SMALL_BASE_RADIUS_M)
    said.push(
      `The pivot of the hole is ${mm(card.inside.pivot_to_bit_centre_m)} mm from the bit, under the router's base: put the pin on a plate fixed to the base.`,
    );
  const wall = (outer - bore) / 2;
  if (wall < SINGLE_RING_WALL_M)
    said.push(
      `The ring's wall is ${mm(wall)} mm: below 10 mm, glue the blanks first and cut the rings from the stack.`,
    );
  else if (wall < STACK_WALL_M)
    said.push(`The ring's wall is ${mm(wall)} mm; a glued stack in the box wants 12 mm or more.`);
  const bushing = request.bushing_diameter_m ?? null;
  if (bushing !== null && bushing <= bit)
    said.push(
      `The bushing (${mm(bushing)} mm) is no wider than the bit (${mm(bit)} mm): the bit would cut the collar and the template.`,
    );
  const disc = card.outside.bushing_template_diameter_m;
  if (disc !== null && disc <= 0)
    said.push("With this bushing no template is left for the outside: take a smaller bushing.");
  return said;
}

function roundOverWarnings(request: JigRequest, edge: RoundOver | null): string[] {
  const radius = request.round_over_radius_m ?? 0;
  if (!edge) return [];
  const said: string[] = [];
  const needed = mm(edge.stack_depth_needed_m);
  if (request.stack_depth_m == null)
    said.push(`The round-over needs a stack at least ${needed} mm deep for its bearing.`);
  else if (request.stack_depth_m < edge.stack_depth_needed_m - 1e-9)
    said.push(
      `The stack is ${mm(request.stack_depth_m)} mm deep; a ${mm(radius)} mm round-over needs ${needed} mm, or its bearing runs on nothing.`,
    );
  if (!(request.bore_m > edge.bore_needed_m + 1e-9))
    said.push(
      `A ${mm(radius)} mm round-over bit does not go into this bore: it must be wider than ${mm(edge.bore_needed_m)} mm.`,
    );
  if (!(request.bore_m + 2 * radius < request.outer_diameter_m))
    said.push("The round-over reaches the ring's outside and leaves no edge.");
  return said;
}

/** Millimetres to a tenth, as a jig can be read. */
function mm(length_m: number): string {
  return (Math.round(length_m * 1e4) / 10).toString();
}
