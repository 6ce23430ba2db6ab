/** The whole system as one circuit: source, coil, cone, enclosure air with its losses, vents. */
import type { Design, Driver } from "@/lib/document/schema";
import { coilImpedance } from "./coil";
import { mechanicalFrom, referenceAir, type Mechanical } from "./driver";
import { arrangement, driverArray } from "./driver-array";
import { filterGain } from "./filters";
import type { AirProperties, VentModel } from "./vent-model";

export interface SystemResponse {
  /** Volume velocity that cone, vents and leak send out together [m³/s rms]. */
  volumeRe: Float64Array;
  volumeIm: Float64Array;
  /** Cone excursion [m peak]. */
  excursion: Float64Array;
  /** Impedance of the array, without the source [Ω]. */
  impedanceRe: Float64Array;
  impedanceIm: Float64Array;
  /** |Z + R_g|: what the source has to drive [Ω]. */
  load: Float64Array;
  /** Voltage of the source after the filters, and across the array [V rms]. */
  sourceVoltage: Float64Array;
  arrayVoltage: Float64Array;
  /** Per vent: mean over the bore at the faster of its two ends [m/s peak]. */
  airSpeed: Float64Array[];
}

export interface System {
  /** All drivers as one. */
  array: Mechanical;
  /** Angular frequency that the enclosure's losses refer to: of the tuning, or of f_C [rad/s]. */
  lossFrequency: number;
  respond(angularFrequency: Float64Array): SystemResponse;
}

/** Acoustic compliance of the enclosure's air, C_AB = V / (ρ c²) [m⁵/N]. */
export function enclosureCompliance(volume_m3: number, air: AirProperties): number {
  return volume_m3 / (air.density * air.speedOfSound ** 2);
}

/**
 * Resonance of the drivers on the closed enclosure, f_C [Hz].
 *
 *     f_C = (1/2π) √((1/C_MS + S_D²/C_AB) / M_MS)
 *
 * @source vented-box dossier 5 (f_C² = (1 + α) f_S²)
 * @example System A with its vent blocked: 46.7516 Hz
 */
export function closedBoxResonance(array: Mechanical, compliance: number): number {
  const stiffness = 1 / array.cms_m_n + array.sd_m2 ** 2 / compliance;
  return Math.sqrt(stiffness / array.mms_kg) / (2 * Math.PI);
}

/**
 * The circuit of a design with a driver.
 *
 *     Y_B = jωC_AB / (1 + jωC_AB R_AB) + 1/R_AL + Σ n_v Y_v,   Z_M = R_MS + jωM_MS + 1/(jωC_MS) + S_D²/Y_B
 *     u = Bl e / ((Z_E + R_g) Z_M + (Bl)²),   p_B = S_D u / Y_B (inwards),   Z = Z_E + (Bl)²/Z_M
 *     R_AL = Q_L / (ω_B C_AB),   R_AB = 1 / (Q_A ω_B C_AB)
 *
 * U_0 = S_D u − leak − vents' outer ends, turned so that outwards is positive.
 *
 * @param tuning_hz - of the vents together; null for a closed box, whose losses refer to f_C
 * @remarks Cone and vents are one compact source: wavelengths long against the box. Convention e^{+jωt}.
 * @source R. H. Small, J. Audio Eng. Soc. 21 (1973); vented-box dossier 1.2 and 3
 */
