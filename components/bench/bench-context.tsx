"use client";

import { createContext, useContext, useState, type ReactNode } from "react";
import { useStore } from "zustand";
import { createBenchStore, type BenchState, type BenchStore } from "@/lib/bench/store";
import type { Design } from "@/lib/document/schema";

const BenchContext = createContext<BenchStore | null>(null);

/** Holds one Bench's state for all that stands on the page. */
export function BenchProvider({ design, children }: { design: Design; children: ReactNode }) {
  const [store] = useState(() => createBenchStore(design));
  return <BenchContext value={store}>{children}</BenchContext>;
}

export function useBenchStore(): BenchStore {
  const store = useContext(BenchContext);
  if (!store) throw new Error("A part of the Bench stands outside its provider.");
  return store;
}

/** Subscribes to a part of the Bench's state. */
export function useBench<T>(select: (state: BenchState) => T): T {
  return useStore(useBenchStore(), select);
}
