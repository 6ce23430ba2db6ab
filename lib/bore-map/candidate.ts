/** One candidate of the bore map: what it is made of, and the vent it stands for. */
import type { AirwayVent, Bore, Design, Piece } from "@/lib/document/schema";

/** Radii of the quarter-circle flares, mouth and inner end [m]. */
export interface FlareChoice {
  outer_m: number;
  inner_m: number;
}

/** "plain": a tube (and its bends) alone; "ringed": a tube that ends in rings and what stands behind them. */
export type VentForm = "plain" | "ringed";

/**
 * How a candidate stands to the box: the first fits. "too long" has its length solved as in a
 * box deep enough to leave one bore's width behind it; of the others there are no figures.
 */
export const candidateStates = [
  "fits",
  "too long",
  "too short",
  "too wide",
  "not buildable",
] as const;
export type CandidateState = (typeof candidateStates)[number];

export interface CandidateShape {
  diameter_m: number;
  count: number;
  flare: FlareChoice;
  form: VentForm;
}

/** What the candidates of one map share. */
export interface CandidateBase {
  vent: AirwayVent;
  /** Equal-area diameter of the vent as it stands [m]. */
  diameter_m: number;
  wall_m: number;
  ringThickness_m: number;
  ringGlue_m: number;
  ringCount: number;
  ringWall_m: number;
}

/** Wall of a tube whose outside is not known, of a moulded trumpet, and of a new ring [m]: usual shop figures. */
const TUBE_WALL_M = 0.003;
const RING_WALL_M = 0.025;
/** Wood left outside a flare that is cut into a ring [m]. */
const LAND_M = 0.006;

export function candidateBase(vent: AirwayVent, design: Design): CandidateBase {
  const diameter = equalDiameter(vent.bore);
  const tube = vent.pieces.find((piece) => piece.kind === "tube");
  const rings = vent.pieces.find((piece) => piece.kind === "rings");
  const panel = design.enclosure.panel_thickness_m;
  const outside = tube?.outer_diameter_m;
  return {
    vent,
    diameter_m: diameter,
    wall_m: outside !== undefined && outside > diameter ? (outside - diameter) / 2 : TUBE_WALL_M,
    ringThickness_m:
      rings?.kind === "rings" ? rings.thickness_m : panel > 0.025 ? panel / 2 : panel,
    ringGlue_m: rings?.kind === "rings" ? rings.glue_line_m : 0.0001,
    ringCount: rings?.kind === "rings" ? Math.max(1, rings.count) : 1,
    ringWall_m:
      rings?.kind === "rings" && rings.outer_diameter_m > diameter
        ? (rings.outer_diameter_m - diameter) / 2
        : RING_WALL_M,
  };
}

/** Diameter of the circle of equal area [m]. */
export function equalDiameter(bore: Bore): number {
  return bore.shape === "round"
    ? bore.diameter_m
    : 2 * Math.sqrt((bore.width_m * bore.height_m) / Math.PI);
}

/** The form the vent has as it stands. */
export function presentForm(vent: AirwayVent): VentForm {
  return vent.pieces.some((piece) => piece.kind === "rings" || piece.kind === "plate")
    ? "ringed"
    : "plain";
}

/** Outside of the widest piece of a candidate [m]. */
export function widestOutside(base: CandidateBase, shape: CandidateShape): number {
  const tube = shape.diameter_m + 2 * base.wall_m;
  return shape.form === "ringed" ? Math.max(tube, ringOutside(base, shape)) : tube;
}

function ringOutside(base: CandidateBase, { diameter_m, flare }: CandidateShape): number {
  return diameter_m + 2 * Math.max(base.ringWall_m, flare.inner_m + LAND_M);
}

/**
 * The vent of a candidate with its first tube of a given length. A slot keeps its width; its height
 * follows the area. Walls keep their thickness; bends and plates stay as they are in the vent.
 */
export function candidateVent(
  base: CandidateBase,
  shape: CandidateShape,
  tubeLength_m: number,
): AirwayVent {
  const { vent } = base;
  const bore: Bore =
    vent.bore.shape === "round"
      ? { shape: "round", diameter_m: shape.diameter_m }
      : {
          ...vent.bore,
          height_m: ((Math.PI / 4) * shape.diameter_m ** 2) / vent.bore.width_m,
        };
  const ringed = shape.form === "ringed" && bore.shape === "round";
  const outer = ringOutside(base, shape);
  const pieces: Piece[] = [];
  let tubes = 0;
  let lastTube = -1;
  for (const piece of vent.pieces) {
    const outer_diameter_m =
      piece.outer_diameter_m === undefined
        ? undefined
        : Math.max(
            shape.diameter_m + 0.002,
            piece.outer_diameter_m + shape.diameter_m - base.diameter_m,
          );
    if (piece.kind === "tube") {
      pieces.push({
        kind: "tube",
        length_m: tubes === 0 ? tubeLength_m : piece.length_m,
        ...(outer_diameter_m === undefined ? {} : { outer_diameter_m }),
      });
      tubes++;
      lastTube = pieces.length;
    } else if (piece.kind === "bend")
      pieces.push({ ...piece, bore_m: undefined, outer_diameter_m });
    else if (piece.kind === "plate" && ringed)
      pieces.push({
        ...piece,
        bore_m: undefined,
        outer_diameter_m: Math.max(outer, outer_diameter_m ?? 0),
      });
  }
  if (tubes === 0) {
    pieces.unshift({
      kind: "tube",
      length_m: tubeLength_m,
      outer_diameter_m: shape.diameter_m + 2 * base.wall_m,
    });
    lastTube = 1;
  }
  if (ringed)
    pieces.splice(lastTube, 0, {
      kind: "rings",
      count: base.ringCount,
      thickness_m: base.ringThickness_m,
      outer_diameter_m: outer,
      glue_line_m: base.ringGlue_m,
    });
  const { inner_m, outer_m } = shape.flare;
  return {
    ...vent,
    count: shape.count,
    bore,
    outer_end: { ...vent.outer_end, flare_radius_m: outer_m },
    pieces,
    inner_end:
      ringed || inner_m === 0
        ? { flare_radius_m: inner_m, form: "cut" }
        : { flare_radius_m: inner_m, form: "shell", wall_m: vent.inner_end.wall_m ?? base.wall_m },
  };
}
