/** Filters before the amplifier. They act on the voltage only. */
import type { Filter } from "@/lib/document/schema";
import type { Complexes } from "./coil";

export interface FilterSections {
  /** Q of each second-order section. */
  q: number[];
  /** Whether a first-order section comes with them. */
  firstOrder: boolean;
}

/**
 * Q of the second-order sections of a Butterworth filter of an order.
 *
 *     Q_k = 1 / (2 sin((2k − 1) π / (2n))),  k = 1 … ⌊n/2⌋
 *
 * @example butterworthQ(4) // [1.306563, 0.541196]
 */
export function butterworthQ(order: number): number[] {
  return Array.from(
    { length: Math.floor(order / 2) },
    (_, k) => 1 / (2 * Math.sin(((2 * k + 1) * Math.PI) / (2 * order))),
  );
}

/**
 * The sections of a filter: Butterworth 1 to 8; Linkwitz-Riley 2, 4, 6, 8 (the Butterworth of half
 * the order twice, so two first-order ones make a section of Q 0.5); one resonant section.
 *
 * @source S. Linkwitz, J. Audio Eng. Soc. 24 (1976); vented-box dossier 7
 */
export function filterSections(filter: Filter): FilterSections {
  if (filter.family === "resonant") return { q: [filter.q ?? Math.SQRT1_2], firstOrder: false };
  if (filter.family === "butterworth")
    return { q: butterworthQ(filter.order), firstOrder: filter.order % 2 === 1 };
  const half = filter.order / 2;
  const q = butterworthQ(half);
  return { q: half % 2 === 0 ? [...q, ...q] : [...q, ...q, 0.5], firstOrder: false };
}

/**
 * Complex gain of filters in a row at each frequency.
 *
 *     high-pass s² / (s² + s ω_0/Q + ω_0²),  low-pass ω_0² / (…);  first order s / (s + ω_0), ω_0 / (…)
 *
 * @param angularFrequency - ω, > 0 [rad/s]
 * @source vented-box dossier 7
 * @example BW4 at f_0/2: −24.099 dB; LR4 at f_0/2: −24.609 dB
 */
export function filterGain(filters: readonly Filter[], angularFrequency: Float64Array): Complexes {
  const n = angularFrequency.length;
  const re = new Float64Array(n).fill(1);
  const im = new Float64Array(n);
  for (const filter of filters) {
    const { q, firstOrder } = filterSections(filter);
    const corner = 2 * Math.PI * filter.frequency_hz;
    const high = filter.kind === "highpass";
    for (let i = 0; i < n; i++) {
      const x = angularFrequency[i]! / corner;
      let r = re[i]!;
      let m = im[i]!;
      // Each section divides by 1 − x² + jx/Q; the numerators are real and come at once.
      const a = 1 - x * x;
      for (let s = 0; s < q.length; s++) {
        const b = x / q[s]!;
        const d = (high ? -x * x : 1) / (a * a + b * b);
        const t = (r * a + m * b) * d;
        m = (m * a - r * b) * d;
        r = t;
      }
      if (firstOrder) {
        // 1 / (1 + jx), or jx / (1 + jx)
        const d = 1 / (1 + x * x);
        const t = high ? (r * x - m) * x * d : (r + m * x) * d;
        m = high ? (m * x + r) * x * d : (m - r * x) * d;
        r = t;
      }
      re[i] = r;
      im[i] = m;
    }
  }
  return { re, im };
}
