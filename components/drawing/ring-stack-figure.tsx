import { fillPath, plyPath } from "@/lib/drawing/plies";
import { outlinePath } from "@/lib/drawing/outline";
import { ringSheets } from "@/lib/drawing/ring-stack";
import styles from "./section.module.css";

/** Height of the figure, and how far its edges' strokes stand out [CSS px]. */
const HEIGHT = 22;
const EDGE = 1;

/**
 * A stack of rings seen as cut, at one scale beside its neighbours in a table; decoration beside
 * words, so that screen readers pass it by.
 */
export function RingStackFigure({
  thicknesses_m,
  scale = 0.5,
}: {
  /** Each ring's thickness, from the tube inwards. */
  thicknesses_m: number[];
  /** CSS pixels per millimetre. */
  scale?: number;
}) {
  const { sheets, outlines, length } = ringSheets(thicknesses_m, (HEIGHT - 2 * EDGE) / scale);
  const transform = { scale, x: (x: number) => EDGE + x * scale, axis: HEIGHT - EDGE };
  const width = length * scale + 2 * EDGE;
  const outline = outlines.map((each) => outlinePath(each, transform, "above")).join("");
  return (
    <svg
      className={styles.svg}
      width={width}
      height={HEIGHT}
      viewBox={`0 0 ${width} ${HEIGHT}`}
      aria-hidden="true"
    >
      <path d={fillPath(sheets, transform, "above")} className={styles.plyLight} />
      <path d={plyPath(sheets, transform, "above")} className={styles.plyDark} />
      <path d={outline} className={styles.thin} />
    </svg>
  );
}
