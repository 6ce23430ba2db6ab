"use client";

import { useCallback, useRef } from "react";

const GAP = 6;
const EDGE = 8;

/**
 * Places a native popover beside what opened it: under it, or over it where there is no room;
 * inside the window always. The top layer keeps it clear of every scrolling column.
 */
export function usePopover<Anchor extends HTMLElement, Panel extends HTMLElement>() {
  const anchor = useRef<Anchor>(null);
  const panel = useRef<Panel>(null);

  const show = useCallback(() => {
    const [from, box] = [anchor.current, panel.current];
    if (!from || !box) return;
    if (!box.matches(":popover-open")) box.showPopover();
    const { left, right, top, bottom } = from.getBoundingClientRect();
    const { width, height } = box.getBoundingClientRect();
    const page = document.documentElement;
    const fromRight = left > page.clientWidth / 2;
    const x = fromRight ? right - width : left;
    const below = bottom + GAP + height <= page.clientHeight || top < height + GAP;
    box.style.left = `${Math.max(EDGE, Math.min(x, page.clientWidth - width - EDGE))}px`;
    box.style.top = `${Math.max(EDGE, below ? bottom + GAP : top - GAP - height)}px`;
  }, []);

  const hide = useCallback(() => {
    if (panel.current?.matches(":popover-open")) panel.current.hidePopover();
  }, []);

  return { anchor, panel, show, hide };
}
