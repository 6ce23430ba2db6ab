/**
 * Scales as plain data: a domain in the unit of the quantity, a range in pixels, and the two maps
 * between them. Recharts is given the same domains and the same plot box, so a path written by
 * hand and a line drawn by recharts fall on each other to the pixel.
 */

export type Domain = readonly [low: number, high: number];

export interface Scale {
  readonly domain: Domain;
  /** [px] at the low and at the high end of the domain. */
  readonly range: readonly [number, number];
  /** Value → [px]; values outside the domain fall outside the range. */
  toPixel: (value: number) => number;
  /** [px] → value. */
  toValue: (pixel: number) => number;
}

/** p = p₀ + (v − v₀) (p₁ − p₀) / (v₁ − v₀). */
export function linearScale(domain: Domain, range: readonly [number, number]): Scale {
  const gain = (range[1] - range[0]) / (domain[1] - domain[0] || 1);
  return {
    domain,
    range,
    toPixel: (value) => range[0] + (value - domain[0]) * gain,
    toValue: (pixel) => domain[0] + (pixel - range[0]) / (gain || 1),
  };
}

/** p = p₀ + ln(v / v₀) (p₁ − p₀) / ln(v₁ / v₀); domain and values > 0. */
export function logScale(domain: Domain, range: readonly [number, number]): Scale {
  const start = Math.log(domain[0]);
  const gain = (range[1] - range[0]) / (Math.log(domain[1]) - start || 1);
  return {
    domain,
    range,
    toPixel: (value) => range[0] + (Math.log(value) - start) * gain,
    toValue: (pixel) => Math.exp(start + (pixel - range[0]) / (gain || 1)),
  };
}

/**
 * A linear scale from SI values straight to pixels: p = offset + gain · value. The factor from SI
 * to the shown unit is folded in, so nothing is converted while a hand drags.
 */
export interface PixelMap {
  readonly offset: number;
  readonly gain: number;
  /** Edges of the plot [px], top < bottom. */
  readonly top: number;
  readonly bottom: number;
}

/** @param factor - shown unit per SI unit; the scale's domain is in the shown unit. */
export function pixelMap(scale: Scale, factor: number): PixelMap {
  const perUnit = (scale.range[1] - scale.range[0]) / (scale.domain[1] - scale.domain[0] || 1);
  return {
    offset: scale.range[0] - scale.domain[0] * perUnit,
    gain: perUnit * factor,
    top: Math.min(scale.range[0], scale.range[1]),
    bottom: Math.max(scale.range[0], scale.range[1]),
  };
}
