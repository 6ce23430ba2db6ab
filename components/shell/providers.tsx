"use client";

import { QueryClient, QueryClientProvider } from "@tanstack/react-query";
import { useState, type ReactNode } from "react";
import { Toasts } from "@/components/ui/toasts";
import { AskError } from "@/lib/platform/ask";
import type { SessionPreferences } from "@/lib/units/session-preferences";
import { PreferencesProvider } from "./unit-preferences";

interface ProvidersProps {
  preferences: SessionPreferences;
  signedIn: boolean;
  children: ReactNode;
}

/** What every page shares: the person's units, what was fetched, and a place for toasts. */
export function Providers({ preferences, signedIn, children }: ProvidersProps) {
  const [client] = useState(
    () =>
      new QueryClient({
        defaultOptions: {
          queries: {
            staleTime: 15_000,
            retry: (count, error) =>
              count < 2 &&
              (!(error instanceof AskError) || ["offline", "unavailable"].includes(error.code)),
          },
        },
      }),
  );
  return (
    <QueryClientProvider client={client}>
      <PreferencesProvider initial={preferences} signedIn={signedIn}>
        {children}
        <Toasts />
      </PreferencesProvider>
    </QueryClientProvider>
  );
}
