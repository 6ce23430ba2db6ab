import { memo, useId } from "react";
import type { StripLayout } from "@/lib/charts/layout";
import type { StripPlot } from "@/lib/charts/strip-plot";
import styles from "./strips.module.css";

/** What is written straight over recharts' axes: live paths, dots at the cursor; and the labels. */
export const StripOverlay = memo(function StripOverlay({
  plot,
  width,
  layout,
}: {
  plot: StripPlot;
  width: number;
  layout: StripLayout;
}) {
  const clip = useId();
  const present = plot.lines.filter((line) => line.kind === "present");
  return (
    <svg className={styles.overlay}>
      <clipPath id={clip}>
        <rect x={0} y={layout.margin - 1} width={width} height={layout.plot + 2} />
      </clipPath>
      {plot.labels.map((label) => (
        <text
          key={`${label.kind}-${label.text}`}
          className={label.kind === "curve" ? styles.curveLabel : styles.lettering}
          x={label.x}
          y={label.y}
          textAnchor="middle"
          fill={label.colour}
        >
          {label.text}
        </text>
      ))}
      <g clipPath={`url(#${clip})`} className={styles.live}>
        {present.map((line) => (
          <path
            key={line.key}
            data-live-path=""
            fill="none"
            stroke={line.mark.colour}
            strokeWidth={line.mark.width}
            strokeDasharray={line.mark.dash}
          />
        ))}
      </g>
      {present.map((line) => (
        <circle
          key={line.key}
          data-dot=""
          r={3.5}
          fill="var(--color-scribe)"
          stroke="var(--color-film)"
          strokeWidth={1}
          visibility="hidden"
        />
      ))}
    </svg>
  );
});
