"use client";

import dynamic from "next/dynamic";
import { useMemo, useState } from "react";
import { applyCandidate } from "@/lib/bore-map/apply";
import { boreMapSeries, type BoreMapPoint } from "@/lib/bore-map/series";
import { useBoreField } from "@/lib/bore-map/use-bore-field";
import { useUnitPreferences } from "@/components/shell/unit-preferences";
import { Dialog } from "@/components/ui/dialog";
import { useBench, useBenchStore } from "./bench-context";
import { useSettled } from "./use-settled";

const BoreMap = dynamic(() => import("@/components/charts/bore-map").then((part) => part.BoreMap), {
  ssr: false,
  loading: () => <div className="bore-map-frame" aria-hidden="true" />,
});

/** Vent diameter against air speed, with what is too long for the box: small here, large on asking. */
export function BoreMapPanel() {
  const { design, answer } = useSettled();
  const ventIndex = useBench((state) => state.ventIndex);
  const store = useBenchStore();
  const [preferences] = useUnitPreferences();
  const [large, setLarge] = useState(false);
  const { field, message } = useBoreField(design, ventIndex);
  const series = useMemo(() => (field ? boreMapSeries(field, design) : null), [field, design]);
  const pick = (point: BoreMapPoint) => {
    store.getState().change(applyCandidate(design, ventIndex, point), "commit");
    setLarge(false);
  };
  const chart = (size: "small" | "large") =>
    series && (
      <BoreMap
        size={size}
        series={series}
        design={design}
        ventIndex={ventIndex}
        airSpeed_m_s={answer?.vents[ventIndex]?.peak_air_speed?.speed_m_s ?? null}
        preferences={preferences}
        onPick={pick}
      />
    );
  return (
    <section aria-labelledby="bore-map-title" className="bench-part">
      <header className="part-head">
        <h2 id="bore-map-title">Bore map</h2>
        {series && (
          <button type="button" className="link-quiet" onClick={() => setLarge(true)}>
            open large
          </button>
        )}
      </header>
      {message && <p className="text-sm text-ink-2">{message}</p>}
      {chart("small") ?? (!message && <div className="bore-map-frame" aria-hidden="true" />)}
      {large && (
        <Dialog title="Bore map" wide onClose={() => setLarge(false)}>
          {chart("large")}
        </Dialog>
      )}
    </section>
  );
}
