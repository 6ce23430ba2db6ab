import type { AirwayVent, Enclosure, Vent } from "@/lib/document/schema";
import { layOutAirway, type Airway } from "./airway";
import { InputError } from "./input-error";
import type { Note } from "./answer";
import type { AirProperties, VentModel, VentResponse } from "./vent-model";
import * as ends from "./end-corrections";

interface Line {
  length: number;
  radius: number;
  perimeterRadius: number;
}
export interface VentParts {
  airway: Airway;
  lines: Line[];
  outerLump: number;
  innerLump: number;
  plane: number;
  outer: number;
  inner: number;
  steps: number;
  displaced: number;
  notes: Note[];
}

export function ventParts(vent: AirwayVent, enclosure: Enclosure, path: string): VentParts {
  const airway = layOutAirway(vent, enclosure, path);
  const a = airway.boreRadius_m,
    S = airway.boreArea_m2;
  const notes: Note[] = [];
  const ro = vent.outer_end.flare_radius_m,
    ri = vent.inner_end.flare_radius_m;
  if (ro + ri > airway.overallLength_m + 1e-12)
    throw new InputError(
      "flare_too_large",
      `${path}.outer_end.flare_radius_m`,
      "The flares are longer than the vent.",
      `0 to ${(airway.overallLength_m * 1000).toFixed(1)} mm for both flares together`,
    );
  const last = airway.segments.at(-1);
  const lastOuter = last?.outer_m ?? 2 * a * 1.06;
  const shell = vent.inner_end.form === "shell";
  const wall = vent.inner_end.wall_m ?? Math.max(0.001, lastOuter / 2 - a);
  if (ri > 0 && !shell && last?.outer_m != null && a + ri >= last.outer_m / 2)
    throw new InputError(
      "flare_leaves_no_wood",
      `${path}.inner_end.flare_radius_m`,
      "The inner flare cuts through the outside of the last piece.",
      `less than ${((last.outer_m / 2 - a) * 1000).toFixed(1)} mm`,
    );
  // outer end
  const slot = vent.bore.shape === "slot" ? vent.bore : null;
  const scale = slot
    ? (ends.rectangle(slot.width_m / slot.height_m) * Math.sqrt(S)) / a / ends.FLANGED
    : 1;
  const proud = vent.outer_end.proud_m;
  const first = airway.segments[0];
  const b0 = first?.outer_m ? first.outer_m / 2 / a : 1.06;
  const flushOuter = ends.flushFlare(ro / a),
    freeOuter = ends.flareInBody(ro / a, Math.max(b0, 1 + ro / a));
  const shareOut = ends.flangeShare(proud / a);
  let outer = (freeOuter + (flushOuter - freeOuter) * shareOut) * scale * a - ro;
  if (vent.outer_clearance_m) outer += a * ends.wallIncrement(vent.outer_clearance_m / a);
  // inner end
  const n = vent.count;
  const SB = enclosure.inside_m ? enclosure.inside_m.width * enclosure.inside_m.height : Infinity;
  const xi = Number.isFinite(SB) ? Math.sqrt((n * S) / SB) : 0;
  const R = Number.isFinite(SB) ? Math.sqrt(SB / Math.PI) : Infinity;
  const p = Math.max(0, airway.protrusion_m),
    h = airway.clearance_m;
  const body = shell ? 1 + ri / a + (wall / a) * 0.3 : Math.max(1.0005, lastOuter / 2 / a);
  const flushInner = ends.flushFlare(ri / a),
    freeInner = ends.flareInBody(ri / a, body);
  const shareIn = ends.flangeShare(p / a);
  let inner = (freeInner + (flushInner - freeInner) * shareIn) * scale * a - ri;
  if (xi > 0) inner -= ends.boxReduction(xi, p / R) * a * (slot ? scale : 1);
  inner += a * ends.wallIncrement(h / a);
  if (slot) {
    const walls = slot.shared_walls;
    const mirrored =
      walls === 0
        ? 1
        : walls === 1
          ? imageFactor(slot.width_m, slot.height_m, 1)
          : walls === 2
            ? imageFactor(slot.width_m, slot.height_m, 2)
            : imageFactor(slot.width_m, slot.height_m, 2) * 1.15;
    inner *= mirrored;
    notes.push({
      code: "slot_inner_end_approximate",
      message:
        "The inner end of a slot along the walls is taken from image openings in wide walls.",
    });
  }
  if (n > 1 && vent.spacing_m) {
    for (let k = 1; k < n; k++) {
      const d = k * vent.spacing_m;
      const w = (2 * (n - k)) / n;
      outer += (w * a * a) / (2 * d);
      inner += (w * a * a) / (4 * d);
    }
  }
  const H = p + h;
  const plane =
    Number.isFinite(SB) && Number.isFinite(H) && H > 0
      ? (((n * S) / SB) * (h ** 3 + p ** 3)) / (3 * H * H)
      : 0;
  // lines
  const lines: Line[] = [];
  const hydraulic = slot ? (2 * S) / (2 * (slot.width_m + slot.height_m)) : null;
  let straight = 0,
    steps = 0;
  const L = airway.overallLength_m;
  let static1 = 0;
  let previous: number | null = null;
  for (const seg of airway.segments) {
    const r = seg.bore_m / 2;
    const from = Math.max(seg.start_m, ro),
      to = Math.min(seg.end_m, L - ri);
    const piece = vent.pieces[seg.piece]!;
    const bendRatio = piece.kind === "bend" ? bend(piece, r) : 1;
    if (previous !== null && Math.abs(previous - r) > 1e-9) {
      const small = Math.min(previous, r),
        big = Math.max(previous, r);
      steps +=
        ends.FLANGED *
        small *
        (1 - ends.flushReduction(small / big)) *
        (S / (Math.PI * small * small));
    }
    previous = r;
    if (to <= from) continue;
    const len = (to - from) * bendRatio;
    lines.push({ length: len, radius: r, perimeterRadius: hydraulic ?? r });
    straight += to - from;
    static1 += (len * a * a) / (r * r);
  }
  const bulge = static1 - straight; // bore steps and bends beyond the plain length
  const flareLine = (r: number, reverse: boolean) => {
    const out: Line[] = [];
    const N = 8;
    for (let i = 0; i < N; i++) {
      const x = ((i + 0.5) / N) * r;
      const rad = a + r - Math.sqrt(r * r - x * x);
      out.push({ length: r / N, radius: rad, perimeterRadius: rad });
    }
    return reverse ? out.reverse() : out;
  };
  const outLines = ro > 0 ? flareLine(ro, true) : [],
    inLines = ri > 0 ? flareLine(ri, false) : [];
  const eq = (ls: Line[]) => ls.reduce((s, l) => s + (l.length * a * a) / (l.radius * l.radius), 0);
  return {
    airway,
    lines: [...outLines, ...lines, ...inLines],
    outerLump: outer + ro - eq(outLines),
    innerLump: inner + ri - eq(inLines) + steps,
    plane,
    outer,
    inner,
    steps: steps + bulge,
    displaced: displaced(vent, enclosure, airway, a, wall),
    notes,
  };
}

