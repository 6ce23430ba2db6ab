/** The drawing in words and as a table, for those who do not see it or would rather read. */
import type { VentAnswer } from "@/lib/acoustics/answer";
import type { AirwayVent } from "@/lib/document/schema";
import { chainOf, overallOf } from "./dimension-chain";
import type { DrawingText } from "./drawing-text";
import type { Section } from "./section";
import { airStroke } from "./sheet";

export interface DimensionRow {
  name: string;
  value: string;
}

/** Every dimension of the section, in the order of the drawing. */
export function dimensionRows(
  section: Section,
  vent: AirwayVent,
  figures: VentAnswer | null,
  text: DrawingText,
): DimensionRow[] {
  const mm = (length: number) => text.full(length / 1000);
  const { slot, profile } = section;
  const rows: DimensionRow[] = [
    slot
      ? { name: "Slot, width × height", value: `${mm(slot.width)} × ${mm(slot.height)}` }
      : { name: "Bore", value: `Ø ${mm(2 * Math.min(profile.mouthRadius, profile.endRadius))}` },
    {
      name: section.layers.length > 1 ? `Baffle, ${section.layers.length} layers` : "Baffle",
      value: mm(section.panel),
    },
  ];
  if (slot) rows.push({ name: "Sides on the box's own panels", value: `${slot.shared} of 4` });
  if (section.proud > 0)
    rows.push({ name: "Mouth before the outer face", value: mm(section.proud) });
  if (profile.outerFlare > 0)
    rows.push({ name: "Outer flare radius", value: mm(profile.outerFlare) });
  for (const dimension of chainOf(section, vent, text)) {
    const piece = section.pieces.find((at) => `piece-${at.index}` === dimension.id);
    const given = piece ? vent.pieces[piece.index] : undefined;
    const detail =
      given?.kind === "rings" ? `${given.count} × ${text.full(given.thickness_m)}, together ` : "";
    rows.push({ name: dimension.name, value: detail + text.full(dimension.length_m) });
    if (piece?.outerKnown)
      rows.push({ name: `${dimension.name}, outside`, value: `Ø ${mm(2 * piece.outer)}` });
  }
  if (profile.innerFlare > 0)
    rows.push({
      name: section.shellWall === null ? "Inner flare radius, cut" : "Inner flare radius, moulded",
      value: mm(profile.innerFlare),
    });
  const overall = overallOf(section, text);
  rows.push({ name: overall.name, value: text.full(overall.length_m) });
  if (figures) {
    rows.push(
      { name: "End air outside", value: text.full(figures.end_corrections_m.outer) },
      { name: "End air inside", value: text.full(figures.end_corrections_m.inner) },
    );
    const peak = figures.peak_air_speed;
    if (peak)
      rows.push({
        name: `Air stroke, peak to peak at ${text.frequency(peak.frequency_hz)}`,
        value: text.full(airStroke(peak.speed_m_s, peak.frequency_hz)),
      });
  }
  return rows;
}

/** One paragraph that says what the section shows. */
export function sectionSummary(
  section: Section,
  vent: AirwayVent,
  figures: VentAnswer | null,
  text: DrawingText,
): string {
  const pieces = vent.pieces
    .filter((_, index) => section.pieces.some((piece) => piece.index === index))
    .map((piece) => {
      if (piece.kind === "rings")
        return `${piece.count} ${piece.count === 1 ? "ring" : "rings"} of ${text.full(piece.thickness_m)}`;
      if (piece.kind === "plate") return `a support plate of ${text.full(piece.thickness_m)}`;
      if (piece.kind === "bend") return `a bend of ${piece.angle_deg}°`;
      return `a ${section.slot ? "slot" : "tube"} of ${text.full(piece.length_m)}`;
    });
  const clear =
    section.clearance === null
      ? ""
      : section.clearance < 0
        ? ` It is ${text.full(-section.clearance / 1000)} too long for the box.`
        : ` ${text.full(section.clearance / 1000)} stay clear behind its inner end.`;
  const peak = figures?.peak_air_speed;
  const air = peak
    ? ` Air moves ${text.full(airStroke(peak.speed_m_s, peak.frequency_hz))} peak to peak at ${text.frequency(peak.frequency_hz)}.`
    : "";
  return `${vent.name}, cut through its axis. From the mouth inwards: ${pieces.join(", ")}; ${text.full(section.overall / 1000)} overall from the outer face.${clear}${air}`;
}

/** A part's name and size, shown when it is pointed at. */
export function partName(
  id: string,
  section: Section,
  vent: AirwayVent,
  text: DrawingText,
): string {
  const mm = (length: number) => text.full(length / 1000);
  const piece = section.pieces.find((at) => `piece-${at.index}` === id);
  if (piece) {
    const given = vent.pieces[piece.index];
    const outside = piece.outerKnown ? `, Ø ${mm(2 * piece.outer)} outside` : "";
    const bore = section.slot ? "" : `, bore ${mm(2 * piece.own)}`;
    const length = mm(piece.x1 - piece.x0);
    if (given?.kind === "rings")
      return `Rings: ${given.count} × ${text.full(given.thickness_m)}, together ${length}${outside}${bore}`;
    if (given?.kind === "plate") return `Support plate: ${length}${outside}${bore}`;
    if (given?.kind === "bend")
      return `Bend of ${given.angle_deg}°: ${length} along its centreline, drawn unfolded`;
    return section.slot
      ? `Slot: ${length} long, ${mm(section.slot.width)} × ${mm(section.slot.height)}`
      : `Tube: ${length} long${outside}${bore}`;
  }
  if (id === "panel")
    return section.layers.length > 1
      ? `Baffle: ${section.layers.length} layers, together ${mm(section.panel)}`
      : `Baffle: ${mm(section.panel)}`;
  if (id === "wall") return section.wallIsBack ? "Back panel" : "Wall the vent faces";
  if (id === "side-floor" || id === "side-ceiling")
    return "The box's own panel: one side of the slot";
  return "Side of the box, drawn as if the vent stood in its middle";
}
