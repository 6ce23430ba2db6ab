/** The whole sheet, ready to be painted: paths and lettering, from a design and the room there is. */
import type { VentAnswer } from "@/lib/acoustics/answer";
import type { AirwayVent, Enclosure } from "@/lib/document/schema";
import { placeAnnotations, type AirStroke, type GhostAir } from "./annotations";
import { airPath } from "./air-path";
import { chainOf, drawDimensions, overallOf, type DrawnDimensions } from "./dimension-chain";
import type { DrawingText } from "./drawing-text";
import { outlinePath, sheetNumber } from "./outline";
import { fillPath, plyPath } from "./plies";
import type { PlacedLabel } from "./place-labels";
import { sectionOf, type Section } from "./section";
import { sectionParts, type PartKind } from "./section-parts";
import { frameOf, ghostLength, type FrameHold, type SheetFrame } from "./sheet-frame";

export interface DrawnPart {
  id: string;
  kind: PartKind;
  piece: number | null;
  wooden: boolean;
  outline: string;
  plies: string;
  glue: string;
}

export interface Sheet {
  section: Section;
  frame: SheetFrame;
  parts: DrawnPart[];
  /** Outline of the air inside the vent. */
  air: string;
  ghosts: GhostAir[];
  stroke: AirStroke | null;
  /** The bore's own dimension line. */
  bore: { x: number; y0: number; y1: number };
  centre: { x0: number; x1: number };
  /** Break marks: where the clearance is shortened, and both ends of each bend. */
  breaks: string;
  dimensions: DrawnDimensions;
  annotations: PlacedLabel[];
  /** Leaders of the annotations. */
  leaders: string;
}

export interface SheetRequest {
  vent: AirwayVent;
  enclosure: Enclosure;
  figures: VentAnswer | null;
  text: DrawingText;
  width: number;
  height: number;
  layers?: number;
  hold?: FrameHold;
}

/** Below this width [CSS px] lettering without room is left out. */
const NARROW_PX = 520;

const FIRST_ROOM = { above: 46, below: 62 };

/** Lays out the sheet; lettering that needs more rows takes them from the section's own room. */
export function layOutSheet(request: SheetRequest): Sheet {
  const section = sectionOf(request.vent, request.enclosure, request.layers);
  if (request.hold) return attempt(request, section, request.hold);
  let room = FIRST_ROOM;
  let sheet = attempt(request, section, room);
  for (let round = 0; round < 2; round++) {
    const top = Math.min(...sheet.annotations.map((label) => label.box.y0), 99);
    const below = sheet.dimensions.bottom - (request.height - room.below) + 4;
    const wanted = {
      above: Math.max(28, Math.min(room.above + 6 - top, request.height * 0.34)),
      below: Math.max(56, Math.min(below, request.height * 0.4)),
    };
    if (Math.abs(wanted.below - room.below) < 3 && Math.abs(wanted.above - room.above) < 3) break;
    room = wanted;
    sheet = attempt(request, section, room);
  }
  return sheet;
}

function attempt(
  request: SheetRequest,
  section: Section,
  room: { above: number; below: number },
): Sheet {
  const { figures, text } = request;
  const ends = figures?.end_corrections_m;
  const outer = ghostLength(section, ends?.outer ?? 0);
  const behind = Math.max(0, section.clearance ?? Infinity);
  const inner = Math.min(ghostLength(section, ends?.inner ?? 0), behind);
  const frame = frameOf(
    section,
    { width: request.width, height: request.height, above: room.above, below: room.below },
    { outer, inner },
    request.hold,
  );
  const { transform } = frame;
  const { profile } = section;
  const parts = sectionParts(section, frame.panelHalf, breakDepth(section, frame));
  const ghosts: GhostAir[] = [];
  if (ends && Math.abs(ends.outer) > 1e-5)
    ghosts.push(ghost("outer", ends.outer, outer, section, frame));
  if (ends && Math.abs(ends.inner) > 1e-5)
    ghosts.push(ghost("inner", ends.inner, inner, section, frame));
  const halfBore = Math.min(profile.mouthRadius, profile.endRadius) * transform.scale;
  const stroke = strokeOf(figures, section, frame, halfBore);
  const boreAt = boreLineAt(section, frame);
  // What finds no room above a narrow sheet is left to the table of dimensions.
  const annotations = placeAnnotations(
    section,
    parts,
    frame,
    { ghosts, stroke, boreAt },
    text,
  ).filter((label) => frame.width > NARROW_PX || label.box.y0 >= 2);
  const wall = parts.find((part) => part.kind === "wall");
  return {
    section,
    frame,
    parts: parts.map((part) => ({
      id: part.id,
      kind: part.kind,
      piece: part.piece,
      wooden: part.wooden,
      outline: part.outlines.map((outline) => outlinePath(outline, transform, part.side)).join(""),
      plies: plyPath(part.sheets, transform, part.side),
      glue: fillPath(part.glue, transform, part.side),
    })),
    air: airPath(section, transform),
    ghosts,
    stroke,
    bore: { x: boreAt, y0: transform.axis - halfBore, y1: transform.axis + halfBore },
    centre: {
      x0: Math.max(2, transform.x(profile.mouth) - Math.max(outer * transform.scale, 16) - 18),
      x1: Math.min(request.width - 2, transform.x(wall?.x1 ?? profile.end + inner) + 14),
    },
    breaks: breakMarks(section, frame),
    dimensions: drawDimensions(
      chainOf(section, request.vent, text),
      overallOf(section, text),
      section,
      frame,
    ),
    annotations,
    leaders: annotations
      .map(({ leader: l }) =>
        l
          ? `M${sheetNumber(l.x0)} ${sheetNumber(l.y0)}L${sheetNumber(l.x1)} ${sheetNumber(l.y1)}`
          : "",
      )
      .join(""),
  };
}

