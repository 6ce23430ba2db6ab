"use client";

import { editEnclosure } from "@/lib/bench/edits";
import { useBench, useBenchStore } from "../bench-context";

/** Whether the inside dimensions are known. Without them the walls count as far away. */
export function EnclosureInside() {
  const store = useBenchStore();
  const known = useBench((state) => state.design.enclosure.inside_m !== null);
  const setKnown = (next: boolean) => {
    const { design, change } = store.getState();
    const side = Math.cbrt(design.enclosure.net_volume_m3 * 1.15);
    const round = (value: number) => Math.round(value * 200) / 200;
    const inside_m = next
      ? { width: round(side * 0.85), height: round(side), depth: round(side / 0.85) }
      : null;
    change(editEnclosure(design, { inside_m }), "commit");
  };
  return (
    <label className="check-row">
      <input type="checkbox" checked={known} onChange={(event) => setKnown(event.target.checked)} />
      <span>Inside dimensions known</span>
    </label>
  );
}
