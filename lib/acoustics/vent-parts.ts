/** A vent taken apart: its lines, and the lumped air at its ends. */
import type { AirwayVent, Enclosure } from "@/lib/document/schema";
import { layOutAirway, type Airway } from "./airway";
import type { Note } from "./answer";
import { displacedVolume } from "./displaced-volume";
import * as ends from "./end-corrections";
import { InputError } from "./input-error";

/** A short cylinder of the airway. Lengths and radii [m]. */
export interface Line {
  length: number;
  radius: number;
  perimeterRadius: number;
}
export interface VentParts {
  airway: Airway;
  lines: Line[];
  outerLump: number;
  innerLump: number;
  /** The inner lump without the enclosure walls' reduction, as at a pipe resonance. */
  openInnerLump: number;
  plane: number;
  outer: number;
  inner: number;
  steps: number;
  displaced: number;
  notes: Note[];
}

/**
 * Takes an airway vent apart. Ends are composed as: the end as it is in free space (wall, flare),
 * the flange it still feels, less the enclosure's cross-section, plus the wall it faces; the
 * enclosure's plane air beside them.
 *
 * @throws InputError for flares that cannot be and a negative clearance
 * @source reference notes on acoustics, 14; parts as in end-corrections.ts
 */
export function ventParts(vent: AirwayVent, enclosure: Enclosure, path: string): VentParts {
  const airway = layOutAirway(vent, enclosure, path);
  const a = airway.boreRadius_m,
    S = airway.boreArea_m2;
  const notes: Note[] = [];
  const ro = vent.outer_end.flare_radius_m,
    ri = vent.inner_end.flare_radius_m;
  refuseFlares(vent, airway, path);
  const last = airway.segments.at(-1);
  const lastOuter = last?.outer_m ?? 2 * a * 1.06;
  const shell = vent.inner_end.form === "shell";
  const wall = vent.inner_end.wall_m ?? Math.max(0.001, lastOuter / 2 - a);
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
  const shareOut = ends.flangeShare(proud / a, b0 - 1);
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
  const shareIn = ends.enclosedFlangeShare(p / a, body - 1, xi > 0 ? p / R : 0);
  let inner = (freeInner + (flushInner - freeInner) * shareIn) * scale * a - ri;
  const reduction = xi > 0 ? ends.boxReduction(xi, p / R) * a * (slot ? scale : 1) : 0;
  inner -= reduction;
  inner += a * ends.enclosedWallIncrement(h / a, xi > 0 ? 1 / xi : Infinity, ri / a, body);
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
  const plane =
    xi > 0 && Number.isFinite(h)
      ? a * ends.planeAir(1 / xi, h / a, p / a, Math.min(body, 0.9 / xi))
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
    openInnerLump: inner + reduction + ri - eq(inLines) + steps,
    plane,
    outer,
    inner,
    steps: steps + bulge,
    displaced: displacedVolume(vent, enclosure, airway, a, wall),
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

/** Flares that cannot be: longer than the vent, or cut through the outside of the last piece. */
function refuseFlares(vent: AirwayVent, airway: Airway, path: string): void {
  const { flare_radius_m: inner, form } = vent.inner_end;
  const both = vent.outer_end.flare_radius_m + inner;
  if (both > airway.overallLength_m + 1e-9)
    throw new InputError(
      "flare_too_large",
      `${path}.${inner > vent.outer_end.flare_radius_m ? "inner" : "outer"}_end.flare_radius_m`,
      "The flares are longer than the vent.",
      `0 to ${airway.overallLength_m.toFixed(4)} m for both flares together`,
    );
  const last = airway.segments.at(-1);
  const wood = last?.outer_m == null ? Infinity : (last.outer_m - last.bore_m) / 2;
  if (inner > 0 && form === "cut" && inner >= wood)
    throw new InputError(
      "flare_leaves_no_wood",
      `${path}.inner_end.flare_radius_m`,
      "The inner flare cuts through the outside of the last piece.",
      `less than ${wood.toFixed(4)} m`,
    );
}
