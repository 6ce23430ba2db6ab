import type { Driver } from "@/lib/document/schema";
import { seriesPerString } from "@/lib/document/series-parallel";
import type { DriverAnswer } from "./answer";
import type { AirProperties } from "./vent-model";

/** Mechanical parameters; V_AS refers to the given reference air. */
export function mechanicalParameters(driver: Driver, reference: AirProperties): DriverAnswer {
  const { density: rho, speedOfSound: c } = reference;
  const w = 2 * Math.PI * driver.fs_hz;
  const cms = driver.vas_m3 / (rho * c * c * driver.sd_m2 ** 2);
  const mms = 1 / (w * w * cms);
  const bl = Math.sqrt((w * mms * driver.re_ohm) / driver.qes);
  const efficiency =
    (rho * (bl * driver.sd_m2) ** 2) / (2 * Math.PI * c * driver.re_ohm * mms * mms);
  return {
    mms_kg: mms,
    cms_m_n: cms,
    rms_kg_s: (w * mms) / driver.qms,
    bl_t_m: bl,
    qts: (driver.qes * driver.qms) / (driver.qes + driver.qms),
    efficiency,
    sensitivity_db:
      20 *
      Math.log10((2.83 * rho * bl * driver.sd_m2) / (2 * Math.PI * driver.re_ohm * mms) / 20e-6),
  };
}

/** Drivers in series in each string, and strings in parallel. */
export function arrangement(driver: Driver): { series: number; parallel: number } {
  if (driver.wiring === "series") return { series: driver.count, parallel: 1 };
  if (driver.wiring === "parallel") return { series: 1, parallel: driver.count };
  const series = seriesPerString(driver.count) ?? 1;
  return { series, parallel: driver.count / series };
}
