/** What is lettered beside the section: diameters, radii, end corrections, stroke, datum. */
import type { DrawingText } from "./drawing-text";
import {
  boxesOverlap,
  placeLabels,
  textBox,
  type LabelRequest,
  type PlacedLabel,
} from "./place-labels";
import { gripBoxes, partBoxes, reservedBoxes } from "./reserved-boxes";
import type { Section } from "./section";
import type { SectionPart } from "./section-parts";
import type { SheetFrame } from "./sheet-frame";
import { textWidth } from "./text-width";

/** An end's correction as drawn: ghost air from the face outwards. */
export interface GhostAir {
  end: "outer" | "inner";
  correction_m: number;
  /** Sheet positions; for a negative correction `to` lies inside the vent. */
  from: number;
  to: number;
  half: number;
}

export interface AirStroke {
  /** Peak to peak [m]. */
  stroke_m: number;
  speed_m_s: number;
  frequency_hz: number;
  /** Sheet positions of the arrow's ends, cut off at the sheet's edges (whole: nothing cut off). */
  x0: number;
  x1: number;
  whole: boolean;
  /** Half the stroke on the sheet, the height of its line, and half the slug's width. */
  half: number;
  y: number;
  slug: number;
}

interface Wish extends LabelRequest {
  /** Places tried before the rows above: middle of the text and baseline. */
  places: { x: number; y: number; leader?: boolean }[];
  /** Left to the table rather than lettered in a row above. */
  besideOnly?: boolean;
}

/** Places every annotation; those beside their part first, the rest in rows above. */
export function placeAnnotations(
  section: Section,
  parts: SectionPart[],
  frame: SheetFrame,
  air: { ghosts: GhostAir[]; stroke: AirStroke | null; boreAt: number },
  text: DrawingText,
): PlacedLabel[] {
  const solids = parts.flatMap((part) => partBoxes(part, frame));
  const wishes = [
    ...flareWishes(section, frame, text),
    ...airWishes(section, frame, air, text),
    ...partWishes(section, parts, frame, text),
  ];
  const placed: PlacedLabel[] = [];
  const leftOver: LabelRequest[] = [];
  const kept = [...reservedBoxes(frame, air), ...gripBoxes(section, frame)];
  for (const wish of wishes) {
    const found = wish.places
      .map(({ x, y, leader }) => labelAt(wish, x, y, leader ?? false))
      .find(
        ({ box }) =>
          box.x0 >= 3 &&
          box.x1 <= frame.width - 3 &&
          ![...solids, ...kept, ...placed.map((label) => label.box)].some((other) =>
            boxesOverlap(box, other, 2),
          ),
      );
    if (found) placed.push(found);
    else if (!wish.besideOnly) leftOver.push(wish);
  }
  const above = placeLabels(leftOver, {
    direction: -1,
    startY: frame.top - 9,
    minX: 4,
    maxX: frame.width - 4,
    rows: 5,
    obstacles: [...solids, ...kept],
    before: placed,
    beside: true,
  });
  return [...placed, ...above];
}

function labelAt(wish: Wish, x: number, y: number, withLeader: boolean): PlacedLabel {
  const box = textBox(wish.text, x, y);
  const right = wish.anchorX > box.x1;
  const leader = withLeader
    ? {
        x0: wish.anchorX,
        y0: wish.anchorY,
        x1: right ? box.x1 + 2 : wish.anchorX < box.x0 ? box.x0 - 2 : wish.anchorX,
        y1: right || wish.anchorX < box.x0 ? y - 4 : box.y1,
      }
    : null;
  return { id: wish.id, text: wish.text, x, y, box, leader };
}

function flareWishes(section: Section, frame: SheetFrame, text: DrawingText): Wish[] {
  const { profile } = section;
  const { x, axis, scale } = frame.transform;
  const wishes: Wish[] = [];
  const wish = (end: "outer" | "inner", R: number, r: number, plane: number) => {
    if (R <= 0) return;
    const sign = end === "outer" ? -1 : 1;
    const inset = R * (1 - Math.SQRT1_2);
    const label = `R ${text.bare(R / 1000)}`;
    const half = textWidth(label) / 2;
    const beside = x(plane) + sign * (16 + half);
    const anchorY = axis - (r + inset) * scale;
    wishes.push({
      id: `flare-${end}`,
      text: label,
      anchorX: x(plane - sign * inset),
      anchorY,
      places: [12, 26, 40, 0].map((lift) => ({ x: beside, y: anchorY - lift, leader: true })),
    });
  };
  wish("outer", profile.outerFlare, profile.mouthRadius, profile.mouth);
  wish("inner", profile.innerFlare, profile.endRadius, profile.end);
  return wishes;
}

/** Half height of a bore on the sheet from which the stroke is lettered inside it [px]. */
const STROKE_TEXT_FROM = 28;

