"use client";

import { useMemo } from "react";

/** Plain data that keeps its identity as long as it says the same. */
export function useSame<T>(value: T): T {
  const text = JSON.stringify(value);
  return useMemo(() => JSON.parse(text) as T, [text]);
}
