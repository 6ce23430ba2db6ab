"use client";

import type { SavedDesign } from "@/lib/designs/contract";
import { Bench } from "./bench";
import { BenchProvider } from "./bench-context";
import { SaveState } from "./save-state";
import { useAutosave } from "./use-autosave";

interface SavedBenchProps {
  saved: SavedDesign;
  canEdit: boolean;
  drawn: string;
}

/** A saved design on the Bench; every finished edit is saved. */
export function SavedBench(props: SavedBenchProps) {
  return (
    <BenchProvider design={props.saved.document}>
      <Inside {...props} />
    </BenchProvider>
  );
}

function Inside({ saved, canEdit, drawn }: SavedBenchProps) {
  const autosave = useAutosave(saved, canEdit);
  return (
    <Bench
      canEdit={canEdit}
      state={canEdit ? <SaveState autosave={autosave} /> : "Your role reads this design"}
      actions={null}
      revision={`save ${autosave.version}`}
      drawn={drawn}
    />
  );
}
