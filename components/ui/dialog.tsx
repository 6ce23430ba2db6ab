"use client";

import { useEffect, useId, useRef, type ReactNode } from "react";
import { IconButton } from "./icon-button";

interface DialogProps {
  title: string;
  onClose: () => void;
  children: ReactNode;
  /** Nearly the whole page: for a chart or a drawing. */
  wide?: boolean;
  /** Stands at the edge of the page, so that what it explains stays in view. */
  aside?: boolean;
}

/**
 * A dialog that is open as long as it is mounted. The browser's own element keeps the focus
 * inside and closes on Escape; the focus goes back where it came from.
 */
export function Dialog({ title, onClose, children, wide = false, aside = false }: DialogProps) {
  const element = useRef<HTMLDialogElement>(null);
  const titleId = useId();
  useEffect(() => {
    const dialog = element.current;
    const before = document.activeElement;
    if (dialog && !dialog.open) dialog.showModal();
    return () => {
      dialog?.close();
      if (before instanceof HTMLElement) before.focus();
    };
  }, []);
  const form = aside ? "sheet-dialog" : wide ? "wide-dialog" : "plain-dialog";
  return (
    <dialog
      ref={element}
      aria-labelledby={titleId}
      className={`dialog ${form}`}
      onCancel={(event) => {
        event.preventDefault();
        onClose();
      }}
      onClick={(event) => event.target === event.currentTarget && onClose()}
    >
      <div className="flex max-h-[inherit] min-h-0 flex-1 flex-col">
        <header className="flex items-center justify-between gap-4 border-b border-rule py-2 pr-2 pl-4">
          <h2 id={titleId} className="title-wide text-lg">
            {title}
          </h2>
          <IconButton icon="close" label="Close" onClick={onClose} />
        </header>
        <div className="min-h-0 flex-1 overflow-auto p-4">{children}</div>
      </div>
    </dialog>
  );
}
