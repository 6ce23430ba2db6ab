"use client";

import { Moment } from "@/components/ui/moment";
import { createDesign } from "@/lib/designs/requests";
import { showToast } from "@/components/ui/toasts";
import { useBenchStore } from "./bench-context";
import type { Autosave } from "./use-autosave";

/** How the design is kept, always in sight. */
export function SaveState({ autosave }: { autosave: Autosave }) {
  const store = useBenchStore();
  const { status, saved_at, message, retry } = autosave;
  const keepCopy = async () => {
    const { design } = store.getState();
    try {
      const copy = await createDesign({
        ...design,
        name: `${design.name}, my changes`.slice(0, 200),
      });
      showToast({ message: `Your changes are kept as ${copy.name}.` });
    } catch (error) {
      showToast({ message: error instanceof Error ? error.message : String(error), fault: true });
    }
  };
  return (
    <p role="status" aria-live="polite" data-save={status}>
      {status === "saved" && (
        <>
          Saved <Moment iso={saved_at} />
        </>
      )}
      {status === "saving" && "Saving …"}
      {status === "unsaved" && "Not saved yet"}
      {status === "offline" && (
        <>
          {message} <RetryButton onClick={retry} />
        </>
      )}
      {status === "refused" && (
        <span className="text-over">
          {message} <RetryButton onClick={retry} />
        </span>
      )}
      {status === "conflict" && (
        <span className="text-over">
          {message}{" "}
          <button type="button" className="link-quiet" onClick={keepCopy}>
            Keep mine as a copy
          </button>{" "}
          <button type="button" className="link-quiet" onClick={() => window.location.reload()}>
            Open theirs
          </button>
        </span>
      )}
    </p>
  );
}

function RetryButton({ onClick }: { onClick: () => void }) {
  return (
    <button type="button" className="link-quiet" onClick={onClick}>
      Try again
    </button>
  );
}
