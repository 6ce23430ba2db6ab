"use client";

import { useState } from "react";
import { editableQuantity } from "@/lib/units/editable";
import { looksLikeExpression, parseExpression } from "@/lib/units/expression";
import { parseQuantity, withoutNoise, type Parsed } from "@/lib/units/parse";
import type { QuantityKind, UnitPreferences } from "@/lib/units/preferences";
import { rangeMessage } from "@/lib/units/range";
import { stepped } from "@/lib/units/step";

export interface QuantityInput {
  label: string;
  kind: QuantityKind;
  /** Null where the number is not set. */
  value: number | null;
  min: number;
  max: number;
  step: number;
  /** May be left empty, and what that means. */
  emptyMeaning?: string;
  onCommit: (value: number | null) => void;
}

/** What stands in the field while it differs from the value, and why it is not taken. */
interface Draft {
  text: string;
  /** The value it was typed over: once that changes (undo, a drag), the draft is void. */
  over: number | null;
  fault: string | null;
  busy?: boolean;
}

/** The text of a quantity's field: typed freely, taken on Enter or on leaving, stepped by arrows. */
export function useQuantity(input: QuantityInput, preferences: UnitPreferences) {
  const { label, kind, value, min, max, step, emptyMeaning, onCommit } = input;
  const [kept, setDraft] = useState<Draft | null>(null);
  const draft = kept && Object.is(kept.over, value) ? kept : null;
  const standing = value === null ? "" : editableQuantity(value, kind, preferences);
  const text = draft?.text ?? standing;

  const take = (next: number | null) => {
    setDraft(null);
    if (!Object.is(next, value)) onCommit(next);
  };
  const refuse = (fault: string) => setDraft({ text, over: value, fault });

  const settle = (parsed: Parsed) => {
    if (!parsed.ok) return refuse(parsed.message);
    const fault = rangeMessage(label, parsed.value, { kind, min, max }, preferences);
    if (fault) refuse(fault);
    else take(kind === "count" ? Math.round(parsed.value) : parsed.value);
  };

  const commit = () => {
    if (!draft) return;
    if (text.trim() === standing) return setDraft(null);
    if (text.trim() === "") {
      if (emptyMeaning !== undefined) return take(null);
      return refuse(`${label} needs a number.`);
    }
    const parsed = parseQuantity(text, kind, preferences);
    if (parsed.ok || !looksLikeExpression(text)) return settle(parsed);
    setDraft({ text, over: value, fault: null, busy: true });
    void parseExpression(text, kind, preferences).then(settle);
  };

  return {
    text,
    fault: draft?.fault ?? null,
    busy: draft?.busy ?? false,
    type: (next: string) => setDraft({ text: next, over: value, fault: null }),
    commit,
    restore: () => setDraft(null),
    stepBy: (steps: number) => {
      const parsed = draft ? parseQuantity(text, kind, preferences) : null;
      const from = parsed?.ok ? parsed.value : (value ?? 0);
      take(withoutNoise(stepped(from, steps, { kind, min, max, step }, preferences)));
    },
  };
}
