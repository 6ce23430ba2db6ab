"use client";

import { Button } from "@/components/ui/button";
import { StatusMark } from "@/components/ui/status-mark";
import type { FormState } from "./use-account-form";

interface FormNoticeProps {
  state: FormState;
  onRetry: () => void;
  onGoOn: () => void;
}

/** What the server said, over the form's button. */
export function FormNotice({ state, onRetry, onGoOn }: FormNoticeProps) {
  if (state.step === "refused") {
    const { code, message, requestId } = state.refusal;
    return (
      <div role="alert" className="flex gap-2 border-l-2 border-over py-1 pl-3">
        <StatusMark status="over" label="Not done" />
        <p>
          {message}
          {code === "internal" && requestId && (
            <span className="block text-sm text-ink-2">Request {requestId}</span>
          )}
        </p>
      </div>
    );
  }
  if (state.step !== "not-kept") return null;
  return (
    <div role="alert" className="flex flex-col gap-3 border-l-2 border-near py-1 pl-3">
      <p>You are signed in. {state.message} It stays in this browser until it is.</p>
      <p className="flex gap-2">
        <Button onClick={onRetry}>Try again</Button>
        <Button onClick={onGoOn}>Go on without it</Button>
      </p>
    </div>
  );
}
