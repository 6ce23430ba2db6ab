import type { Curves } from "@/lib/acoustics/answer";
import { curveTracer } from "@/lib/charts/path";
import type { Domain } from "@/lib/charts/scale";
import { linearScale, logScale, pixelMap } from "@/lib/charts/scale";
import { decimalsOf, figure } from "@/lib/charts/readings";
import { stripDomains } from "@/lib/charts/strip-domains";
import type { CurveLimits, StripId } from "@/lib/charts/strips";
import { stripDefinition } from "@/lib/charts/strips";
import { frequencyGrid, frequencyTicks, linearTicks } from "@/lib/charts/ticks";
import { presentMark } from "@/lib/charts/marks";
import type { UnitPreferences } from "@/lib/units/preferences";
import { StripRow } from "./strip-row";
import foot from "./strip-foot.module.css";
import styles from "./strips.module.css";

/** Units of the frame's own drawing, stretched to whatever room there is. */
const WIDTH = 1000;
const HEIGHT = 74;
const DEFAULT_RANGE: Domain = [10, 500];
const NO_LIMITS: CurveLimits = {};

/**
 * The sheet of the recorder before the charts' code has come: the same rows at the same heights,
 * and the curves already on them where they are known. Light, without a charting library; it
 * renders on the server too.
 */
export function CurveStripsFrame({
  strips,
  preferences,
  curves = null,
  limits = NO_LIMITS,
  range_hz = DEFAULT_RANGE,
  message,
  caution,
}: {
  strips: readonly StripId[];
  preferences: UnitPreferences;
  curves?: Curves | null;
  limits?: CurveLimits;
  range_hz?: Domain;
  /** Said in place of the curves, such as what is missing for them. */
  message?: string;
  /** The same caution as the strips will carry, so that its room is kept. */
  caution?: string;
}) {
  const x = logScale(range_hz, [0, WIDTH]);
  const domains = stripDomains(null, curves ? [curves] : [], limits, preferences, range_hz);
  const tracer = curves ? curveTracer(curves.frequency_hz, x) : null;
  const grid = frequencyGrid(range_hz);
  return (
    <div className={styles.sheet} aria-busy={message ? undefined : true}>
      <ul className={styles.list}>
        {strips.map((id) => {
          const definition = stripDefinition(id);
          const y = linearScale(domains[id], [HEIGHT, 0]);
          const map = pixelMap(y, definition.unit(preferences).factor);
          const ticks = curves ? (definition.ticks ?? linearTicks(domains[id], 4)) : [];
          return (
            <StripRow key={id} definition={definition} preferences={preferences}>
              <div className={styles.ticks}>
                {ticks.map((tick) => (
                  <span key={tick} style={{ top: `${(100 * y.toPixel(tick)) / HEIGHT}%` }}>
                    {figure(tick, decimalsOf(ticks))}
                  </span>
                ))}
              </div>
              <svg
                className={styles.still}
                viewBox={`0 0 ${WIDTH} ${HEIGHT}`}
                preserveAspectRatio="none"
              >
                <path d={gridPath(grid, ticks, x.toPixel, y.toPixel)} {...HAIRLINE} />
                {curves && tracer
                  ? definition
                      .series(curves, [])
                      .map((series, n) => (
                        <path
                          key={n}
                          d={tracer.trace(series.values, map)}
                          fill="none"
                          stroke={presentMark(n).colour}
                          strokeWidth={presentMark(n).width}
                          strokeDasharray={presentMark(n).dash}
                          vectorEffect="non-scaling-stroke"
                        />
                      ))
                  : null}
              </svg>
            </StripRow>
          );
        })}
      </ul>
      <div className={styles.axis} aria-hidden="true">
        {frequencyTicks(range_hz, 300).map((tick) => (
          <span key={tick} style={{ left: `${(100 * x.toPixel(tick)) / WIDTH}%` }}>
            {tick}
          </span>
        ))}
      </div>
      <p className={foot.foot}>{message}</p>
      {caution ? <p className={foot.caution}>{caution}</p> : null}
    </div>
  );
}

const HAIRLINE = {
  fill: "none",
  stroke: "var(--color-rule)",
  strokeWidth: 1,
  vectorEffect: "non-scaling-stroke",
} as const;

function gridPath(
  vertical: readonly number[],
  horizontal: readonly number[],
  toX: (value: number) => number,
  toY: (value: number) => number,
): string {
  const columns = vertical.map((tick) => `M${toX(tick).toFixed(1)} 0V${HEIGHT}`);
  const lines = horizontal.map((tick) => `M0 ${toY(tick).toFixed(1)}H${WIDTH}`);
  return [...columns, ...lines].join("");
}
