/** The sheet of a box that has no airway to cut: its panels alone. */
import type { Enclosure } from "@/lib/document/schema";
import { outlinePath } from "./outline";
import { fillPath, plyPath } from "./plies";
import { closedSection } from "./section";
import { sectionParts } from "./section-parts";
import type { DrawnPart } from "./sheet";
import { frameOf } from "./sheet-frame";

export type { DrawnPart };

export interface ClosedBox {
  parts: DrawnPart[];
  scale: number;
  axis: number;
  /** Between panel and back: where words may stand. */
  middle: number;
}

export function layOutClosedBox(
  enclosure: Enclosure,
  width: number,
  height: number,
  layers?: number,
): ClosedBox {
  const section = closedSection(enclosure, layers);
  const room = { width, height, above: 24, below: 24 };
  const { transform, panelHalf } = frameOf(section, room, { outer: 0, inner: 0 });
  const parts = sectionParts(
    section,
    panelHalf,
    Math.min(5 / transform.scale, 0.3 * section.panel),
  ).map((part) => ({
    id: part.id,
    kind: part.kind,
    piece: part.piece,
    wooden: part.wooden,
    outline: part.outlines.map((outline) => outlinePath(outline, transform, part.side)).join(""),
    plies: plyPath(part.sheets, transform, part.side),
    glue: fillPath(part.glue, transform, part.side),
  }));
  const back =
    section.clearance === null ? width : transform.x(section.profile.end + section.clearance);
  return {
    parts,
    scale: transform.scale,
    axis: transform.axis,
    middle: (transform.x(section.panel) + back) / 2,
  };
}
