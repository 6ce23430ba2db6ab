/** How a section sits on its sheet: scale, where the axis runs, where long clearances are broken off. */
import type { SheetTransform } from "./outline";
import { insideAbove, sharedSides, type Section, type Span } from "./section";

export interface SheetRoom {
  /** Size of the sheet [CSS px]. */
  width: number;
  height: number;
  /** Kept free above and below the section for lettering [px]. */
  above: number;
  below: number;
}

/** A frame that must not move while a hand drags. */
export interface FrameHold {
  scale: number;
  origin: number;
  gap: Span | null;
  /** Room that lettering had taken above and below. */
  above: number;
  below: number;
}

export interface SheetFrame extends SheetRoom {
  transform: SheetTransform;
  /** How far from the axis panels are shown [mm]. */
  panelHalf: number;
  /** Sheet positions of the panels' ends. */
  top: number;
  bottom: number;
  /** Part of the clearance left out [mm along the axis]. */
  gap: Span | null;
  hold: FrameHold;
}

/** Narrower sheets keep no margin for lettering beside the section. */
const WIDE_SHEET_PX = 600;
/** Panels are shown at most this much farther than what must be seen. */
const PANEL_SPARE = 1.9;
/** … or this share of the room, whichever is more. */
const PANEL_SHARE = 0.85;
/** Shown below a slot's floor panel [mm]. */
const FLOOR_SPARE_MM = 4;

/** Ghost air is drawn no longer than this many bores. */
export const LONGEST_GHOST_BORES = 1.2;

/** Length at which an end's ghost air is drawn [mm]. */
export function ghostLength(section: Section, correction_m: number): number {
  const bore = 2 * Math.min(section.profile.mouthRadius, section.profile.endRadius);
  return Math.min(Math.abs(correction_m) * 1000, LONGEST_GHOST_BORES * bore);
}

/** Fits a section to its room. */
export function frameOf(
  section: Section,
  room: SheetRoom,
  ghosts: { outer: number; inner: number },
  hold?: FrameHold,
): SheetFrame {
  const { profile, clearance, board } = section;
  const gap = hold ? hold.gap : gapOf(section);
  const cut = gap ? gap.x1 - gap.x0 : 0;
  const side = room.width > WIDE_SHEET_PX ? 84 : 36;
  const left = Math.min(profile.mouth - ghosts.outer, 0);
  const wallEnd = clearance === null ? -Infinity : profile.end + clearance + board;
  const right = Math.max(
    clearance === null ? profile.end + ghosts.inner : profile.end,
    wallEnd - cut,
    section.panel,
  );
  const padRight = clearance === null ? side : 26;
  const across = Math.max(40, room.height - room.above - room.below);
  const seen = section.reach * 1.04;
  const fit = Math.min(
    Math.max(60, room.width - side - padRight) / Math.max(right - left, 1),
    (across - 20) / (2 * seen),
  );
  const scale = hold?.scale ?? fit;
  const spare = (room.width - side - padRight - (right - left) * scale) / 2;
  const origin = hold?.origin ?? side + Math.max(0, spare) - left * scale;
  const x = (x_mm: number) => {
    const shown = !gap || x_mm <= gap.x0 ? x_mm : Math.max(gap.x0, x_mm - cut);
    return origin + shown * scale;
  };
  const inside = insideAbove(section);
  const box = inside === null ? Infinity : Math.max(inside + board, seen);
  const { floor } = sharedSides(section);
  const below = floor ? (section.reach + FLOOR_SPARE_MM) * scale : Infinity;
  const half = across / 2;
  const roomAbove = floor ? Math.max(half, across - below) : half;
  const up = Math.min(
    roomAbove,
    Math.max(seen * PANEL_SPARE * scale, PANEL_SHARE * roomAbove),
    box * scale,
  );
  const down = Math.min(up, below);
  const axis = room.above + (across - up - down) / 2 + up;
  return {
    ...room,
    transform: { scale, x, axis },
    panelHalf: up / scale,
    top: axis - up,
    bottom: axis + down,
    gap,
    hold: { scale, origin, gap, above: room.above, below: room.below },
  };
}

/** A clearance much longer than the vent is broken off, as a long shaft would be. */
function gapOf(section: Section): Span | null {
  const { profile, clearance, overall } = section;
  if (clearance === null || section.pieces.length === 0) return null;
  const limit = Math.max(4.4 * profile.endRadius, 0.9 * overall, 80);
  if (clearance <= limit) return null;
  const shown = 0.7 * limit;
  const x0 = profile.end + shown * 0.62;
  return { x0, x1: x0 + clearance - shown };
}

/** Scale as a drawing names it, `1 : n`, from sheet units of 1/96 inch (the CSS pixel); two figures. */
export function scaleName(scalePerMm: number): string {
  const ratio = 96 / 25.4 / scalePerMm;
  const figure = (value: number) => String(Number(value.toPrecision(2)));
  return ratio >= 0.995 ? `1 : ${figure(ratio)}` : `${figure(1 / ratio)} : 1`;
}
