"use client";

import type { ReactNode } from "react";
import { useUnitPreferences } from "@/components/shell/unit-preferences";
import { formatQuantity } from "@/lib/units/format";
import { rangeWords } from "@/lib/units/range";
import { shownUnits } from "@/lib/units/shown-units";
import { Lettered } from "./lettered";
import { useQuantity, type QuantityInput } from "./use-quantity";

interface QuantityFieldProps extends QuantityInput {
  id: string;
  /** Explains the term, beside the label. */
  hint?: ReactNode;
  /** Half-width of the tolerance, in the value's unit. */
  plusMinus?: number | null;
  disabled?: boolean;
}

/**
 * A number with its unit, typed the way people say it: `3/4 in`, `18 mm + 3/8 in`, `1,5`. Enter or
 * leaving takes it, Escape brings back what stood, arrows step it (with Shift ten times).
 */
export function QuantityField(props: QuantityFieldProps) {
  const { id, label, hint, kind, value, emptyMeaning, plusMinus, disabled } = props;
  const [preferences] = useUnitPreferences();
  const field = useQuantity(props, preferences);
  const { unit } = shownUnits[kind][preferences.system];
  const other = value === null ? "" : formatQuantity(value, kind, preferences).other;
  return (
    <div className="field-row" data-field={id} data-fault={field.fault !== null || undefined}>
      <div className="field-name">
        <label htmlFor={id}>
          <Lettered text={label} />
        </label>
        {hint}
      </div>
      <span className="field-aside lettering">
        {other && <span className="field-other">{other}</span>}
        {plusMinus ? (
          <span className="field-tolerance">
            ± {formatQuantity(plusMinus, kind, preferences, { digits: 2 }).value.replace(/0$/, "")}
          </span>
        ) : null}
      </span>
      <span className="field-box">
        <input
          id={id}
          type="text"
          inputMode={kind === "count" ? "numeric" : "decimal"}
          autoComplete="off"
          spellCheck={false}
          className="field-input"
          value={field.text}
          placeholder={emptyMeaning}
          disabled={disabled}
          aria-invalid={field.fault !== null || undefined}
          aria-busy={field.busy || undefined}
          aria-describedby={`${id}-about${field.fault ? ` ${id}-fault` : ""}`}
          onFocus={(event) => event.currentTarget.select()}
          onChange={(event) => field.type(event.target.value)}
          onBlur={field.commit}
          onKeyDown={(event) => {
            if (event.key === "Enter") field.commit();
            else if (event.key === "Escape") field.restore();
            else if (event.key === "ArrowUp" || event.key === "ArrowDown") {
              event.preventDefault();
              field.stepBy((event.key === "ArrowUp" ? 1 : -1) * (event.shiftKey ? 10 : 1));
            }
          }}
        />
        <span className="field-unit" aria-hidden>
          {value === null && field.text === "" ? "" : unit}
        </span>
      </span>
      <span id={`${id}-about`} className="sr-only">
        {[unit, other && `that is ${other}`, `from ${rangeWords(props, preferences)}`]
          .filter(Boolean)
          .join(", ")}
      </span>
      {field.fault && (
        <p id={`${id}-fault`} role="alert" className="field-fault">
          {field.fault}
        </p>
      )}
    </div>
  );
}
