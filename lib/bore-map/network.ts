/**
 * Driver, enclosure and the other vents of a map, worked out once: every candidate has the same
 * tuning, so its air is fastest near the same frequencies as the others' is.
 */
import { coilImpedance } from "@/lib/acoustics/coil";
import { mechanicalFrom, referenceAir } from "@/lib/acoustics/driver";
import { arrangement, driverArray } from "@/lib/acoustics/driver-array";
import { filterGain } from "@/lib/acoustics/filters";
import { searchFrequencies } from "@/lib/acoustics/peak-speed";
import { enclosureCompliance } from "@/lib/acoustics/system";
import type { AirProperties, VentModel, VentResponse } from "@/lib/acoustics/vent-model";
import type { Design, Driver } from "@/lib/document/schema";

const TAU = 2 * Math.PI;

/** Peak volume velocity at the faster end of one of `count` like vents [m³/s], at prepared frequencies. */
export type VentFlow = (response: VentResponse, count: number) => Float64Array;

export interface PeakSearch {
  angularFrequency: Float64Array;
  /** Where each peak's frequencies begin, and how many there are: one at an edge of the range, else five. */
  groups: { first: number; size: number }[];
  flow: VentFlow;
}

/** Frequencies beside a peak of the lossless flow, in ratio to it. */
const AROUND = [0.93, 0.965, 1, 1.035, 1.075];
/** A peak lower than this share of the largest cannot overtake it through losses. */
const RIVAL = 0.6;

/**
 * The circuit of `systemOf` from one vent's point of view, with all that does not depend on the
 * vent worked out at the given frequencies. Same formulas and conventions.
 *
 * @param others - the design's other vents
 */
function ventFlow(
  design: Design,
  driver: Driver,
  air: AirProperties,
  others: VentModel[],
  tuning_hz: number,
  w: Float64Array,
): VentFlow {
  const wiring = arrangement(driver);
  const array = driverArray(mechanicalFrom(driver, referenceAir(design.air)), wiring);
  const compliance = enclosureCompliance(design.enclosure.net_volume_m3, air);
  const { ql, qa } = design.enclosure;
  const wb = TAU * tuning_hz;
  const leak = ql === null ? 0 : (wb * compliance) / ql;
  const absorption = qa === null ? 0 : 1 / (qa * wb * compliance);
  const coil = coilImpedance(driver, w, wiring.series / wiring.parallel);
  const gain = filterGain(design.filters, w);
  const rest = others.map((model) => ({ count: model.count, y: model.respond(w) }));
  const n = w.length;
  const boxRe = new Float64Array(n);
  const boxIm = new Float64Array(n);
  const out = new Float64Array(n);
  for (let i = 0; i < n; i++) {
    const b = w[i]! * compliance;
    const share = b / (1 + (b * absorption) ** 2);
    boxRe[i] = share * b * absorption + leak;
    boxIm[i] = share;
    for (const { count, y } of rest) {
      boxRe[i]! += count * y.innerRe[i]!;
      boxIm[i]! += count * y.innerIm[i]!;
    }
  }
  const { mms_kg: mass, cms_m_n: cms, rms_kg_s: friction, bl_t_m: bl, sd_m2: area } = array;
  return (response, count) => {
    for (let i = 0; i < n; i++) {
      const [oRe, oIm] = [response.outerRe[i]!, response.outerIm[i]!];
      const [iRe, iIm] = [response.innerRe[i]!, response.innerIm[i]!];
      const yRe = boxRe[i]! + count * iRe;
      const yIm = boxIm[i]! + count * iIm;
      const y2 = yRe * yRe + yIm * yIm;
      const zRe = friction + (area * area * yRe) / y2;
      const zIm = w[i]! * mass - 1 / (w[i]! * cms) - (area * area * yIm) / y2;
      const rs = coil.re[i]! + design.drive.source_resistance_ohm;
      const xs = coil.im[i]!;
      const dRe = rs * zRe - xs * zIm + bl * bl;
      const dIm = rs * zIm + xs * zRe;
      const drive2 = gain.re[i]! ** 2 + gain.im[i]! ** 2;
      const fastest2 = Math.max(oRe * oRe + oIm * oIm, iRe * iRe + iIm * iIm);
      out[i] =
        Math.SQRT2 *
        bl *
        area *
        design.drive.voltage_v *
        Math.sqrt((drive2 * fastest2) / (y2 * (dRe * dRe + dIm * dIm)));
    }
    return out;
  };
}

