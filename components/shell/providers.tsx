"use client";

import type { ReactNode } from "react";
import { Toasts } from "@/components/ui/toasts";
import type { SessionPreferences } from "@/lib/units/session-preferences";
import { PreferencesProvider } from "./unit-preferences";

interface ProvidersProps {
  preferences: SessionPreferences;
  signedIn: boolean;
  children: ReactNode;
}

/** What every page shares: the person's units, and a place for toasts. */
export function Providers({ preferences, signedIn, children }: ProvidersProps) {
  return (
    <PreferencesProvider initial={preferences} signedIn={signedIn}>
      {children}
      <Toasts />
    </PreferencesProvider>
  );
}
