/** The largest clean level at each frequency, and what stands in its way. */
import type { Design, Driver } from "@/lib/document/schema";
import type { LevelLimit } from "./answer";
import { arrangement } from "./driver-array";
import type { SystemResponse } from "./system";

export interface LargestLevel {
  max_spl_db: (number | null)[];
  max_spl_limit: (LevelLimit | null)[];
}

/**
 * Level at which the first limit is reached, everything scaling with the drive.
 *
 *     L_max = L + 20 log10 min(x_max/x, v_max/v, √(P R_E)/e, e_max/e_g, i_max/i)
 *
 * - excursion: the driver's x_max, peak;
 * - air speed: the target's limit, peak, in the fastest vent;
 * - power: each driver's `power_w` counted as e²/R_E, e the rms voltage across it: the usual
 *   reference of a thermal rating. The coil's warming is not in it;
 * - voltage: the amplifier's limit after the filters;
 * - load: below the amplifier's least load its voltage falls in proportion, that is, its current
 *   stays at voltage limit / least load.
 *
 * @returns null where nothing limits
 * @source vented-box dossier 8 (System A: the table of its limits, within 0.01 dB)
 */
export function largestLevel(
  design: Design & { driver: Driver },
  response: SystemResponse,
  level_db: ArrayLike<number>,
): LargestLevel {
  const { driver, amplifier, target } = design;
  const { series, parallel } = arrangement(driver);
  const excursion = driver.xmax_m ?? Infinity;
  const speed = target.air_speed_limit_m_s ?? Infinity;
  // N drivers of P each in R_E · s/p: e² = N P R_E s/p = P R_E s².
  const thermal =
    driver.power_w === undefined
      ? Infinity
      : Math.sqrt(((driver.power_w * driver.re_ohm * series) / parallel) * driver.count);
  const voltage = amplifier?.voltage_limit_v ?? Infinity;
  const least = amplifier?.minimum_load_ohm ?? 0;
  const n = level_db.length;
  const max_spl_db = new Array<number | null>(n);
  const max_spl_limit = new Array<LevelLimit | null>(n);
  for (let i = 0; i < n; i++) {
    let scale = excursion / response.excursion[i]!;
    let name: LevelLimit = "excursion";
    for (const speeds of response.airSpeed) {
      const s = speed / speeds[i]!;
      if (s < scale) {
        scale = s;
        name = "air speed";
      }
    }
    const power = thermal / response.arrayVoltage[i]!;
    if (power < scale) {
      scale = power;
      name = "power";
    }
    const source = response.sourceVoltage[i]!;
    if (voltage / source < scale) {
      scale = voltage / source;
      name = "voltage";
    }
    const load = response.load[i]!;
    if (load < least && (voltage * load) / (least * source) < scale) {
      scale = (voltage * load) / (least * source);
      name = "load";
    }
    const limited = Number.isFinite(scale);
    max_spl_db[i] = limited ? level_db[i]! + 20 * Math.log10(scale) : null;
    max_spl_limit[i] = limited ? name : null;
  }
  return { max_spl_db, max_spl_limit };
}
