"use client";

import { useId, type ReactNode } from "react";

interface ChoiceProps<Value extends string> {
  label: string;
  value: NoInfer<Value>;
  options: readonly { value: Value; label: ReactNode }[];
  onChange: (value: Value) => void;
}

/** One of a few, side by side: radio buttons that look like a switch. */
export function Choice<Value extends string>({
  label,
  value,
  options,
  onChange,
}: ChoiceProps<Value>) {
  const name = useId();
  return (
    <fieldset className="choice">
      <legend>{label}</legend>
      <div className="choice-row">
        {options.map((option) => (
          <label key={option.value}>
            <input
              type="radio"
              name={name}
              value={option.value}
              checked={option.value === value}
              onChange={() => onChange(option.value)}
            />
            <span>{option.label}</span>
          </label>
        ))}
      </div>
    </fieldset>
  );
}
