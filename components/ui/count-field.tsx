"use client";

import type { ReactNode } from "react";
import { IconButton } from "./icon-button";

interface CountFieldProps {
  id: string;
  label: string;
  hint?: ReactNode;
  value: number;
  min: number;
  max: number;
  onCommit: (value: number) => void;
  disabled?: boolean;
}

/** A whole number with one fewer and one more beside it; arrow keys work on it too. */
export function CountField(props: CountFieldProps) {
  const { id, label, hint, value, min, max, onCommit, disabled } = props;
  const put = (next: number) => {
    const bounded = Math.min(max, Math.max(min, next));
    if (bounded !== value) onCommit(bounded);
  };
  return (
    <div className="field-row" data-field={id}>
      <div className="field-name">
        <span id={`${id}-label`}>{label}</span>
        {hint}
      </div>
      <span className="field-aside" />
      <span className="flex items-center justify-end gap-1">
        <IconButton
          icon="remove"
          label={`${label}: one fewer`}
          disabled={disabled || value <= min}
          onClick={() => put(value - 1)}
        />
        <span
          id={id}
          role="spinbutton"
          tabIndex={disabled ? -1 : 0}
          aria-labelledby={`${id}-label`}
          aria-valuenow={value}
          aria-valuemin={min}
          aria-valuemax={max}
          className="field-count lettering"
          onKeyDown={(event) => {
            const step = { ArrowUp: 1, ArrowDown: -1, PageUp: 10, PageDown: -10 }[event.key];
            if (!step || disabled) return;
            event.preventDefault();
            put(value + step * (event.shiftKey ? 10 : 1));
          }}
        >
          {value}
        </span>
        <IconButton
          icon="add"
          label={`${label}: one more`}
          disabled={disabled || value >= max}
          onClick={() => put(value + 1)}
        />
      </span>
    </div>
  );
}
