/** The greatest air speed in each vent over frequency. */
import { logarithmicFrequencies, USUAL_FREQUENCIES } from "./curves";
import type { System } from "./system";

export interface PeakSpeed {
  speed_m_s: number;
  frequency_hz: number;
}

/** Golden section: the share of a bracket kept at each step. */
const GOLDEN = (Math.sqrt(5) - 1) / 2;
const STEPS = 12;

/** Frequencies among which the peak is looked for: the usual ones, or around a tuning far outside them. */
export function searchFrequencies(tuning_hz: number): Float64Array {
  const usual = tuning_hz >= 25 && tuning_hz <= 200;
  return usual
    ? USUAL_FREQUENCIES
    : logarithmicFrequencies(400, Math.min(10, tuning_hz / 3), Math.max(500, tuning_hz * 3));
}

/**
 * Refines the largest of sampled speeds by golden section in the logarithm of frequency, between
 * the samples beside it, for every vent.
 *
 * @remarks The peak of voltage drive lies below the tuning, not at it (vented-box dossier 1.3).
 */
export function peakSpeeds(
  system: System,
  frequency_hz: ArrayLike<number>,
  speeds: readonly ArrayLike<number>[],
): PeakSpeed[] {
  return speeds.map((speed, vent) => {
    let top = 0;
    for (let i = 1; i < speed.length; i++) if (speed[i]! > speed[top]!) top = i;
    const sampled = { speed_m_s: speed[top]!, frequency_hz: frequency_hz[top]! };
    if (top === 0 || top === speed.length - 1) return sampled;
    const found = refine(system, vent, frequency_hz[top - 1]!, frequency_hz[top + 1]!);
    return found.speed_m_s > sampled.speed_m_s ? found : sampled;
  });
}

function refine(system: System, vent: number, from_hz: number, to_hz: number): PeakSpeed {
  const omega = new Float64Array(1);
  const at = (logarithm: number) => {
    omega[0] = 2 * Math.PI * Math.exp(logarithm);
    return system.respond(omega).airSpeed[vent]![0]!;
  };
  let low = Math.log(from_hz);
  let high = Math.log(to_hz);
  let left = high - GOLDEN * (high - low);
  let right = low + GOLDEN * (high - low);
  let atLeft = at(left);
  let atRight = at(right);
  for (let step = 0; step < STEPS; step++) {
    if (atLeft > atRight) {
      high = right;
      right = left;
      atRight = atLeft;
      left = high - GOLDEN * (high - low);
      atLeft = at(left);
    } else {
      low = left;
      left = right;
      atLeft = atRight;
      right = low + GOLDEN * (high - low);
      atRight = at(right);
    }
  }
  const best = atLeft > atRight ? left : right;
  return { speed_m_s: Math.max(atLeft, atRight), frequency_hz: Math.exp(best) };
}
