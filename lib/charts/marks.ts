/**
 * How curves are told apart: by a direct label first, then by the dash pattern, then by the hue.
 * Colours are the application's own tokens, so that both themes follow; a hue is turned, its
 * lightness and strength kept, so that every one has the contrast of the accent.
 */

export interface Mark {
  dash: string | undefined;
  colour: string;
  width: number;
}

export const PRESENT_COLOUR = "var(--color-scribe)";
export const LIMIT_COLOUR = "var(--color-near)";

/** The design before the present edit. */
export const BEFORE: Mark = { dash: "1.5 3", colour: "var(--color-ink-2)", width: 1.2 };
export const LIMIT: Mark = { dash: "6 3", colour: LIMIT_COLOUR, width: 1.2 };

const VENT_DASHES = [undefined, "7 3", "2 2", "9 3 2 3", "4 2", "12 3 2 3 2 3"] as const;
const SAVED_DASHES = ["8 3", "8 3 2 3", "3 3", "12 4", "5 2 2 2 2 2"] as const;
/** Degrees from the accent; none comes near the colours of a status. */
const SAVED_TURNS = [50, -55, 75, -35, 30] as const;

/** Curves of the present design: one hue, a dash of its own for each vent. */
export function presentMark(index: number): Mark {
  return { dash: VENT_DASHES[index % VENT_DASHES.length], colour: PRESENT_COLOUR, width: 1.8 };
}

/** Saved tunings laid over the present design. */
export function savedMark(index: number): Mark {
  const turn = SAVED_TURNS[index % SAVED_TURNS.length] ?? 0;
  return {
    dash: SAVED_DASHES[index % SAVED_DASHES.length],
    colour: `oklch(from ${PRESENT_COLOUR} l calc(c * 0.8) calc(h + ${turn}))`,
    width: 1.4,
  };
}

const COUNT_DASHES = ["5 3", undefined, "9 3 2 3", "2 2.5"] as const;

/** A curve of the bore map for a number of vents: one dashed, two solid, three chain, four dotted. */
export function countMark(count: number): Mark {
  return {
    dash: COUNT_DASHES[(count - 1) % COUNT_DASHES.length],
    colour: PRESENT_COLOUR,
    width: 1.6,
  };
}
