/**
 * A vent and its enclosure cut through the vent's axis, in millimetres: what there is to draw, before
 * anyone asks how large. Datum: x = 0 is the panel's outer face, x grows inwards; radii from the axis.
 */
import { layOutAirway, type AirwaySegment } from "@/lib/acoustics/airway";
import type { AirwayVent, Enclosure, Piece } from "@/lib/document/schema";
import { outerFlareRadius, type BoreProfile } from "./bore-profile";

const MM = 1000;

export interface Span {
  x0: number;
  x1: number;
}

export interface SectionPiece extends Span {
  /** Index into the vent's pieces. */
  index: number;
  kind: Piece["kind"];
  /** Half height of its own bore, and of its outside [mm]. */
  own: number;
  outer: number;
  /** False where the document gives no outside and a usual wall is drawn. */
  outerKnown: boolean;
  wooden: boolean;
  /** Each sheet (a ring, the plate) and each glue line. */
  sheets: Span[];
  glue: Span[];
}

export interface Section {
  profile: BoreProfile;
  pieces: SectionPiece[];
  /** Thickness of the panel and its layers, from the outer face [mm]. */
  panel: number;
  layers: Span[];
  proud: number;
  overall: number;
  /** Innermost plane to the wall it faces [mm]; negative where the vent runs through it; null where no wall is known. */
  clearance: number | null;
  /** The wall is the box's own (from the inside depth), not one the vent was said to face. */
  wallIsBack: boolean;
  /** Thickness at which walls are drawn whose thickness the document does not give [mm]. */
  board: number;
  /** Half the inside height, where known [mm]; the vent is drawn in its middle. */
  insideHalf: number | null;
  slot: { width: number; height: number; shared: number } | null;
  /** The outer flare is deeper than the panel: a moulded wall follows it. Its thickness [mm], else null. */
  mouldedWall: number | null;
  /** Wall of a moulded inner trumpet [mm], else null. */
  shellWall: number | null;
  /** Half height that must be seen [mm]. */
  reach: number;
}

/** A baffle thicker than this is taken for two layers glued together [mm]. */
const TWO_LAYERS_FROM_MM = 25;

/** Wall drawn for a tube whose outside is not given: 3 % of its bore, 1.5 to 4 mm. */
function usualWall(bore_mm: number): number {
  return Math.min(4, Math.max(1.5, 0.03 * bore_mm));
}

/** Cuts a vent and its enclosure through the axis. A vent too long for its box is drawn as it is. */
export function sectionOf(vent: AirwayVent, enclosure: Enclosure, layers?: number): Section {
  const airway = layOutAirway({ ...vent, clearance_m: 0 }, enclosure);
  const proud = vent.outer_end.proud_m * MM;
  const panel = enclosure.panel_thickness_m * MM;
  const layerCount = Math.max(1, Math.round(layers ?? (panel > TWO_LAYERS_FROM_MM ? 2 : 1)));
  const board = panel / layerCount;
  const overall = airway.overallLength_m * MM;
  const slot =
    vent.bore.shape === "slot"
      ? {
          width: vent.bore.width_m * MM,
          height: vent.bore.height_m * MM,
          shared: vent.bore.shared_walls,
        }
      : null;
  const height = slot?.height ?? (vent.bore.shape === "round" ? vent.bore.diameter_m * MM : 0);
  const pieces = piecesOf(vent, airway.segments, { proud, height, board, slot: slot !== null });
  const first = pieces[0];
  const last = pieces[pieces.length - 1];
  const profile: BoreProfile = {
    mouth: -proud,
    end: overall - proud,
    mouthRadius: first?.own ?? height / 2,
    endRadius: last?.own ?? height / 2,
    outerFlare: Math.min(vent.outer_end.flare_radius_m * MM, overall),
    innerFlare: Math.min(vent.inner_end.flare_radius_m * MM, overall),
  };
  const inside = enclosure.inside_m;
  const clearance_m =
    vent.clearance_m ??
    (inside
      ? inside.depth + enclosure.panel_thickness_m - airway.overallLength_m + vent.outer_end.proud_m
      : null);
  const moulded = first !== undefined && !first.wooden && profile.outerFlare > panel + proud + 1e-6;
  const shell =
    last !== undefined && !last.wooden && vent.inner_end.form === "shell" && profile.innerFlare > 0;
  const section: Section = {
    profile,
    pieces,
    panel,
    layers: Array.from({ length: layerCount }, (_, i) => ({ x0: i * board, x1: (i + 1) * board })),
    proud,
    overall,
    clearance: clearance_m === null ? null : clearance_m * MM,
    wallIsBack: vent.clearance_m === null,
    board,
    insideHalf: inside ? (inside.height * MM) / 2 : null,
    slot,
    mouldedWall: moulded ? Math.max(first.outer - first.own, 0.5) : null,
    shellWall: shell
      ? (vent.inner_end.wall_m ?? Math.max(last.outer - last.own, 500e-6) / MM) * MM
      : null,
    reach: 0,
  };
  const hole = Math.max(...[0, panel / 2, panel].map((x) => panelHole(section, x)));
  section.reach = Math.max(
    profile.mouthRadius + profile.outerFlare,
    profile.endRadius + profile.innerFlare + (section.shellWall ?? 0),
    ...pieces.map((piece) => piece.outer),
    slot ? 1 : hole * PANEL_RIM,
  );
  return section;
}

