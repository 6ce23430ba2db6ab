/**
 * What a browser remembers about how its person likes the page: units, tape, theme. One short
 * cookie, so that the server's first paint is already right.
 */
import { defaultUnitPreferences, type UnitPreferences } from "./preferences";

/** "system" follows the device. */
export type Theme = "light" | "dark" | "system";

export type SessionPreferences = UnitPreferences & { theme: Theme };

export const PREFERENCES_COOKIE = "ventwright.preferences";

/** A year [s]. */
export const PREFERENCES_MAX_AGE_S = 365 * 24 * 3600;

export const defaultSessionPreferences: SessionPreferences = {
  ...defaultUnitPreferences,
  theme: "system",
};

const themes = ["light", "dark", "system"] as const;
const tapes = [16, 32, 64] as const;

/** Reads `metric.32.dark`; each part that is not understood takes its default. */
export function readSessionPreferences(text: string | undefined): SessionPreferences {
  const [system, tape, theme] = (text ?? "").split(".");
  return {
    system: system === "imperial" || system === "metric" ? system : defaultUnitPreferences.system,
    tape: tapes.find((mark) => String(mark) === tape) ?? defaultUnitPreferences.tape,
    theme: themes.find((name) => name === theme) ?? "system",
  };
}

export function writeSessionPreferences({ system, tape, theme }: SessionPreferences): string {
  return `${system}.${tape}.${theme}`;
}
