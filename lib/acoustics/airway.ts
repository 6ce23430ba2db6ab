/**
 * The airway laid out along its centreline: every piece with where it starts and ends, and how it
 * stands to the panel and to the opposite wall. The acoustics and the drawings read the same layout.
 *
 * Datum: s = 0 is the mouth plane (the outermost face of the vent), s grows inwards. The panel's
 * outer face lies at s = proud, its inner face at s = proud + panel thickness.
 */
import type { AirwayVent, Bore, Enclosure, Piece } from "@/lib/document/schema";
import { InputError } from "./input-error";

export interface AirwaySegment {
  /** Index into the vent's pieces. */
  piece: number;
  /** Which of a piece's equal parts (the n-th ring), from 0. */
  part: number;
  kind: Piece["kind"] | "glue";
  /** Start and end along the centreline [m]. */
  start_m: number;
  end_m: number;
  /** Bore diameter [m]; for a slot, that of the circle of equal area. */
  bore_m: number;
  /** Outer diameter [m]; null where none is known (a slot, a bend without one). */
  outer_m: number | null;
}

export interface Airway {
  segments: AirwaySegment[];
  /** Mouth plane to innermost plane [m]. */
  overallLength_m: number;
  /** How far the vent stands into the box from the panel's inner face [m]; negative inside the panel's thickness. */
  protrusion_m: number;
  /** Innermost plane to the wall it faces [m]; Infinity where none is known. */
  clearance_m: number;
  boreArea_m2: number;
  /** Radius of the circle of equal area [m]. */
  boreRadius_m: number;
}

/** Area of a bore [m²]. */
export function boreArea(bore: Bore): number {
  return bore.shape === "round"
    ? (Math.PI / 4) * bore.diameter_m ** 2
    : bore.width_m * bore.height_m;
}

/**
 * Length of a piece along its centreline, its glue lines included [m].
 *
 * A bend counts its centreline arc, `angle · centre radius`; a mitred one the two half legs of its corner square.
 */
export function pieceLength(piece: Piece, bore: Bore): number {
  switch (piece.kind) {
    case "tube":
      return piece.length_m;
    case "rings":
      return piece.count * (piece.thickness_m + piece.glue_line_m);
    case "plate":
      return piece.thickness_m + piece.glue_line_m;
    case "bend": {
      const angle = (piece.angle_deg * Math.PI) / 180;
      if (!piece.mitred && piece.centre_radius_m !== undefined)
        return angle * piece.centre_radius_m;
      const width = bore.shape === "round" ? (piece.bore_m ?? bore.diameter_m) : bore.height_m;
      return width * Math.tan(Math.min(angle, 2.6) / 2);
    }
  }
}

/** Lays a vent out along its centreline. Throws an InputError where the clearance comes out negative. */
export function layOutAirway(
  vent: AirwayVent,
  enclosure: Enclosure,
  path = "design.vents[0]",
): Airway {
  const area = boreArea(vent.bore);
  const equalDiameter = 2 * Math.sqrt(area / Math.PI);
  const segments: AirwaySegment[] = [];
  let s = 0;
  vent.pieces.forEach((piece, index) => {
    const bore_m = piece.bore_m ?? equalDiameter;
    const outer_m = piece.outer_diameter_m ?? null;
    const add = (kind: AirwaySegment["kind"], part: number, length: number) => {
      if (length <= 0) return;
      segments.push({ piece: index, part, kind, start_m: s, end_m: s + length, bore_m, outer_m });
      s += length;
    };
    if (piece.kind === "rings")
      for (let part = 0; part < piece.count; part++) {
        add("glue", part, piece.glue_line_m);
        add("rings", part, piece.thickness_m);
      }
    else if (piece.kind === "plate") {
      add("glue", 0, piece.glue_line_m);
      add("plate", 0, piece.thickness_m);
    } else add(piece.kind, 0, pieceLength(piece, vent.bore));
  });
  const overall = s;
  const protrusion = overall - vent.outer_end.proud_m - enclosure.panel_thickness_m;
  const clearance =
    vent.clearance_m ??
    (enclosure.inside_m
      ? enclosure.inside_m.depth + enclosure.panel_thickness_m - (overall - vent.outer_end.proud_m)
      : Infinity);
  if (clearance < 0)
    throw new InputError(
      "clearance_negative",
      `${path}.clearance_m`,
      `The vent is ${(-clearance * 1000).toFixed(1)} mm longer than the room inside the enclosure.`,
      "0 m or more between the inner mouth and the wall it faces",
    );
  return {
    segments,
    overallLength_m: overall,
    protrusion_m: protrusion,
    clearance_m: clearance,
    boreArea_m2: area,
    boreRadius_m: equalDiameter / 2,
  };
}
