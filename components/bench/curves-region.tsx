"use client";

import dynamic from "next/dynamic";
import { useEffect, useRef, useState } from "react";
import { limitsOf } from "@/lib/bench/limits";
import { keepStripChoice, readStripChoice } from "@/lib/bench/strip-choice";
import { DEFAULT_STRIPS, type StripId } from "@/lib/charts/strips";
import { hearingCaution } from "@/lib/margins/cautions";
import { CurveStripsFrame } from "@/components/charts/curve-strips-frame";
import type { CurveStripsHandle } from "@/components/charts/curve-strips";
import { useUnitPreferences } from "@/components/shell/unit-preferences";
import { useBenchStore } from "./bench-context";
import { useBrowserValue, type BrowserValue } from "./use-browser-value";
import { useSettled } from "./use-settled";

const stripChoice: BrowserValue<readonly StripId[]> = {
  read: readStripChoice,
  keep: keepStripChoice,
  usual: DEFAULT_STRIPS,
};

const CurveStrips = dynamic(
  () => import("@/components/charts/curve-strips").then((part) => part.CurveStrips),
  { ssr: false },
);

/** The strips. Their code comes after the drawing answers; while a hand drags they are written over. */
export function CurvesRegion({ ready }: { ready: boolean }) {
  const store = useBenchStore();
  const { design, answer } = useSettled();
  const before = store.getState().before;
  const [preferences] = useUnitPreferences();
  const [strips, setStrips] = useBrowserValue(stripChoice);
  const [cursor_hz, setCursor] = useState<number | null>(null);
  const handle = useRef<CurveStripsHandle>(null);
  useEffect(
    () =>
      store.subscribe(({ dragOrigin, answer: live }, old) => {
        if (dragOrigin && live?.curves)
          handle.current?.live(live.curves, { tuning_hz: live.tuning_hz });
        else if (old.dragOrigin) handle.current?.settle();
      }),
    [store],
  );
  const limits = limitsOf(design, answer);
  const curves = answer?.curves ?? null;
  const frame = (
    <CurveStripsFrame
      strips={strips}
      preferences={preferences}
      curves={curves}
      limits={limits}
      caution={hearingCaution.text}
      message={design.driver ? undefined : "Curves need a driver."}
    />
  );
  return (
    <section aria-label="Curves" className="curves-region">
      {ready && curves ? (
        <CurveStrips
          ref={handle}
          curves={curves}
          previous={before?.answer?.curves ?? undefined}
          limits={limits}
          ventNames={design.vents.map((vent) => vent.name)}
          preferences={preferences}
          strips={strips}
          onStripsChange={setStrips}
          cursor_hz={cursor_hz ?? answer?.tuning_hz ?? 40}
          onCursor={setCursor}
          caution={hearingCaution.text}
          fallback={frame}
        />
      ) : (
        frame
      )}
    </section>
  );
}
