/** Closed outlines in millimetres, with true arcs, and their way to SVG path data. */

/** A corner; with `radius`, the edge that ends here is an arc of that radius. */
export interface OutlinePoint {
  x: number;
  y: number;
  radius?: number;
  /** For an arc: turning clockwise as seen with y pointing away from the axis (SVG sweep after the flip). */
  clockwise?: boolean;
}

export type Outline = OutlinePoint[];

/** From millimetres along and across the axis to the sheet. */
export interface SheetTransform {
  /** Sheet units per millimetre. */
  scale: number;
  /** Sheet position of a point x millimetres inside the datum face. */
  x: (x_mm: number) => number;
  /** Sheet position of the axis. */
  axis: number;
}

/** Which side of the axis an outline is drawn on: above, below, or both. */
export type Side = "above" | "below" | "both";

/** Sheet coordinates to a hundredth: enough for any screen, short enough for a frame. */
export function sheetNumber(value: number): number {
  return Math.round(value * 100) / 100;
}

/**
 * SVG path data of an outline; y counts away from the axis, so that the half below is the mirror.
 */
export function outlinePath(outline: Outline, transform: SheetTransform, side: Side): string {
  if (outline.length < 3) return "";
  const half = (up: boolean) => {
    let path = "";
    outline.forEach((point, index) => {
      const x = sheetNumber(transform.x(point.x));
      const y = sheetNumber(transform.axis + (up ? -1 : 1) * point.y * transform.scale);
      if (index === 0) path += `M${x} ${y}`;
      else if (point.radius !== undefined && point.radius > 0) {
        const r = sheetNumber(point.radius * transform.scale);
        path += `A${r} ${r} 0 0 ${(point.clockwise ?? false) === up ? 1 : 0} ${x} ${y}`;
      } else path += `L${x} ${y}`;
    });
    return `${path}Z`;
  };
  return (side !== "below" ? half(true) : "") + (side !== "above" ? half(false) : "");
}
