/** One vent as the whole-system circuit and the answer need it. */
import type { Enclosure, LumpedVent, Vent } from "@/lib/document/schema";
import { pipeResonances } from "./pipe-resonance";
import type { AirProperties, VentModel } from "./vent-model";
import { ventParts } from "./vent-parts";
import { newResponse, respond } from "./vent-response";

/**
 * Models a vent: figures per one vent of `count`, static and lossless, and its response.
 *
 * @param path - where the vent stands in the request, for what is refused
 * @throws InputError for flares that cannot be and a negative clearance
 */
export function modelVent(
  vent: Vent,
  enclosure: Enclosure,
  air: AirProperties,
  options: { vent_losses: boolean },
  path: string,
): VentModel {
  if ("lumped" in vent) return lumpedVent(vent, air);
  const parts = ventParts(vent, enclosure, path);
  const { airway } = parts;
  const S = airway.boreArea_m2,
    a = airway.boreRadius_m;
  const effective = airway.overallLength_m + parts.outer + parts.inner + parts.plane + parts.steps;
  let resonances: number[] | null = null;
  return {
    count: vent.count,
    boreArea_m2: S,
    notes: parts.notes,
    figures: {
      overall_length_m: airway.overallLength_m,
      effective_length_m: effective,
      end_corrections_m: {
        outer: parts.outer,
        inner: parts.inner,
        enclosure_air: parts.plane,
        bore_steps: parts.steps,
      },
      inertance_kg_m4: (air.density * effective) / S,
      /** Found when first asked for: searches over many vents seldom need them. */
      get pipe_resonances_hz() {
        return (resonances ??= pipeResonances(parts, air.speedOfSound));
      },
      bore_area_m2: S,
      displaced_volume_m3: parts.displaced,
    },
    respond: (w) => respond(w, parts, air, options.vent_losses, S, a),
  };
}

/** A vent given as bare elements: exactly R + jωM, nothing added. */
function lumpedVent(vent: LumpedVent, air: AirProperties): VentModel {
  const { inertance_kg_m4: M, resistance_pa_s_m3: Rr, area_m2 } = vent.lumped;
  const le = (M * area_m2) / air.density;
  return {
    count: vent.count,
    boreArea_m2: area_m2,
    notes: [],
    figures: {
      overall_length_m: 0,
      effective_length_m: le,
      end_corrections_m: { outer: 0, inner: 0, enclosure_air: 0, bore_steps: 0 },
      inertance_kg_m4: M,
      pipe_resonances_hz: [],
      bore_area_m2: area_m2,
      displaced_volume_m3: 0,
    },
    respond(w) {
      const out = newResponse(w.length);
      for (let i = 0; i < w.length; i++) {
        const x = w[i]! * M,
          d = Rr * Rr + x * x;
        out.innerRe[i] = Rr / d;
        out.innerIm[i] = -x / d;
      }
      out.outerRe.set(out.innerRe);
      out.outerIm.set(out.innerIm);
      return out;
    },
  };
}
