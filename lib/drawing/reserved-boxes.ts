/** What no lettering beside the section may cover: solids, lines and grips. */
import type { AirStroke } from "./annotations";
import type { Box } from "./place-labels";
import type { Section } from "./section";
import type { SectionPart } from "./section-parts";
import type { SheetFrame } from "./sheet-frame";

/** Lines that lettering beside the axis keeps clear of. */
export function reservedBoxes(
  frame: SheetFrame,
  air: { stroke: AirStroke | null; boreAt: number },
): Box[] {
  const { axis } = frame.transform;
  const boxes: Box[] = [{ x0: -1e5, x1: 1e5, y0: axis - 0.5, y1: axis + 0.5 }];
  const { stroke, boreAt } = air;
  boxes.push({ x0: boreAt - 1, x1: boreAt + 1, y0: axis, y1: axis + 1e4 });
  if (stroke) boxes.push({ x0: stroke.x0, x1: stroke.x1, y0: stroke.y - 2, y1: stroke.y + 2 });
  return boxes;
}

/** What a part covers above and below the axis; one box where it crosses it. */
export function partBoxes(part: SectionPart, { transform }: SheetFrame): Box[] {
  return part.outlines.flatMap((outline) => {
    const across = outline.map((point) => point.y);
    const along = outline.map((point) => transform.x(point.x));
    const box = (from: number, to: number): Box => ({
      x0: Math.min(...along),
      x1: Math.max(...along),
      y0: transform.axis - to * transform.scale,
      y1: transform.axis - from * transform.scale,
    });
    const [low, high] = [Math.min(...across), Math.max(...across)];
    return [
      ...(part.side !== "below" ? [box(low, high)] : []),
      ...(part.side !== "above" ? [box(-high, -low)] : []),
    ];
  });
}

/** Half the side of the square that a grip is given [px]. */
const GRIP = 8;

/** Where grips stand that lettering could meet: the ends of the tube and both flares. */
export function gripBoxes(section: Section, { transform }: SheetFrame): Box[] {
  const { profile, pieces } = section;
  const tube = pieces.find((piece) => piece.kind === "tube");
  const grips: [number, number][] = [
    [profile.mouth, profile.mouthRadius + profile.outerFlare],
    [profile.end, (section.slot ? 1 : -1) * (profile.endRadius + profile.innerFlare)],
    [profile.end, 0],
  ];
  if (tube) grips.push([tube.x1, tube.x1 < profile.end - 1e-6 ? -tube.outer : 0]);
  return grips.map(([along, across]) => {
    const x = transform.x(along);
    const y = transform.axis - across * transform.scale;
    return { x0: x - GRIP, x1: x + GRIP, y0: y - GRIP, y1: y + GRIP };
  });
}
