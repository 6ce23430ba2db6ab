"use client";

import { useState } from "react";
import type { MapLines, MapPoint } from "@/lib/charts/bore-map";
import { pickAt, probeNear, roomWords } from "@/lib/charts/bore-map";
import type { StockBore } from "@/lib/charts/stock-bores";
import { formatQuantity, NO_FIGURE } from "@/lib/units/format";
import type { QuantityKind, UnitPreferences } from "@/lib/units/preferences";
import { shownUnits } from "@/lib/units/shown-units";
import styles from "./table-twin.module.css";

/** The table twin of the bore map: every count at the stock bores, each row can be chosen. */
export function BoreTable<P extends MapPoint>({
  series,
  stock,
  chosen,
  preferences,
  onPick,
}: {
  series: MapLines<P>;
  stock: readonly StockBore[];
  chosen: { count: number; diameter_m: number } | null;
  preferences: UnitPreferences;
  onPick?: (pick: P) => void;
}) {
  const [open, setOpen] = useState(false);
  const rows = open ? rowsOf(series, stock, chosen) : [];
  const units = (kind: QuantityKind) => shownUnits[kind][preferences.system].unit;
  const value = (si: number | null, kind: QuantityKind) =>
    si === null ? NO_FIGURE : formatQuantity(si, kind, preferences).value;
  const heads: [string, string][] = [
    ["Vents", ""],
    ["Bore", units("length")],
    ["Air speed", units("speed")],
    ["Length", units("length")],
    ["Clearance", units("length")],
    ["Pipe resonance", "Hz"],
    ["Box", ""],
  ];
  return (
    <details className={styles.twin} onToggle={(event) => setOpen(event.currentTarget.open)}>
      <summary>Figures</summary>
      {open ? (
        <div
          className={styles.scroll}
          tabIndex={0}
          role="region"
          aria-label="Figures of the bore map"
        >
          <table>
            <caption className="sr-only">Vents at stock bores</caption>
            <thead>
              <tr>
                {heads.map(([name, unit]) => (
                  <th key={name} scope="col">
                    {name} <span>{unit}</span>
                  </th>
                ))}
                {onPick ? <td /> : null}
              </tr>
            </thead>
            <tbody>
              {rows.map(({ pick, standing }) => (
                <tr
                  key={`${pick.count}-${pick.diameter_m}`}
                  data-chosen={standing ? "" : undefined}
                >
                  <th scope="row">{pick.count}</th>
                  <td>{value(pick.diameter_m, "length")}</td>
                  <td>{value(pick.peak_air_speed_m_s, "speed")}</td>
                  <td>{value(pick.overall_length_m, "length")}</td>
                  <td>{value(pick.clearance_m, "length")}</td>
                  <td>{value(pick.pipe_resonance_hz, "frequency")}</td>
                  <td>{roomWords(pick)}</td>
                  {onPick ? (
                    <td>
                      <button
                        type="button"
                        className="link"
                        hidden={!pick.fits}
                        onClick={() => onPick(pick)}
                      >
                        Use
                        <span className="sr-only">
                          {` ${pick.count} × ${value(pick.diameter_m, "length")}`}
                        </span>
                      </button>
                    </td>
                  ) : null}
                </tr>
              ))}
            </tbody>
          </table>
        </div>
      ) : null}
    </details>
  );
}

function rowsOf<P extends MapPoint>(
  series: MapLines<P>,
  stock: readonly StockBore[],
  chosen: { count: number; diameter_m: number } | null,
) {
  return series.flatMap(({ count, points }) => {
    const first = points[0]?.diameter_m ?? Infinity;
    const last = points.at(-1)?.diameter_m ?? 0;
    const own = chosen?.count === count ? [chosen.diameter_m] : [];
    const bores = [...stock.map((one) => one.diameter_m), ...own]
      .filter((bore) => bore >= first && bore <= last)
      .sort((a, b) => a - b);
    const seen = new Set<number>();
    return bores.flatMap((bore) => {
      const probe = probeNear(series, count, bore);
      const pick = pickAt(series, probe);
      if (!pick || seen.has(pick.diameter_m)) return [];
      seen.add(pick.diameter_m);
      return [{ pick, standing: own.includes(bore) }];
    });
  });
}
