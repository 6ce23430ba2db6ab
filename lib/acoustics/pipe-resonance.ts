/** Pipe resonances: the vent sounding like an organ pipe, open at both ends. */
import type { VentParts } from "./vent-parts";

/**
 * The first pipe resonances [Hz]: zeros of the lossless line with its lumped ends, the enclosure
 * taken as open.
 *
 * A wave is then about as short as the box, so the box no longer narrows the flow evenly and the
 * inner end stands as in free space.
 *
 * @param speedOfSound - c [m/s]
 * @remarks Within 2 % of four field-solved resonators, ka < 1.2; radiation lowers the true ones a little.
 * @source own composition; checked in tests/reference/resonators
 */
export function pipeResonances(parts: VentParts, speedOfSound: number, count = 3): number[] {
  const { boreRadius_m: a } = parts.airway;
  const lumps = parts.outerLump + parts.openInnerLump;
  const static_m = parts.lines.reduce(
    (sum, line) => sum + (line.length * a * a) / (line.radius * line.radius),
    lumps,
  );
  const found: number[] = [];
  for (let mode = 1; mode <= count; mode++) {
    const k = resonance(parts, (mode * Math.PI) / static_m, mode);
    if (k === null) break;
    found.push((k * speedOfSound) / (2 * Math.PI));
  }
  return found;
}

/** The wave number of a mode [1/m], by false position from where the static length puts it; null where none is found. */
function resonance(parts: VentParts, guess: number, mode: number): number | null {
  const sign = mode % 2 === 1 ? 1 : -1;
  const value = (k: number) => sign * pressureAtInnerEnd(parts, k);
  let low = guess * (mode === 1 ? 0.8 : 0.92);
  let high = guess * 1.15;
  let below = value(low);
  let above = value(high);
  for (let step = 0; step < 12 && above > 0; step++) {
    low = high;
    below = above;
    high *= 1.08;
    above = value(high);
  }
  for (let step = 0; step < 12 && below <= 0; step++) {
    high = low;
    above = below;
    low *= 0.92;
    below = value(low);
  }
  if (!(below > 0) || !(above <= 0)) return null;
  for (let step = 0; step < 40 && high - low > 1e-6 * high; step++) {
    const share = below / (below - above);
    const middle = low + (high - low) * Math.min(0.98, Math.max(0.02, share));
    const there = value(middle);
    if (there > 0) {
      low = middle;
      below = there;
      above *= 0.6;
    } else {
      high = middle;
      above = there;
      below *= 0.6;
    }
    if (there === 0) return middle;
  }
  return (low + high) / 2;
}

/** Pressure at the inner end for unit flow at the outer mouth, in ρc/S, without its j. */
function pressureAtInnerEnd(parts: VentParts, k: number): number {
  const { boreRadius_m: a } = parts.airway;
  let pressure = k * parts.outerLump;
  let flow = 1;
  for (const { length, radius } of parts.lines) {
    const area = (radius / a) ** 2;
    const cos = Math.cos(k * length);
    const sin = Math.sin(k * length);
    const next = pressure * cos + (flow * sin) / area;
    flow = flow * cos - pressure * sin * area;
    pressure = next;
  }
  return pressure + flow * k * parts.openInnerLump;
}
