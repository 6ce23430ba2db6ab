"use client";

import { memo, useMemo } from "react";
import { CartesianGrid, Line, LineChart, ReferenceLine, XAxis, YAxis } from "recharts";
import { decimalsOf, figure } from "@/lib/charts/readings";
import type { StripLayout } from "@/lib/charts/layout";
import { AXIS_HEIGHT, TICK_WIDTH } from "@/lib/charts/layout";
import { LIMIT } from "@/lib/charts/marks";
import type { Domain } from "@/lib/charts/scale";
import type { StripPlot } from "@/lib/charts/strip-plot";
import { frequencyGrid, frequencyTicks } from "@/lib/charts/ticks";
import styles from "./strips.module.css";

const LETTERING = { fontSize: 11, fontStretch: "75%", fill: "var(--color-ink-2)" } as const;

/** Axes, grid, limit and settled curves of one strip, drawn by recharts. */
export const StripChart = memo(function StripChart({
  plot,
  frequency_hz,
  range_hz,
  width,
  layout,
  withAxis,
}: {
  plot: StripPlot;
  frequency_hz: readonly number[];
  range_hz: Domain;
  /** Of the plot itself [px]. */
  width: number;
  layout: StripLayout;
  /** Whether the frequencies are written under this strip. */
  withAxis: boolean;
}) {
  const rows = useMemo(() => rowsOf(plot, frequency_hz, range_hz), [plot, frequency_hz, range_hz]);
  const grid = useMemo(() => frequencyGrid(range_hz), [range_hz]);
  const labelled = useMemo(() => frequencyTicks(range_hz, width), [range_hz, width]);
  const foot = withAxis ? AXIS_HEIGHT : 0;
  const decimals = decimalsOf(plot.ticks);
  return (
    <div className={styles.chart}>
      <LineChart
        data={rows}
        width={TICK_WIDTH + width}
        height={layout.plot + 2 * layout.margin + foot}
        margin={{ top: layout.margin, right: 0, bottom: layout.margin, left: 0 }}
        accessibilityLayer={false}
        throttledEvents={[]}
      >
        <CartesianGrid
          stroke="var(--color-rule)"
          strokeOpacity={0.7}
          verticalValues={grid}
          horizontalValues={plot.ticks}
        />
        <XAxis
          dataKey="f"
          type="number"
          scale="log"
          domain={[range_hz[0], range_hz[1]]}
          allowDataOverflow
          ticks={labelled}
          interval={0}
          hide={!withAxis}
          height={foot}
          axisLine={false}
          tickLine={false}
          tickMargin={7}
          tick={LETTERING}
        />
        <YAxis
          width={TICK_WIDTH}
          type="number"
          domain={[plot.domain[0], plot.domain[1]]}
          allowDataOverflow
          ticks={plot.ticks}
          interval={0}
          axisLine={false}
          tickLine={false}
          tickMargin={6}
          tick={LETTERING}
          tickFormatter={(tick: number) => figure(tick, decimals)}
        />
        {plot.limit === null ? null : (
          <ReferenceLine
            y={plot.limit}
            stroke={LIMIT.colour}
            strokeWidth={LIMIT.width}
            strokeDasharray={LIMIT.dash}
          />
        )}
        {plot.lines.map((line) => (
          <Line
            key={line.key}
            className={`strip-${line.kind}`}
            dataKey={line.key}
            type="linear"
            dot={false}
            activeDot={false}
            isAnimationActive={false}
            stroke={line.mark.colour}
            strokeWidth={line.mark.width}
            strokeDasharray={line.mark.dash}
          />
        ))}
      </LineChart>
    </div>
  );
});

type Row = Record<string, number | null>;

/** Rows in the shown unit, from the last point before the axis to the first after it. */
function rowsOf(plot: StripPlot, frequency_hz: readonly number[], range: Domain): Row[] {
  const { factor } = plot.unit;
  const rows: Row[] = [];
  frequency_hz.forEach((f, i) => {
    if ((frequency_hz[i + 1] ?? f) < range[0] || (frequency_hz[i - 1] ?? f) > range[1]) return;
    const row: Row = { f };
    for (const line of plot.lines) {
      const value = line.values[i];
      row[line.key] = value === null || value === undefined ? null : value * factor;
    }
    rows.push(row);
  });
  return rows;
}