function piecesOf(
  vent: AirwayVent,
  segments: AirwaySegment[],
  room: { proud: number; height: number; board: number; slot: boolean },
): SectionPiece[] {
  const pieces: SectionPiece[] = [];
  let before: SectionPiece | undefined;
  vent.pieces.forEach((piece, index) => {
    const own = ((piece.bore_m ?? 0) * MM || room.height) / 2;
    const given = room.slot ? undefined : piece.outer_diameter_m;
    const mine = segments.filter((segment) => segment.piece === index);
    const start = mine[0];
    const end = mine[mine.length - 1];
    if (!start || !end) return;
    const span = (segment: AirwaySegment): Span => ({
      x0: segment.start_m * MM - room.proud,
      x1: segment.end_m * MM - room.proud,
    });
    const wooden = room.slot || piece.kind === "rings" || piece.kind === "plate";
    const assumed = room.slot
      ? own + room.board
      : Math.max(piece.kind === "bend" ? (before?.outer ?? 0) : 0, own + usualWall(2 * own));
    const laid: SectionPiece = {
      index,
      kind: piece.kind,
      x0: span(start).x0,
      x1: span(end).x1,
      own,
      outer: given === undefined ? assumed : (given * MM) / 2,
      outerKnown: given !== undefined,
      wooden,
      sheets: wooden ? mine.filter((segment) => segment.kind !== "glue").map(span) : [],
      glue: mine.filter((segment) => segment.kind === "glue").map(span),
    };
    pieces.push(laid);
    if (!laid.wooden) before = laid;
  });
  return pieces;
}

/** Whether the slot's lower side, or its upper one too, is a panel of the box. */
export function sharedSides({ slot }: Section): { floor: boolean; ceiling: boolean } {
  return { floor: slot !== null && slot.shared >= 1, ceiling: slot !== null && slot.shared >= 4 };
}

/**
 * From the axis up to the box's inside [mm], null where unknown: the vent is drawn in the middle of
 * the box, a slot that shares the floor on the floor.
 */
export function insideAbove(section: Section): number | null {
  const { insideHalf, slot } = section;
  if (insideHalf === null) return null;
  return slot && sharedSides(section).floor ? 2 * insideHalf - slot.height / 2 : insideHalf;
}

/** Radius of the hole in the panel at x, what stands in it and the flare in its wood included [mm]. */
export function panelHole(section: Section, x: number): number {
  const { profile, mouldedWall } = section;
  if (mouldedWall !== null)
    return Math.min(
      outerFlareRadius(profile, 0) + mouldedWall,
      profile.mouthRadius + Math.max(profile.outerFlare, mouldedWall),
    );
  return Math.max(holeCylinder(section, x), outerFlareRadius(profile, x));
}

/** The cylinder cut for what stands in the panel at x; behind a vent that ends inside the panel, a recess. */
export function holeCylinder(section: Section, x: number): number {
  const { pieces, profile } = section;
  const at = pieces.find((piece) => x >= piece.x0 - 1e-9 && x <= piece.x1 + 1e-9);
  if (at) return Math.max(at.outer, at.own);
  const last = pieces[pieces.length - 1];
  return Math.max(last?.outer ?? 0, profile.endRadius + profile.innerFlare) * RECESS;
}

/** Panel that must be seen around its hole, of the hole's radius. */
const PANEL_RIM = 1.2;

/** How much wider than the vent the recess behind a vent is drawn that ends inside its panel. */
const RECESS = 1.25;

/** A box without an airway to draw: its panel and, where the inside depth is known, its back. */
export function closedSection(enclosure: Enclosure, layers?: number): Section {
  const panel = enclosure.panel_thickness_m * MM;
  const layerCount = Math.max(1, Math.round(layers ?? (panel > TWO_LAYERS_FROM_MM ? 2 : 1)));
  const board = panel / layerCount;
  const inside = enclosure.inside_m;
  return {
    profile: { mouth: 0, end: panel, mouthRadius: 0, endRadius: 0, outerFlare: 0, innerFlare: 0 },
    pieces: [],
    panel,
    layers: Array.from({ length: layerCount }, (_, i) => ({ x0: i * board, x1: (i + 1) * board })),
    proud: 0,
    overall: panel,
    clearance: inside ? inside.depth * MM : null,
    wallIsBack: true,
    board,
    insideHalf: inside ? (inside.height * MM) / 2 : null,
    slot: null,
    mouldedWall: null,
    shellWall: null,
    reach: inside ? Math.min((inside.height * MM) / 2 + board, 1.2 * inside.depth * MM) : 4 * panel,
  };
}
