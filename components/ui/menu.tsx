"use client";

import type { ReactNode } from "react";
import { usePopover } from "./use-popover";

interface MenuProps {
  /** What the button shows. */
  face: ReactNode;
  /** Its name, where the face is not words enough. */
  label?: string;
  className?: string;
  /** Called with the way to close it. */
  children: (close: () => void) => ReactNode;
}

/** A button that folds out a small panel of choices; it closes on Escape or a press elsewhere. */
export function Menu({ face, label, className = "header-item", children }: MenuProps) {
  const { anchor, panel, show, hide } = usePopover<HTMLButtonElement, HTMLDivElement>();
  return (
    <>
      <button
        ref={anchor}
        type="button"
        className={className}
        aria-label={label}
        aria-haspopup="dialog"
        onClick={() => (panel.current?.matches(":popover-open") ? hide() : show())}
      >
        {face}
      </button>
      <div
        ref={panel}
        popover="auto"
        role="group"
        aria-label={label}
        className="popover menu-panel"
      >
        {children(hide)}
      </div>
    </>
  );
}
