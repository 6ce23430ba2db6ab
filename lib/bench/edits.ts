/**
 * Edits of a design: small pure functions that return a changed copy. Everything a hand can do on
 * the Bench (drag, type, press a cure) is one of these, so that undo, autosave and the tests see
 * one kind of change.
 */
import type {
  AirwayVent,
  Design,
  Driver,
  Enclosure,
  Filter,
  Piece,
  Vent,
} from "@/lib/document/schema";

export type PieceOf<Kind extends Piece["kind"]> = Extract<Piece, { kind: Kind }>;

/** The vent at an index where it is an airway, not a bare circuit element. */
export function airwayAt(design: Design, index: number): AirwayVent | null {
  const vent = design.vents[index];
  return vent && !("lumped" in vent) ? vent : null;
}

export function withVent(design: Design, index: number, vent: Vent): Design {
  return { ...design, vents: design.vents.map((old, at) => (at === index ? vent : old)) };
}

/** Changes an airway vent; a bare or missing one is left as it is. */
export function editAirway(
  design: Design,
  index: number,
  change: (vent: AirwayVent) => AirwayVent,
): Design {
  const vent = airwayAt(design, index);
  return vent ? withVent(design, index, change(vent)) : design;
}

/** Changes the piece at an index of a vent. */
export function editPiece(
  design: Design,
  ventIndex: number,
  pieceIndex: number,
  change: (piece: Piece) => Piece,
): Design {
  return editAirway(design, ventIndex, (vent) => ({
    ...vent,
    pieces: vent.pieces.map((piece, at) => (at === pieceIndex ? change(piece) : piece)),
  }));
}

export function editEnclosure(design: Design, change: Partial<Enclosure>): Design {
  return { ...design, enclosure: { ...design.enclosure, ...change } };
}

/** Changes figures of the driver; does nothing while there is none. */
export function editDriver(design: Design, change: Partial<Driver>): Design {
  return design.driver ? { ...design, driver: { ...design.driver, ...change } } : design;
}

/** Where the first piece of a kind stands in a vent, or -1. */
export function firstPiece(vent: AirwayVent, kind: Piece["kind"]): number {
  return vent.pieces.findIndex((piece) => piece.kind === kind);
}

/** Length of the first tube [m]. */
export function setTubeLength(design: Design, ventIndex: number, length_m: number): Design {
  const vent = airwayAt(design, ventIndex);
  const at = vent ? firstPiece(vent, "tube") : -1;
  return at < 0
    ? design
    : editPiece(design, ventIndex, at, (piece) =>
        piece.kind === "tube" ? { ...piece, length_m } : piece,
      );
}

/** How many rings a vent carries, over all its stacks. */
export function ringsOf(vent: AirwayVent): number {
  return vent.pieces.reduce((sum, piece) => sum + (piece.kind === "rings" ? piece.count : 0), 0);
}

/**
 * Sets how many rings the first stack holds; a stack of none is taken away, and a missing one is
 * begun after the last tube, of the sheet the panel is made of.
 */
export function setRingCount(design: Design, ventIndex: number, count: number): Design {
  return editAirway(design, ventIndex, (vent) => {
    const at = firstPiece(vent, "rings");
    if (at >= 0) {
      const pieces =
        count > 0
          ? vent.pieces.map((piece, i) =>
              i === at && piece.kind === "rings" ? { ...piece, count } : piece,
            )
          : vent.pieces.filter((_, i) => i !== at);
      return pieces.length > 0 ? { ...vent, pieces } : vent;
    }
    if (count <= 0) return vent;
    return insertRings(vent, [newStack(vent, design.enclosure, count)]);
  });
}

/** Replaces every stack of rings by the given ones, after the last tube and before any plate. */
export function replaceRings(
  design: Design,
  ventIndex: number,
  stacks: PieceOf<"rings">[],
): Design {
  return editAirway(design, ventIndex, (vent) =>
    insertRings({ ...vent, pieces: vent.pieces.filter((piece) => piece.kind !== "rings") }, stacks),
  );
}

function insertRings(vent: AirwayVent, stacks: PieceOf<"rings">[]): AirwayVent {
  const lastTube = vent.pieces.reduce((found, piece, i) => (piece.kind === "tube" ? i : found), -1);
  const pieces = [
    ...vent.pieces.slice(0, lastTube + 1),
    ...stacks.filter((stack) => stack.count > 0),
    ...vent.pieces.slice(lastTube + 1),
  ];
  return pieces.length > 0 ? { ...vent, pieces } : vent;
}

/** Ring wall a new stack is given [m]: a glued stack inside the box wants 12 mm and more (common practice). */
const NEW_RING_WALL_M = 0.025;

function newStack(vent: AirwayVent, enclosure: Enclosure, count: number): PieceOf<"rings"> {
  const bore = vent.bore.shape === "round" ? vent.bore.diameter_m : vent.bore.height_m;
  const plate = vent.pieces.find((piece) => piece.kind === "plate");
  const panel = enclosure.panel_thickness_m;
  return {
    kind: "rings",
    count,
    thickness_m: plate?.thickness_m ?? (panel > 0.025 ? panel / 2 : panel),
    outer_diameter_m: Math.round((bore + 2 * NEW_RING_WALL_M) * 1000) / 1000,
    glue_line_m: 0.0001,
  };
}

/** Bore of a round vent [m]; tubes, rings and plates keep their wall. */
export function setBore(design: Design, ventIndex: number, diameter_m: number): Design {
  return editAirway(design, ventIndex, (vent) => {
    if (vent.bore.shape !== "round") return vent;
    const grown = diameter_m - vent.bore.diameter_m;
    const pieces = vent.pieces.map((piece): Piece => {
      if (piece.bore_m !== undefined || piece.outer_diameter_m === undefined) return piece;
      return { ...piece, outer_diameter_m: round6(piece.outer_diameter_m + grown) };
    });
    return { ...vent, bore: { shape: "round", diameter_m }, pieces };
  });
}

export function setVentCount(design: Design, ventIndex: number, count: number): Design {
  return editAirway(design, ventIndex, (vent) => ({ ...vent, count }));
}

export function setOuterFlare(design: Design, ventIndex: number, radius_m: number): Design {
  return editAirway(design, ventIndex, (vent) => ({
    ...vent,
    outer_end: { ...vent.outer_end, flare_radius_m: radius_m },
  }));
}

export function setInnerFlare(design: Design, ventIndex: number, radius_m: number): Design {
  return editAirway(design, ventIndex, (vent) => ({
    ...vent,
    inner_end: { ...vent.inner_end, flare_radius_m: radius_m },
  }));
}

/** The first filter of a kind, or null. */
export function filterOf(design: Design, kind: Filter["kind"]): Filter | null {
  return design.filters.find((filter) => filter.kind === kind) ?? null;
}

/** Sets the first filter of a kind, adds it, or (with null) takes it away. */
export function setFilter(design: Design, kind: Filter["kind"], filter: Filter | null): Design {
  const at = design.filters.findIndex((old) => old.kind === kind);
  const filters = design.filters.filter((_, i) => i !== at);
  if (filter) filters.splice(at < 0 ? filters.length : at, 0, filter);
  return { ...design, filters };
}

/** Keeps sums of lengths free of binary crumbs: a micrometre's tenth is far below any caliper. */
function round6(value: number): number {
  return Math.round(value * 1e7) / 1e7;
}
