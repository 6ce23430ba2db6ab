"use client";

import { SectionDrawing } from "@/components/drawing/section-drawing";
import { useUnitPreferences } from "@/components/shell/unit-preferences";
import { useBench, useBenchStore } from "./bench-context";

interface DrawingRegionProps {
  canEdit: boolean;
  revision: string;
  drawn: string;
}

/** The section drawing, live. */
export function DrawingRegion({ canEdit, revision, drawn }: DrawingRegionProps) {
  const store = useBenchStore();
  const design = useBench((state) => state.design);
  const answer = useBench((state) => state.answer);
  const ventIndex = useBench((state) => state.ventIndex);
  const selection = useBench((state) => state.selection);
  const [preferences] = useUnitPreferences();
  const { change, select } = store.getState();
  return (
    <section aria-label="Section drawing" className="drawing-region">
      <SectionDrawing
        design={design}
        vent={ventIndex}
        answer={answer}
        preferences={preferences}
        title={{ revision, date: drawn }}
        selected={selection}
        onSelect={select}
        onChange={canEdit ? change : undefined}
      />
    </section>
  );
}
