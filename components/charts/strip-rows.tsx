"use client";

import type { ReactNode } from "react";
import { memo, useMemo } from "react";
import type { Domain } from "@/lib/charts/scale";
import type { SheetInput } from "@/lib/charts/strip-plot";
import { stripSummary } from "@/lib/charts/summary";
import { StripChart } from "./strip-chart";
import { StripOverlay } from "./strip-overlay";
import { StripRow } from "./strip-row";
import { StripValues } from "./strip-values";
import type { StripSheet } from "./use-strip-sheet";
import cursor from "./strip-cursor.module.css";
import styles from "./strips.module.css";

/** The strips with the cursor through all of them. */
export function StripRows({
  input,
  sheet,
  range_hz,
  children,
}: {
  input: SheetInput;
  sheet: StripSheet;
  range_hz: Domain;
  /** The cursor's handle. */
  children: ReactNode;
}) {
  return (
    <div className={styles.rows}>
      <div className={cursor.marks} aria-hidden="true">
        <div className={cursor.tuning} data-tuning="" hidden>
          <span>
            f<sub>B</sub> <span data-tuning-figure="" />
          </span>
        </div>
        <div className={cursor.line} data-cursor="" />
      </div>
      <StripList
        curves={input.curves}
        limits={input.limits}
        preferences={input.preferences}
        ventNames={input.ventNames}
        plots={sheet.plots}
        width={sheet.width}
        layout={sheet.layout}
        range_hz={range_hz}
      />
      <div className={styles.axis} aria-hidden="true" />
      <div className={cursor.marks} aria-hidden="true">
        <div className={cursor.flag} data-cursor-flag="" />
      </div>
      {children}
      <p className={cursor.unit} aria-hidden="true">
        Hz
      </p>
    </div>
  );
}

type ListProps = Pick<SheetInput, "curves" | "limits" | "preferences" | "ventNames"> &
  Pick<StripSheet, "plots" | "width" | "layout"> & { range_hz: Domain };

/** Rendered again only when something settled has changed, never for the cursor. */
const StripList = memo(function StripList({
  curves,
  limits,
  preferences,
  ventNames,
  plots,
  width,
  layout,
  range_hz,
}: ListProps) {
  const summaries = useMemo(
    () =>
      plots.map(({ definition }) =>
        stripSummary(definition, curves, limits, preferences, ventNames),
      ),
    [plots, curves, limits, preferences, ventNames],
  );
  return (
    <ul className={styles.list}>
      {plots.map((plot, n) => (
        <StripRow
          key={plot.id}
          definition={plot.definition}
          preferences={preferences}
          summary={summaries[n]}
          values={<StripValues plot={plot} />}
        >
          <StripChart
            plot={plot}
            frequency_hz={curves.frequency_hz}
            range_hz={range_hz}
            width={width}
            layout={layout}
            withAxis={n === plots.length - 1}
          />
          <StripOverlay plot={plot} width={width} layout={layout} />
        </StripRow>
      ))}
    </ul>
  );
});
