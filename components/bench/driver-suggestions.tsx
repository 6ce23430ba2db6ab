"use client";

import { useState } from "react";
import { editEnclosure } from "@/lib/bench/edits";
import { formatQuantity } from "@/lib/units/format";
import { useUnitPreferences } from "@/components/shell/unit-preferences";
import type { BoxSuggestion } from "@/lib/acoustics/suggest-boxes";
import { useBenchStore } from "./bench-context";
import { useSettled } from "./use-settled";

/** What box suits the driver: standard alignments as suggestions, each to take with one press. */
export function DriverSuggestions() {
  const { design } = useSettled();
  const store = useBenchStore();
  const [preferences] = useUnitPreferences();
  const [found, setFound] = useState<BoxSuggestion[] | null>(null);
  const ask = async () => {
    const { suggestBoxes } = await import("@/lib/acoustics/suggest-boxes");
    if (design.driver) setFound(suggestBoxes(design.driver, { ql: design.enclosure.ql }));
  };
  const take = (box: BoxSuggestion) => {
    const resized = editEnclosure(design, { net_volume_m3: box.net_volume_m3, inside_m: null });
    const target = { ...design.target, tuning_hz: box.tuning_hz };
    const vents = box.tuning_hz === null ? [] : design.vents;
    store.getState().change({ ...resized, target, vents }, "commit");
  };
  const told = (value: number, kind: "volume" | "frequency") =>
    formatQuantity(value, kind, preferences).text;
  return (
    <div className="py-2">
      <button type="button" className="link-quiet" onClick={ask}>
        What box suits it?
      </button>
      {found?.length === 0 && (
        <p className="text-sm text-ink-2">No standard alignment fits these figures.</p>
      )}
      <ul>
        {found?.map((box) => (
          <li key={box.id} className="flex items-start justify-between gap-2 py-1.5">
            <span className="min-w-0 text-sm">
              <span className="lettering font-semibold">
                {told(box.net_volume_m3, "volume")},{" "}
                {box.tuning_hz === null ? "closed" : told(box.tuning_hz, "frequency")}
              </span>{" "}
              <span className="text-ink-2">
                {box.title}: −3 dB at {told(box.f3_hz, "frequency")}. {box.purpose}
              </span>
            </span>
            <button type="button" className="button-quiet button-small" onClick={() => take(box)}>
              Use
            </button>
          </li>
        ))}
      </ul>
    </div>
  );
}
