/** The solids of a section as closed outlines with their sheets: panel, tube, rings, plate, walls. */
import {
  airRadius,
  outerFlareAt,
  outerFlareRadius,
  solidOutline,
  trumpetOutline,
} from "./bore-profile";
import type { Outline, OutlinePoint, Side } from "./outline";
import {
  holeCylinder,
  insideAbove,
  panelHole,
  sharedSides,
  type Section,
  type SectionPiece,
  type Span,
} from "./section";

export type PartKind = "panel" | "tube" | "rings" | "plate" | "bend" | "wall" | "side";

/** One sheet of wood in a part: plies run parallel to its faces. */
export interface Sheet extends Span {
  /** Reach of the sheet across the axis at x [mm]; for a sheet along the axis, constant. */
  from: (x: number) => number;
  to: (x: number) => number;
  /** Faces parallel to the axis (a floor, a slot's board) instead of across it. */
  along: boolean;
}

export interface SectionPart {
  id: string;
  kind: PartKind;
  /** Index into the vent's pieces; null for the enclosure's own panels. */
  piece: number | null;
  side: Side;
  wooden: boolean;
  outlines: Outline[];
  sheets: Sheet[];
  glue: Sheet[];
  /** Box that no lettering may cover [mm]. */
  x0: number;
  x1: number;
  outer: number;
}

/**
 * The parts to draw.
 *
 * @param section - the vent and its enclosure, cut
 * @param panelHalf - how far from the axis the panels are shown before they break off [mm]
 * @param breakDepth - depth of the wave of a broken edge [mm]
 */
export function sectionParts(
  section: Section,
  panelHalf: number,
  breakDepth: number,
): SectionPart[] {
  const top = edgeOf(section, panelHalf, breakDepth);
  const { floor, ceiling } = sharedSides(section);
  const parts: SectionPart[] = [];
  if (!ceiling) parts.push(panelPart(section, top, floor ? "above" : "both"));
  const wall = wallPart(section, top);
  if (wall) parts.push(wall);
  const far = wall?.x1 ?? section.profile.end + 0.5 * section.overall;
  const half = section.slot ? section.slot.height / 2 : 0;
  if (floor) parts.push(sidePart("floor", "below", section, half, far));
  if (ceiling) parts.push(sidePart("ceiling", "above", section, half, far));
  const inside = insideAbove(section);
  if (inside !== null && inside + section.board <= panelHalf + 1e-6) {
    if (!floor) parts.push(sidePart("low", "below", section, inside, far));
    if (!ceiling) parts.push(sidePart("high", "above", section, inside, far));
  }
  const side: Side = ceiling ? "both" : floor ? "above" : "both";
  if (!ceiling) for (const piece of section.pieces) parts.push(piecePart(section, piece, side));
  return parts.filter((part) => part.outlines.length > 0);
}

/** Outer edge of a panel: straight where the box ends, a wave where the drawing breaks it off. */
function edgeOf(section: Section, half: number, depth: number): (x: number, span: Span) => number {
  const inside = insideAbove(section);
  if (inside !== null && inside + section.board <= half + 1e-6) return () => inside;
  return (x, { x0, x1 }) =>
    half - depth * (0.5 - 0.5 * Math.sin((2 * Math.PI * (x - x0)) / (x1 - x0)));
}

function panelPart(
  section: Section,
  top: (x: number, span: Span) => number,
  side: Side,
): SectionPart {
  const whole: Span = { x0: 0, x1: section.panel };
  const closed = section.pieces.length === 0;
  return {
    id: "panel",
    kind: "panel",
    piece: null,
    side: closed ? "above" : side,
    wooden: true,
    outlines: section.layers.map((layer) => {
      const edge = waveEdge(whole, layer, top);
      const foot = closed
        ? edge.map(({ x, y }) => ({ x, y: -y })).reverse()
        : holeEdge(section, layer);
      return [...edge, ...foot];
    }),
    sheets: section.layers.map((layer) => ({
      ...layer,
      from: (x) => (closed ? -top(x, whole) : panelHole(section, x)),
      to: (x) => top(x, whole),
      along: false,
    })),
    glue: [],
    ...whole,
    outer: top(0, whole),
  };
}

function waveEdge(whole: Span, span: Span, top: (x: number, span: Span) => number): OutlinePoint[] {
  const steps = 6;
  return Array.from({ length: steps + 1 }, (_, i) => {
    const x = span.x0 + ((span.x1 - span.x0) * i) / steps;
    return { x, y: top(x, whole) };
  });
}

