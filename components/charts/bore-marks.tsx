import type { MapLines, Probe } from "@/lib/charts/bore-map";
import { boreValue } from "@/lib/charts/bore-map";
import type { BorePlot } from "@/lib/charts/bore-plot";
import { valueAt } from "@/lib/charts/cursor";
import { figure } from "@/lib/charts/readings";
import type { Scale } from "@/lib/charts/scale";
import type { StockBore } from "@/lib/charts/stock-bores";
import { formatQuantity } from "@/lib/units/format";
import type { UnitPreferences } from "@/lib/units/preferences";
import styles from "./bore-map.module.css";

/** Over the curves: their names, stock bores, the vent as it stands, the person's probe. */
export function BoreMarks({
  plot,
  series,
  x,
  boreFactor,
  chosen,
  probe,
  stock,
  limit,
  everywhere,
  preferences,
}: {
  plot: BorePlot;
  series: MapLines;
  x: Scale;
  boreFactor: number;
  chosen: { count: number; diameter_m: number; peak_air_speed_m_s: number | null } | null;
  probe: Probe | null;
  stock: readonly StockBore[];
  limit: number | null;
  /** Stock bores on every curve, not only on that of the chosen count. */
  everywhere: boolean;
  preferences: UnitPreferences;
}) {
  const place = (count: number, diameter_m: number, given: number | null = null) => {
    const points = series.find((curve) => curve.count === count)?.points ?? [];
    const bores = points.map((point) => point.diameter_m);
    const values = points.map((point) => boreValue(point, plot.quantity));
    const value = given ?? valueAt(bores, values, diameter_m);
    const at = { x: x.toPixel(diameter_m * boreFactor), y: NaN };
    if (value !== null) at.y = plot.map.offset + plot.map.gain * value;
    const inside =
      at.x >= -0.5 && at.x <= x.range[1] + 0.5 && at.y >= plot.map.top && at.y <= plot.map.bottom;
    return inside ? at : null;
  };
  const speed = plot.quantity === "air-speed" ? (chosen?.peak_air_speed_m_s ?? null) : null;
  const here = chosen ? place(chosen.count, chosen.diameter_m, speed) : null;
  const probed = probe ? series[probe.series] : undefined;
  const probedPoint = probe ? probed?.points[probe.point] : undefined;
  const probeAt = probed && probedPoint ? place(probed.count, probedPoint.diameter_m) : null;
  const limitY = limit === null ? null : plot.map.offset + plot.map.gain * limit;
  const toLeft = here !== null && here.x > x.range[1] - 78;
  return (
    <svg className={styles.over} aria-hidden="true">
      {plot.labels.map((label) => (
        <text key={label.text} x={label.x} y={label.y} className={styles.curveName}>
          {label.text}
        </text>
      ))}
      {limit !== null && limitY !== null ? (
        <text x={x.range[1] - 3} y={limitY - 4} className={styles.limitName}>
          limit {figure(limit * plot.unit.factor, 1).replace(/\.0$/, "")}
        </text>
      ) : null}
      {plot.tooLong ? (
        <text x={x.range[1] - 3} y={plot.map.bottom - 5} className={styles.tooLongName}>
          too long: under 1 Ø clear
        </text>
      ) : null}
      {series
        .filter(({ count }) => everywhere || count === chosen?.count)
        .flatMap(({ count }) =>
          stock.flatMap(({ diameter_m }) => {
            const at = place(count, diameter_m);
            return at ? (
              <circle
                key={`${count}-${diameter_m}`}
                cx={at.x}
                cy={at.y}
                r={3}
                className={styles.stock}
              />
            ) : (
              []
            );
          }),
        )}
      {probeAt ? <circle cx={probeAt.x} cy={probeAt.y} r={6} className={styles.probe} /> : null}
      {here && chosen ? (
        <>
          <circle cx={here.x} cy={here.y} r={6.5} className={styles.chosenRing} />
          <circle cx={here.x} cy={here.y} r={3} className={styles.chosenDot} />
          <text
            x={here.x + (toLeft ? -10 : 10)}
            y={here.y - 6}
            textAnchor={toLeft ? "end" : "start"}
            className={styles.chosenName}
          >
            {chosen.count} × Ø {formatQuantity(chosen.diameter_m, "length", preferences).value}
          </text>
        </>
      ) : null}
    </svg>
  );
}
