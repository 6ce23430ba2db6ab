/** One driver: mechanical parameters from Thiele-Small ones and back, efficiency, sensitivity. */
import type { Air, Driver } from "@/lib/document/schema";
import { airProperties } from "./air";
import type { DriverAnswer } from "./answer";
import type { AirProperties } from "./vent-model";

/** 0 dB [Pa rms]. */
export const REFERENCE_PRESSURE = 20e-6;

export interface ThieleSmall {
  fs_hz: number;
  qes: number;
  qms: number;
  vas_m3: number;
  re_ohm: number;
  sd_m2: number;
}

export interface Mechanical {
  mms_kg: number;
  cms_m_n: number;
  rms_kg_s: number;
  bl_t_m: number;
  re_ohm: number;
  sd_m2: number;
}

/**
 * The air that V_AS refers to: 20 °C and 101,325 Pa, or the given air where it is given outright.
 * The weather of the day changes none of a driver's mechanical figures.
 */
export function referenceAir(air: Air): AirProperties {
  return airProperties(
    "density_kg_m3" in air
      ? air
      : { temperature_c: 20, pressure_pa: 101_325, relative_humidity: 0.5 },
  );
}

/**
 * Mechanical parameters of a driver from its Thiele-Small ones.
 *
 *     C_MS = V_AS / (ρ c² S_D²),  M_MS = 1 / (ω_S² C_MS)
 *     R_MS = ω_S M_MS / Q_MS,     Bl = √(ω_S M_MS R_E / Q_ES)
 *
 * @param air - the air that V_AS refers to
 * @remarks M_MS contains the air load of the measurement, on both sides of the cone.
 * @source R. H. Small, J. Audio Eng. Soc. 20 (1972); vented-box dossier 3.2
 * @example System A of the dossier: M_MS 48.4233 g, C_MS 5.81224e-4 m/N, R_MS 2.28189, Bl 11.7010
 */
export function mechanicalFrom(given: ThieleSmall, air: AirProperties): Mechanical {
  const { density, speedOfSound } = air;
  const omega = 2 * Math.PI * given.fs_hz;
  const cms = given.vas_m3 / (density * speedOfSound ** 2 * given.sd_m2 ** 2);
  const mms = 1 / (omega * omega * cms);
  return {
    mms_kg: mms,
    cms_m_n: cms,
    rms_kg_s: (omega * mms) / given.qms,
    bl_t_m: Math.sqrt((omega * mms * given.re_ohm) / given.qes),
    re_ohm: given.re_ohm,
    sd_m2: given.sd_m2,
  };
}

/**
 * Thiele-Small parameters from mechanical ones; the reverse of `mechanicalFrom`.
 *
 *     f_S = 1 / (2π √(M_MS C_MS)),  Q_ES = ω_S M_MS R_E / (Bl)²,  Q_MS = ω_S M_MS / R_MS
 *     V_AS = ρ c² S_D² C_MS
 *
 * @param air - the air that V_AS shall refer to
 * @source vented-box dossier 3.2
 * @example driver of the dossier 4.4: f_S 21.973 Hz, Q_ES 0.33062, Q_MS 3.3179, V_AS 340.94 L
 */
export function thieleSmallFrom(given: Mechanical, air: AirProperties): ThieleSmall {
  const omega = 1 / Math.sqrt(given.mms_kg * given.cms_m_n);
  return {
    fs_hz: omega / (2 * Math.PI),
    qes: (omega * given.mms_kg * given.re_ohm) / given.bl_t_m ** 2,
    qms: (omega * given.mms_kg) / given.rms_kg_s,
    vas_m3: air.density * air.speedOfSound ** 2 * given.sd_m2 ** 2 * given.cms_m_n,
    re_ohm: given.re_ohm,
    sd_m2: given.sd_m2,
  };
}

/** Q_TS = Q_ES Q_MS / (Q_ES + Q_MS), the total Q without a source resistance. */
export function totalQ(qes: number, qms: number): number {
  return (qes * qms) / (qes + qms);
}

/**
 * Reference efficiency into half space [1].
 *
 *     η_0 = ρ (Bl)² S_D² / (2π c R_E M_MS²) = (4π²/c³) f_S³ V_AS / Q_ES
 *
 * @source R. H. Small (1972); vented-box dossier 1.4
 */
export function referenceEfficiency(driver: Mechanical, air: AirProperties): number {
  const { density, speedOfSound } = air;
  return (
    (density * (driver.bl_t_m * driver.sd_m2) ** 2) /
    (2 * Math.PI * speedOfSound * driver.re_ohm * driver.mms_kg ** 2)
  );
}

/**
 * Mid-band level of one driver at a voltage, 1 m, half space [dB re 20 µPa].
 *
 *     p = ρ Bl S_D e / (2π R_E M_MS · 1 m)
 *
 * @source vented-box dossier 3.2
 * @example System A at 2.83 V: 91.471 dB
 */
export function midBandLevel(driver: Mechanical, air: AirProperties, voltage_v: number): number {
  const pressure =
    (air.density * driver.bl_t_m * driver.sd_m2 * voltage_v) /
    (2 * Math.PI * driver.re_ohm * driver.mms_kg);
  return 20 * Math.log10(pressure / REFERENCE_PRESSURE);
}

/** The contract's figures of one driver, in the air that its V_AS refers to. */
export function driverAnswer(driver: Driver, reference: AirProperties): DriverAnswer {
  const mechanical = mechanicalFrom(driver, reference);
  return {
    mms_kg: mechanical.mms_kg,
    cms_m_n: mechanical.cms_m_n,
    rms_kg_s: mechanical.rms_kg_s,
    bl_t_m: mechanical.bl_t_m,
    qts: totalQ(driver.qes, driver.qms),
    efficiency: referenceEfficiency(mechanical, reference),
    sensitivity_db: midBandLevel(mechanical, reference, 2.83),
  };
}
