"use client";

import { Button } from "@/components/ui/button";
import { TextField } from "@/components/ui/text-field";
import { FormNotice } from "./form-notice";
import { useAccountForm } from "./use-account-form";

export function SignInForm({ next }: { next: string | null }) {
  const form = useAccountForm("/api/sign-in", next);
  const { state, faults, input } = form;
  const busy = state.step === "sending" || state.step === "keeping";
  return (
    <form method="post" noValidate className="flex flex-col gap-4" onSubmit={form.submit}>
      <TextField
        id="email"
        name="email"
        label="E-mail"
        type="email"
        autoComplete="username"
        required
        fault={faults.email}
        {...input}
      />
      <TextField
        id="password"
        name="password"
        label="Password"
        type="password"
        autoComplete="current-password"
        required
        fault={faults.password}
        {...input}
      />
      <FormNotice state={state} onRetry={form.keepWork} onGoOn={() => form.goOn()} />
      <Button type="submit" tone="primary" busy={busy} className="min-h-11">
        {state.step === "keeping" ? "Saving your work …" : busy ? "Signing in …" : "Sign in"}
      </Button>
    </form>
  );
}
