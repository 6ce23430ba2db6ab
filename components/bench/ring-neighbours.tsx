"use client";

import { useMemo } from "react";
import { oneMoreOneLess } from "@/lib/workshop/ring-neighbours";
import { setRingCount } from "@/lib/bench/edits";
import { formatQuantity } from "@/lib/units/format";
import { useUnitPreferences } from "@/components/shell/unit-preferences";
import { useBench, useBenchStore } from "./bench-context";
import { useSettled } from "./use-settled";

/** The stack as it stands, with one ring less and one more beside it. */
export function RingNeighbours() {
  const { design } = useSettled();
  const ventIndex = useBench((state) => state.ventIndex);
  const store = useBenchStore();
  const [preferences] = useUnitPreferences();
  const rows = useMemo(() => oneMoreOneLess(design, ventIndex), [design, ventIndex]);
  if (rows.length === 0) return null;
  const hertz = (value: number, signed = false) =>
    formatQuantity(value, "frequency", preferences, { digits: 1, signed }).value;
  const length = (value: number) => formatQuantity(value, "length", preferences);
  const unit = length(0).unit;
  const target = design.target.tuning_hz;
  return (
    <table className="figures-table">
      <caption className="sr-only">The ring stack as it stands, one ring less and one more</caption>
      <thead>
        <tr>
          <th scope="col">Rings</th>
          <th scope="col">Overall, {unit}</th>
          <th scope="col">
            f<sub>B</sub>, Hz
          </th>
          <th scope="col">{target === null ? "Change, Hz" : "Off, Hz"}</th>
          <th scope="col">
            <span className="sr-only">Use</span>
          </th>
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <tr key={row.count} aria-current={row.present ? "true" : undefined}>
            <th scope="row">
              {row.count} × {length(row.thickness_m).value}
            </th>
            <td>{length(row.overall_length_m).value}</td>
            <td>{hertz(row.tuning_hz)}</td>
            <td>{hertz(target === null ? row.change_hz : row.tuning_hz - target, true)}</td>
            <td>
              {row.present ? (
                <span className="text-ink-2">now</span>
              ) : (
                <button
                  type="button"
                  className="link-quiet"
                  aria-label={`Use ${row.count} rings`}
                  onClick={() =>
                    store.getState().change(setRingCount(design, ventIndex, row.count), "commit")
                  }
                >
                  use
                </button>
              )}
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
