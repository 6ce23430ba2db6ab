"use client";

import { useId, useRef } from "react";
import type { Answer } from "@/lib/acoustics/answer";
import type { Design } from "@/lib/document/schema";
import type { UnitPreferences } from "@/lib/units/preferences";
import { AirwayDrawing } from "./airway-drawing";
import { PlainDrawing } from "./plain-drawing";
import type { TitleBlockText } from "./title-block";
import { useBoxSize, type BoxSize } from "./use-box-size";
import type { DesignChange } from "./use-handles";
import { VentLinks } from "./vent-links";

/** What is marked on the drawing: a piece of the airway, or (piece null) a panel named by its kind. */
export interface PartSelection {
  piece: number | null;
  kind: string;
}

export interface SectionDrawingProps {
  design: Design;
  /** Index of the vent to draw. */
  vent?: number;
  answer: Answer | null;
  preferences: UnitPreferences;
  /** Without it the drawing has no handles. */
  onChange?: DesignChange;
  selected?: PartSelection | null;
  onSelect?: (selection: PartSelection | null) => void;
  /** Offers the design's other vents by name. */
  onVent?: (index: number) => void;
  title?: TitleBlockText;
  /** Layers of the baffle; two where it is thicker than 25 mm. */
  layers?: number;
  /** Size assumed until the room has been measured, and on the server [CSS px]. */
  initial?: BoxSize;
  className?: string;
}

/** The drawing's room on the Bench at 1440 px. */
const USUAL_ROOM: BoxSize = { width: 812, height: 400 };

/** The airway and its enclosure cut through the axis, to scale, live. */
export function SectionDrawing(props: SectionDrawingProps) {
  const { design, vent: index = 0, initial = USUAL_ROOM } = props;
  const id = useId();
  const room = useRef<HTMLDivElement>(null);
  const size = useBoxSize(room, initial);
  const vent = design.vents[index];
  const links = <VentLinks vents={design.vents} shown={index} onVent={props.onVent} />;
  return (
    <figure
      className={`m-0 flex h-full min-h-0 min-w-0 flex-col ${props.className ?? ""}`}
      aria-labelledby={`${id}-title`}
      data-drawing="section"
    >
      {vent && !("lumped" in vent) ? (
        <AirwayDrawing {...props} vent={index} airway={vent} id={id} room={room} size={size}>
          {links}
        </AirwayDrawing>
      ) : (
        <PlainDrawing {...props} lumped={vent ?? null} id={id} room={room} size={size}>
          {links}
        </PlainDrawing>
      )}
    </figure>
  );
}
