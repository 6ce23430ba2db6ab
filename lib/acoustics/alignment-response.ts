/**
 * The response of a driver on a vented box with leakage, in normalised form:
 *
 *     G = s⁴ / (s⁴ + a1 s³ + a2 s² + a3 s + 1),  s in units of ω_0 = √(ω_S ω_B)
 *
 * Mind the order: a1 belongs to s³ of the high-pass. Low-pass tables list them the other way round.
 */

/** Small's parameters of a box: h = f_B/f_S, α = V_AS/V_B; no leakage is `ql` null. */
export interface BoxShape {
  qt: number;
  ql: number | null;
  h: number;
  alpha: number;
}

export interface Coefficients {
  a1: number;
  a2: number;
  a3: number;
}

const inverse = (ql: number | null) => (ql === null ? 0 : 1 / ql);

/**
 * Coefficients of the high-pass from the box.
 *
 *     a1 = 1/(√h Q_T) + √h/Q_L,  a2 = (α + 1 + h²)/h + 1/(Q_L Q_T),  a3 = √h/Q_T + 1/(√h Q_L)
 *
 * @source R. H. Small, J. Audio Eng. Soc. 21 (1973), Part I; vented-box dossier 1.1
 * @example System A lossless: 2.62202, 3.30779, 2.88422
 */
export function coefficientsOf({ qt, ql, h, alpha }: BoxShape): Coefficients {
  const r = Math.sqrt(h);
  const leak = inverse(ql);
  return {
    a1: 1 / (r * qt) + r * leak,
    a2: (alpha + 1 + h * h) / h + leak / qt,
    a3: r / qt + leak / r,
  };
}

/**
 * The box that has given coefficients.
 *
 *     r⁴/Q_L − a1 r³ + a3 r − 1/Q_L = 0,  r = √h
 *     1/Q_T = r (a1 − r/Q_L),  α = h (a2 − 1/(Q_L Q_T)) − 1 − h²
 *
 * @returns null where no box with a positive Q_T and α has them
 * @source vented-box dossier 1.1
 */
export function boxWith({ a1, a2, a3 }: Coefficients, ql: number | null): BoxShape | null {
  const leak = inverse(ql);
  let r = Math.sqrt(a3 / a1);
  for (let step = 0; step < 60; step++) {
    const value = leak * r ** 4 - a1 * r ** 3 + a3 * r - leak;
    const slope = 4 * leak * r ** 3 - 3 * a1 * r * r + a3;
    const next = r - value / slope;
    const settled = Math.abs(next - r) < 1e-15 * r;
    r = next;
    if (settled) break;
  }
  const h = r * r;
  const inverseQ = r * (a1 - r * leak);
  const alpha = h * (a2 - leak * inverseQ) - 1 - h * h;
  if (!(h > 0 && inverseQ > 0 && alpha > 0)) return null;
  return { qt: 1 / inverseQ, ql, h, alpha };
}

/** A1, A2, A3 of |G|² = ω⁸ / (ω⁸ + A1 ω⁶ + A2 ω⁴ + A3 ω² + 1). */
export function squaredCoefficients({ a1, a2, a3 }: Coefficients): [number, number, number] {
  return [a1 * a1 - 2 * a2, a2 * a2 + 2 - 2 * a1 * a3, a3 * a3 - 2 * a2];
}

/**
 * Frequency, in units of f_0, below which the response stays a number of decibels down.
 *
 *     (10^(L/10) − 1) d⁴ − A1 d³ − A2 d² − A3 d − 1 = 0,  d = (f/f_0)²; its largest root
 *
 * @source vented-box dossier 2.1
 */
export function cornerFrequency(coefficients: Coefficients, drop_db = 10 * Math.log10(2)): number {
  const [A1, A2, A3] = squaredCoefficients(coefficients);
  const lead = 10 ** (drop_db / 10) - 1;
  const value = (d: number) => (((lead * d - A1) * d - A2) * d - A3) * d - 1;
  let high = 1 + Math.max(Math.abs(A1), Math.abs(A2), Math.abs(A3), 1) / lead; // Cauchy's bound
  let low = high;
  while (value(low) > 0 && low > 1e-12) {
    high = low;
    low /= 1.05;
  }
  return Math.sqrt(bisect(value, low, high));
}

/**
 * Highest point of the response above its level far above the corner [dB]; 0 where there is none.
 *
 * With y = (f_0/f)²: the smallest 1 + A1 y + A2 y² + A3 y³ + y⁴ over y > 0.
 */
export function peakLevel(coefficients: Coefficients): number {
  const [A1, A2, A3] = squaredCoefficients(coefficients);
  const value = (y: number) => (((y + A3) * y + A2) * y + A1) * y + 1;
  const slope = (y: number) => ((4 * y + 3 * A3) * y + 2 * A2) * y + A1;
  let least = 1;
  let before = slope(1e-4);
  for (let y = 1e-4; y < 1e4; y *= 1.1) {
    const after = slope(y * 1.1);
    if (before < 0 && after >= 0) least = Math.min(least, value(bisect(slope, y, y * 1.1)));
    before = after;
  }
  return least < 1 ? -10 * Math.log10(least) : 0;
}

/**
 * Largest displacement above f_B, as a share of that at zero frequency.
 *
 *     |X| = |1 − ω²/h² + jω/(h Q_L)| / |D|,  ω in units of ω_S
 *
 * @source vented-box dossier 1.1, 1.5
 */
export function displacementPeak(box: BoxShape): number {
  const { a1, a2, a3 } = coefficientsOf(box);
  const leak = inverse(box.ql);
  const r = Math.sqrt(box.h);
  const squared = (logarithm: number) => {
    const omega = Math.exp(logarithm);
    const b = omega / box.h;
    const w = omega / r;
    const up = (1 - b * b) ** 2 + (b * leak) ** 2;
    const down = (w ** 4 - a2 * w * w + 1) ** 2 + (a3 * w - a1 * w ** 3) ** 2;
    return up / down;
  };
  const start = Math.log(box.h);
  let top = start;
  for (let step = 0; step <= 400; step++) {
    const at = start + step * 0.01;
    if (squared(at) > squared(top)) top = at;
  }
  const slope = (at: number) => squared(at - 1e-5) - squared(at + 1e-5);
  return Math.sqrt(squared(top > start ? bisect(slope, top - 0.01, top + 0.01) : top));
}

/** Root of a function that is negative at `low` and positive at `high`. */
export function bisect(value: (x: number) => number, low: number, high: number): number {
  for (let step = 0; step < 200; step++) {
    const middle = (low + high) / 2;
    if (middle === low || middle === high) return middle;
    if (value(middle) < 0) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}
