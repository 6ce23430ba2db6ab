/**
 * Paths from arrays, fast enough to be rewritten at every move of a hand: x positions are turned
 * into text once per axis, values go to pixels by one multiplication, and what lies outside the
 * plot is cut at its edge.
 */
import type { PixelMap, Scale } from "./scale";

export interface CurveTracer {
  /** Path data of one curve; "" where nothing of it is inside the plot. */
  trace: (values: ArrayLike<number | null>, map: PixelMap) => string;
}

/** Points of one path at the most, not counting turning points. */
export const PATH_POINTS = 250;

const round = (pixel: number) => Math.round(pixel * 100) / 100;

/**
 * Prepares an axis for tracing.
 *
 * Of more than `points` positions an even choice is taken; turning points of the curve are always
 * kept, so that a narrow peak or dip keeps its height.
 *
 * @param at - ascending positions, in the unit of the scale's domain; those outside it are left out
 */
export function curveTracer(at: ArrayLike<number>, x: Scale, points = PATH_POINTS): CurveTracer {
  const left = Math.min(x.range[0], x.range[1]) - 0.01;
  const right = Math.max(x.range[0], x.range[1]) + 0.01;
  const pixels = new Float64Array(at.length);
  const texts: string[] = [];
  let first = at.length;
  let last = -1;
  for (let i = 0; i < at.length; i++) {
    const pixel = x.toPixel(at[i] ?? NaN);
    pixels[i] = pixel;
    texts.push(String(round(pixel)));
    if (pixel >= left && pixel <= right) {
      first = Math.min(first, i);
      last = i;
    }
  }
  const kept = new Uint8Array(at.length);
  const stride = Math.max(1, (last - first) / Math.max(1, points - 1));
  for (let n = 0; first + n * stride <= last + 1e-6; n++) kept[Math.round(first + n * stride)] = 1;
  if (last >= 0) kept[last] = 1;

  const trace = (values: ArrayLike<number | null>, map: PixelMap): string => {
    let path = "";
    /** Whether the last point drawn is the one before. */
    let drawing = false;
    let before = -1;
    let yBefore = NaN;
    for (let i = first; i <= last; i++) {
      const value = values[i];
      if (value === null || value === undefined || !(Math.abs(value) < Infinity)) {
        drawing = false;
        before = -1;
        continue;
      }
      if (!kept[i] && !turns(values, i)) continue;
      const y = map.offset + map.gain * value;
      const inside = y >= map.top && y <= map.bottom;
      if (before >= 0 && (!drawing || !inside)) {
        const cut = cutSegment(pixels[before] ?? 0, yBefore, pixels[i] ?? 0, y, map);
        if (cut) path += (drawing ? "" : "M" + cut.from) + "L" + cut.to;
        else if (inside) path += "M" + texts[i] + " " + round(y);
      } else if (inside) {
        path += (drawing ? "L" : "M") + texts[i] + " " + round(y);
      }
      drawing = inside;
      before = i;
      yBefore = y;
    }
    return path;
  };
  return { trace };
}

function turns(values: ArrayLike<number | null>, index: number): boolean {
  const left = values[index - 1];
  const here = values[index];
  const right = values[index + 1];
  if (left === null || left === undefined || right === null || right === undefined) return true;
  return here === null || here === undefined || (here - left) * (right - here) <= 0;
}

/** The part of a segment between the plot's top and bottom edge, as two points in path notation. */
function cutSegment(x0: number, y0: number, x1: number, y1: number, map: PixelMap) {
  const dy = y1 - y0;
  let from = 0;
  let to = 1;
  if (dy === 0) {
    if (y0 < map.top || y0 > map.bottom) return null;
  } else {
    const a = (map.top - y0) / dy;
    const b = (map.bottom - y0) / dy;
    from = Math.max(0, Math.min(a, b));
    to = Math.min(1, Math.max(a, b));
    if (from >= to) return null;
  }
  const point = (t: number) => `${round(x0 + t * (x1 - x0))} ${round(y0 + t * dy)}`;
  return { from: point(from), to: point(to) };
}
