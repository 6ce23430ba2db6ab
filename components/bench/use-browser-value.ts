"use client";

import { useCallback, useSyncExternalStore } from "react";

/** What this browser keeps of one choice: read once, then held here for every part that asks. */
export interface BrowserValue<T> {
  read: () => T;
  keep: (value: T) => void;
  /** On the server and until the first paint. */
  usual: T;
}

interface Held<T> {
  value: T;
  listeners: Set<() => void>;
}

const held = new Map<object, Held<unknown>>();

function holdOf<T>(source: BrowserValue<T>): Held<T> {
  const known = held.get(source);
  if (known) return known as Held<T>;
  const made: Held<T> = { value: source.read(), listeners: new Set() };
  held.set(source, made as Held<unknown>);
  return made;
}

/** A choice kept in the browser, and the way to change it. */
export function useBrowserValue<T>(source: BrowserValue<T>): [T, (value: T) => void] {
  const value = useSyncExternalStore(
    (listener) => {
      const { listeners } = holdOf(source);
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    () => holdOf(source).value,
    () => source.usual,
  );
  const change = useCallback(
    (next: T) => {
      const hold = holdOf(source);
      hold.value = next;
      source.keep(next);
      hold.listeners.forEach((listener) => listener());
    },
    [source],
  );
  return [value, change];
}
