/** The voice coil's impedance while it is held still. */
import type { Driver } from "@/lib/document/schema";

export interface Complexes {
  re: Float64Array;
  im: Float64Array;
}

export type Coil = Pick<Driver, "re_ohm" | "le_h" | "l2_h" | "r2_ohm" | "semi_inductance">;

/**
 * Blocked impedance of a voice coil, all parts in series [Ω].
 *
 *     Z_E = R_E + jω L_E + (R_2 ∥ jω L_2) + K (jω)ⁿ
 *     K (jω)ⁿ = K ωⁿ (cos(nπ/2) + j sin(nπ/2))
 *
 * @param angularFrequency - ω, > 0 [rad/s]
 * @param scale - s/p of an array of s in series, p in parallel [1]
 * @source semi-inductance: W. M. Leach Jr., J. Audio Eng. Soc. 50 (2002); vented-box dossier 3.1
 * @example K 0.02, n 0.7 at 100 Hz: 0.825663 + j1.620454 Ω beside R_E
 */
export function coilImpedance(coil: Coil, angularFrequency: Float64Array, scale = 1): Complexes {
  const n = angularFrequency.length;
  const re = new Float64Array(n);
  const im = new Float64Array(n);
  const inductance = coil.le_h ?? 0;
  const pair = (coil.l2_h ?? 0) > 0 && (coil.r2_ohm ?? 0) > 0;
  const l2 = coil.l2_h ?? 0;
  const r2 = coil.r2_ohm ?? 0;
  const { k, n: exponent } = coil.semi_inductance ?? { k: 0, n: 1 };
  const cosine = k * Math.cos((exponent * Math.PI) / 2);
  const sine = k * Math.sin((exponent * Math.PI) / 2);
  for (let i = 0; i < n; i++) {
    const omega = angularFrequency[i]!;
    let r = coil.re_ohm;
    let x = omega * inductance;
    if (pair) {
      const x2 = omega * l2;
      const d = r2 * r2 + x2 * x2;
      r += (r2 * x2 * x2) / d;
      x += (r2 * r2 * x2) / d;
    }
    if (k > 0) {
      const power = omega ** exponent;
      r += cosine * power;
      x += sine * power;
    }
    re[i] = scale * r;
    im[i] = scale * x;
  }
  return { re, im };
}
