/**
 * Placing lettering so that none covers another, a part, or a leader: each label takes the cheapest
 * free place, in rows that move away from what it names.
 */
import { LETTERING_PX, textWidth } from "./text-width";

export interface Box {
  x0: number;
  y0: number;
  x1: number;
  y1: number;
}

export interface LabelRequest {
  id: string;
  text: string;
  /** What the label names. */
  anchorX: number;
  anchorY: number;
  /** Placed before those of a lower one; equal ones from the left. */
  priority?: number;
  /** Left out, rather than forced into a further row, where no place is free. */
  optional?: boolean;
}

export interface PlacedLabel {
  id: string;
  text: string;
  /** Middle of the text, and its baseline. */
  x: number;
  y: number;
  box: Box;
  leader: { x0: number; y0: number; x1: number; y1: number } | null;
}

export interface PlacingRoom {
  /** −1: rows go up from startY; +1: down. */
  direction: -1 | 1;
  /** Baseline of the first row. */
  startY: number;
  minX: number;
  maxX: number;
  rows: number;
  obstacles: Box[];
  /** Lettering that already stands: no text and no leader may meet it. */
  before?: PlacedLabel[];
  /** Try the place right beside the anchor first, without a leader. */
  beside: boolean;
}

export const ROW_HEIGHT = 16;
const PAD = 3;
const SHIFTS = [0, 10, -10, 22, -22, 36, -36, 52, -52, 70, -70, 92, -92, 120, -120, 160, -160];

/** Box of a text centred at x on a baseline. */
export function textBox(text: string, x: number, baseline: number): Box {
  const half = textWidth(text) / 2;
  return {
    x0: x - half,
    x1: x + half,
    y0: baseline - LETTERING_PX * 0.8,
    y1: baseline + LETTERING_PX * 0.24,
  };
}

export function boxesOverlap(a: Box, b: Box, pad = 0): boolean {
  return a.x0 < b.x1 + pad && b.x0 < a.x1 + pad && a.y0 < b.y1 + pad && b.y0 < a.y1 + pad;
}

/** Places each request in turn, from the left; what could be placed, in that order. */
export function placeLabels(requests: LabelRequest[], room: PlacingRoom): PlacedLabel[] {
  const placed: PlacedLabel[] = [];
  const ordered = [...requests].sort(
    (a, b) =>
      (b.priority ?? 0) - (a.priority ?? 0) || a.anchorX - b.anchorX || a.anchorY - b.anchorY,
  );
  for (const request of ordered) {
    const label =
      cheapest(request, room, placed) ?? (request.optional ? null : force(request, room, placed));
    if (label) placed.push(label);
  }
  return placed;
}

function cheapest(
  request: LabelRequest,
  room: PlacingRoom,
  placed: PlacedLabel[],
): PlacedLabel | null {
  let best: PlacedLabel | null = null;
  let bestCost = Infinity;
  const consider = (baseline: number, rowCost: number, withLeader: boolean) => {
    for (const shift of SHIFTS) {
      const cost = rowCost + Math.abs(shift) * 0.3;
      if (cost >= bestCost) continue;
      const label = labelAt(request, room, request.anchorX + shift, baseline, withLeader);
      if (!withLeader && (label.box.x0 > request.anchorX || label.box.x1 < request.anchorX))
        continue;
      if (free(label, room, placed)) {
        best = label;
        bestCost = cost;
      }
    }
  };
  if (room.beside) consider(request.anchorY + room.direction * 6, 0, false);
  for (let row = 0; row < room.rows; row++)
    consider(room.startY + room.direction * row * ROW_HEIGHT, 8 + row * 9, true);
  return best;
}

/** A row of its own beyond all others. */
function force(request: LabelRequest, room: PlacingRoom, placed: PlacedLabel[]): PlacedLabel {
  for (let row = room.rows; ; row++) {
    const baseline = room.startY + room.direction * row * ROW_HEIGHT;
    const label = labelAt(request, room, request.anchorX, baseline, true);
    if (
      ![...placed, ...(room.before ?? [])].some((other) => boxesOverlap(label.box, other.box, PAD))
    )
      return label;
  }
}

function labelAt(
  { id, text, anchorX, anchorY }: LabelRequest,
  room: PlacingRoom,
  wanted: number,
  y: number,
  withLeader: boolean,
): PlacedLabel {
  const half = textWidth(text) / 2;
  const x = Math.max(room.minX + half, Math.min(room.maxX - half, wanted));
  const box = textBox(text, x, y);
  const nearX = Math.max(box.x0 + 2, Math.min(box.x1 - 2, anchorX));
  const nearY = room.direction < 0 ? box.y1 + 1 : box.y0 - 1;
  const leader = withLeader ? { x0: anchorX, y0: anchorY, x1: nearX, y1: nearY } : null;
  return { id, text, x, y, box, leader };
}

function free(label: PlacedLabel, room: PlacingRoom, placed: PlacedLabel[]): boolean {
  if (label.box.x0 < room.minX - 0.5 || label.box.x1 > room.maxX + 0.5) return false;
  if (room.obstacles.some((obstacle) => boxesOverlap(label.box, obstacle, 1))) return false;
  return [...placed, ...(room.before ?? [])].every(
    (other) =>
      !boxesOverlap(label.box, other.box, PAD) &&
      !(label.leader && crosses(label.leader, other.box)) &&
      !(other.leader && crosses(other.leader, label.box)),
  );
}

/** Whether a straight leader runs through a box. */
export function crosses(
  line: { x0: number; y0: number; x1: number; y1: number },
  box: Box,
): boolean {
  let enter = 0;
  let leave = 1;
  const clip = (start: number, delta: number, low: number, high: number) => {
    if (Math.abs(delta) < 1e-9) return start >= low && start <= high;
    const t0 = (low - start) / delta;
    const t1 = (high - start) / delta;
    enter = Math.max(enter, Math.min(t0, t1));
    leave = Math.min(leave, Math.max(t0, t1));
    return enter <= leave;
  };
  return (
    clip(line.x0, line.x1 - line.x0, box.x0 - 1, box.x1 + 1) &&
    clip(line.y0, line.y1 - line.y0, box.y0 - 1, box.y1 + 1)
  );
}
