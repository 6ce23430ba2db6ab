/**
 * What a hand can move on the section: each handle with its value, how far it may go and why not
 * farther, and the design that follows from a new value.
 */
import {
  airwayAt,
  editAirway,
  editEnclosure,
  editPiece,
  firstPiece,
  ringsOf,
  setInnerFlare,
  setOuterFlare,
  setRingCount,
  setTubeLength,
} from "@/lib/bench/edits";
import type { AirwayVent, Design } from "@/lib/document/schema";
import type { DrawingText } from "./drawing-text";
import type { Section } from "./section";

export interface Handle {
  id: "tube" | "stack" | "outer-flare" | "inner-flare" | "wall";
  name: string;
  /** SI, or a count of rings. */
  value: number;
  min: number;
  max: number;
  step: number;
  /** Why it stops at either end. */
  minReason: string;
  maxReason: string;
  /** Where it is held: millimetres from the datum face and from the axis, upwards. */
  x: number;
  y: number;
  /** Value gained per millimetre the hand moves inwards, and away from the axis. */
  perInwards: number;
  perOutwards: number;
  cursor: "ew-resize" | "nwse-resize" | "nesw-resize";
  snap: (value: number) => number;
  say: (value: number) => string;
  edit: (value: number) => Design;
}

/** Handles of one vent; none for a vent given as a bare element. */
export function handlesOf(
  design: Design,
  ventIndex: number,
  section: Section,
  text: DrawingText,
): Handle[] {
  const vent = airwayAt(design, ventIndex);
  if (!vent) return [];
  const room = section.clearance === null ? Infinity : Math.max(0, section.clearance / 1000);
  const free = vent.clearance_m === null ? room : Infinity;
  const shortest = Math.max(section.profile.outerFlare, section.profile.innerFlare) / 1000;
  const spare = Math.max(0, section.overall / 1000 - shortest);
  const context: HandleContext = { design, ventIndex, vent, section, text, free, spare };
  return [
    tubeHandle(context),
    canStack(vent, section) ? stackHandle(context) : null,
    outerFlareHandle(context),
    innerFlareHandle(context),
    wallHandle(context),
  ].filter((handle): handle is Handle => handle !== null);
}

/** Rings go on a round vent, and not behind a moulded trumpet. */
function canStack(vent: AirwayVent, section: Section): boolean {
  return section.slot === null && (section.shellWall === null || ringsOf(vent) > 0);
}

interface HandleContext {
  design: Design;
  ventIndex: number;
  vent: AirwayVent;
  section: Section;
  text: DrawingText;
  /** Room left before the inner end meets the wall [m]. */
  free: number;
  /** How much shorter the vent may get before a flare no longer fits [m]. */
  spare: number;
}

const NO_ROOM = "The inner end meets the wall.";
const FLARE_NEEDS = "The flare needs this length.";

function lengths(text: DrawingText) {
  return {
    step: text.step_m,
    snap: (value: number) => Math.round(Math.round(value / text.snap_m) * text.snap_m * 1e7) / 1e7,
    say: (value: number) => text.full(value),
  };
}

function tubeHandle({
  design,
  ventIndex,
  vent,
  section,
  text,
  free,
  spare,
}: HandleContext): Handle | null {
  const index = firstPiece(vent, "tube");
  const piece = vent.pieces[index];
  const laid = section.pieces.find((at) => at.index === index);
  if (piece?.kind !== "tube" || !laid) return null;
  const value = piece.length_m;
  return {
    id: "tube",
    name: section.slot ? "Slot length" : "Tube length",
    value,
    min: Math.min(value, Math.max(0.001, value - spare)),
    max: Math.min(10, value + free),
    minReason: spare < value ? FLARE_NEEDS : "A tube has some length.",
    maxReason: NO_ROOM,
    x: laid.x1,
    y: laid.x1 < section.profile.end - 1e-6 ? -laid.outer : 0,
    perInwards: 0.001,
    perOutwards: 0,
    cursor: "ew-resize",
    ...lengths(text),
    edit: (length) => setTubeLength(design, ventIndex, length),
  };
}

