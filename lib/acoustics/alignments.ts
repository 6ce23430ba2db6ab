/** The standard alignments of a vented box, for any driver Q and any leakage. */
import {
  bisect,
  boxWith,
  coefficientsOf,
  cornerFrequency,
  displacementPeak,
  peakLevel,
  type BoxShape,
  type Coefficients,
} from "./alignment-response";
import { butterworthQ } from "./filters";

/** Families whose members follow the driver's Q_T, and those with one member alone. */
export type AlignmentFamily = "QB3" | "C4" | "SC4" | "SBB4";
export type FixedAlignment = "B4" | "BE4";

export interface Alignment extends BoxShape {
  family: AlignmentFamily | FixedAlignment | "B6";
  /** f_3/f_S and f_10/f_S. */
  f3: number;
  f10: number;
  peak_db: number;
  /** Largest displacement above f_B, as a share of that at zero frequency. */
  displacement: number;
}

/** a1 = a3 = √(4 + 2√2), a2 = 2 + √2: all of A1, A2, A3 vanish. */
const BUTTERWORTH: Coefficients = {
  a1: Math.sqrt(4 + 2 * Math.SQRT2),
  a2: 2 + Math.SQRT2,
  a3: Math.sqrt(4 + 2 * Math.SQRT2),
};
/** From the Bessel polynomial s⁴ + 10s³ + 45s² + 105s + 105, turned to a high-pass. */
const BESSEL: Coefficients = {
  a1: 105 ** 0.25,
  a2: 45 / Math.sqrt(105),
  a3: 10 / 105 ** 0.25,
};

function finish(family: Alignment["family"], box: BoxShape | null): Alignment | null {
  if (!box) return null;
  const coefficients = coefficientsOf(box);
  const unit = Math.sqrt(box.h);
  return {
    family,
    ...box,
    f3: unit * cornerFrequency(coefficients),
    f10: unit * cornerFrequency(coefficients, 10),
    peak_db: peakLevel(coefficients),
    displacement: displacementPeak(box),
  };
}

/**
 * The alignments with one member: Butterworth and Bessel. They fix Q_T as well.
 *
 * @source A. N. Thiele (1961, 1971), R. H. Small (1973); vented-box dossier 2.1
 * @example fixedAlignment("B4", 7) // Q_T 0.404814, α 1.061320, h 1
 */
export function fixedAlignment(family: FixedAlignment, ql: number | null): Alignment | null {
  return finish(family, boxWith(family === "B4" ? BUTTERWORTH : BESSEL, ql));
}

/**
 * Chebyshev coefficients of a k: ripple for k < 1, Butterworth at 1, below it beyond.
 *
 *     D = (k⁴ + 6k² + 1)/8,  a3 = k √(4 + 2√2) / D^¼,  a2 = (1 + k² (1 + √2)) / √D
 *     a1 = (a3/√D) (1 − (1 − k²)/(2√2))
 *
 * @source vented-box dossier 2.1
 */
export function chebyshev(k: number): Coefficients {
  const k2 = k * k;
  const D = (k2 * k2 + 6 * k2 + 1) / 8;
  const a3 = (k * BUTTERWORTH.a1) / D ** 0.25;
  return {
    a3,
    a2: (1 + k2 * (1 + Math.SQRT2)) / Math.sqrt(D),
    a1: (a3 / Math.sqrt(D)) * (1 - (1 - k2) / (2 * Math.SQRT2)),
  };
}

/**
 * Peak of a Chebyshev response above its mid-band [dB], k ≤ 1.
 *
 *     10 log10(1 + ε²),  ε² = K⁴ / (64 + 128K + 80K² + 16K³),  K = 1/k² − 1
 *
 * @source vented-box dossier 2.1 @example chebyshevPeak(0.5) // 0.21448
 */
export function chebyshevPeak(k: number): number {
  const K = 1 / (k * k) - 1;
  return 10 * Math.log10(1 + K ** 4 / (64 + 128 * K + 80 * K * K + 16 * K ** 3));
}