/** The hole's edge through one layer, from its inner to its outer face. */
function holeEdge(section: Section, { x0, x1 }: Span): OutlinePoint[] {
  const { profile } = section;
  if (section.mouldedWall !== null) {
    const y = panelHole(section, x0);
    return [
      { x: x1, y },
      { x: x0, y },
    ];
  }
  const cuts = section.pieces
    .flatMap((piece) => [piece.x0, piece.x1])
    .filter((x) => x > x0 + 1e-6 && x < x1 - 1e-6);
  const places = [...new Set([x0, ...cuts, x1])].sort((a, b) => b - a);
  const edge: OutlinePoint[] = [];
  for (let i = 0; i + 1 < places.length; i++) {
    const right = places[i] ?? x1;
    const left = places[i + 1] ?? x0;
    const cylinder = holeCylinder(section, (left + right) / 2);
    edge.push({ x: right, y: Math.max(cylinder, outerFlareRadius(profile, right)) });
    const flared = outerFlareRadius(profile, left);
    if (flared <= cylinder) edge.push({ x: left, y: cylinder });
    else {
      const foot = outerFlareAt(profile, cylinder);
      if (foot < right) edge.push({ x: foot, y: cylinder });
      edge.push({ x: left, y: flared, radius: profile.outerFlare, clockwise: true });
    }
  }
  return edge;
}

function piecePart(section: Section, piece: SectionPiece, side: Side): SectionPart {
  const { profile, mouldedWall, shellWall } = section;
  const isFirst = piece === section.pieces[0];
  const isLast = piece === section.pieces[section.pieces.length - 1];
  const x0 =
    isFirst && mouldedWall !== null
      ? Math.min(piece.x1, profile.mouth + profile.outerFlare)
      : piece.x0;
  const x1 =
    isLast && shellWall !== null ? Math.max(x0, profile.end - profile.innerFlare) : piece.x1;
  const bare =
    mouldedWall !== null || shellWall !== null ? { ...profile, ...flaresLeft(section) } : profile;
  const outlines = [solidOutline(bare, { x0, x1, own: piece.own, outer: piece.outer })];
  if (isFirst && mouldedWall !== null) outlines.push(trumpetOutline(profile, "mouth", mouldedWall));
  if (isLast && shellWall !== null) outlines.push(trumpetOutline(profile, "end", shellWall));
  if (
    isFirst &&
    !piece.wooden &&
    mouldedWall === null &&
    section.proud > 0 &&
    profile.outerFlare > 0
  ) {
    const lip = profile.mouthRadius + profile.outerFlare + FLANGE_LIP_MM;
    outlines.push(
      solidOutline(profile, {
        x0: piece.x0,
        x1: Math.min(0, piece.x1),
        own: piece.outer,
        outer: lip,
      }),
    );
  }
  const sheet = (span: Span): Sheet =>
    section.slot
      ? { ...span, from: () => piece.own, to: () => piece.outer, along: true }
      : {
          ...span,
          from: (x) => Math.min(airRadius(profile, piece.own, x), piece.outer),
          to: () => piece.outer,
          along: false,
        };
  return {
    id: `piece-${piece.index}`,
    kind: piece.kind,
    piece: piece.index,
    side,
    wooden: piece.wooden,
    outlines: outlines.filter((outline) => outline.length > 0),
    sheets: piece.sheets.map(sheet),
    glue: piece.glue.map(sheet),
    x0: piece.x0,
    x1: piece.x1,
    outer: piece.outer,
  };
}

/** How far a flange laid on the panel's face is drawn beyond its flare [mm]. */
const FLANGE_LIP_MM = 5;

function flaresLeft(section: Section): { outerFlare: number; innerFlare: number } {
  return {
    outerFlare: section.mouldedWall === null ? section.profile.outerFlare : 0,
    innerFlare: section.shellWall === null ? section.profile.innerFlare : 0,
  };
}

function wallPart(section: Section, top: (x: number, span: Span) => number): SectionPart | null {
  if (section.clearance === null) return null;
  const x0 = section.profile.end + section.clearance;
  const span: Span = { x0, x1: x0 + section.board };
  const { floor } = sharedSides(section);
  const half = section.slot ? section.slot.height / 2 : 0;
  const foot = floor ? -half : null;
  const edge = waveEdge(span, span, top);
  const outline: Outline = [
    ...edge,
    ...(foot === null
      ? edge.map(({ x, y }) => ({ x, y: -y })).reverse()
      : [
          { x: span.x1, y: foot },
          { x: span.x0, y: foot },
        ]),
  ];
  const sheet: Sheet = {
    ...span,
    from: (x) => foot ?? -top(x, span),
    to: (x) => top(x, span),
    along: false,
  };
  return {
    id: "wall",
    kind: "wall",
    piece: null,
    side: "above",
    wooden: true,
    outlines: [outline],
    sheets: [sheet],
    glue: [],
    ...span,
    outer: top(span.x0, span),
  };
}

function sidePart(
  name: string,
  side: Side,
  section: Section,
  half: number,
  far: number,
): SectionPart {
  const y1 = half + section.board;
  return {
    id: `side-${name}`,
    kind: "side",
    piece: null,
    side,
    wooden: true,
    outlines: [
      [
        { x: 0, y: y1 },
        { x: far, y: y1 },
        { x: far, y: half },
        { x: 0, y: half },
      ],
    ],
    sheets: [{ x0: 0, x1: far, from: () => half, to: () => y1, along: true }],
    glue: [],
    x0: 0,
    x1: far,
    outer: y1,
  };
}
