/**
 * Sizes shared by the frame that stands before the charts' code has come and by the charts
 * themselves, so that nothing moves when one takes the other's place. All in CSS pixels.
 */

/** Below this width a strip's name and values stand above its plot, not beside it. */
export const NARROW_BELOW = 560;

export interface StripLayout {
  narrow: boolean;
  /** Left of the plot: name, unit, ticks. */
  gutterLeft: number;
  /** Right of the plot: values at the cursor. */
  gutterRight: number;
  /** Name and values over the plot, on a narrow screen. */
  header: number;
  /** The plot itself. */
  plot: number;
  /** Free space inside the chart, above and below the plot. */
  margin: number;
}

export const AXIS_HEIGHT = 26;
/** Width kept for the figures of the vertical axis, left of the plot. */
export const TICK_WIDTH = 34;

const WIDE: StripLayout = {
  narrow: false,
  gutterLeft: 104,
  gutterRight: 96,
  header: 0,
  plot: 74,
  margin: 7,
};

const NARROW: StripLayout = {
  narrow: true,
  gutterLeft: TICK_WIDTH,
  gutterRight: 4,
  header: 26,
  plot: 78,
  margin: 6,
};

export function stripLayout(width_px: number): StripLayout {
  return width_px < NARROW_BELOW ? NARROW : WIDE;
}

/** Height of one strip with its header and margins. */
export function stripHeight(layout: StripLayout): number {
  return layout.header + layout.plot + 2 * layout.margin;
}
