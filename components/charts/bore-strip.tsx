"use client";

import { memo } from "react";
import { CartesianGrid, Line, LineChart, ReferenceLine, XAxis, YAxis } from "recharts";
import type { MapLines } from "@/lib/charts/bore-map";
import type { BorePlot } from "@/lib/charts/bore-plot";
import { AXIS_HEIGHT, TICK_WIDTH } from "@/lib/charts/layout";
import { countMark, LIMIT } from "@/lib/charts/marks";
import { decimalsOf, figure } from "@/lib/charts/readings";
import type { Scale } from "@/lib/charts/scale";
import { linearTicks } from "@/lib/charts/ticks";
import styles from "./bore-map.module.css";

const LETTERING = { fontSize: 11, fontStretch: "75%", fill: "var(--color-ink-2)" } as const;

/** Axes, grid, limit and curves of one strip of the bore map, drawn by recharts. */
export const BoreStrip = memo(function BoreStrip({
  plot,
  series,
  x,
  limit,
  withAxis,
  titled,
}: {
  plot: BorePlot;
  series: MapLines;
  x: Scale;
  /** SI. */
  limit: number | null;
  withAxis: boolean;
  titled: boolean;
}) {
  const width = x.range[1];
  const tall = plot.map.bottom - plot.map.top;
  const foot = withAxis ? AXIS_HEIGHT : 0;
  const across = linearTicks(x.domain, Math.max(2, Math.floor(width / 38)));
  const up = linearTicks(plot.domain, tall < 130 ? 3 : 6);
  return (
    <div style={{ height: plot.map.bottom + 8 + foot }}>
      {plot.tooLong ? (
        <svg className={styles.under} aria-hidden="true">
          <polygon points={plot.tooLong} fill="var(--color-rule)" fillOpacity={0.6} />
        </svg>
      ) : null}
      {titled ? (
        <p className={styles.title}>
          {plot.name} <span>{plot.unit.name}</span>
        </p>
      ) : null}
      <div className={styles.chart} aria-hidden="true">
        <LineChart
          data={plot.rows}
          width={TICK_WIDTH + width}
          height={plot.map.bottom + 8 + foot}
          margin={{ top: plot.map.top, right: 0, bottom: 8, left: 0 }}
          accessibilityLayer={false}
          throttledEvents={[]}
        >
          <CartesianGrid
            stroke="var(--color-rule)"
            strokeOpacity={0.7}
            verticalValues={across}
            horizontalValues={up}
          />
          <XAxis
            dataKey="b"
            type="number"
            domain={[x.domain[0], x.domain[1]]}
            allowDataOverflow
            ticks={across}
            interval={0}
            hide={!withAxis}
            height={foot}
            axisLine={false}
            tickLine={false}
            tickMargin={7}
            tick={LETTERING}
            tickFormatter={(tick: number) => figure(tick, decimalsOf(across))}
          />
          <YAxis
            width={TICK_WIDTH}
            type="number"
            domain={[plot.domain[0], plot.domain[1]]}
            allowDataOverflow
            ticks={up}
            interval={0}
            axisLine={false}
            tickLine={false}
            tickMargin={6}
            tick={LETTERING}
            tickFormatter={(tick: number) => figure(tick, decimalsOf(up))}
          />
          {limit === null ? null : (
            <ReferenceLine
              y={limit * plot.unit.factor}
              stroke={LIMIT.colour}
              strokeWidth={LIMIT.width}
              strokeDasharray={LIMIT.dash}
            />
          )}
          {series.flatMap(({ count }) =>
            (["fit", "long"] as const).map((part) => (
              <Line
                key={`${part}${count}`}
                dataKey={`${part}${count}`}
                type="linear"
                dot={false}
                activeDot={false}
                isAnimationActive={false}
                stroke={part === "fit" ? countMark(count).colour : "var(--color-ink-2)"}
                strokeOpacity={part === "fit" ? 1 : 0.75}
                strokeWidth={part === "fit" ? countMark(count).width : 1.1}
                strokeDasharray={countMark(count).dash}
              />
            )),
          )}
        </LineChart>
      </div>
    </div>
  );
});
