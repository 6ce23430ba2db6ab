"use client";

import { Choice } from "@/components/ui/choice";
import { Menu } from "@/components/ui/menu";
import { useTheme, useUnitPreferences } from "./unit-preferences";

const systems = [
  { value: "metric", label: "mm, L" },
  { value: "imperial", label: "in, ft³" },
] as const;

const tapes = [
  { value: "16", label: "1/16" },
  { value: "32", label: "1/32" },
  { value: "64", label: "1/64" },
] as const;

const themes = [
  { value: "light", label: "Light" },
  { value: "dark", label: "Dark" },
  { value: "system", label: "Device" },
] as const;

/** How numbers and pages read: units, the tape's finest mark, light or dark. */
export function UnitsMenu() {
  const [{ system, tape }, change] = useUnitPreferences();
  const [theme, setTheme] = useTheme();
  return (
    <Menu
      face={<span className="lettering">{system === "metric" ? "mm" : `in, 1/${tape}`}</span>}
      label="Units and theme"
    >
      {() => (
        <div className="flex w-60 flex-col gap-3 p-3">
          <Choice
            label="Units"
            value={system}
            options={systems}
            onChange={(next) => change({ system: next })}
          />
          <Choice
            label="Finest mark on the tape, in"
            value={`${tape}`}
            options={tapes}
            onChange={(next) => change({ tape: next === "16" ? 16 : next === "32" ? 32 : 64 })}
          />
          <Choice label="Theme" value={theme} options={themes} onChange={setTheme} />
        </div>
      )}
    </Menu>
  );
}
