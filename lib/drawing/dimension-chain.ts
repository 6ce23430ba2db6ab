/** Dimensions along the axis: a chain of pieces and clearance, and the overall length from its datum. */
import type { AirwayVent } from "@/lib/document/schema";
import type { DrawingText } from "./drawing-text";
import { sheetNumber } from "./outline";
import { boxesOverlap, placeLabels, textBox, type Box, type PlacedLabel } from "./place-labels";
import type { Section } from "./section";
import type { SheetFrame } from "./sheet-frame";
import { textWidth } from "./text-width";

export interface Dimension {
  id: string;
  /** From and to, millimetres along the axis. */
  x0: number;
  x1: number;
  text: string;
  /** What it measures, in words, and the length [m]: for the table. */
  name: string;
  length_m: number;
}

export interface DrawnDimensions {
  lines: string;
  /** Filled arrowheads. */
  arrows: string;
  labels: PlacedLabel[];
  /** Lowest point used. */
  bottom: number;
  warn: boolean;
}

/** The chain: every piece from the mouth inwards, then the clearance. */
export function chainOf(section: Section, vent: AirwayVent, text: DrawingText): Dimension[] {
  const chain: Dimension[] = section.pieces.map((piece) => {
    const length_m = (piece.x1 - piece.x0) / 1000;
    const given = vent.pieces[piece.index];
    const span = { id: `piece-${piece.index}`, x0: piece.x0, x1: piece.x1, length_m };
    if (given?.kind === "rings") {
      const glue = given.glue_line_m > 0 ? " + glue" : "";
      const sum = `${given.count} × ${text.sheet(given.thickness_m)}${glue} = ${text.bare(length_m)}`;
      return { ...span, text: sum, name: "Rings" };
    }
    if (given?.kind === "bend")
      return { ...span, text: `bend ${given.angle_deg}° ${text.bare(length_m)}`, name: "Bend" };
    if (given?.kind === "plate")
      return { ...span, text: `plate ${text.bare(length_m)}`, name: "Support plate" };
    const word = section.slot ? "slot" : "tube";
    return {
      ...span,
      text: `${word} ${text.bare(length_m)}`,
      name: section.slot ? "Slot" : "Tube",
    };
  });
  if (section.clearance !== null) chain.push(clearanceOf(section, section.clearance, text));
  return chain;
}

function clearanceOf(section: Section, clearance: number, text: DrawingText): Dimension {
  const end = section.profile.end;
  const span = { id: "clearance", name: "Clearance", length_m: clearance / 1000 };
  if (clearance < 0)
    return {
      ...span,
      x0: end + clearance,
      x1: end,
      text: `${text.bare(-clearance / 1000)} too long`,
    };
  const bores = clearance / (2 * section.profile.endRadius);
  const unit = section.slot ? "× height" : "Ø";
  return {
    ...span,
    x0: end,
    x1: end + clearance,
    text: `clear ${text.bare(clearance / 1000)} (${bores.toFixed(2)} ${unit})`,
  };
}

/** The overall length: always from the mouth plane, which a flush mouth shares with the datum face. */
export function overallOf(section: Section, text: DrawingText): Dimension {
  const { profile, overall, proud } = section;
  const length = text.bare(overall / 1000);
  return {
    id: "overall",
    x0: profile.mouth,
    x1: profile.end,
    text:
      proud > 0
        ? `overall ${length}, mouth ${text.bare(proud / 1000)} before face A`
        : `overall ${length} from the outer face A`,
    name: proud > 0 ? "Overall, from the mouth" : "Overall, from the outer face",
    length_m: overall / 1000,
  };
}

const FIRST_LINE = 26;
const TEXT_LIFT = 5;

