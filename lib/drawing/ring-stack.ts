/** A bare stack of rings as sheets and outlines, for small pictures of a plan. */
import type { Outline } from "./outline";
import type { Sheet } from "./section-parts";

export interface RingSheets {
  sheets: Sheet[];
  outlines: Outline[];
  /** Of the whole stack [mm]. */
  length: number;
}

/**
 * Lays rings end to end, glue lines left out.
 *
 * @param thicknesses_m - each ring's thickness, from the tube inwards [m]
 * @param height - how high each ring is drawn [mm]
 * @example ringSheets([0.018, 0.012], 40).length // 30
 */
export function ringSheets(thicknesses_m: readonly number[], height: number): RingSheets {
  const sheets: Sheet[] = [];
  const outlines: Outline[] = [];
  let x0 = 0;
  for (const thickness_m of thicknesses_m) {
    const x1 = x0 + thickness_m * 1000;
    sheets.push({ x0, x1, from: () => 0, to: () => height, along: false });
    outlines.push([
      { x: x0, y: height },
      { x: x1, y: height },
      { x: x1, y: 0 },
      { x: x0, y: 0 },
    ]);
    x0 = x1;
  }
  return { sheets, outlines, length: x0 };
}
