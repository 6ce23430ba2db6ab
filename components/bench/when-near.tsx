"use client";

import { useEffect, useRef, useState, type ReactNode } from "react";

/** How far from the window's edge a part is fetched. */
const NEAR = "120px";

/** Fetches and shows a part once its place comes near the window; until then it keeps the room. */
export function WhenNear({ name, children }: { name: string; children: ReactNode }) {
  const place = useRef<HTMLDivElement>(null);
  const [near, setNear] = useState(false);
  useEffect(() => {
    const element = place.current;
    if (!element) return;
    const observer = new IntersectionObserver(
      ([entry]) => {
        if (!entry?.isIntersecting) return;
        observer.disconnect();
        setNear(true);
      },
      { rootMargin: NEAR },
    );
    observer.observe(element);
    return () => observer.disconnect();
  }, []);
  return (
    <div ref={place} data-part={name} className={near ? undefined : "part-place"}>
      {near && children}
    </div>
  );
}
