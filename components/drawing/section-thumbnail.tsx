"use client";

import { memo, useMemo } from "react";
import { airwayAt } from "@/lib/bench/edits";
import type { Design } from "@/lib/document/schema";
import { drawingText } from "@/lib/drawing/drawing-text";
import { layOutSheet, type Sheet } from "@/lib/drawing/sheet";
import { InputError } from "@/lib/acoustics/input-error";
import { defaultUnitPreferences } from "@/lib/units/preferences";
import styles from "./section.module.css";

/** The sheet the thumbnail is laid out on [px]; it is shown smaller. */
const SHEET = { width: 300, height: 190 };

/** A design's first airway in section, small and without lettering. */
export const SectionThumbnail = memo(function SectionThumbnail({ design }: { design: Design }) {
  const sheet = useMemo(() => sheetOf(design), [design]);
  if (!sheet) return <span className="section-thumbnail" aria-hidden="true" />;
  return (
    <svg
      className={`section-thumbnail ${styles.svg}`}
      viewBox={`0 0 ${SHEET.width} ${SHEET.height}`}
      aria-hidden="true"
    >
      <path d={sheet.air} className={styles.air} />
      {sheet.parts.map((part) => (
        <g key={part.id}>
          <path d={part.outline} className={part.wooden ? styles.plyLight : styles.tube} />
          <path d={part.outline} className={styles.cut} />
        </g>
      ))}
    </svg>
  );
});

function sheetOf(design: Design): Sheet | null {
  const vent = airwayAt(design, 0);
  if (!vent) return null;
  try {
    return layOutSheet({
      vent,
      enclosure: design.enclosure,
      figures: null,
      text: drawingText(defaultUnitPreferences),
      ...SHEET,
    });
  } catch (error) {
    if (error instanceof InputError) return null;
    throw error;
  }
}
