/** The air inside a vent as one closed path, flares and bore steps included. */
import { airRadius, innerFlareAt, outerFlareAt } from "./bore-profile";
import { sheetNumber, type SheetTransform } from "./outline";
import type { Section } from "./section";

const ARC_POINTS = 10;

/** Path data of the air between mouth and innermost plane. */
export function airPath(section: Section, transform: SheetTransform): string {
  const { profile, pieces } = section;
  const edge: [number, number][] = [];
  for (const piece of pieces) {
    const foot = Math.min(piece.x1, Math.max(piece.x0, outerFlareAt(profile, piece.own)));
    const rise = Math.max(foot, Math.min(piece.x1, innerFlareAt(profile, piece.own)));
    const arc = (from: number, to: number) => {
      if (to - from < 1e-9) return;
      for (let i = 0; i <= ARC_POINTS; i++) {
        const x = from + ((to - from) * i) / ARC_POINTS;
        edge.push([x, airRadius(profile, piece.own, x)]);
      }
    };
    const left = Math.max(piece.x0, profile.mouth);
    if (profile.outerFlare > 0) arc(left, foot);
    edge.push(
      [foot, airRadius(profile, piece.own, foot)],
      [rise, airRadius(profile, piece.own, rise)],
    );
    if (profile.innerFlare > 0) arc(rise, piece.x1);
    else edge.push([piece.x1, piece.own]);
  }
  if (edge.length === 0) return "";
  const point = ([x, y]: [number, number], sign: number) =>
    `${sheetNumber(transform.x(x))} ${sheetNumber(transform.axis + sign * y * transform.scale)}`;
  const top = edge.map((at) => point(at, -1));
  const bottom = edge.map((at) => point(at, 1)).reverse();
  return `M${[...top, ...bottom].join("L")}Z`;
}
