/** The contract's curves from the circuit's response. */
import type { Design, Driver } from "@/lib/document/schema";
import type { Curves } from "./answer";
import { REFERENCE_PRESSURE } from "./driver";
import { largestLevel } from "./limits";
import type { System, SystemResponse } from "./system";
import type { AirProperties } from "./vent-model";

/** Step of the group delay's difference, relative. */
const STEP = 1e-6;

/** n frequencies from low to high, evenly spaced in their logarithm. */
export function logarithmicFrequencies(n: number, low: number, high: number): Float64Array {
  return Float64Array.from({ length: n }, (_, i) =>
    i === n - 1 ? high : low * (high / low) ** (i / (n - 1)),
  );
}

/** Where `evaluate` answers unless told otherwise: 400 points, 10 to 500 Hz. */
export const USUAL_FREQUENCIES = logarithmicFrequencies(400, 10, 500);

/**
 * Group delay of the pressure without its path [s].
 *
 *     τ = −dφ/dω,  φ = arg(jω U_0)
 *
 * taken between ω and ω (1 + 10⁻⁶) as the angle between two phasors, so neither the caller's
 * spacing nor the phase's jumps enter. Rounding costs under a nanosecond above 1 Hz.
 *
 * @source vented-box dossier 9 (B4 at 30 Hz: 19.605 ms)
 */
export function groupDelay(
  angularFrequency: Float64Array,
  at: SystemResponse,
  ahead: SystemResponse,
): number[] {
  const n = angularFrequency.length;
  const delay = new Array<number>(n);
  for (let i = 0; i < n; i++) {
    const aRe = at.volumeRe[i]!;
    const aIm = at.volumeIm[i]!;
    const bRe = ahead.volumeRe[i]!;
    const bIm = ahead.volumeIm[i]!;
    const turn = Math.atan2(bIm * aRe - bRe * aIm, bRe * aRe + bIm * aIm);
    delay[i] = -turn / (STEP * angularFrequency[i]!);
  }
  return delay;
}

/** All curves at the given frequencies, of a drive that is not zero. */
export function curvesOf(
  design: Design & { driver: Driver },
  air: AirProperties,
  system: System,
  frequency_hz: Float64Array,
): Curves {
  const n = frequency_hz.length;
  const omega = new Float64Array(n);
  const next = new Float64Array(n);
  for (let i = 0; i < n; i++) {
    omega[i] = 2 * Math.PI * frequency_hz[i]!;
    next[i] = omega[i]! * (1 + STEP);
  }
  const response = system.respond(omega);
  const spl = new Array<number>(n);
  const phase = new Array<number>(n);
  const impedance = new Array<number>(n);
  const impedancePhase = new Array<number>(n);
  const toPressure = air.density / (2 * Math.PI * REFERENCE_PRESSURE);
  for (let i = 0; i < n; i++) {
    const qRe = response.volumeRe[i]!;
    const qIm = response.volumeIm[i]!;
    spl[i] = 20 * Math.log10(omega[i]! * toPressure * Math.sqrt(qRe * qRe + qIm * qIm));
    phase[i] = (Math.atan2(qRe, -qIm) * 180) / Math.PI;
    const zRe = response.impedanceRe[i]!;
    const zIm = response.impedanceIm[i]!;
    impedance[i] = Math.sqrt(zRe * zRe + zIm * zIm);
    impedancePhase[i] = (Math.atan2(zIm, zRe) * 180) / Math.PI;
  }
  return {
    frequency_hz: Array.from(frequency_hz),
    spl_db: spl,
    phase_deg: phase,
    group_delay_s: groupDelay(omega, response, system.respond(next)),
    excursion_peak_m: Array.from(response.excursion),
    impedance_ohm: impedance,
    impedance_phase_deg: impedancePhase,
    air_speed_peak_m_s: response.airSpeed.map((speeds) => Array.from(speeds)),
    ...largestLevel(design, response, spl),
  };
}
