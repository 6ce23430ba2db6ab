"use client";

import type { ReactNode, Ref } from "react";
import { startTransition, useImperativeHandle, useLayoutEffect, useRef, useState } from "react";
import type { Curves } from "@/lib/acoustics/answer";
import type { Domain } from "@/lib/charts/scale";
import { stripDomains } from "@/lib/charts/strip-domains";
import type { CurveLimits, StripId } from "@/lib/charts/strips";
import type { UnitPreferences } from "@/lib/units/preferences";
import { StripFoot } from "./strip-foot";
import { StripHand } from "./strip-hand";
import { StripPainter } from "./strip-painter";
import { StripRows } from "./strip-rows";
import { useSame } from "./use-same";
import { shownCurves, useStripSheet } from "./use-strip-sheet";
import { useWidth } from "./use-width";
import styles from "./strips.module.css";

export interface CurveStripsHandle {
  /** Writes curves of a design in motion over the settled ones, without rendering. */
  live: (curves: Curves, marks?: { tuning_hz: number | null }) => void;
  /** Shows the settled curves again; new `curves` do the same. */
  settle: () => void;
}

export interface CurveStripsProps {
  curves: Curves;
  /** The design before the present edit: dotted. */
  previous?: Curves | null;
  saved?: readonly { name: string; curves: Curves }[];
  limits: CurveLimits;
  ventNames?: readonly string[];
  preferences: UnitPreferences;
  strips: readonly StripId[];
  onStripsChange?: (strips: StripId[]) => void;
  cursor_hz: number;
  onCursor?: (cursor_hz: number) => void;
  range_hz?: Domain;
  /** The hearing caution, shown once where levels pass 85 dB. */
  caution?: string;
  /** Stands until the width is known. */
  fallback?: ReactNode;
  ref?: Ref<CurveStripsHandle>;
}

const NONE: readonly never[] = [];
const DEFAULT_RANGE: Domain = [10, 500];

/** Curves as a chart recorder writes them: strips on one frequency axis, one cursor through all. */
export function CurveStrips(props: CurveStripsProps) {
  const { curves, strips, cursor_hz, onCursor, ref } = props;
  const previous = props.previous ?? null;
  const saved = props.saved ?? (NONE as NonNullable<CurveStripsProps["saved"]>);
  const limits = useSame(props.limits);
  const preferences = useSame(props.preferences);
  const ventNames = useSame(props.ventNames ?? NONE);
  const range_hz = useSame(props.range_hz ?? DEFAULT_RANGE);
  const standing = useSame(strips);
  const root = useRef<HTMLDivElement>(null);
  const width_px = useWidth(root);
  const [painter] = useState(() => new StripPainter());
  const [outgrown, setOutgrown] = useState<{ base: Curves; live: Curves } | null>(null);
  const live = outgrown?.base === curves ? outgrown.live : null;
  const input = { curves, previous, saved, limits, preferences, ventNames };
  const sheet = useStripSheet(input, standing, range_hz, width_px, live);
  const { plots, x, domains } = sheet;
  const tuning_hz = limits.tuning_hz ?? null;

  useLayoutEffect(() => {
    if (root.current && width_px > 0)
      painter.adopt(root.current, { curves, ventNames, tuning_hz, x, plots });
  }, [painter, width_px, curves, ventNames, tuning_hz, x, plots]);
  useLayoutEffect(() => painter.moveCursor(cursor_hz), [painter, cursor_hz]);
  useImperativeHandle(
    ref,
    () => ({
      live: (moving, marks) => {
        painter.live(moving, marks ? marks.tuning_hz : tuning_hz);
        const shown = shownCurves(curves, null, saved, moving);
        if (stripDomains(domains, shown, limits, preferences, range_hz) !== domains)
          startTransition(() => setOutgrown({ base: curves, live: moving }));
      },
      settle: () => {
        painter.settle();
        setOutgrown(null);
      },
    }),
    [painter, curves, saved, limits, preferences, range_hz, domains, tuning_hz],
  );

  const position = useRef(cursor_hz);
  const frame = useRef(0);
  useLayoutEffect(() => {
    position.current = cursor_hz;
    return () => cancelAnimationFrame(frame.current);
  }, [cursor_hz]);
  const move = (next_hz: number) => {
    position.current = next_hz;
    painter.moveCursor(next_hz);
    cancelAnimationFrame(frame.current);
    frame.current = requestAnimationFrame(() => onCursor?.(next_hz));
  };

  return (
    <div ref={root} className={styles.sheet}>
      {width_px === 0 ? (
        props.fallback
      ) : (
        <>
          <StripRows input={input} sheet={sheet} range_hz={range_hz}>
            <StripHand x={x} current={() => position.current} onMove={move} />
          </StripRows>
          <StripFoot
            input={input}
            strips={standing}
            range_hz={range_hz}
            onStripsChange={props.onStripsChange}
            caution={props.caution}
          />
        </>
      )}
    </div>
  );
}
