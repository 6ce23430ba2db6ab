/**
 * Line kinds after ISO 128-2, as widths and dash patterns in the drawing's own units (CSS pixels on
 * screen). One table for screen, print and templates.
 */
export interface LineKind {
  width: number;
  /** SVG dash pattern; absent for a continuous line. */
  dash?: string;
}

export const lineKinds = {
  /** Outline of a cut face. */
  cut: { width: 1.4 },
  /** Visible edge that is not cut. */
  visible: { width: 0.9 },
  /** Dimension, witness and leader lines. */
  thin: { width: 0.7 },
  /** Ply, hatch and glue. */
  fine: { width: 0.5 },
  /** Edge behind the cut. */
  hidden: { width: 0.7, dash: "5 3" },
  /** Centre line: long, short, long. */
  centre: { width: 0.7, dash: "14 3 3 3" },
  /** Something beside the part, or a part in another place. */
  phantom: { width: 0.7, dash: "14 3 3 3 3 3" },
} as const satisfies Record<string, LineKind>;
