"use client";

import { useState, type FocusEvent, type FormEvent, type SubmitEvent } from "react";
import { keepVisitorDraft } from "@/lib/bench/draft";
import { ask, AskError } from "@/lib/platform/ask";

export interface Refusal {
  code: string;
  message: string;
  requestId: string | null;
}

export type FormState =
  | { step: "open" }
  | { step: "sending" }
  | { step: "keeping" }
  | { step: "refused"; refusal: Refusal }
  /** Signed in, but what was made before could not be saved. */
  | { step: "not-kept"; message: string };

const words: Record<string, Record<string, string>> = {
  name: { valueMissing: "Say what to call you." },
  email: {
    valueMissing: "Type your e-mail address.",
    typeMismatch: "Type a whole e-mail address, such as name@example.org.",
  },
  password: {
    valueMissing: "Type the password.",
    tooShort: "A password has at least 10 characters.",
  },
};

/** What is wrong with one input, in our words; null where nothing is. */
export function faultOf(input: HTMLInputElement): string | null {
  const { validity, name, minLength, value } = input;
  const own = words[name] ?? {};
  if (validity.valueMissing) return own.valueMissing ?? "Fill this in.";
  if (validity.typeMismatch) return own.typeMismatch ?? "This is not understood.";
  if (minLength > 0 && value.length > 0 && value.length < minLength) return own.tooShort ?? null;
  return null;
}

/**
 * The course of signing up or in: checked field by field on leaving, all at once on sending; then
 * the visitor's work is saved, and the page asked for opens.
 */
export function useAccountForm(path: "/api/sign-in" | "/api/sign-up", next: string | null) {
  const [state, setState] = useState<FormState>({ step: "open" });
  const [faults, setFaults] = useState<Record<string, string | null>>({});

  const goOn = (designId?: string) =>
    window.location.assign(next ?? (designId ? `/bench/${designId}` : "/designs"));

  const keepWork = async () => {
    setState({ step: "keeping" });
    try {
      const kept = await keepVisitorDraft();
      goOn(kept?.designId);
    } catch (error) {
      const message = error instanceof Error ? error.message : "The server did not answer.";
      setState({ step: "not-kept", message });
    }
  };

  const send = async (body: Record<string, string>, afterwards?: () => Promise<unknown>) => {
    setState({ step: "sending" });
    try {
      await ask(path, { method: "POST", body });
      await afterwards?.();
    } catch (error) {
      if (!(error instanceof AskError)) throw error;
      setFaults(error.fields);
      if (Object.keys(error.fields).length > 0) return setState({ step: "open" });
      const { code, message, requestId } = error;
      return setState({ step: "refused", refusal: { code, message, requestId } });
    }
    await keepWork();
  };

  return {
    state,
    faults,
    keepWork,
    goOn,
    input: {
      onBlur: ({ currentTarget: input }: FocusEvent<HTMLInputElement>) => {
        if (input.value !== "") setFaults({ ...faults, [input.name]: faultOf(input) });
      },
      /** A fault goes as soon as it is mended: later, the button would move away from the hand. */
      onInput: ({ currentTarget: input }: FormEvent<HTMLInputElement>) => {
        if (faults[input.name]) setFaults({ ...faults, [input.name]: faultOf(input) });
      },
    },
    /** Sends what the form holds, unless something in it is wrong: that is said and focused. */
    submit: (event: SubmitEvent<HTMLFormElement>, afterwards?: () => Promise<unknown>) => {
      event.preventDefault();
      const inputs = [...event.currentTarget.querySelectorAll("input")];
      const found = Object.fromEntries(inputs.map((input) => [input.name, faultOf(input)]));
      setFaults(found);
      const first = inputs.find((input) => found[input.name]);
      if (first) return first.focus();
      void send(Object.fromEntries(inputs.map(({ name, value }) => [name, value])), afterwards);
    },
  };
}
