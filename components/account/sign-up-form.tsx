"use client";

import { useSessionPreferences } from "@/components/shell/unit-preferences";
import { Button } from "@/components/ui/button";
import { TextField } from "@/components/ui/text-field";
import { ask } from "@/lib/platform/ask";
import { FormNotice } from "./form-notice";
import { useAccountForm } from "./use-account-form";

export function SignUpForm({ next }: { next: string | null }) {
  const form = useAccountForm("/api/sign-up", next);
  const preferences = useSessionPreferences();
  const { state, faults, input } = form;
  const busy = state.step === "sending" || state.step === "keeping";
  /** The new account reads numbers as the visitor did. */
  const keepPreferences = () =>
    ask("/api/session/preferences", { method: "PATCH", body: preferences }).catch(() => undefined);
  return (
    <form
      method="post"
      noValidate
      className="flex flex-col gap-4"
      onSubmit={(event) => form.submit(event, keepPreferences)}
    >
      <TextField
        id="name"
        name="name"
        label="Your name"
        autoComplete="name"
        maxLength={120}
        required
        fault={faults.name}
        {...input}
      />
      <TextField
        id="shopName"
        name="shopName"
        label="Name of your shop"
        note="Stands on your drawings. Leave it empty to use your own name."
        autoComplete="organization"
        maxLength={120}
        fault={faults.shopName}
        {...input}
      />
      <TextField
        id="email"
        name="email"
        label="E-mail"
        type="email"
        autoComplete="username"
        maxLength={254}
        required
        fault={faults.email}
        {...input}
      />
      <TextField
        id="password"
        name="password"
        label="Password"
        type="password"
        note="At least 10 characters. A sentence is easier to keep than a puzzle."
        autoComplete="new-password"
        minLength={10}
        required
        fault={faults.password}
        {...input}
      />
      <FormNotice state={state} onRetry={form.keepWork} onGoOn={() => form.goOn()} />
      <Button type="submit" tone="primary" busy={busy} className="min-h-11">
        {state.step === "keeping" ? "Saving your work …" : busy ? "Opening your shop …" : "Sign up"}
      </Button>
    </form>
  );
}
