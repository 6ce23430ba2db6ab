import type { StripPlot } from "@/lib/charts/strip-plot";
import styles from "./strips.module.css";

/**
 * The right end of a strip: the values at the cursor. The figures are written by the painter, never
 * by React, so that neither a cursor nor a hand on the drawing makes anything render.
 */
export function StripValues({ plot }: { plot: StripPlot }) {
  const present = plot.lines.filter((line) => line.kind === "present");
  const saved = plot.lines.filter((line) => line.kind === "saved");
  return (
    <>
      {present.map((line) => (
        <p key={line.key}>
          {line.label ? <Key dash={line.mark.dash} colour={line.mark.colour} /> : null}
          <span className={styles.main} data-value={line.key} />
        </p>
      ))}
      {plot.id === "level" ? <p className={styles.words} data-words="" /> : null}
      {present.map((line, n) => (
        <p key={line.key} className={styles.minor} data-value={`before-${n}`} />
      ))}
      {saved.map((line) => (
        <p key={line.key} className={styles.saved}>
          <Key dash={line.mark.dash} colour={line.mark.colour} />
          <span className={styles.label}>{line.label}</span>
          <span data-value={line.key} />
        </p>
      ))}
    </>
  );
}

/** A sample of a line: its dash and its hue. */
export function Key({ dash, colour }: { dash: string | undefined; colour: string }) {
  return (
    <svg className={styles.key} viewBox="0 0 16 4" aria-hidden="true">
      <path d="M0 2H16" fill="none" stroke={colour} strokeWidth={1.8} strokeDasharray={dash} />
    </svg>
  );
}
