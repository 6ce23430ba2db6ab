/** Adding, taking away and moving the pieces of an airway. */
import type { AirwayVent, Design, Piece } from "@/lib/document/schema";
import { airwayAt, editAirway, withVent } from "./edits";

export const pieceNames: Record<Piece["kind"], string> = {
  tube: "Tube",
  rings: "Ring stack",
  plate: "Support plate",
  bend: "Bend",
};

/** A new piece that suits the airway as it stands: wall and sheet like its neighbours. */
export function newPiece(kind: Piece["kind"], vent: AirwayVent, design: Design): Piece {
  const bore =
    vent.bore.shape === "round"
      ? vent.bore.diameter_m
      : Math.min(vent.bore.width_m, vent.bore.height_m);
  const known = (wanted: Piece["kind"]) => vent.pieces.find((piece) => piece.kind === wanted);
  const panel = design.enclosure.panel_thickness_m;
  const sheet = known("rings") ?? known("plate");
  const thickness_m =
    sheet && "thickness_m" in sheet ? sheet.thickness_m : panel > 0.025 ? panel / 2 : panel;
  const millimetre = (value: number) => Math.round(value * 1000) / 1000;
  const tubeOutside = known("tube")?.outer_diameter_m ?? millimetre(bore + 0.006);
  switch (kind) {
    case "tube":
      return { kind, length_m: 0.1, outer_diameter_m: tubeOutside };
    case "rings":
      return {
        kind,
        count: 1,
        thickness_m,
        outer_diameter_m: millimetre(bore + 0.05),
        glue_line_m: 0.0001,
      };
    case "plate":
      return {
        kind,
        thickness_m,
        outer_diameter_m: millimetre(bore + 0.13),
        glue_line_m: 0.0001,
      };
    case "bend":
      return {
        kind,
        angle_deg: 90,
        centre_radius_m: millimetre(bore * 1.2),
        mitred: false,
        outer_diameter_m: tubeOutside,
      };
  }
}

export function addPiece(design: Design, ventIndex: number, kind: Piece["kind"]): Design {
  return editAirway(design, ventIndex, (vent) => ({
    ...vent,
    pieces: [...vent.pieces, newPiece(kind, vent, design)],
  }));
}

/** Takes a piece away; the last one stays, for a vent is made of something. */
export function removePiece(design: Design, ventIndex: number, at: number): Design {
  return editAirway(design, ventIndex, (vent) =>
    vent.pieces.length > 1 ? { ...vent, pieces: vent.pieces.filter((_, i) => i !== at) } : vent,
  );
}

/** Moves a piece outwards (-1) or inwards (+1) past its neighbour. */
export function movePiece(design: Design, ventIndex: number, at: number, by: -1 | 1): Design {
  return editAirway(design, ventIndex, (vent) => {
    const pieces = [...vent.pieces];
    const piece = pieces[at];
    const neighbour = pieces[at + by];
    if (!piece || !neighbour) return vent;
    pieces[at] = neighbour;
    pieces[at + by] = piece;
    return { ...vent, pieces };
  });
}

/** Round bore to a slot of equal area and back; a slot's height starts at a tenth of its width. */
export function setBoreShape(design: Design, ventIndex: number, shape: "round" | "slot"): Design {
  return editAirway(design, ventIndex, (vent) => {
    if (vent.bore.shape === shape) return vent;
    const micro = (value: number) => Math.round(value * 1e4) / 1e4;
    if (vent.bore.shape === "round") {
      const area = (Math.PI / 4) * vent.bore.diameter_m ** 2;
      const height_m = micro(Math.sqrt(area / 8));
      return {
        ...vent,
        bore: { shape: "slot", width_m: micro(area / height_m), height_m, shared_walls: 1 },
        inner_end: { flare_radius_m: 0, form: "cut" },
        pieces: vent.pieces
          .filter((piece) => piece.kind === "tube" || piece.kind === "bend")
          .map((piece) => ({ ...piece, outer_diameter_m: undefined, bore_m: undefined })),
      };
    }
    const diameter_m = micro(2 * Math.sqrt((vent.bore.width_m * vent.bore.height_m) / Math.PI));
    return {
      ...vent,
      bore: { shape: "round", diameter_m },
      pieces: vent.pieces.map((piece) =>
        piece.kind === "tube" ? { ...piece, outer_diameter_m: micro(diameter_m + 0.006) } : piece,
      ),
    };
  });
}

/** Another vent beside those there are, begun as a plain stock tube. */
export function addVent(design: Design): Design {
  const vent: AirwayVent = {
    name: `Vent ${design.vents.length + 1}`,
    count: 1,
    spacing_m: null,
    bore: { shape: "round", diameter_m: 0.0762 },
    outer_end: { flare_radius_m: 0.0127, proud_m: 0 },
    pieces: [{ kind: "tube", length_m: 0.15, outer_diameter_m: 0.0822 }],
    inner_end: { flare_radius_m: 0, form: "cut" },
    clearance_m: null,
    outer_clearance_m: null,
  };
  return design.vents.length < 16 ? { ...design, vents: [...design.vents, vent] } : design;
}

export function removeVent(design: Design, ventIndex: number): Design {
  return { ...design, vents: design.vents.filter((_, at) => at !== ventIndex) };
}

export function renameVent(design: Design, ventIndex: number, name: string): Design {
  const vent = design.vents[ventIndex];
  return vent ? withVent(design, ventIndex, { ...vent, name }) : design;
}

/** Whether any tube is there whose length can be solved for a tuning. */
export function hasTube(design: Design, ventIndex: number): boolean {
  return airwayAt(design, ventIndex)?.pieces.some((piece) => piece.kind === "tube") ?? false;
}
