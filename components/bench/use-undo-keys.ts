"use client";

import { useEffect } from "react";
import { useBenchStore } from "./bench-context";

/** Ctrl or ⌘ with Z takes back, with shift (or Ctrl+Y) does again; a text field keeps its own. */
export function useUndoKeys(): void {
  const store = useBenchStore();
  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      if (!(event.ctrlKey || event.metaKey) || event.altKey) return;
      const target = event.target;
      if (target instanceof HTMLInputElement && target.dataset.editing === "true") return;
      if (target instanceof HTMLTextAreaElement) return;
      const key = event.key.toLowerCase();
      if (key !== "z" && key !== "y") return;
      event.preventDefault();
      const { undo, redo } = store.getState();
      if (key === "y" || event.shiftKey) redo();
      else undo();
    };
    window.addEventListener("keydown", onKey);
    return () => window.removeEventListener("keydown", onKey);
  }, [store]);
}