/**
 * The member of a family for a driver's Q_T (its source resistance included).
 *
 * @returns null where the family has none: QB3 and SC4 lie below the Q_T of B4, C4 above
 * @source QB3, C4, SC4: vented-box dossier 2.1; SBB4 as inferred there (h = 1, a squared
 * second-order high-pass)
 * @example alignmentFor("QB3", 0.3, 7) // h 1.3145, α 2.8452, f3/fS 1.5732
 */
export function alignmentFor(
  family: AlignmentFamily,
  qt: number,
  ql: number | null,
): Alignment | null {
  const butterworth = boxWith(BUTTERWORTH, ql);
  if (!butterworth || !(qt > 0)) return null;
  switch (family) {
    case "QB3":
      return qt < butterworth.qt ? finish(family, quasiButterworth(qt, ql)) : null;
    case "C4":
      return qt > butterworth.qt ? finish(family, withChebyshev(qt, ql, 0.02, 1)) : null;
    case "SC4":
      return qt < butterworth.qt ? finish(family, withChebyshev(qt, ql, 1, 1e3)) : null;
    case "SBB4": {
      const difference = 1 / qt - (ql === null ? 0 : 1 / ql);
      return difference > 0 ? finish(family, { qt, ql, h: 1, alpha: difference ** 2 / 4 }) : null;
    }
  }
}

/**
 * QB3: A1 = A2 = 0. Without leakage h = 1/(2√2 Q_T √(1 − Q_T²)); with it, the h at which
 * a2 = a1²/2 and a2² + 2 = 2 a1 a3.
 */
function quasiButterworth(qt: number, ql: number | null): BoxShape | null {
  const lossless = 1 / (2 * Math.SQRT2 * qt * Math.sqrt(1 - qt * qt));
  const sides = (h: number) => {
    const { a1, a3 } = coefficientsOf({ qt, ql, h, alpha: 0 });
    return { a1, a3, a2: (a1 * a1) / 2 };
  };
  const value = (h: number) => {
    const { a1, a2, a3 } = sides(h);
    return 2 * a1 * a3 - a2 * a2 - 2;
  };
  const h = ql === null ? lossless : bisect(value, lossless / 2, lossless * 2);
  const { a2 } = sides(h);
  const leak = ql === null ? 0 : 1 / ql;
  const alpha = h * (a2 - leak / qt) - 1 - h * h;
  return alpha > 0 ? { qt, ql, h, alpha } : null;
}

/** The box of the Chebyshev kind with a wanted Q_T; Q_T falls as k grows. */
function withChebyshev(qt: number, ql: number | null, from: number, to: number): BoxShape | null {
  const short = (logarithm: number) =>
    qt - (boxWith(chebyshev(Math.exp(logarithm)), ql)?.qt ?? Infinity);
  const low = Math.log(from);
  const high = Math.log(to);
  if (short(high) < 0 || short(low) > 0) return null;
  return boxWith(chebyshev(Math.exp(bisect(short, low, high))), ql);
}

export interface AssistedAlignment extends Alignment {
  /** Q of the electrical high-pass section that completes it, at f_3. */
  sectionQ: number;
}

/**
 * Sixth-order Butterworth: the box and one second-order high-pass, all at f_3 = f_B = f_S.
 * Class I puts the sharpest section before the amplifier, class III the dullest.
 *
 *     a1 = a3 = 1/Q_a + 1/Q_b,  a2 = 2 + 1/(Q_a Q_b)   of the two sections left to the box
 *
 * f3, f10 and the peak are those of the box alone.
 *
 * @source A. N. Thiele's three classes; vented-box dossier 7
 * @example sixthOrderButterworth(1, null) // Q_T 0.29886, α 2.7321, section Q 1.9319
 */
export function sixthOrderButterworth(
  kind: 1 | 2 | 3,
  ql: number | null,
): AssistedAlignment | null {
  const sections = butterworthQ(6);
  const sectionQ = sections[kind - 1]!;
  const [qa, qb] = sections.filter((_, i) => i !== kind - 1) as [number, number];
  const a = 1 / qa + 1 / qb;
  const box = finish("B6", boxWith({ a1: a, a2: 2 + 1 / (qa * qb), a3: a }, ql));
  return box && { ...box, sectionQ };
}