/** Draws chain and overall below the section, from the section's bottom edge down. */
export function drawDimensions(
  chain: Dimension[],
  overall: Dimension,
  section: Section,
  frame: SheetFrame,
): DrawnDimensions {
  const at = frame.transform.x;
  const y1 = frame.bottom + FIRST_LINE;
  const labels: PlacedLabel[] = [];
  const small: Dimension[] = [];
  const marks = { lines: "", arrows: "" };
  const witnesses = new Map<number, number>();
  for (const dimension of chain) {
    const left = at(dimension.x0);
    const right = at(dimension.x1);
    witnesses.set(left, y1 + 4);
    witnesses.set(right, y1 + 4);
    drawSpan(marks, left, right, y1);
    const label = plainLabel(dimension, (left + right) / 2, y1 - TEXT_LIFT);
    const fits = textWidth(dimension.text) + 8 <= right - left;
    // A vent too long for its box is dimensioned over its own pieces.
    if (fits && !labels.some(({ box }) => boxesOverlap(box, label.box, 3))) labels.push(label);
    else small.push(dimension);
  }
  const mouth = at(overall.x0);
  const end = at(overall.x1);
  const staggered = stagger(small, frame, y1, [mouth, end]);
  labels.push(...staggered);
  const lowest = Math.max(y1 + 6, ...staggered.map((label) => label.box.y1));
  const y2 = lowest + 20;
  drawSpan(marks, mouth, end, y2);
  const half = textWidth(overall.text) / 2;
  const right = end + 10 + half;
  const left = mouth - 10 - half;
  const aside =
    2 * half + 4 <= end - mouth
      ? null
      : right + half < frame.width - 4
        ? right
        : left - half > 4
          ? left
          : null;
  const middle = aside ?? Math.max(half + 4, Math.min(frame.width - half - 4, (mouth + end) / 2));
  labels.push(plainLabel(overall, middle, aside === null ? y2 - TEXT_LIFT : y2 + 4));
  witnesses.set(mouth, y2 + 4);
  witnesses.set(end, y2 + 4);
  for (const [x, to] of witnesses)
    marks.lines += `M${sheetNumber(x)} ${sheetNumber(frame.bottom + 4)}V${sheetNumber(to)}`;
  for (const { leader } of staggered)
    if (leader)
      marks.lines += `M${sheetNumber(leader.x0)} ${sheetNumber(leader.y0)}L${sheetNumber(leader.x1)} ${sheetNumber(leader.y1)}`;
  return { ...marks, labels, bottom: y2 + 6, warn: (section.clearance ?? 0) < 0 };
}

/** Rows that short dimensions may take below their line. */
const STAGGER_ROWS = 5;

/**
 * Texts of dimensions too short to carry them, in rows below the line. Tried with the longest
 * first, from the left, from the right, and once more without the word for the glue; what then
 * still finds no place is left to the table.
 */
function stagger(
  small: Dimension[],
  { transform, width }: SheetFrame,
  y: number,
  witnesses: number[],
): PlacedLabel[] {
  const at = transform.x;
  const orders: ((dimension: Dimension) => number)[] = [
    ({ x0, x1 }) => Math.round(Math.abs(at(x1) - at(x0))),
    () => 0,
    ({ x0 }) => x0,
  ];
  let best: PlacedLabel[] = [];
  for (const glue of [true, false])
    for (const priority of orders) {
      const placed = placeLabels(
        small.map((dimension) => ({
          id: dimension.id,
          text: glue ? dimension.text : dimension.text.replace(" + glue", ""),
          anchorX: (at(dimension.x0) + at(dimension.x1)) / 2,
          anchorY: y,
          priority: priority(dimension),
          optional: true,
        })),
        {
          direction: 1,
          startY: y + 18,
          minX: 4,
          maxX: width - 4,
          rows: STAGGER_ROWS,
          obstacles: witnesses.map((x) => upright(x, y)),
          beside: false,
        },
      );
      if (placed.length === small.length) return placed;
      if (placed.length > best.length) best = placed;
    }
  return best;
}

function plainLabel({ id, text }: Dimension, x: number, y: number): PlacedLabel {
  return { id, text, x, y, box: textBox(text, x, y), leader: null };
}

/** What the overall length's witness line takes up beside it. */
function upright(x: number, y: number): Box {
  return { x0: x - 1, x1: x + 1, y0: y, y1: y + 400 };
}

const ARROW = 7;

/** A dimension line with arrowheads inside, or with strokes where it is too short for them. */
export function drawSpan(
  marks: { lines: string; arrows: string },
  x0: number,
  x1: number,
  y: number,
): void {
  const [left, right] = x0 <= x1 ? [x0, x1] : [x1, x0];
  const n = sheetNumber;
  marks.lines += `M${n(left)} ${n(y)}H${n(right)}`;
  if (right - left >= 3 * ARROW) {
    marks.arrows += `M${n(left)} ${n(y)}l${ARROW} -2v4zM${n(right)} ${n(y)}l-${ARROW} -2v4z`;
  } else for (const x of [left, right]) marks.lines += `M${n(x - 3)} ${n(y + 3)}l6 -6`;
}
