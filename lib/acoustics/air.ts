/**
 * The state of the air: speed of sound, density, viscosity from temperature, pressure, humidity.
 */
import type { Air } from "@/lib/document/schema";
import type { AirProperties } from "./vent-model";

const ZERO_CELSIUS = 273.15;
/** Mole fraction of carbon dioxide taken for room air (IEC 61094-2:2009 Annex F). */
const CARBON_DIOXIDE = 0.0004;

const cramerSpeed = [
  331.5024, 0.603055, -0.000528, 51.471935, 0.1495874, -0.000782, -1.82e-7, 3.73e-8, -2.93e-10,
  -85.20931, -0.228525, 5.91e-5, -2.835149, -2.15e-13, 29.179762, 0.000486,
] as const;
const cramerGamma = [
  1.400822, -1.75e-5, -1.73e-7, -0.0873629, -1.665e-4, -3.26e-6, 2.047e-8, -1.26e-10, 5.939e-14,
  -0.1199717, -8.693e-4, 1.979e-6, -0.01104, -3.478e-16, 0.0450616, 1.82e-6,
] as const;

/** Saturation vapour pressure over water [Pa], T in K. CIPM-2007 eq. A1.1. */
export function saturationPressure(temperature_k: number): number {
  return Math.exp(
    1.2378847e-5 * temperature_k ** 2 -
      1.9121316e-2 * temperature_k +
      33.93711047 -
      6343.1645 / temperature_k,
  );
}

/** Mole fraction of water vapour [1]. */
export function vapourFraction(
  temperature_c: number,
  pressure_pa: number,
  humidity: number,
): number {
  const enhancement = 1.00062 + 3.14e-8 * pressure_pa + 5.6e-7 * temperature_c ** 2;
  return (humidity * enhancement * saturationPressure(temperature_c + ZERO_CELSIUS)) / pressure_pa;
}

/** Cramer's polynomial in temperature [°C], pressure [Pa], water and carbon dioxide mole fractions. */
function cramer(a: readonly number[], t: number, p: number, xw: number): number {
  const xc = CARBON_DIOXIDE;
  const [a0, a1, a2, a3, a4, a5, a6, a7, a8, a9, a10, a11, a12, a13, a14, a15] = a as number[];
  return (
    a0! +
    a1! * t +
    a2! * t * t +
    (a3! + a4! * t + a5! * t * t) * xw +
    (a6! + a7! * t + a8! * t * t) * p +
    (a9! + a10! * t + a11! * t * t) * xc +
    a12! * xw * xw +
    a13! * p * p +
    a14! * xc * xc +
    a15! * xw * p * xc
  );
}

/** Density of moist air [kg/m³], CIPM-2007 (Picard et al., Metrologia 45, 2008). */
export function moistAirDensity(t: number, p: number, xv: number): number {
  const T = t + ZERO_CELSIUS;
  const Z =
    1 -
    (p / T) *
      (1.58123e-6 -
        2.9331e-8 * t +
        1.1043e-10 * t * t +
        (5.707e-6 - 2.051e-8 * t) * xv +
        (1.9898e-4 - 2.376e-6 * t) * xv * xv) +
    (p / T) ** 2 * (1.83e-11 - 0.765e-8 * xv * xv);
  return ((3.48374 + 1.4446 * (CARBON_DIOXIDE - 0.0004)) * 1e-3 * p * (1 - 0.378 * xv)) / (Z * T);
}

export function airProperties(air: Air): AirProperties {
  if ("density_kg_m3" in air) {
    const standard = airProperties({
      temperature_c: 20,
      pressure_pa: 101_325,
      relative_humidity: 0.5,
    });
    return { ...standard, density: air.density_kg_m3, speedOfSound: air.speed_of_sound_m_s };
  }
  const { temperature_c: t, pressure_pa: p, relative_humidity: h } = air;
  const T = t + ZERO_CELSIUS;
  const xw = vapourFraction(t, p, h);
  const density = moistAirDensity(t, p, xw);
  const viscosity =
    (84.986 + 7.0 * T + (113.157 - T) * xw - 3.7501e-3 * T * T - 100.015 * xw * xw) * 1e-8;
  const conductivity =
    4186.8 * (60.054 + 1.846 * T + 2.06e-6 * T * T + (40 - 1.775e-4 * T) * xw) * 1e-8;
  const heat =
    4186.8 *
    (0.251625 -
      9.2525e-5 * T +
      2.1334e-7 * T * T -
      1.0043e-10 * T ** 3 +
      (0.12477 - 2.283e-5 * T + 1.267e-7 * T * T) * xw +
      (0.01116 + 4.61e-6 * T + 1.74e-8 * T * T) * xw * xw);
  return {
    density,
    speedOfSound: cramer(cramerSpeed, t, p, xw),
    kinematicViscosity: viscosity / density,
    heatCapacityRatio: cramer(cramerGamma, t, p, xw),
    prandtl: (viscosity * heat) / conductivity,
  };
}
