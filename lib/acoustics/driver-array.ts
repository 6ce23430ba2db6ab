/** Several identical drivers on one enclosure, wired as one. */
import type { Driver } from "@/lib/document/schema";
import { seriesPerString } from "@/lib/document/series-parallel";
import type { Mechanical } from "./driver";

/** Drivers in series in each string, and strings in parallel. */
export function arrangement(driver: Pick<Driver, "count" | "wiring">): {
  series: number;
  parallel: number;
} {
  if (driver.wiring === "series") return { series: driver.count, parallel: 1 };
  if (driver.wiring === "parallel") return { series: 1, parallel: driver.count };
  const series = seriesPerString(driver.count) ?? 1;
  return { series, parallel: driver.count / series };
}

/**
 * The one driver that N identical ones make together, their cones moving as one.
 *
 *     S_D, M_MS, R_MS × N,  C_MS ÷ N,  R_E and Z_coil × s/p,  Bl × s
 *
 * with s drivers in series in each of p parallel strings. All of it sees the array's voltage.
 *
 * @source vented-box dossier 6
 * @example two in parallel: R_E ÷ 2, Bl unchanged, +6.02 dB at the same voltage
 */
export function driverArray(
  one: Mechanical,
  wiring: { series: number; parallel: number },
): Mechanical {
  const { series, parallel } = wiring;
  const count = series * parallel;
  return {
    mms_kg: count * one.mms_kg,
    cms_m_n: one.cms_m_n / count,
    rms_kg_s: count * one.rms_kg_s,
    bl_t_m: series * one.bl_t_m,
    re_ohm: (one.re_ohm * series) / parallel,
    sd_m2: count * one.sd_m2,
  };
}

/**
 * Two drivers face to face or nose to tail on one hole, the air between them stiff.
 *
 *     S_D of one,  M_MS, R_MS × 2,  C_MS ÷ 2,  V_AS ÷ 2,  f_S and the Qs unchanged
 *
 * @remarks The coupling chamber's compliance is left out.
 * @source vented-box dossier 6
 */
export function isobaricPair(one: Mechanical, wiring: "parallel" | "series"): Mechanical {
  const series = wiring === "series" ? 2 : 1;
  const pair = driverArray(one, { series, parallel: 2 / series });
  return { ...pair, sd_m2: one.sd_m2 };
}
