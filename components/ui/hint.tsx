"use client";

import { useId, useRef, type ReactNode } from "react";
import { usePopover } from "./use-popover";

interface HintProps {
  /** The question it answers, as the name of its button. */
  label: string;
  children: ReactNode;
}

/** Time a pointer rests before the words come, and may leave before they go [ms]. */
const REST = 250;

/** A term explained where it stands: on pointing, on focus, on a tap. Escape puts it away. */
export function Hint({ label, children }: HintProps) {
  const id = useId();
  const { anchor, panel, show, hide } = usePopover<HTMLButtonElement, HTMLSpanElement>();
  const timer = useRef<ReturnType<typeof setTimeout> | null>(null);
  const later = (act: () => void) => {
    if (timer.current) clearTimeout(timer.current);
    timer.current = setTimeout(act, REST);
  };
  return (
    <span
      className="hint"
      onPointerEnter={({ pointerType }) => pointerType === "mouse" && later(show)}
      onPointerLeave={({ pointerType }) => pointerType === "mouse" && later(hide)}
    >
      <button
        ref={anchor}
        type="button"
        className="hint-mark"
        aria-label={label}
        aria-describedby={id}
        onClick={show}
        onFocus={(event) => event.currentTarget.matches(":focus-visible") && show()}
        onBlur={hide}
      >
        <span aria-hidden>?</span>
      </button>
      <span ref={panel} id={id} role="tooltip" popover="auto" className="popover hint-words">
        {children}
      </span>
    </span>
  );
}
