"use client";

import { useEffect, useState, type RefObject } from "react";

export interface BoxSize {
  width: number;
  height: number;
}

/** Size of an element as it stands, `initial` until it has been measured. */
export function useBoxSize(ref: RefObject<Element | null>, initial: BoxSize): BoxSize {
  const [size, setSize] = useState(initial);
  useEffect(() => {
    const element = ref.current;
    if (!element) return;
    const observer = new ResizeObserver(([entry]) => {
      if (!entry) return;
      const width = Math.round(entry.contentRect.width);
      const height = Math.round(entry.contentRect.height);
      if (width < 40 || height < 40) return;
      setSize((old) => (old.width === width && old.height === height ? old : { width, height }));
    });
    observer.observe(element);
    return () => observer.disconnect();
  }, [ref]);
  return size;
}
