"use client";

import type { Field } from "@/lib/bench/fields/field";
import { QuantityField } from "@/components/ui/quantity-field";
import { TermHint } from "@/components/bench/term-hint";
import { useBench, useBenchStore } from "../bench-context";

/** One number of the design: read from the Bench, written back as a finished edit. */
export function FieldRow({ field }: { field: Field }) {
  const value = useBench((state) => field.read(state.design));
  const store = useBenchStore();
  if (value === undefined) return null;
  return (
    <QuantityField
      id={field.id}
      label={field.label}
      hint={field.term ? <TermHint term={field.term} label={field.label} /> : undefined}
      kind={field.kind}
      value={value}
      min={field.min}
      max={field.max}
      step={field.step}
      emptyMeaning={field.empty}
      onCommit={(next) => {
        const { design, change } = store.getState();
        change(field.write(design, next), "commit");
      }}
    />
  );
}

export function FieldRows({ fields }: { fields: readonly Field[] }) {
  return fields.map((field) => <FieldRow key={field.id} field={field} />);
}
