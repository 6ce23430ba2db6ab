"use client";

import { useEffect, useState } from "react";
import type { Reading } from "@/lib/bench/store";
import { useBenchStore } from "./bench-context";

/**
 * The reading as it stands while no hand drags. What is costly to draw follows this; what must
 * follow the hand listens to the store.
 */
export function useSettled(): Reading {
  const store = useBenchStore();
  const [settled, setSettled] = useState<Reading>(() => store.getState());
  useEffect(() => {
    const take = () => {
      const state = store.getState();
      if (!state.dragOrigin) setSettled(state);
    };
    take();
    return store.subscribe(take);
  }, [store]);
  return settled;
}