/** How far solids stand above the axis at a place of the sheet [px]. */
function outsideAt(section: Section, { transform }: SheetFrame, at: number): number {
  const outer = section.pieces
    .filter((piece) => transform.x(piece.x0) <= at && transform.x(piece.x1) >= at)
    .map((piece) => piece.outer);
  return Math.max(0, ...outer) * transform.scale;
}

function airWishes(
  section: Section,
  frame: SheetFrame,
  { ghosts, stroke, boreAt }: { ghosts: GhostAir[]; stroke: AirStroke | null; boreAt: number },
  text: DrawingText,
): Wish[] {
  const { axis, scale, x } = frame.transform;
  const radius = Math.min(section.profile.mouthRadius, section.profile.endRadius);
  const halfBore = radius * scale;
  const { slot } = section;
  const bore = slot
    ? `slot ${text.bare(slot.width / 1000)} × ${text.bare(slot.height / 1000)}`
    : `Ø ${text.bare((2 * radius) / 1000)}`;
  const boreHalf = textWidth(bore) / 2;
  /** Right above whatever stands over a place of the bore. */
  const over = (at: number, lift: number) => ({
    x: at,
    y: axis - outsideAt(section, frame, at) - lift,
    leader: true,
  });
  const wishes: Wish[] = [
    {
      id: "bore",
      text: bore,
      anchorX: boreAt,
      anchorY: axis - halfBore,
      places:
        halfBore >= 17
          ? [
              ...[1, -1].map((s) => ({ x: boreAt + s * (8 + boreHalf), y: axis - 9 })),
              over(boreAt, 14),
            ]
          : [over(boreAt, 14)],
    },
  ];
  if (stroke && (halfBore >= STROKE_TEXT_FROM || frame.width > 600)) {
    const label = `air stroke ${text.bare(stroke.stroke_m)} peak to peak at ${text.frequency(stroke.frequency_hz)}`;
    const short = `stroke ${text.bare(stroke.stroke_m)} at ${text.frequency(stroke.frequency_hz)}`;
    const long = x(section.profile.end) - x(section.profile.mouth) >= textWidth(label) + 12;
    const middle = (stroke.x0 + stroke.x1) / 2;
    wishes.push({
      id: "stroke",
      text: long ? label : short,
      anchorX: middle,
      anchorY: stroke.y,
      besideOnly: frame.width <= 600,
      places:
        halfBore >= STROKE_TEXT_FROM
          ? [stroke.y + 15, axis - 9].flatMap((y) =>
              [0, 24, -24, 48, -48, 72].map((aside) => ({ x: middle + aside, y })),
            )
          : [over(middle, 14), over(middle, 30)],
    });
  }
  for (const ghost of ghosts) {
    const label = `end air ${text.signed(ghost.correction_m)}`;
    const sign = ghost.end === "outer" ? -1 : 1;
    const tip = sign < 0 ? Math.min(ghost.from, ghost.to) : Math.max(ghost.from, ghost.to);
    const at = tip + sign * (8 + textWidth(label) / 2);
    wishes.push({
      id: `end-air-${ghost.end}`,
      text: label,
      anchorX: (ghost.from + ghost.to) / 2,
      anchorY: axis - ghost.half,
      optional: true,
      places: [
        { x: at, y: axis - 7 },
        { x: at, y: axis + 16 },
      ],
    });
  }
  return wishes;
}

function partWishes(
  section: Section,
  parts: SectionPart[],
  frame: SheetFrame,
  text: DrawingText,
): Wish[] {
  const { x, axis, scale } = frame.transform;
  const above = (id: string, label: string, at: number, y: number, optional = false): Wish => ({
    id,
    text: label,
    anchorX: x(at),
    anchorY: y,
    optional,
    places: [],
  });
  const layers = section.layers.length;
  const baffle = text.bare(section.panel / 1000);
  const wishes: Wish[] = parts.some((part) => part.id === "panel")
    ? [
        above(
          "panel",
          layers > 1
            ? `baffle ${layers} × ${text.bare(section.board / 1000)} = ${baffle}`
            : `baffle ${baffle}`,
          section.panel / 2,
          frame.top,
        ),
      ]
    : [];
  const many = section.pieces.length > 6;
  for (const piece of section.pieces) {
    if (piece.x1 <= section.panel || section.slot) continue;
    const visible = (Math.max(piece.x0, section.panel) + piece.x1) / 2;
    const y = axis - piece.outer * scale;
    const size = piece.outerKnown ? ` Ø ${text.bare((2 * piece.outer) / 1000)}` : "";
    if (piece.kind === "bend")
      wishes.push(above(`bend-${piece.index}`, "bend, drawn unfolded", visible, y, many));
    else if (size !== "")
      wishes.push(above(`outer-${piece.index}`, `${piece.kind}${size}`, visible, y, many));
  }
  const wall = parts.find((part) => part.kind === "wall");
  if (wall)
    wishes.push(
      above(
        "wall",
        section.wallIsBack ? "back panel" : "wall it faces",
        (wall.x0 + wall.x1) / 2,
        frame.top,
      ),
    );
  return wishes;
}
