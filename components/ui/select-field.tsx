"use client";

import type { ReactNode } from "react";
import { Icon } from "./icons";
import { Lettered } from "./lettered";

interface SelectFieldProps<Value extends string> {
  id: string;
  label: string;
  hint?: ReactNode;
  value: NoInfer<Value>;
  options: readonly { value: Value; label: string }[];
  onChange: (value: Value) => void;
  disabled?: boolean;
}

/** A choice from a short list, with the device's own picker. */
export function SelectField<Value extends string>(props: SelectFieldProps<Value>) {
  const { id, label, hint, value, options, onChange, disabled } = props;
  return (
    <div className="field-row" data-field={id}>
      <div className="field-name">
        <label htmlFor={id}>
          <Lettered text={label} />
        </label>
        {hint}
      </div>
      <span className="field-aside" />
      <span className="field-choice">
        <select
          id={id}
          value={value}
          disabled={disabled}
          onChange={(event) => {
            const chosen = options.find((option) => option.value === event.target.value);
            if (chosen) onChange(chosen.value);
          }}
        >
          {options.map((option) => (
            <option key={option.value} value={option.value}>
              {option.label}
            </option>
          ))}
        </select>
        <Icon name="chevron" />
      </span>
    </div>
  );
}
