"use client";

import { useMemo, type ReactNode, type RefObject } from "react";
import type { LumpedVent } from "@/lib/document/schema";
import { drawingText } from "@/lib/drawing/drawing-text";
import { layOutClosedBox, type DrawnPart } from "@/lib/drawing/closed-box";
import { sheetNumber } from "@/lib/drawing/outline";
import { scaleName } from "@/lib/drawing/sheet-frame";
import { formatQuantity } from "@/lib/units/format";
import type { UnitPreferences } from "@/lib/units/preferences";
import { PartView } from "./section-parts-view";
import styles from "./section.module.css";
import type { SectionDrawingProps } from "./section-drawing";
import { TitleBlock } from "./title-block";
import type { BoxSize } from "./use-box-size";

interface PlainDrawingProps extends SectionDrawingProps {
  lumped: LumpedVent | null;
  id: string;
  room: RefObject<HTMLDivElement | null>;
  size: BoxSize;
  children: ReactNode;
}

/** A box with no airway to cut: closed, or with a vent given as a bare circuit element. */
export function PlainDrawing(props: PlainDrawingProps) {
  const {
    design,
    lumped,
    preferences,
    onSelect,
    selected,
    id,
    size,
    title,
    layers,
    children,
    room,
  } = props;
  const text = useMemo(() => drawingText(preferences), [preferences]);
  const { enclosure } = design;
  const box = useMemo(
    () => layOutClosedBox(enclosure, size.width, size.height, layers),
    [enclosure, size, layers],
  );
  const said = lumped ? elementLines(lumped, preferences) : ["Closed box: no vent"];
  const pick = onSelect
    ? (part: DrawnPart) => onSelect({ piece: null, kind: part.kind })
    : undefined;
  const x = sheetNumber(box.middle);
  const y = sheetNumber(box.axis);
  return (
    <>
      <div ref={room} className="relative min-h-0 flex-1 overflow-hidden">
        <svg
          className={`${styles.svg} absolute inset-0 h-full w-full`}
          viewBox={`0 0 ${size.width} ${size.height}`}
          role="group"
          aria-labelledby={`${id}-title`}
        >
          <title id={`${id}-title`}>{`${design.name}: ${said.join(", ")}`}</title>
          {box.parts.map((part) => (
            <PartView
              key={part.id}
              part={part}
              name={
                part.kind === "panel"
                  ? `Baffle: ${text.full(enclosure.panel_thickness_m)}`
                  : "Panel of the box"
              }
              pressed={selected?.piece === null && selected.kind === part.kind}
              onPick={pick}
              onPoint={ignore}
            />
          ))}
          {lumped && (
            <path
              className={styles.thin}
              d={`M${x - 60} ${y - 26}h26v-8h22v16h-22v-8m22 0h14a6 6 0 0 1 12 0a6 6 0 0 1 12 0a6 6 0 0 1 12 0h14`}
            />
          )}
          {said.map((line, index) => (
            <text
              key={line}
              x={x}
              y={y + index * 17}
              className={index === 0 ? styles.label : styles.labelQuiet}
            >
              {line}
            </text>
          ))}
        </svg>
      </div>
      <figcaption className="flex flex-wrap items-end justify-between gap-x-4 gap-y-1 px-3 pb-1">
        <div className="flex min-w-0 flex-1 items-center gap-4">{children}</div>
        <TitleBlock
          text={{ drawing: "Enclosure, section", ...title }}
          scale={scaleName(box.scale)}
          units={text.units}
        />
      </figcaption>
    </>
  );
}

function ignore() {}

function elementLines(vent: LumpedVent, preferences: UnitPreferences): string[] {
  const { inertance_kg_m4, resistance_pa_s_m3, area_m2 } = vent.lumped;
  return [
    `${vent.name}: a bare element, nothing to cut`,
    `inertance ${Number(inertance_kg_m4.toPrecision(4))} kg/m⁴`,
    `resistance ${Number(resistance_pa_s_m3.toPrecision(4))} Pa·s/m³`,
    `area ${formatQuantity(area_m2, "area", preferences).text}`,
  ];
}
