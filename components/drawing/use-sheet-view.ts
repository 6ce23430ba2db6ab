"use client";

import { useRef, useState, type PointerEvent } from "react";
import type { BoxSize } from "./use-box-size";

export interface SheetZoom {
  zoom: number;
  x: number;
  y: number;
}

const FIT: SheetZoom = { zoom: 1, x: 0, y: 0 };
const MOST = 8;

/** Looking closer: zoom about a point, pan with one finger or the mouse, pinch with two. */
export function useSheetView(box: BoxSize) {
  const [view, setView] = useState<SheetZoom>(FIT);
  const touches = useRef(new Map<number, { x: number; y: number }>());

  const clamp = ({ zoom, x, y }: SheetZoom): SheetZoom => ({
    zoom,
    x: Math.min(Math.max(0, x), box.width * (zoom - 1)),
    y: Math.min(Math.max(0, y), box.height * (zoom - 1)),
  });
  const zoomBy = (factor: number, at = { x: box.width / 2, y: box.height / 2 }) =>
    setView((old) => {
      const zoom = Math.min(MOST, Math.max(1, old.zoom * factor));
      const grown = zoom / old.zoom;
      return clamp({ zoom, x: (old.x + at.x) * grown - at.x, y: (old.y + at.y) * grown - at.y });
    });
  const panBy = (dx: number, dy: number) =>
    setView((old) => clamp({ ...old, x: old.x - dx, y: old.y - dy }));

  const handlers = {
    onPointerDown: (event: PointerEvent<SVGSVGElement>) => {
      touches.current.set(event.pointerId, { x: event.clientX, y: event.clientY });
    },
    onPointerMove: (event: PointerEvent<SVGSVGElement>) => {
      const before = touches.current.get(event.pointerId);
      if (!before) return;
      const now = { x: event.clientX, y: event.clientY };
      const other = [...touches.current].find(([id]) => id !== event.pointerId)?.[1];
      touches.current.set(event.pointerId, now);
      if (other) {
        const bounds = event.currentTarget.getBoundingClientRect();
        const spread = (p: { x: number; y: number }) => Math.hypot(p.x - other.x, p.y - other.y);
        const middle = {
          x: (now.x + other.x) / 2 - bounds.left,
          y: (now.y + other.y) / 2 - bounds.top,
        };
        if (spread(before) > 8) zoomBy(spread(now) / spread(before), middle);
      } else if (view.zoom > 1) {
        const moved = { x: now.x - before.x, y: now.y - before.y };
        if (moved.x !== 0 || moved.y !== 0) panBy(moved.x, moved.y);
      }
    },
    onPointerUp: (event: PointerEvent<SVGSVGElement>) => touches.current.delete(event.pointerId),
    onPointerCancel: (event: PointerEvent<SVGSVGElement>) =>
      touches.current.delete(event.pointerId),
    onPointerLeave: (event: PointerEvent<SVGSVGElement>) => touches.current.delete(event.pointerId),
  };
  return { view: clamp(view), zoomBy, panBy, reset: () => setView(FIT), handlers };
}
