/**
 * Where a direct label stands: on its own curve, as far as possible from all others and from the
 * labels already set.
 */

export interface LabelledCurve {
  text: string;
  /** [px] at each of the shared positions; null where the curve is not in the plot. */
  y: readonly (number | null)[];
}

export interface PlacedLabel {
  text: string;
  x: number;
  y: number;
}

export interface LabelBox {
  top: number;
  bottom: number;
  left: number;
  right: number;
  /** Advance of one letter [px]. */
  letter: number;
  /** Height of a line of lettering [px]. */
  line: number;
}

/**
 * Places one label per curve, the first curves choosing first.
 *
 * @param x - shared positions [px], ascending
 * @param curves - those that want a label
 * @param obstacles - other curves to keep clear of
 * @returns one place per curve that has one; the text's middle stands at x, its baseline at y
 */
export function placeLabels(
  x: readonly number[],
  curves: readonly LabelledCurve[],
  obstacles: readonly (readonly (number | null)[])[],
  box: LabelBox,
): PlacedLabel[] {
  const placed: PlacedLabel[] = [];
  for (const curve of curves) {
    const half = (curve.text.length * box.letter) / 2;
    const labelled = curves.filter((other) => other !== curve).map((other) => other.y);
    const others = [...obstacles, ...labelled];
    let best: (PlacedLabel & { score: number }) | null = null;
    for (let i = 0; i < x.length; i++) {
      const at = x[i] ?? 0;
      const on = curve.y[i];
      if (on === null || on === undefined) continue;
      if (at - half < box.left || at + half > box.right) continue;
      for (const side of [-1, 1] as const) {
        const middle = on + side * (box.line * 0.5 + 4);
        if (middle - box.line / 2 < box.top || middle + box.line / 2 > box.bottom) continue;
        const clear = Math.min(
          clearance(x, others, at, half, middle),
          clearance(x, [curve.y], at, half, middle),
          ...placed.map((label) =>
            apart(label, at, middle, half + (label.text.length * box.letter) / 2, box.line),
          ),
        );
        // A label must also say which curve it means: where curves run together, it cannot.
        const alone = Math.min(...labelled.map((y) => Math.abs((y[i] ?? Infinity) - on)));
        // Beyond a line of room, more is no better: then the place further right wins.
        const score = 2 * (Math.min(clear, box.line) + Math.min(alone, box.line)) + at / 2000;
        if (!best || score > best.score) best = { text: curve.text, x: at, y: middle + 4, score };
      }
    }
    if (best) placed.push({ text: best.text, x: best.x, y: best.y });
  }
  return placed;
}

/** Least vertical distance from a label's middle line to any curve over the label's width. */
function clearance(
  x: readonly number[],
  curves: readonly (readonly (number | null)[])[],
  at: number,
  half: number,
  middle: number,
): number {
  let least = Infinity;
  for (let i = 0; i < x.length; i++) {
    if (Math.abs((x[i] ?? 0) - at) > half) continue;
    for (const curve of curves) {
      const y = curve[i];
      if (y !== null && y !== undefined) least = Math.min(least, Math.abs(y - middle));
    }
  }
  return least;
}

function apart(label: PlacedLabel, at: number, middle: number, width: number, line: number) {
  const free = Math.abs(label.x - at) - width;
  return free > 6 ? Infinity : Math.abs(label.y - 4 - middle) - line * 0.6;
}
