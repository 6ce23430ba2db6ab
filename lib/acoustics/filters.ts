import type { Filter } from "@/lib/document/schema";

/** Q of the second-order sections of a filter; odd orders have a first-order section besides. */
export function sections(filter: Filter): { q: number[]; firstOrder: number } {
  if (filter.family === "resonant") return { q: [filter.q ?? Math.SQRT1_2], firstOrder: 0 };
  const butterworth = (n: number) =>
    Array.from(
      { length: Math.floor(n / 2) },
      (_, k) => 1 / (2 * Math.cos((Math.PI * (2 * k + 1 - (n % 2 === 0 ? 0 : -1))) / (2 * n))),
    );
  if (filter.family === "butterworth")
    return { q: butterworth(filter.order), firstOrder: filter.order % 2 };
  const half = filter.order / 2;
  const q = butterworth(half);
  return half % 2 === 0
    ? { q: [...q, ...q], firstOrder: 0 }
    : { q: [...q, ...q, 0.5], firstOrder: 0 };
}

/** Multiplies a complex response by the filters, in place. */
export function applyFilters(
  filters: readonly Filter[],
  w: Float64Array,
  re: Float64Array,
  im: Float64Array,
): void {
  for (const filter of filters) {
    const { q, firstOrder } = sections(filter);
    const w0 = 2 * Math.PI * filter.frequency_hz;
    const high = filter.kind === "highpass";
    for (let i = 0; i < w.length; i++) {
      const x = w[i]! / w0;
      let hr = 1,
        hi = 0;
      const multiply = (nr: number, ni: number, dr: number, di: number) => {
        const d = dr * dr + di * di;
        const gr = (nr * dr + ni * di) / d,
          gi = (ni * dr - nr * di) / d;
        const t = hr * gr - hi * gi;
        hi = hr * gi + hi * gr;
        hr = t;
      };
      for (const Q of q) multiply(high ? -x * x : 1, 0, 1 - x * x, x / Q);
      if (firstOrder) multiply(high ? 0 : 1, high ? x : 0, 1, x);
      const t = re[i]! * hr - im[i]! * hi;
      im[i] = re[i]! * hi + im[i]! * hr;
      re[i] = t;
    }
  }
}
