"use client";

import { useId, useMemo, useRef, useState } from "react";
import type { Answer } from "@/lib/acoustics/answer";
import { airwayAt } from "@/lib/bench/edits";
import type { Design } from "@/lib/document/schema";
import { drawingText } from "@/lib/drawing/drawing-text";
import { dimensionRows, partName, sectionSummary } from "@/lib/drawing/describe";
import { placeHandles } from "@/lib/drawing/handle-places";
import { handlesOf } from "@/lib/drawing/handles";
import { layOutSheet, type DrawnPart } from "@/lib/drawing/sheet";
import { scaleName } from "@/lib/drawing/sheet-frame";
import type { UnitPreferences } from "@/lib/units/preferences";
import { BareVent } from "./bare-vent";
import { DimensionTable } from "./dimension-table";
import { HandleView } from "./handle-view";
import { SheetView } from "./sheet-view";
import { TitleBlock, type TitleBlockText } from "./title-block";
import { useBoxSize } from "./use-box-size";
import { useHandles, type DesignChange } from "./use-handles";
import { useSheetView } from "./use-sheet-view";
import { ViewControls } from "./view-controls";
import styles from "./section.module.css";

export interface PartSelection {
  piece: number | null;
  kind: string;
}

export interface SectionDrawingProps {
  design: Design;
  /** Which vent is drawn. */
  vent: number;
  answer: Answer | null;
  preferences: UnitPreferences;
  title?: TitleBlockText;
  /** Room for the drawing before it has been measured [px]. */
  initial?: { width: number; height: number };
  selected?: PartSelection | null;
  onSelect?: (selection: PartSelection | null) => void;
  /** Left out: the drawing is only looked at. */
  onChange?: DesignChange;
}

const WIDE = { width: 800, height: 430 };

/** The airway and the enclosure cut through the axis, to scale; a hand can move what it is made of. */
export function SectionDrawing(props: SectionDrawingProps) {
  return airwayAt(props.design, props.vent) ? (
    <Drawing {...props} />
  ) : (
    <BareVent vent={props.design.vents[props.vent] ?? null} preferences={props.preferences} />
  );
}

function Drawing(props: SectionDrawingProps) {
  const { design, answer, preferences, initial = WIDE, selected, onSelect, onChange } = props;
  const vent = airwayAt(design, props.vent)!;
  const figures = answer?.vents[props.vent] ?? null;
  const id = useId();
  const room = useRef<HTMLDivElement>(null);
  const box = useBoxSize(room, initial);
  const look = useSheetView(box);
  const [pointed, setPointed] = useState<string | null>(null);
  const [reason, setReason] = useState<string | null>(null);
  const text = useMemo(() => drawingText(preferences), [preferences]);
  // The frame is held while a hand drags; it is then laid out in the frame of the start.
  const request = { vent, enclosure: design.enclosure, figures, text, ...box };
  const free = layOutSheet(request);
  const { bindings, hold } = useHandles(
    design,
    free.frame.hold,
    () => look.view.zoom,
    onChange,
    setReason,
  );
  const sheet = hold ? layOutSheet({ ...request, hold }) : free;
  const { section } = sheet;
  const handles = onChange ? handlesOf(design, props.vent, section, text) : [];
  const nameOf = (part: string) => partName(part, section, vent, text);
  const pick = onSelect
    ? (part: DrawnPart) => onSelect({ piece: part.piece, kind: part.kind })
    : undefined;
  const pressed = sheet.parts.find(
    ({ piece, kind }) =>
      selected && piece === selected.piece && (piece !== null || kind === selected.kind),
  );
  const summary = sectionSummary(section, vent, figures, text);
  const { zoom, x, y } = look.view;
  return (
    <div className="flex h-full min-h-0 flex-col">
      <div ref={room} className="relative min-h-0 flex-1">
        <svg
          className={`${styles.svg} absolute inset-0 block h-full w-full`}
          viewBox={`${x / zoom} ${y / zoom} ${box.width / zoom} ${box.height / zoom}`}
          preserveAspectRatio="xMidYMid meet"
          role="group"
          aria-label={summary}
          style={{ touchAction: zoom > 1 ? "none" : "pan-y" }}
          {...look.handlers}
        >
          <SheetView
            sheet={sheet}
            id={id}
            nameOf={nameOf}
            pressed={pressed?.id ?? null}
            onPick={pick}
            onPoint={setPointed}
          />
          {placeHandles(handles, sheet.frame.transform).map((place) => (
            <HandleView key={place.handle.id} place={place} bindings={bindings} />
          ))}
        </svg>
        <p
          className="pointer-events-none absolute top-2 left-3 text-sm text-ink-2"
          aria-live="polite"
        >
          {reason ?? pointed ?? (vent.count > 1 ? `${vent.count} vents alike; one is drawn` : "")}
        </p>
      </div>
      <div className="flex flex-wrap items-end justify-between gap-x-4 gap-y-1 px-3 pb-1">
        <div className="flex flex-wrap items-center gap-x-4">
          <ViewControls zoom={zoom} onZoom={look.zoomBy} onFit={look.reset} />
          <DimensionTable rows={dimensionRows(section, vent, figures, text)} summary={summary} />
        </div>
        <TitleBlock
          text={props.title ?? {}}
          scale={scaleName(sheet.frame.transform.scale * zoom)}
          units={preferences.system === "metric" ? "mm" : "in"}
        />
      </div>
    </div>
  );
}
