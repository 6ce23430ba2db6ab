"use client";

import { useEffect, useState } from "react";
import type { Cure } from "@/lib/margins/margin";
import { useUnitPreferences } from "@/components/shell/unit-preferences";
import { useBenchStore } from "./bench-context";
import { useSettled } from "./use-settled";

/** How long the hand must rest before cures are looked for [ms]. */
const REST = 250;

/** The cheapest cures of one margin, looked for once the hand rests, applied with one press. */
export function MarginCures({ id }: { id: string }) {
  const { design, answer } = useSettled();
  const store = useBenchStore();
  const [preferences] = useUnitPreferences();
  const [found, setFound] = useState<{ of: typeof design; cures: Cure[] } | null>(null);
  useEffect(() => {
    if (!answer) return;
    let stale = false;
    const timer = window.setTimeout(async () => {
      const { curesOf } = await import("@/lib/margins/cures");
      if (!stale) setFound({ of: design, cures: curesOf(id, design, answer, { preferences }) });
    }, REST);
    return () => {
      stale = true;
      window.clearTimeout(timer);
    };
  }, [id, design, answer, preferences]);
  if (!found || found.of !== design) return <p className="mt-1 min-h-11 text-sm text-ink-2">…</p>;
  if (found.cures.length === 0) return null;
  return (
    <ul className="mt-1.5 flex flex-col gap-1.5">
      {found.cures.slice(0, 3).map((cure) => (
        <li key={cure.id}>
          <button
            type="button"
            className="cure"
            onClick={() => store.getState().change(cure.apply(design), "commit")}
          >
            <span className="font-medium">{cure.text}</span>
            <span className="text-ink-2">{cure.effect}</span>
          </button>
        </li>
      ))}
    </ul>
  );
}
