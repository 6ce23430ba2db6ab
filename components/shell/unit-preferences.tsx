"use client";

import { createContext, useCallback, useContext, useMemo, useState, type ReactNode } from "react";
import { ask } from "@/lib/platform/ask";
import type { UnitPreferences } from "@/lib/units/preferences";
import {
  defaultSessionPreferences,
  PREFERENCES_COOKIE,
  PREFERENCES_MAX_AGE_S,
  writeSessionPreferences,
  type SessionPreferences,
  type Theme,
} from "@/lib/units/session-preferences";

type Change = (change: Partial<SessionPreferences>) => void;

const PreferencesContext = createContext<[SessionPreferences, Change]>([
  defaultSessionPreferences,
  () => undefined,
]);

interface ProviderProps {
  initial: SessionPreferences;
  /** The account keeps them too. */
  signedIn: boolean;
  children: ReactNode;
}

/** Units, tape and theme of this person: in a cookie, and with the account where there is one. */
export function PreferencesProvider({ initial, signedIn, children }: ProviderProps) {
  const [preferences, setPreferences] = useState(initial);
  const change = useCallback<Change>(
    (part) => {
      const next = { ...preferences, ...part };
      setPreferences(next);
      keepInCookie(next);
      showTheme(next.theme);
      if (signedIn)
        void ask("/api/session/preferences", { method: "PATCH", body: next }).catch(
          () => undefined,
        );
    },
    [preferences, signedIn],
  );
  const value = useMemo<[SessionPreferences, Change]>(
    () => [preferences, change],
    [preferences, change],
  );
  return <PreferencesContext value={value}>{children}</PreferencesContext>;
}

/** The person's units, and the way to change them. */
export function useUnitPreferences(): [
  UnitPreferences,
  (change: Partial<UnitPreferences>) => void,
] {
  return useContext(PreferencesContext);
}

export function useTheme(): [Theme, (theme: Theme) => void] {
  const [{ theme }, change] = useContext(PreferencesContext);
  return [theme, (next) => change({ theme: next })];
}

/** All of them, as the account keeps them. */
export function useSessionPreferences(): SessionPreferences {
  return useContext(PreferencesContext)[0];
}

function keepInCookie(preferences: SessionPreferences): void {
  document.cookie = `${PREFERENCES_COOKIE}=${writeSessionPreferences(preferences)}; path=/; max-age=${PREFERENCES_MAX_AGE_S}; samesite=lax`;
}

function showTheme(theme: Theme): void {
  if (theme === "system") delete document.documentElement.dataset.theme;
  else document.documentElement.dataset.theme = theme;
}
