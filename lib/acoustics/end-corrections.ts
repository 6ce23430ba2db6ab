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

/** Projections p/a of a ring of wall t/a out of a wide panel, and δ/a at its mouth. */
const projections = [0.05, 0.1, 0.2, 0.3, 0.5, 1, 2, 5, 10] as const;
const projectingRings: readonly [wall: number, delta: readonly number[]][] = [
  [0, [0.796, 0.779, 0.756, 0.739, 0.717, 0.686, 0.659, 0.635, 0.625]],
  [0.05, [0.803, 0.79, 0.771, 0.756, 0.737, 0.708, 0.684, 0.661, 0.651]],
  [0.1, [0.807, 0.795, 0.778, 0.766, 0.748, 0.722, 0.698, 0.676, 0.666]],
  [0.2, [0.811, 0.802, 0.788, 0.778, 0.762, 0.74, 0.718, 0.697, 0.688]],
  [0.5, [0.816, 0.811, 0.802, 0.795, 0.785, 0.769, 0.752, 0.734, 0.725]],
];
const shareCurves = projectingRings.map(([wall, deltas]) => {
  const free = thickWall(1 + wall);
  return {
    wall,
    at: monotone(
      [0, ...projections.map((p) => Math.log1p(10 * p))],
      [1, ...deltas.map((delta) => (delta - free) / (FLANGED - free))],
    ),
  };
});
/** Last projection of the table, beyond which the share falls as 1/p. */
const FARTHEST = 10;

/**
 * How much of an infinite flange an end still feels when it stands proud of a wide panel: 1 flush,
 * 0 in free space. δ = δ_free + share · (δ_flanged − δ_free).
 *
 * @param p - projection over a, ≥ 0
 * @param t - wall of the end over a, ≥ 0; above 0.5 the projection counts against the whole radius
 * @remarks Within 0.003 a of the field-solved table it interpolates; asymptote a²/(8p).
 * @source reference notes on acoustics, 2.8 (computed with a finite-volume solution)
 */
export function flangeShare(p: number, t: number): number {
  if (p <= 0) return 1;
  const wall = Math.min(Math.max(t, 0), 0.5);
  const scaled = t > 0.5 ? (p * 1.5) / (1 + t) : p;
  const read = (curve: (x: number) => number) =>
    scaled <= FARTHEST
      ? curve(Math.log1p(10 * scaled))
      : (curve(Math.log1p(10 * FARTHEST)) * FARTHEST) / scaled;
  const above = shareCurves.findIndex((curve) => curve.wall >= wall);
  const upper = shareCurves[Math.max(1, above)]!;
  const lower = shareCurves[Math.max(1, above) - 1]!;
  const weight = (wall - lower.wall) / (upper.wall - lower.wall);
  return (1 - weight) * read(lower.at) + weight * read(upper.at);
}

/**
 * The same inside an enclosure of radius R: its side walls shut the panel off from an end that
 * stands far in.
 *
 * @param pOverR - protrusion over R, 0 where there are no side walls
 * @source own fit to the finite-element table of re-entrant pipes, within 0.008 a
 */
export function enclosedFlangeShare(p: number, t: number, pOverR: number): number {
  return flangeShare(p, t) * Math.exp(-0.5 * pOverR * pOverR);
}

/** A wall faced at x = h/a by a thin tube: what it adds to δ/a. Fit within 0.003 for 0.25 ≤ x ≤ 20. */
function thinWallIncrement(x: number): number {
  return 1 / (8 * x) + (0.2872 * x ** 0.5431) / (1 + 5.671 * x ** 2.3095);
}

/**
 * What a rigid wall facing an end adds to its correction, over a.
 *
 * The radial gap between wall and end face adds its own mass, a²/(2h) · ln of the radii it spans,
 * less where the flow has room.
 *
 * @param x - distance h/a, > 0; Infinity for none
 * @param flare - flare radius over a
 * @param body - outer radius of the end's face over a, ≥ 1 + flare
 * @remarks Within 0.01 a of the field-solved tables for 0.25 ≤ x ≤ 4.
 * @source reference notes on acoustics, 2.4; gap terms: own fit to the finite-element tables
 */
export function wallIncrement(x: number, flare = 0, body = 1 + flare): number {
  if (!Number.isFinite(x)) return 0;
  const near = Math.max(x, 0.02);
  const lip = 1 + flare;
  const gap = (Math.log(lip) / (2 * near)) * (0.302 / (1 + 1.055 * near));
  const face = Math.log(Math.max(1, body / lip)) / (2 * near) / (1 + (1.6 * near) / lip);
  return thinWallIncrement(near) + gap + face;
}

/**
 * The same in an enclosure of radius R: side walls already turn the flow, so a facing wall adds less.
 *
 * @param x - h/a
 * @param radius - R/a; Infinity for no side walls
 * @source own fit to the closed-cylinder table of reference notes 2.4, within 0.008 a
 */
export function enclosedWallIncrement(
  x: number,
  radius: number,
  flare: number,
  body: number,
): number {
  const open = wallIncrement(x, flare, body);
  if (!Number.isFinite(radius) || open === 0) return open;
  const share = x / radius;
  // Beyond half a radius the duct has levelled the flow and the wall is no longer felt.
  const felt = 1 / (1 + (share / 0.55) ** 8);
  return felt * Math.max(0, open - (0.62 / radius) * Math.exp(-1.2 * share - share * share));
}

/**
 * Plane part of the enclosure's air over a: the flow that fills the volume evenly before and behind
 * the mouth, and the turn of what flows back.
 *
 *     (S/3V²)(S_B h³ + (S_B − S_o) p³) / a + 1.35 (1 − 0.74 a/R)(a/R)² · share flowing back
 *
 * @param R - enclosure radius over a
 * @param h - inner mouth to facing wall over a
 * @param p - protrusion over a
 * @param body - outer radius of the vent over a
 * @source energy of linearly decaying flow; the turn: own fit to the finite-element table of pipes in a finite cavity, within 0.006 a
 */
export function planeAir(R: number, h: number, p: number, body: number): number {
  const annulus = Math.max(0.05 * R * R, R * R - body * body);
  const volume = R * R * h + annulus * p;
  if (volume <= 0) return 0;
  const plane = (R * R * h ** 3 + annulus * p ** 3) / (3 * volume * volume);
  const back = (annulus * p) / volume;
  return plane + 1.35 * Math.max(0, 1 - 0.74 / R) * back * (1 / (R * R));
}

/** True rectangular duct, flanged: δ/√S by aspect ≥ 1. */
export function rectangle(aspect: number): number {
  const g = Math.log(Math.max(aspect, 1 / aspect));
  return 0.4571 / (1 + (0.05364 * g * g) / (1 - 0.04157 * g));
}
