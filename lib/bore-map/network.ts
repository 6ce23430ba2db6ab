/**
 * Driver, enclosure and the other vents of a map, worked out once: every candidate has the same
 * tuning, so the peak of the air's speed lies near the same frequencies for all of them.
 */
import { arrangement, mechanicalParameters } from "@/lib/acoustics/driver";
import { applyFilters } from "@/lib/acoustics/filters";
import { airProperties } from "@/lib/acoustics/air";
import type { AirProperties, VentModel, VentResponse } from "@/lib/acoustics/vent-model";
import type { Design, Driver } from "@/lib/document/schema";

const TAU = 2 * Math.PI;
/** The range `evaluate` looks for the peak in [Hz]. */
const SCAN = { points: 160, from_hz: 10, to_hz: 500 };

export interface Network {
  /** Volume velocity of one vent's faster end, peak [m³/s], for responses at these frequencies. */
  ventFlow(w: Float64Array, response: VentResponse, count: number, out: Float64Array): void;
  /** Where the flow of a lossless vent of this tuning peaks, largest first [Hz]. */
  peaks_hz: number[];
}

/** Impedance of one driver's coil without motion, at ω [Ω]. */
function coil(driver: Driver, w: number): [number, number] {
  let re = driver.re_ohm;
  let im = w * (driver.le_h ?? 0);
  const [l2, r2] = [driver.l2_h ?? 0, driver.r2_ohm ?? 0];
  if (l2 > 0 && r2 > 0) {
    const x = w * l2;
    const d = r2 * r2 + x * x;
    re += (r2 * x * x) / d;
    im += (r2 * r2 * x) / d;
  }
  if (driver.semi_inductance) {
    const { k, n } = driver.semi_inductance;
    re += k * w ** n * Math.cos((n * Math.PI) / 2);
    im += k * w ** n * Math.sin((n * Math.PI) / 2);
  }
  return [re, im];
}

/** The network of a design with a driver whose enclosure is tuned to `tuning_hz`. */
export function network(
  design: Design,
  driver: Driver,
  air: AirProperties,
  others: VentModel[],
  tuning_hz: number,
): Network {
  const compliance = design.enclosure.net_volume_m3 / (air.density * air.speedOfSound ** 2);
  const reference =
    "density_kg_m3" in design.air
      ? air
      : airProperties({ temperature_c: 20, pressure_pa: 101_325, relative_humidity: 0.5 });
  const one = mechanicalParameters(driver, reference);
  const { series, parallel } = arrangement(driver);
  const area = driver.count * driver.sd_m2;
  const mass = driver.count * one.mms_kg;
  const friction = driver.count * one.rms_kg_s;
  const give = one.cms_m_n / driver.count;
  const force = series * one.bl_t_m;
  const wb = TAU * tuning_hz;
  const leak = design.enclosure.ql === null ? 0 : (wb * compliance) / design.enclosure.ql;
  const absorb = design.enclosure.qa === null ? 0 : 1 / (design.enclosure.qa * wb * compliance);

  /** Peak pressure in the box [Pa] for the admittance of all vents together. */
  const pressure = (w: number, ventRe: number, ventIm: number, drive: number): number => {
    const b = w * compliance * absorb;
    const d = 1 + b * b;
    const yr = (w * compliance * b) / d + leak + ventRe;
    const yi = (w * compliance) / d + ventIm;
    const yd = yr * yr + yi * yi;
    const zr = friction + (area * area * yr) / yd;
    const zi = w * mass - 1 / (w * give) - (area * area * yi) / yd;
    const [cr, ci] = coil(driver, w);
    const er = (cr * series) / parallel + design.drive.source_resistance_ohm;
    const ei = (ci * series) / parallel;
    const dr = er * zr - ei * zi + force * force;
    const di = er * zi + ei * zr;
    const velocity = (Math.SQRT2 * force * drive) / Math.hypot(dr, di);
    return (area * velocity) / Math.sqrt(yd);
  };

  const ventFlow: Network["ventFlow"] = (w, response, count, out) => {
    const n = w.length;
    const vr = new Float64Array(n).fill(design.drive.voltage_v);
    const vi = new Float64Array(n);
    applyFilters(design.filters, w, vr, vi);
    const rest = others.map((model) => ({ model, y: model.respond(w) }));
    for (let i = 0; i < n; i++) {
      let yr = count * response.innerRe[i]!;
      let yi = count * response.innerIm[i]!;
      for (const { model, y } of rest) {
        yr += model.count * y.innerRe[i]!;
        yi += model.count * y.innerIm[i]!;
      }
      const flow = Math.max(
        Math.hypot(response.innerRe[i]!, response.innerIm[i]!),
        Math.hypot(response.outerRe[i]!, response.outerIm[i]!),
      );
      out[i] = flow * pressure(w[i]!, yr, yi, Math.hypot(vr[i]!, vi[i]!));
    }
  };
  return { ventFlow, peaks_hz: losslessPeaks(ventFlow, compliance, others, tuning_hz) };
}

/** Peaks of the flow of a bare mass that brings the enclosure to the tuning; the three largest. */
function losslessPeaks(
  ventFlow: Network["ventFlow"],
  compliance: number,
  others: VentModel[],
  tuning_hz: number,
): number[] {
  const { points, from_hz, to_hz } = SCAN;
  const w = Float64Array.from(
    { length: points },
    (_, i) => TAU * from_hz * (to_hz / from_hz) ** (i / (points - 1)),
  );
  const wb = TAU * tuning_hz;
  let susceptance = wb * compliance;
  for (const model of others)
    susceptance += model.count * model.respond(Float64Array.of(wb)).innerIm[0]!;
  const inertance = 1 / (wb * susceptance);
  const zero = new Float64Array(points);
  const mass = w.map((x) => -1 / (x * inertance));
  const flow = new Float64Array(points);
  ventFlow(w, { innerRe: zero, innerIm: mass, outerRe: zero, outerIm: mass }, 1, flow);
  const tops: number[] = [];
  for (let i = 0; i < points; i++)
    if (flow[i]! >= (flow[i - 1] ?? 0) && flow[i]! > (flow[i + 1] ?? 0)) tops.push(i);
  return tops
    .sort((a, b) => flow[b]! - flow[a]!)
    .slice(0, 3)
    .filter((i) => flow[i]! > 0.5 * flow[tops[0]!]!)
    .map((i) => w[i]! / TAU);
}
