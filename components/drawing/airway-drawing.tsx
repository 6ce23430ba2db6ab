"use client";

import { useMemo, useState, type ReactNode, type RefObject } from "react";
import type { AirwayVent } from "@/lib/document/schema";
import { dimensionRows, partName, sectionSummary } from "@/lib/drawing/describe";
import { drawingText } from "@/lib/drawing/drawing-text";
import { placeHandles } from "@/lib/drawing/handle-places";
import { handlesOf } from "@/lib/drawing/handles";
import { layOutSheet, type DrawnPart } from "@/lib/drawing/sheet";
import type { FrameHold } from "@/lib/drawing/sheet-frame";
import { scaleName } from "@/lib/drawing/sheet-frame";
import { DimensionTable } from "./dimension-table";
import { HandleView } from "./handle-view";
import styles from "./section.module.css";
import type { SectionDrawingProps } from "./section-drawing";
import { SheetView } from "./sheet-view";
import { TitleBlock } from "./title-block";
import type { BoxSize } from "./use-box-size";
import { useHandles } from "./use-handles";
import { useSheetView } from "./use-sheet-view";
import { ViewControls } from "./view-controls";

interface AirwayDrawingProps extends SectionDrawingProps {
  vent: number;
  airway: AirwayVent;
  id: string;
  room: RefObject<HTMLDivElement | null>;
  size: BoxSize;
  children: ReactNode;
}

/** The section of a vent, with handles, names, title block and table. */
export function AirwayDrawing(props: AirwayDrawingProps) {
  const {
    design,
    vent,
    airway,
    answer,
    preferences,
    selected,
    onSelect,
    id,
    size,
    title,
    children,
    layers,
    onChange,
    room,
  } = props;
  const [pointed, setPointed] = useState<string | null>(null);
  const [reason, setReason] = useState<string | null>(null);
  const [hold, setHold] = useState<FrameHold | undefined>();
  const { view, zoomBy, reset, handlers } = useSheetView(size);
  const text = useMemo(() => drawingText(preferences), [preferences]);
  const figures = answer?.vents[vent] ?? null;
  const { enclosure } = design;
  const width = size.width * view.zoom;
  const height = size.height * view.zoom;
  const sheet = useMemo(
    () =>
      layOutSheet({
        vent: airway,
        enclosure,
        figures,
        text,
        width,
        height,
        layers: layers,
        hold,
      }),
    [airway, enclosure, figures, text, width, height, layers, hold],
  );
  const { section, frame } = sheet;
  const bindings = useHandles(design, frame.hold, onChange, setReason, setHold);
  const places = useMemo(
    () => (onChange ? placeHandles(handlesOf(design, vent, section, text), frame.transform) : []),
    [onChange, design, vent, section, text, frame],
  );
  const nameOf = useMemo(
    () => (part: string) => partName(part, section, airway, text),
    [section, airway, text],
  );
  const onPick = useMemo(() => {
    if (!onSelect) return undefined;
    return (part: DrawnPart) => onSelect({ piece: part.piece, kind: part.kind });
  }, [onSelect]);
  const pressed = selected
    ? (sheet.parts.find((part) => part.piece === selected.piece && part.kind === selected.kind)
        ?.id ?? null)
    : null;
  const summary = sectionSummary(section, airway, figures, text);
  return (
    <>
      <div ref={room} className="relative min-h-0 flex-1 overflow-hidden">
        <svg
          className={`${styles.svg} absolute inset-0 h-full w-full`}
          style={{ touchAction: view.zoom > 1 ? "none" : "pan-y" }}
          viewBox={`${view.x} ${view.y} ${size.width} ${size.height}`}
          role="group"
          aria-labelledby={`${id}-title`}
          aria-describedby={`${id}-desc`}
          {...handlers}
        >
          <title id={`${id}-title`}>{`${design.name}: ${airway.name}, section`}</title>
          <desc id={`${id}-desc`}>{summary}</desc>
          <SheetView
            sheet={sheet}
            id={id}
            nameOf={nameOf}
            pressed={pressed}
            onPick={onPick}
            onPoint={setPointed}
          />
          {places.map((place) => (
            <HandleView key={place.handle.id} place={place} bindings={bindings} />
          ))}
        </svg>
      </div>
      <figcaption className="flex flex-wrap items-end justify-between gap-x-4 gap-y-1 px-3 pb-1">
        <div className="flex min-w-0 grow basis-full flex-wrap items-center gap-x-4 gap-y-1 sm:basis-0">
          <ViewControls zoom={view.zoom} onZoom={zoomBy} onFit={reset} />
          <DimensionTable rows={dimensionRows(section, airway, figures, text)} summary={summary} />
          {children}
          <p className="lettering min-h-5 text-xs text-ink-2" role="status">
            {reason ?? pointed ?? ""}
          </p>
        </div>
        <TitleBlock
          text={title ?? {}}
          scale={scaleName(frame.transform.scale)}
          units={text.units}
        />
      </figcaption>
    </>
  );
}
