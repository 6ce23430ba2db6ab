"use client";

import { useState } from "react";
import type { Curves } from "@/lib/acoustics/answer";
import { figuresTable } from "@/lib/charts/figures";
import type { Domain } from "@/lib/charts/scale";
import type { StripId } from "@/lib/charts/strips";
import type { UnitPreferences } from "@/lib/units/preferences";
import styles from "./table-twin.module.css";

/** The table twin of the strips, made when it is opened. */
export function StripFigures({
  curves,
  strips,
  preferences,
  ventNames,
  range_hz,
}: {
  curves: Curves;
  strips: readonly StripId[];
  preferences: UnitPreferences;
  ventNames: readonly string[];
  range_hz: Domain;
}) {
  const [open, setOpen] = useState(false);
  const table = open ? figuresTable(curves, strips, preferences, ventNames, range_hz) : null;
  return (
    <details className={styles.twin} onToggle={(event) => setOpen(event.currentTarget.open)}>
      <summary>Figures</summary>
      {table ? (
        <div
          className={styles.scroll}
          tabIndex={0}
          role="region"
          aria-label="Figures of the curves"
        >
          <table>
            <caption className="sr-only">Curves at third-octave frequencies</caption>
            <thead>
              <tr>
                <th scope="col">
                  Frequency <span>Hz</span>
                </th>
                {table.columns.map((column) => (
                  <th key={column.key} scope="col">
                    {column.name} <span>{column.unit}</span>
                  </th>
                ))}
              </tr>
            </thead>
            <tbody>
              {table.rows.map((row) => (
                <tr key={row.frequency_hz}>
                  <th scope="row">{row.frequency_hz}</th>
                  {row.cells.map((cell, n) => (
                    <td key={table.columns[n]?.key}>{cell}</td>
                  ))}
                </tr>
              ))}
            </tbody>
          </table>
        </div>
      ) : null}
    </details>
  );
}
