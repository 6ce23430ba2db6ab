import type { Enclosure, Design } from "@/lib/document/schema";
import type { AirProperties, VentModel } from "./vent-model";
import { airProperties } from "./air";
import { modelVent } from "./vent";
const one = new Float64Array(1);
export function tuningFrequency(
  enclosure: Enclosure,
  vents: VentModel[],
  air: AirProperties,
): number | null {
  if (vents.length === 0) return null;
  const C = enclosure.net_volume_m3 / (air.density * air.speedOfSound ** 2);
  const total = (f: number) => {
    const w = 2 * Math.PI * f;
    one[0] = w;
    let b = w * C;
    for (const v of vents) b += v.count * v.respond(one).innerIm[0]!;
    return b * w;
  };
  const m = vents.reduce((s, v) => s + v.count / v.figures.inertance_kg_m4, 0);
  const f0 = Math.sqrt(m / C) / (2 * Math.PI);
  let lo = f0 * 0.6,
    hi = f0 * 1.1;
  for (let i = 0; i < 60 && total(lo) > 0; i++) lo *= 0.7;
  for (let i = 0; i < 60 && total(hi) < 0; i++) hi *= 1.1;
  let flo = total(lo),
    fhi = total(hi);
  // Friction can drown the resonance: the total then never changes sign.
  if (!(flo <= 0 && fhi >= 0)) return null;
  for (let i = 0; i < 60; i++) {
    const mid = i < 8 ? lo - (flo * (hi - lo)) / (fhi - flo) : (lo + hi) / 2;
    const fm = total(mid);
    if (fm < 0) {
      lo = mid;
      flo = fm;
    } else {
      hi = mid;
      fhi = fm;
    }
    if (hi - lo < 1e-9 * hi) break;
  }
  return (lo + hi) / 2;
}
export function tuningOf(
  design: Design,
  options: { vent_losses: boolean } = { vent_losses: true },
) {
  const air = airProperties(design.air);
  return tuningFrequency(
    design.enclosure,
    design.vents.map((v, i) => modelVent(v, design.enclosure, air, options, `design.vents[${i}]`)),
    air,
  );
}
