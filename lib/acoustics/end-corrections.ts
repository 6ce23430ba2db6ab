/** End corrections of round openings, as multiples of the bore radius a. */

/** Infinite flange: 0.821674 (Galerkin and two field solvers agree). */
export const FLANGED = 0.821674;
/** Free, infinitely thin wall: 0.612701 (Levine-Schwinger integral, re-evaluated). */
export const FREE = 0.612701;

/** Monotone cubic (Fritsch-Carlson) through a table. */
export function monotone(xs: readonly number[], ys: readonly number[]) {
  const n = xs.length;
  const d = xs.slice(1).map((x, i) => (ys[i + 1]! - ys[i]!) / (x - xs[i]!));
  const m = xs.map((_, i) => {
    if (i === 0) return d[0]!;
    if (i === n - 1) return d[n - 2]!;
    const [p, q] = [d[i - 1]!, d[i]!];
    if (p * q <= 0) return 0;
    const [h0, h1] = [xs[i]! - xs[i - 1]!, xs[i + 1]! - xs[i]!];
    const [w0, w1] = [2 * h1 + h0, h1 + 2 * h0];
    return (w0 + w1) / (w0 / p + w1 / q);
  });
  return (x: number): number => {
    if (x <= xs[0]!) return ys[0]!;
    if (x >= xs[n - 1]!) return ys[n - 1]!;
    let i = 0;
    while (x > xs[i + 1]!) i++;
    const h = xs[i + 1]! - xs[i]!;
    const t = (x - xs[i]!) / h;
    return (
      (1 + 2 * t) * (1 - t) ** 2 * ys[i]! +
      t * (1 - t) ** 2 * h * m[i]! +
      t * t * (3 - 2 * t) * ys[i + 1]! +
      t * t * (t - 1) * h * m[i + 1]!
    );
  };
}

const wallTable: [number, number][] = [
  [1, FREE],
  [1.0001, 0.612851],
  [1.001, 0.613834],
  [1.01, 0.620404],
  [1.02, 0.62593],
  [1.05, 0.638678],
  [1.06, 0.64221],
  [1.1, 0.654251],
  [1.2, 0.676087],
  [1.25, 0.684438],
  [1.5, 0.71348],
  [1.6, 0.721576],
  [2, 0.74409],
  [3, 0.771377],
  [5, 0.791894],
  [10, 0.8066],
  [20, 0.8141],
  [1e9, FLANGED],
];
const wallCurve = monotone(
  wallTable.map(([b]) => Math.sqrt(1 - 1 / b)),
  wallTable.map(([, y]) => y),
);
/** Square-cut thick wall of outer radius b·a in free space. */
export const thickWall = (b: number): number => wallCurve(Math.sqrt(Math.max(0, 1 - 1 / b)));

/** Quarter-circle flare flush in a baffle, from the tangent point; x = r/a. */
const flushCurve = monotone(
  [0, 0.05, 0.1, 0.2, 0.25, 0.3, 0.5, 0.75, 1, 1.5, 2, 3, 4],
  [
    FLANGED,
    0.863,
    0.9006,
    0.969,
    1.00063,
    1.031,
    1.14479,
    1.2717,
    1.38679,
    1.59219,
    1.77412,
    2.091,
    2.366,
  ],
);
export const flushFlare = (x: number): number =>
  x <= 4 ? flushCurve(x) : FLANGED + (0.9182 * x) / (1 + 0.6261 * x ** 0.5693);

const freeCurve = monotone(
  [0, 0.1, 0.25, 0.5, 0.75, 1, 1.5, 2, 3],
  [FREE, 0.7195, 0.8469, 1.0203, 1.1667, 1.2958, 1.5202, 1.7146, 2.047],
);
export const freeFlare = (x: number): number =>
  x <= 3 ? freeCurve(x) : FREE + (1.4135 * x) / (1 + 1.071 * x ** 0.556) + 0.003;

/** Flare of x = r/a whose lip ends at radius 1 + x in a body of outer radius b (all over a). */
export function flareInBody(x: number, b: number): number {
  const lip = 1 + x;
  const share = (thickWall(Math.max(1, b / lip)) - FREE) / (FLANGED - FREE);
  return freeFlare(x) + (flushFlare(x) - freeFlare(x)) * share;
}

/** 1 − H(ξ) of a flush opening in a wall of finite area. */
export const flushReduction = (xi: number): number =>
  1.343 * xi - 0.2452 * xi ** 3 - 0.0968 * xi ** 5;

const protrudingCurve = monotone(
  [0, 1 / 15, 0.1, 0.125, 1 / 6, 0.2, 0.25, 1 / 3, 0.4, 0.5, 1 / 1.5, 1],
  [0, 0.0387, 0.0597, 0.0767, 0.1047, 0.1287, 0.1647, 0.2277, 0.2777, 0.3537, 0.4717, FREE],
);
/** What the enclosure's cross-section takes off an end that stands p·R into it, in a. */
export function boxReduction(xi: number, pOverR: number): number {
  const flush = FLANGED * flushReduction(Math.min(xi, 0.95));
  const far = protrudingCurve(Math.min(xi, 1));
  return far + (flush - far) / (1 + 1.6 * pOverR + 2.2 * pOverR ** 2);
}

/** Projection of an end by p out of a wide panel, as the share of the flange still felt. */
export const flangeShare = (p: number): number =>
  p <= 0 ? 1 : 1 / (1 + 2.6 * p ** 0.72 * (1 + 0.35 * p) ** 0.45);

/** A wall faced at x = h/a, thin tube: what it adds. */
export const wallIncrement = (x: number): number =>
  !Number.isFinite(x) ? 0 : 1 / (8 * x) + (0.2872 * x ** 0.5431) / (1 + 5.671 * x ** 2.3095);

/** True rectangular duct, flanged: δ/√S by aspect ≥ 1. */
export function rectangle(aspect: number): number {
  const g = Math.log(Math.max(aspect, 1 / aspect));
  return 0.4571 / (1 + (0.05364 * g * g) / (1 - 0.04157 * g));
}
