"use client";

import { useRef, useState } from "react";
import type { Design } from "@/lib/document/schema";
import { equalDiameter } from "@/lib/bore-map/candidate";
import type { BoreMapPoint, BoreMapSeries } from "@/lib/bore-map/series";
import type { Probe } from "@/lib/charts/bore-map";
import {
  boreMapSummary,
  describePick,
  pickAt,
  pointBetween,
  probeNear,
} from "@/lib/charts/bore-map";
import type { StockBore } from "@/lib/charts/stock-bores";
import { STOCK_BORES } from "@/lib/charts/stock-bores";
import type { UnitPreferences } from "@/lib/units/preferences";
import { BoreHand } from "./bore-hand";
import { BoreMarks } from "./bore-marks";
import { BoreStrip } from "./bore-strip";
import { BoreTable } from "./bore-table";
import type { ChosenVent } from "./use-bore-plots";
import { useBorePlots } from "./use-bore-plots";
import { useSame } from "./use-same";
import { useWidth } from "./use-width";
import styles from "./bore-map.module.css";

export interface BoreMapProps {
  series: BoreMapSeries;
  /** The design and the vent whose place on the map is marked. */
  design: Design;
  ventIndex: number;
  /** Its peak air speed as computed for the design itself. */
  airSpeed_m_s: number | null;
  /** Diameters that are sold; generic ones where nothing is given. */
  stock?: readonly StockBore[];
  preferences: UnitPreferences;
  /** Small: one strip for a margin. Large: length and pipe resonance below it, and the table. */
  size: "small" | "large";
  onPick?: (point: BoreMapPoint) => void;
}

/** Vent diameter against peak air speed for one, two, three, four vents, with what fits. */
export function BoreMap(props: BoreMapProps) {
  const { size, onPick, stock = STOCK_BORES } = props;
  const series = props.series.lines;
  const limit = props.series.air_speed_limit_m_s;
  const driven = props.series.hasDriver;
  const preferences = useSame(props.preferences);
  const chosen = useSame(chosenOf(props.design, props.ventIndex, props.airSpeed_m_s));
  const root = useRef<HTMLDivElement>(null);
  const width_px = useWidth(root);
  const [probe, setProbe] = useState<Probe | null>(null);
  const { x, plots, inView, boreFactor } = useBorePlots(
    { series, limit, driven, chosen, preferences },
    width_px,
    size,
  );
  const standing = chosen ? probeNear(inView, chosen.count, chosen.diameter_m) : null;
  const start = standing ?? { series: 0, point: 0 };
  const pick = probe
    ? pickAt(inView, probe)
    : chosen && pointBetween(series, chosen.count, chosen.diameter_m);
  const choose = (at: Probe) => {
    const picked = pickAt(inView, at);
    // What does not fit can be looked at, not taken: the design could not be built.
    if (!picked?.fits) return;
    setProbe(null);
    onPick?.(picked);
  };
  return (
    <div className={styles.map}>
      <p className="sr-only">{boreMapSummary(series, limit, preferences)}</p>
      <div ref={root} className={size === "large" ? styles.large : styles.small}>
        {width_px > 0
          ? plots.map((plot, n) => (
              <div key={plot.quantity} className={styles.strip}>
                <BoreStrip
                  plot={plot}
                  series={series}
                  x={x}
                  limit={n === 0 && driven ? limit : null}
                  withAxis={n === plots.length - 1}
                  titled={size === "large" || !driven}
                />
                <BoreMarks
                  plot={plot}
                  series={inView}
                  x={x}
                  boreFactor={boreFactor}
                  chosen={chosen}
                  probe={probe}
                  stock={n === 0 ? stock : NO_STOCK}
                  limit={n === 0 && driven ? limit : null}
                  everywhere={size === "large"}
                  preferences={preferences}
                />
                {n === 0 ? (
                  <BoreHand
                    plot={plot}
                    series={inView}
                    x={x}
                    boreFactor={boreFactor}
                    probe={probe ?? start}
                    onProbe={setProbe}
                    onPick={onPick ? choose : undefined}
                    valueText={pick ? describePick(pick, preferences) : ""}
                  />
                ) : null}
              </div>
            ))
          : null}
      </div>
      <p className={styles.reading}>{pick ? describePick(pick, preferences) : "\u00a0"}</p>
      {size === "large" ? (
        <BoreTable
          series={series}
          stock={stock}
          chosen={chosen}
          preferences={preferences}
          onPick={onPick}
        />
      ) : null}
    </div>
  );
}

const NO_STOCK: readonly StockBore[] = [];

/** The vent as it stands on the map; null for bare elements, which have no bore. */
function chosenOf(
  design: Design,
  ventIndex: number,
  airSpeed_m_s: number | null,
): ChosenVent | null {
  const vent = design.vents[ventIndex];
  if (!vent || "lumped" in vent) return null;
  return {
    count: vent.count,
    diameter_m: equalDiameter(vent.bore),
    peak_air_speed_m_s: airSpeed_m_s,
  };
}
