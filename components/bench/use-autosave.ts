"use client";

import { useEffect, useRef, useState } from "react";
import type { SavedDesign } from "@/lib/designs/contract";
import { saveDesign } from "@/lib/designs/requests";
import { AskError } from "@/lib/platform/ask";
import { useBenchStore } from "./bench-context";

export type SaveStatus = "saved" | "saving" | "unsaved" | "offline" | "conflict" | "refused";

export interface Autosave {
  status: SaveStatus;
  version: number;
  saved_at: string;
  /** What the server said, where it did not save. */
  message: string | null;
  retry: () => void;
}

/** How long after an edit it is saved [ms]; a burst of edits is one save. */
const REST = 700;
/** How long after a failure it is tried again [ms]. */
const AGAIN = 5_000;

/**
 * Saves a design after each finished edit, one save at a time, each naming the version it changes.
 * Without a connection it tries again; where someone else saved first it stops and says so.
 */
export function useAutosave(saved: SavedDesign, canEdit: boolean): Autosave {
  const store = useBenchStore();
  const [state, setState] = useState({
    status: "saved" as SaveStatus,
    version: saved.version,
    saved_at: saved.updated_at,
    message: null as string | null,
  });
  const queue = useRef<() => void>(() => undefined);
  useEffect(() => {
    if (!canEdit) return;
    let version = saved.version;
    let kept = store.getState().design;
    let busy = false;
    let stopped = false;
    let timer = 0;
    const later = (delay: number) => {
      window.clearTimeout(timer);
      timer = window.setTimeout(save, delay);
    };
    async function save() {
      const { design, dragOrigin } = store.getState();
      if (stopped || busy || dragOrigin || design === kept) return;
      busy = true;
      setState((old) => ({ ...old, status: "saving" }));
      try {
        const answer = await saveDesign(saved.id, version, design);
        version = answer.version;
        kept = design;
        const status = store.getState().design === design ? "saved" : "unsaved";
        setState({ status, version, saved_at: answer.updated_at, message: null });
        if (status === "unsaved") later(REST);
      } catch (error) {
        const known = error instanceof AskError ? error : null;
        const lost = known?.code === "offline" || known?.code === "unavailable";
        stopped = !lost;
        const status = lost ? "offline" : known?.code === "conflict" ? "conflict" : "refused";
        setState((old) => ({ ...old, status, message: told(known) }));
        if (lost) later(AGAIN);
      } finally {
        busy = false;
      }
    }
    queue.current = () => {
      stopped = false;
      later(0);
    };
    const leave = (event: BeforeUnloadEvent) => {
      if (store.getState().design !== kept) event.preventDefault();
    };
    window.addEventListener("beforeunload", leave);
    const stop = store.subscribe((now, old) => {
      if (now.design === old.design || now.dragOrigin || stopped) return;
      setState((before) => ({ ...before, status: "unsaved" }));
      later(REST);
    });
    return () => {
      stop();
      window.removeEventListener("beforeunload", leave);
      window.clearTimeout(timer);
      void save();
    };
  }, [store, saved.id, saved.version, canEdit]);
  return { ...state, retry: () => queue.current() };
}

function told(error: AskError | null): string {
  if (!error) return "The design could not be saved.";
  if (error.code !== "conflict") return error.message;
  const who = error.details.updated_by;
  return `${typeof who === "string" ? who : "Someone"} saved this design in the meantime. Open it again to see theirs; copy yours first.`;
}
