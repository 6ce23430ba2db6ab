"use client";

import { useRef, useState, type KeyboardEvent, type PointerEvent } from "react";
import type { Design } from "@/lib/document/schema";
import type { Handle } from "@/lib/drawing/handles";
import type { FrameHold } from "@/lib/drawing/sheet-frame";

export type DesignChange = (design: Design, phase: "drag" | "commit") => void;

interface Grasp {
  /** The handle as it was when taken: edits start from its design, so that nothing adds up twice. */
  handle: Handle;
  design: Design;
  last: Design;
  pointer: { id: number; x: number; y: number } | null;
}

export interface HandleBindings {
  held: Handle["id"] | null;
  of: (handle: Handle) => object;
}

/**
 * Dragging and stepping of the handles; while a hand holds one, the sheet's frame stands still.
 *
 * @param frame - scale and place of the sheet as it is now; sheet units are CSS pixels
 * @param onReason - why a handle goes no farther; null when that is over
 * @param onHold - the frame to keep while a hand holds; undefined when it lets go
 */
export function useHandles(
  design: Design,
  frame: FrameHold,
  onChange: DesignChange | undefined,
  onReason: (reason: string | null) => void,
  onHold: (frame: FrameHold | undefined) => void,
): HandleBindings {
  const grasp = useRef<Grasp | null>(null);
  const [held, setHeld] = useState<Handle["id"] | null>(null);

  const take = (handle: Handle, pointer: Grasp["pointer"]) => {
    grasp.current = { handle, design, last: design, pointer };
    setHeld(handle.id);
    onHold(frame);
  };
  const moveTo = (handle: Handle, wanted: number) => {
    const now = grasp.current;
    if (!now || !onChange) return;
    const value = Math.min(handle.max, Math.max(handle.min, handle.snap(wanted)));
    const stopped =
      wanted > handle.max + 1e-9
        ? handle.maxReason
        : wanted < handle.min - 1e-9
          ? handle.minReason
          : null;
    onReason(stopped);
    const next = value === handle.value ? now.design : handle.edit(value);
    if (next === now.last) return;
    now.last = next;
    onChange(next, "drag");
  };
  const letGo = (keep: boolean) => {
    const now = grasp.current;
    if (!now) return;
    grasp.current = null;
    setHeld(null);
    onHold(undefined);
    onReason(null);
    onChange?.(keep ? now.last : now.design, "commit");
  };

  const pointerDown = (handle: Handle) => (event: PointerEvent<SVGGElement>) => {
    if (event.button !== 0) return;
    event.preventDefault();
    event.stopPropagation();
    event.currentTarget.focus();
    event.currentTarget.setPointerCapture(event.pointerId);
    take(handle, { id: event.pointerId, x: event.clientX, y: event.clientY });
  };
  const pointerMove = (event: PointerEvent<SVGGElement>) => {
    const now = grasp.current;
    if (!now?.pointer || now.pointer.id !== event.pointerId) return;
    const perMm = frame.scale;
    const inwards = (event.clientX - now.pointer.x) / perMm;
    const outwards = (now.pointer.y - event.clientY) / perMm;
    const { handle } = now;
    moveTo(handle, handle.value + inwards * handle.perInwards + outwards * handle.perOutwards);
  };
  const keyDown = (handle: Handle) => (event: KeyboardEvent<SVGGElement>) => {
    if (event.key === "Escape") {
      if (grasp.current) event.preventDefault();
      letGo(false);
      return;
    }
    const wanted = wantedByKey(event, handle);
    if (wanted === null) return;
    event.preventDefault();
    if (!grasp.current) take(handle, null);
    const now = grasp.current;
    // A held key goes on from where it has come to, its limits still those of the start.
    if (now) moveTo({ ...now.handle, value: NaN }, wanted);
  };
  return {
    held,
    of: (handle) => ({
      onPointerDown: pointerDown(handle),
      onPointerMove: pointerMove,
      onPointerUp: () => letGo(true),
      onPointerCancel: () => letGo(false),
      onKeyDown: keyDown(handle),
      onKeyUp: () => {
        if (grasp.current && !grasp.current.pointer) letGo(true);
      },
      onBlur: () => letGo(true),
    }),
  };
}

function wantedByKey(event: KeyboardEvent, handle: Handle): number | null {
  const step = handle.step * (event.shiftKey ? 10 : 1);
  switch (event.key) {
    case "ArrowRight":
    case "ArrowUp":
      return handle.value + step;
    case "ArrowLeft":
    case "ArrowDown":
      return handle.value - step;
    case "PageUp":
      return handle.value + 10 * handle.step;
    case "PageDown":
      return handle.value - 10 * handle.step;
    case "Home":
      return handle.min;
    case "End":
      return handle.max;
    default:
      return null;
  }
}