function stackHandle({ design, ventIndex, vent, section, free, spare }: HandleContext): Handle {
  const lastStack = vent.pieces.reduce(
    (found, piece, i) => (piece.kind === "rings" ? i : found),
    -1,
  );
  const started = lastStack >= 0 ? vent : airwayAt(setRingCount(design, ventIndex, 1), ventIndex);
  const stack = started?.pieces.find((piece, i) =>
    lastStack >= 0 ? i === lastStack : piece.kind === "rings",
  );
  const each = stack?.kind === "rings" ? stack.thickness_m + stack.glue_line_m : 0.018;
  const value = lastStack >= 0 && stack?.kind === "rings" ? stack.count : 0;
  const others = ringsOf(vent) - value;
  const last = section.pieces[section.pieces.length - 1];
  const only = vent.pieces.length === 1 && value > 0;
  const fewest = Math.max(only ? 1 : 0, value - Math.floor(spare / each + 1e-9));
  const own = section.profile.endRadius;
  const outer = last?.wooden ? last.outer : own * 1.25;
  return {
    id: "stack",
    name: "Rings",
    value,
    min: Math.min(value, fewest),
    max: Math.min(
      100 - others,
      Math.max(value, value + Math.floor(Math.min(free, 10) / each + 1e-9)),
    ),
    step: 1,
    minReason: fewest > 0 ? FLARE_NEEDS : "No ring is left.",
    maxReason: 100 - others <= value ? "A vent takes 100 rings at most." : NO_ROOM,
    x: section.profile.end,
    y: Math.max((own + outer) / 2, (own + section.profile.innerFlare + outer) / 2),
    perInwards: 0.001 / each,
    perOutwards: 0,
    cursor: "ew-resize",
    snap: Math.round,
    say: (count) => `${count} ${count === 1 ? "ring" : "rings"}`,
    edit: (count) =>
      lastStack < 0 || count === 0
        ? removeOrBegin(design, ventIndex, lastStack, count)
        : editPiece(design, ventIndex, lastStack, (piece) =>
            piece.kind === "rings" ? { ...piece, count } : piece,
          ),
  };
}

function removeOrBegin(design: Design, ventIndex: number, at: number, count: number): Design {
  if (at < 0) return setRingCount(design, ventIndex, count);
  return editAirway(design, ventIndex, (vent) => {
    const pieces = vent.pieces.filter((_, i) => i !== at);
    return pieces.length > 0 ? { ...vent, pieces } : vent;
  });
}

function outerFlareHandle({ design, ventIndex, section, text }: HandleContext): Handle {
  const { profile, overall } = section;
  const value = profile.outerFlare / 1000;
  return {
    id: "outer-flare",
    name: "Outer flare radius",
    value,
    min: 0,
    max: Math.max(value, Math.min(1, overall / 1000)),
    minReason: "The edge is sharp.",
    maxReason: "A flare is no deeper than the vent is long.",
    x: profile.mouth,
    y: profile.mouthRadius + profile.outerFlare,
    perInwards: 0.001,
    perOutwards: 0.001,
    cursor: "nesw-resize",
    ...lengths(text),
    edit: (radius) => setOuterFlare(design, ventIndex, radius),
  };
}

/** Wood that must stand outside a cut inner flare [m]. */
const LEAST_WOOD_M = 0.001;

function innerFlareHandle({ design, ventIndex, vent, section, text }: HandleContext): Handle {
  const { profile, overall } = section;
  const value = profile.innerFlare / 1000;
  const last = section.pieces[section.pieces.length - 1];
  const cut = vent.inner_end.form === "cut" && !section.slot && last !== undefined;
  const wood = cut ? Math.max(0, (last.outer - last.own) / 1000 - LEAST_WOOD_M) : Infinity;
  const limit = Math.min(1, overall / 1000, wood);
  return {
    id: "inner-flare",
    name: "Inner flare radius",
    value,
    min: 0,
    max: Math.max(value, limit),
    minReason: "The edge is sharp.",
    maxReason:
      limit === wood
        ? "A cut flare must leave wood inside the last piece."
        : "A flare is no deeper than the vent is long.",
    x: profile.end,
    y: (section.slot ? 1 : -1) * (profile.endRadius + profile.innerFlare),
    perInwards: -0.001,
    perOutwards: section.slot ? 0.001 : -0.001,
    cursor: section.slot ? "nwse-resize" : "nesw-resize",
    ...lengths(text),
    edit: (radius) => setInnerFlare(design, ventIndex, radius),
  };
}

function wallHandle({ design, ventIndex, vent, section, text }: HandleContext): Handle | null {
  const { clearance, profile } = section;
  if (clearance === null) return null;
  const inside = design.enclosure.inside_m;
  const common = {
    id: "wall" as const,
    minReason: NO_ROOM,
    maxReason: "That is as far as the design document goes.",
    x: profile.end + clearance,
    y: 0,
    perInwards: 0.001,
    perOutwards: 0,
    cursor: "ew-resize" as const,
    ...lengths(text),
  };
  if (vent.clearance_m !== null)
    return {
      ...common,
      name: "Inner end to wall",
      value: vent.clearance_m,
      min: 0,
      max: 20,
      edit: (clearance_m) => editAirway(design, ventIndex, (old) => ({ ...old, clearance_m })),
    };
  if (!inside) return null;
  return {
    ...common,
    name: "Inside depth",
    value: inside.depth,
    min: Math.max(1e-4, inside.depth - clearance / 1000),
    max: 10,
    edit: (depth) => editEnclosure(design, { inside_m: { ...inside, depth } }),
  };
}
