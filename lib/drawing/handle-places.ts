/** Where handles stand on the sheet: at their part, moved apart where fingers could not tell them. */
import type { Handle } from "./handles";
import type { SheetTransform } from "./outline";

export interface HandlePlace {
  handle: Handle;
  x: number;
  y: number;
  /** Where on the part it acts, when it had to stand aside. */
  at: { x: number; y: number };
}

/** Centres of two handles are at least this far apart [CSS px]: the smallest target WCAG 2.2 allows. */
export const HANDLE_SPACING = 26;

export function placeHandles(handles: Handle[], transform: SheetTransform): HandlePlace[] {
  const placed: HandlePlace[] = [];
  for (const handle of handles) {
    const at = { x: transform.x(handle.x), y: transform.axis - handle.y * transform.scale };
    const away = at.y > transform.axis || (handle.y === 0 && handle.id === "tube") ? 1 : -1;
    let y = at.y;
    for (let tries = 0; tries < 8 && placed.some((other) => near(other, at.x, y)); tries++)
      y += away * 9;
    placed.push({ handle, x: at.x, y, at });
  }
  return placed;
}

function near(other: HandlePlace, x: number, y: number): boolean {
  return Math.hypot(other.x - x, other.y - y) < HANDLE_SPACING;
}
