"use client";

import Link from "next/link";
import { useState, type ReactNode } from "react";
import { useBench, useBenchStore } from "./bench-context";

interface BenchHeaderProps {
  /** Whether the person may change the design. */
  canEdit: boolean;
  /** Kept where, and how that stands. */
  state: ReactNode;
  /** What to do next with the design: keep it, or copy it. */
  actions: ReactNode;
}

/** The design's name, how it is kept, the way back, and the next thing to do with it. */
export function BenchHeader({ canEdit, state, actions }: BenchHeaderProps) {
  const store = useBenchStore();
  const canUndo = useBench(({ past, dragOrigin }) => past.length > 0 && !dragOrigin);
  const canRedo = useBench(({ future, dragOrigin }) => future.length > 0 && !dragOrigin);
  return (
    <header className="bench-head">
      <div className="min-w-0">
        <DesignName canEdit={canEdit} />
        <div className="text-sm text-ink-2">{state}</div>
      </div>
      <div className="flex flex-wrap items-center gap-2">
        {canEdit && (
          <>
            <button
              type="button"
              className="button-quiet"
              disabled={!canUndo}
              title="Ctrl Z"
              onClick={() => store.getState().undo()}
            >
              Undo
            </button>
            <button
              type="button"
              className="button-quiet"
              disabled={!canRedo}
              title="Ctrl Shift Z"
              onClick={() => store.getState().redo()}
            >
              Redo
            </button>
          </>
        )}
        {actions}
      </div>
    </header>
  );
}

function DesignName({ canEdit }: { canEdit: boolean }) {
  const store = useBenchStore();
  const name = useBench(({ design }) => design.name);
  const [draft, setDraft] = useState<string | null>(null);
  const commit = () => {
    const next = draft?.trim();
    setDraft(null);
    if (!next || next === name) return;
    const { design, change } = store.getState();
    change({ ...design, name: next.slice(0, 200) }, "commit");
  };
  if (!canEdit) return <h1 className="title-wide bench-name">{name}</h1>;
  return (
    <h1 className="title-wide">
      <input
        aria-label="Name of the design"
        className="bench-name"
        data-editing={draft !== null}
        maxLength={200}
        value={draft ?? name}
        size={Math.max(6, (draft ?? name).length)}
        onChange={(event) => setDraft(event.target.value)}
        onBlur={commit}
        onKeyDown={(event) => {
          if (event.key === "Enter") event.currentTarget.blur();
          if (event.key === "Escape") setDraft(null);
        }}
      />
    </h1>
  );
}

/** What a visitor is asked: nothing, until there is something to keep. */
export function VisitorActions({ onStart }: { onStart: () => void }) {
  return (
    <>
      <button type="button" className="button-quiet" onClick={onStart}>
        Three questions
      </button>
      <Link href="/sign-up" className="button-primary">
        Sign up to keep it
      </Link>
    </>
  );
}
