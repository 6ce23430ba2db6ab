import type { CSSProperties } from "react";
import type { GhostAir } from "@/lib/drawing/annotations";
import { sheetNumber } from "@/lib/drawing/outline";
import type { Sheet } from "@/lib/drawing/sheet";
import styles from "./section.module.css";

/** The air: in the bore, beyond its ends as fading ghosts, and its stroke to scale. */
export function AirView({ sheet, id }: { sheet: Sheet; id: string }) {
  const { stroke, bore, frame } = sheet;
  const axis = frame.transform.axis;
  return (
    <g aria-hidden="true">
      <defs>
        {sheet.ghosts.map((ghost) => (
          <GhostFade key={ghost.end} ghost={ghost} id={`${id}-${ghost.end}`} />
        ))}
        <clipPath id={`${id}-air`}>
          <rect
            x={0}
            y={sheetNumber(bore.y0)}
            width={frame.width}
            height={sheetNumber(Math.max(0, bore.y1 - bore.y0))}
          />
        </clipPath>
      </defs>
      <path d={sheet.air} className={styles.air} />
      {sheet.ghosts.map((ghost) => (
        <rect
          key={ghost.end}
          x={sheetNumber(Math.min(ghost.from, ghost.to))}
          y={sheetNumber(axis - ghost.half)}
          width={sheetNumber(Math.abs(ghost.to - ghost.from))}
          height={sheetNumber(2 * ghost.half)}
          fill={`url(#${id}-${ghost.end})`}
        />
      ))}
      {stroke && (
        <>
          <g clipPath={`url(#${id}-air)`}>
            <rect
              className={styles.slug}
              style={{ "--half": `${sheetNumber(stroke.half)}px` } as CSSProperties}
              x={sheetNumber((stroke.x0 + stroke.x1) / 2 - stroke.slug)}
              y={sheetNumber(bore.y0)}
              width={sheetNumber(2 * stroke.slug)}
              height={sheetNumber(bore.y1 - bore.y0)}
            />
          </g>
          <path
            className={styles.stroke}
            d={`M${sheetNumber(stroke.x0)} ${sheetNumber(stroke.y)}H${sheetNumber(stroke.x1)}`}
          />
          {stroke.whole && stroke.half > 12 && (
            <path
              className={styles.strokeHead}
              d={`M${sheetNumber(stroke.x0)} ${sheetNumber(stroke.y)}l9 -3.4v6.8zM${sheetNumber(stroke.x1)} ${sheetNumber(stroke.y)}l-9 -3.4v6.8z`}
            />
          )}
        </>
      )}
    </g>
  );
}

/** Densest at the face, gone at the tip; a correction below zero fades into the vent. */
function GhostFade({ ghost, id }: { ghost: GhostAir; id: string }) {
  return (
    <linearGradient
      id={id}
      gradientUnits="userSpaceOnUse"
      x1={sheetNumber(ghost.from)}
      x2={sheetNumber(ghost.to === ghost.from ? ghost.from + 1 : ghost.to)}
      y1={0}
      y2={0}
    >
      <stop offset={0} className={styles.ghostStop} stopOpacity={0.26} />
      <stop offset={1} className={styles.ghostStop} stopOpacity={0} />
    </linearGradient>
  );
}