function imageFactor(w: number, h: number, kind: 1 | 2): number {
  const [a, b] = w >= h ? [w, h] : [h, w];
  return kind === 2
    ? 2
    : (ends.rectangle(a / (2 * b)) * Math.sqrt(2 * a * b)) /
        (ends.rectangle(a / b) * Math.sqrt(a * b));
}
function bend(piece: { centre_radius_m?: number; mitred: boolean }, r: number): number {
  if (piece.mitred || piece.centre_radius_m === undefined) return 0.559;
  const B = Math.min(1, r / piece.centre_radius_m);
  return (1 + Math.sqrt(1 - B * B)) / 2;
}
function displaced(
  vent: AirwayVent,
  enclosure: Enclosure,
  airway: Airway,
  a: number,
  wall: number,
): number {
  const face = vent.outer_end.proud_m + enclosure.panel_thickness_m;
  const slot = vent.bore.shape === "slot" ? vent.bore : null;
  const shell = vent.inner_end.form === "shell" ? vent.inner_end.flare_radius_m : 0;
  let volume = 0;
  for (const seg of airway.segments) {
    const from = Math.max(seg.start_m, face),
      to = Math.min(seg.end_m, airway.overallLength_m - shell);
    if (to <= from) continue;
    const area = slot
      ? airway.boreArea_m2
      : Math.PI * (seg.outer_m !== null ? seg.outer_m / 2 : a + 0.003) ** 2;
    volume += area * (to - from);
  }
  if (shell > 0) {
    const lip = a + shell,
      ra = Math.max(0, shell - wall),
      o = lip - ra;
    volume += Math.PI * lip * lip * Math.min(wall, shell);
    volume +=
      Math.PI * (ra * (o + ra) ** 2 - (o + ra) * (Math.PI / 2) * ra * ra + ra ** 3 - ra ** 3 / 3);
  }
  return Math.max(0, volume);
}