/** Where to look for a candidate's peak, from the flow of a bare mass of the same tuning. */
export function peakSearch(
  design: Design,
  driver: Driver,
  air: AirProperties,
  others: VentModel[],
  tuning_hz: number,
  inertance: number,
): PeakSearch {
  const scan = searchFrequencies(tuning_hz).map((f) => TAU * f);
  const still = new Float64Array(scan.length);
  const mass = scan.map((w) => -1 / (w * inertance));
  const flow = ventFlow(
    design,
    driver,
    air,
    others,
    tuning_hz,
    scan,
  )({ innerRe: still, innerIm: mass, outerRe: still, outerIm: mass }, 1);
  const tops: number[] = [];
  for (let i = 0; i < scan.length; i++)
    if (flow[i]! >= (flow[i - 1] ?? 0) && flow[i]! > (flow[i + 1] ?? 0)) tops.push(i);
  tops.sort((a, b) => flow[b]! - flow[a]!);
  const hz: number[] = [];
  const groups: PeakSearch["groups"] = [];
  for (const top of tops.slice(0, 3)) {
    if (flow[top]! < RIVAL * flow[tops[0]!]!) continue;
    const edge = top === 0 || top === scan.length - 1;
    const ratios = edge ? [1] : AROUND;
    groups.push({ first: hz.length, size: ratios.length });
    hz.push(...ratios.map((ratio) => scan[top]! * ratio));
  }
  const angularFrequency = Float64Array.from(hz);
  return {
    angularFrequency,
    groups,
    flow: ventFlow(design, driver, air, others, tuning_hz, angularFrequency),
  };
}

/** A candidate's peak air speed, mean over the bore: the best sample, put right by a parabola in log f. */
export function peakSpeed(
  search: PeakSearch,
  model: VentModel,
): { speed_m_s: number; frequency_hz: number } {
  const w = search.angularFrequency;
  const flow = search.flow(model.respond(w), model.count);
  let best = { value: 0, at: w[0] ?? 0 };
  for (const { first, size } of search.groups) {
    let top = first;
    for (let i = first; i < first + size; i++) if (flow[i]! > flow[top]!) top = i;
    if (flow[top]! > best.value) best = { value: flow[top]!, at: w[top]! };
    if (size < 3) continue;
    const mid = Math.min(first + size - 2, Math.max(first + 1, top));
    const fit = crest(
      [Math.log(w[mid - 1]!), Math.log(w[mid]!), Math.log(w[mid + 1]!)],
      [flow[mid - 1]!, flow[mid]!, flow[mid + 1]!],
    );
    if (fit && fit.value > best.value) best = { value: fit.value, at: Math.exp(fit.at) };
  }
  return { speed_m_s: best.value / model.boreArea_m2, frequency_hz: best.at / TAU };
}

/** Top of the parabola through three points where it lies between the outer two. */
function crest(
  [x0, x1, x2]: [number, number, number],
  [y0, y1, y2]: [number, number, number],
): { at: number; value: number } | null {
  const p = (y1 - y0) / (x1 - x0);
  const q = (y2 - y1) / (x2 - x1);
  const bend = (q - p) / (x2 - x0);
  if (!(bend < 0)) return null;
  const at = (x0 + x1) / 2 - p / (2 * bend);
  if (at < x0 || at > x2) return null;
  return { at, value: y0 + p * (at - x0) + bend * (at - x0) * (at - x1) };
}
