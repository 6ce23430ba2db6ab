"use client";

import { useSyncExternalStore } from "react";

const never = () => () => undefined;

const format = (iso: string, timeZone?: string) =>
  new Intl.DateTimeFormat("en-GB", {
    day: "numeric",
    month: "short",
    year: "numeric",
    hour: "2-digit",
    minute: "2-digit",
    timeZone,
  }).format(new Date(iso));

/** A moment in the reader's own time; the server, which cannot know it, writes UTC first. */
export function Moment({ iso }: { iso: string }) {
  const text = useSyncExternalStore(
    never,
    () => format(iso),
    () => format(iso, "UTC"),
  );
  return (
    <time dateTime={iso} className="lettering whitespace-nowrap">
      {text}
    </time>
  );
}