export function modelVent(
  vent: Vent,
  enclosure: Enclosure,
  air: AirProperties,
  options: { vent_losses: boolean },
  path: string,
): VentModel {
  if ("lumped" in vent) {
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
        const out = alloc(w.length);
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
  const parts = ventParts(vent, enclosure, path);
  const { airway } = parts;
  const S = airway.boreArea_m2,
    a = airway.boreRadius_m;
  const effective = airway.overallLength_m + parts.outer + parts.inner + parts.plane + parts.steps;
  const c = air.speedOfSound;
  const free = effective - parts.plane;
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
      pipe_resonances_hz: [1, 2, 3].map((k) => (k * c) / (2 * free)),
      bore_area_m2: S,
      displaced_volume_m3: parts.displaced,
    },
    respond: (w) => respond(w, parts, air, options.vent_losses, S, a),
  };
}

function alloc(n: number): VentResponse {
  return {
    innerRe: new Float64Array(n),
    innerIm: new Float64Array(n),
    outerRe: new Float64Array(n),
    outerIm: new Float64Array(n),
  };
}

function respond(
  w: Float64Array,
  parts: VentParts,
  air: AirProperties,
  losses: boolean,
  S: number,
  a: number,
): VentResponse {
  const out = alloc(w.length);
  const {
    density: rho,
    speedOfSound: c,
    kinematicViscosity: nu,
    heatCapacityRatio: g,
    prandtl,
  } = air;
  for (let i = 0; i < w.length; i++) {
    const om = w[i]!;
    const dv = Math.sqrt((2 * nu) / om),
      dt = dv / Math.sqrt(prandtl);
    // start outside: pressure per unit outer volume velocity
    let pr = (rho * om * om) / (2 * Math.PI * c),
      pi = (om * rho * parts.outerLump) / S,
      ur = 1,
      ui = 0;
    for (const line of parts.lines) {
      const A = line.radius === a ? S : Math.PI * line.radius * line.radius;
      const lr = losses ? dv / line.perimeterRadius : 0,
        lt = losses ? ((g - 1) * dt) / line.perimeterRadius : 0;
      // series z = jωρ/A (1 + (1-j) lr), shunt y = jωA/(ρc²) (1 + (1-j) lt)
      const q = (om * rho) / A,
        s = (om * A) / (rho * c * c);
      const zr = q * lr,
        zi = q * (1 + lr),
        yr = s * lt,
        yi = s * (1 + lt);
      const N = Math.max(1, Math.ceil((om / c) * line.length * 4));
      const len = line.length / N;
      // short symmetric section: exact to fourth order with the series of cosh and sinh
      for (let m = 0; m < N; m++) {
        const gr = (zr * yr - zi * yi) * len * len,
          gi = (zr * yi + zi * yr) * len * len;
        const g2r = gr * gr - gi * gi,
          g2i = 2 * gr * gi;
        const cr = 1 + gr / 2 + g2r / 24,
          ci = gi / 2 + g2i / 24;
        const sr = 1 + gr / 6 + g2r / 120,
          si = gi / 6 + g2i / 120;
        const br = (zr * sr - zi * si) * len,
          bi = (zr * si + zi * sr) * len;
        const kr = (yr * sr - yi * si) * len,
          ki = (yr * si + yi * sr) * len;
        const npr = pr * cr - pi * ci + ur * br - ui * bi,
          npi = pr * ci + pi * cr + ur * bi + ui * br;
        const nur = pr * kr - pi * ki + ur * cr - ui * ci,
          nui = pr * ki + pi * kr + ur * ci + ui * cr;
        pr = npr;
        pi = npi;
        ur = nur;
        ui = nui;
      }
    }
    const x = (om * rho * (parts.innerLump + parts.plane)) / S;
    pr -= x * ui;
    pi += x * ur;
    const d = pr * pr + pi * pi;
    out.innerRe[i] = (ur * pr + ui * pi) / d;
    out.innerIm[i] = (ui * pr - ur * pi) / d;
    out.outerRe[i] = pr / d;
    out.outerIm[i] = -pi / d;
  }
  return out;
}