export function systemOf(
  design: Design & { driver: Driver },
  air: AirProperties,
  vents: readonly VentModel[],
  tuning_hz: number | null,
): System {
  const { driver, enclosure, drive, filters } = design;
  const wiring = arrangement(driver);
  const array = driverArray(mechanicalFrom(driver, referenceAir(design.air)), wiring);
  const compliance = enclosureCompliance(enclosure.net_volume_m3, air);
  const lossFrequency = 2 * Math.PI * (tuning_hz ?? closedBoxResonance(array, compliance));
  const leak = enclosure.ql === null ? 0 : (lossFrequency * compliance) / enclosure.ql;
  const absorption = enclosure.qa === null ? 0 : 1 / (enclosure.qa * lossFrequency * compliance);
  const source = drive.source_resistance_ohm;

  const respond = (angularFrequency: Float64Array): SystemResponse => {
    const n = angularFrequency.length;
    const coil = coilImpedance(driver, angularFrequency, wiring.series / wiring.parallel);
    const gain = filterGain(filters, angularFrequency);
    const flows = vents.map((vent) => vent.respond(angularFrequency));
    const out = emptyResponse(n, vents.length);
    const { mms_kg: mass, cms_m_n: cms, rms_kg_s: resistance, bl_t_m: bl, sd_m2: area } = array;
    for (let i = 0; i < n; i++) {
      const omega = angularFrequency[i]!;
      const b = omega * compliance;
      const loss = b * absorption;
      const share = b / (1 + loss * loss);
      let yRe = share * loss + leak;
      let yIm = share;
      for (let v = 0; v < flows.length; v++) {
        yRe += vents[v]!.count * flows[v]!.innerRe[i]!;
        yIm += vents[v]!.count * flows[v]!.innerIm[i]!;
      }
      const y2 = yRe * yRe + yIm * yIm;
      const zmRe = resistance + (area * area * yRe) / y2;
      const zmIm = omega * mass - 1 / (omega * cms) - (area * area * yIm) / y2;
      const zm2 = zmRe * zmRe + zmIm * zmIm;
      const zRe = coil.re[i]! + (bl * bl * zmRe) / zm2;
      const zIm = coil.im[i]! - (bl * bl * zmIm) / zm2;
      const eRe = drive.voltage_v * gain.re[i]!;
      const eIm = drive.voltage_v * gain.im[i]!;
      const e = Math.sqrt(eRe * eRe + eIm * eIm);
      const load = Math.sqrt((zRe + source) * (zRe + source) + zIm * zIm);
      out.impedanceRe[i] = zRe;
      out.impedanceIm[i] = zIm;
      out.load[i] = load;
      out.sourceVoltage[i] = e;
      out.arrayVoltage[i] = (e * Math.sqrt(zRe * zRe + zIm * zIm)) / load;

      const rs = coil.re[i]! + source;
      const xs = coil.im[i]!;
      const dRe = rs * zmRe - xs * zmIm + bl * bl;
      const dIm = rs * zmIm + xs * zmRe;
      const d = bl / (dRe * dRe + dIm * dIm);
      const uRe = (eRe * dRe + eIm * dIm) * d;
      const uIm = (eIm * dRe - eRe * dIm) * d;
      out.excursion[i] = (Math.SQRT2 * Math.sqrt(uRe * uRe + uIm * uIm)) / omega;

      const pRe = (area * (uRe * yRe + uIm * yIm)) / y2;
      const pIm = (area * (uIm * yRe - uRe * yIm)) / y2;
      let qRe = area * uRe - pRe * leak;
      let qIm = area * uIm - pIm * leak;
      const pressure = Math.sqrt(pRe * pRe + pIm * pIm);
      for (let v = 0; v < flows.length; v++) {
        const flow = flows[v]!;
        const { count, boreArea_m2 } = vents[v]!;
        const oRe = flow.outerRe[i]!;
        const oIm = flow.outerIm[i]!;
        const iRe = flow.innerRe[i]!;
        const iIm = flow.innerIm[i]!;
        qRe -= count * (pRe * oRe - pIm * oIm);
        qIm -= count * (pRe * oIm + pIm * oRe);
        const fastest = Math.sqrt(Math.max(oRe * oRe + oIm * oIm, iRe * iRe + iIm * iIm));
        out.airSpeed[v]![i] = (Math.SQRT2 * pressure * fastest) / boreArea_m2;
      }
      out.volumeRe[i] = qRe;
      out.volumeIm[i] = qIm;
    }
    return out;
  };
  return { array, lossFrequency, respond };
}

function emptyResponse(n: number, vents: number): SystemResponse {
  const make = () => new Float64Array(n);
  return {
    volumeRe: make(),
    volumeIm: make(),
    excursion: make(),
    impedanceRe: make(),
    impedanceIm: make(),
    load: make(),
    sourceVoltage: make(),
    arrayVoltage: make(),
    airSpeed: Array.from({ length: vents }, make),
  };
}
