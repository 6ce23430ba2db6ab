"use client";

import { useRef } from "react";
import type { KeyboardEvent, PointerEvent } from "react";
import { clampCursor, stepCursor } from "@/lib/charts/cursor";
import type { Scale } from "@/lib/charts/scale";
import styles from "./strip-cursor.module.css";

/** Sideways movement after which a touch is taken to move the cursor, not to scroll [px]. */
const TAKEN_AFTER = 6;

/** Steps of the keys; with shift, the arrows move ten times as far. */
const KEY_STEPS: Record<string, number> = {
  ArrowLeft: -1,
  ArrowDown: -1,
  ArrowRight: 1,
  ArrowUp: 1,
  PageDown: -24,
  PageUp: 24,
};

/** The cursor's handle over all plots: pointer, touch and keys. */
export function StripHand({
  x,
  current,
  onMove,
}: {
  x: Scale;
  current: () => number;
  onMove: (cursor_hz: number) => void;
}) {
  const grip = useRef<{ id: number; x: number; taken: boolean } | null>(null);
  const moveTo = (event: PointerEvent<HTMLDivElement>) => {
    const { left } = event.currentTarget.getBoundingClientRect();
    onMove(clampCursor(x.toValue(event.clientX - left), x.domain));
  };
  const down = (event: PointerEvent<HTMLDivElement>) => {
    if (event.button !== 0 || !event.isPrimary) return;
    const touch = event.pointerType === "touch";
    grip.current = { id: event.pointerId, x: event.clientX, taken: !touch };
    event.currentTarget.setPointerCapture(event.pointerId);
    if (!touch) moveTo(event);
  };
  const move = (event: PointerEvent<HTMLDivElement>) => {
    const held = grip.current;
    if (held?.id !== event.pointerId) return;
    if (Math.abs(event.clientX - held.x) > TAKEN_AFTER) held.taken = true;
    if (held.taken) moveTo(event);
  };
  const up = (event: PointerEvent<HTMLDivElement>) => {
    if (grip.current?.id !== event.pointerId) return;
    moveTo(event);
    grip.current = null;
  };
  const key = (event: KeyboardEvent<HTMLDivElement>) => {
    const steps = KEY_STEPS[event.key];
    const next =
      event.key === "Home"
        ? x.domain[0]
        : event.key === "End"
          ? x.domain[1]
          : steps === undefined
            ? null
            : stepCursor(current(), steps * (event.shiftKey ? 10 : 1), x.domain);
    if (next === null || event.altKey || event.ctrlKey || event.metaKey) return;
    event.preventDefault();
    onMove(next);
  };
  return (
    <div
      className={styles.hand}
      role="slider"
      tabIndex={0}
      aria-label="Cursor frequency"
      aria-valuemin={x.domain[0]}
      aria-valuemax={x.domain[1]}
      aria-valuenow={x.domain[0]}
      onPointerDown={down}
      onPointerMove={move}
      onPointerUp={up}
      onPointerCancel={() => (grip.current = null)}
      onKeyDown={key}
    />
  );
}