/** Depth of the wave of a broken panel edge [mm]: 5 on the sheet, less on a thin panel. */
function breakDepth({ panel }: Section, { transform }: SheetFrame): number {
  return Math.min(5 / transform.scale, 0.3 * panel);
}

function ghost(
  end: "outer" | "inner",
  correction_m: number,
  length: number,
  { profile }: Section,
  { transform }: SheetFrame,
): GhostAir {
  const plane = end === "outer" ? profile.mouth : profile.end;
  const away = (end === "outer" ? -1 : 1) * Math.sign(correction_m);
  const radius = end === "outer" ? profile.mouthRadius : profile.endRadius;
  return {
    end,
    correction_m,
    from: transform.x(plane),
    to: transform.x(plane) + away * length * transform.scale,
    half: radius * transform.scale,
  };
}

/**
 * Peak-to-peak stroke of the air in the bore at the frequency of its highest speed.
 *
 *     s = 2 v̂ / ω
 */
export function airStroke(speed_m_s: number, frequency_hz: number): number {
  return frequency_hz > 0 ? speed_m_s / (Math.PI * frequency_hz) : 0;
}

function strokeOf(
  figures: VentAnswer | null,
  { profile }: Section,
  { transform, width }: SheetFrame,
  halfBore: number,
): AirStroke | null {
  const peak = figures?.peak_air_speed;
  if (!peak) return null;
  const stroke_m = airStroke(peak.speed_m_s, peak.frequency_hz);
  const half = (stroke_m * 1000 * transform.scale) / 2;
  if (!(half > 1)) return null;
  const middle = (transform.x(profile.mouth) + transform.x(profile.end)) / 2;
  const left = Math.max(middle - half, 4);
  const right = Math.min(middle + half, width - 4);
  return {
    stroke_m,
    speed_m_s: peak.speed_m_s,
    frequency_hz: peak.frequency_hz,
    x0: left,
    x1: right,
    half,
    whole: right - left >= 2 * half - 1e-6,
    y: transform.axis + halfBore * 0.28,
    slug: Math.max(3, Math.min(0.45 * halfBore, half * 0.8)),
  };
}

/** The bore's dimension line stands near the mouth, clear of the flare. */
function boreLineAt({ profile }: Section, { transform }: SheetFrame): number {
  const from = profile.mouth + profile.outerFlare;
  const to = profile.end - profile.innerFlare;
  return transform.x(from < to ? from + (to - from) * 0.12 : (profile.mouth + profile.end) / 2);
}

function breakMarks(section: Section, frame: SheetFrame): string {
  const { x, axis, scale } = frame.transform;
  const n = sheetNumber;
  const zigzag = (at: number, y0: number, y1: number) => {
    const middle = (y0 + y1) / 2;
    return `M${n(at)} ${n(y0)}V${n(middle - 6)}l-4 4l8 5l-4 3V${n(y1)}`;
  };
  let path = "";
  if (frame.gap) {
    const half = section.reach * scale;
    const at = x(frame.gap.x0);
    path += zigzag(at - 3, axis - half, axis + half) + zigzag(at + 3, axis - half, axis + half);
  }
  for (const piece of section.pieces) {
    if (piece.kind !== "bend") continue;
    const half = piece.outer * scale + 8;
    path +=
      zigzag(x(piece.x0), axis - half, axis + half) + zigzag(x(piece.x1), axis - half, axis + half);
  }
  return path;
}
