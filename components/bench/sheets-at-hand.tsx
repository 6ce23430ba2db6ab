"use client";

import type { RingHabits, Sheet } from "@/lib/bench/sheets";
import { QuantityField } from "@/components/ui/quantity-field";

interface SheetsAtHandProps {
  habits: RingHabits;
  onChange: (habits: RingHabits) => void;
}

/** What rings may be cut from, as measured, and how the stack is glued and trimmed. */
export function SheetsAtHand({ habits, onChange }: SheetsAtHandProps) {
  const change = (change: Partial<RingHabits>) => onChange({ ...habits, ...change });
  const changeSheet = (at: number, part: Partial<Sheet>) =>
    change({
      sheets: habits.sheets.map((sheet, index) => (index === at ? { ...sheet, ...part } : sheet)),
    });
  return (
    <details className="mt-1">
      <summary className="link-quiet py-2">Sheets at hand, glue and saw</summary>
      <p className="text-sm text-ink-2">
        Type what the calipers say, the mean of three readings or more. Plywood is thinner than its
        name.
      </p>
      <ul className="divide-y divide-rule">
        {habits.sheets.map((sheet, at) => (
          <li key={sheet.name} className="py-1">
            <label className="check-row">
              <input
                type="checkbox"
                checked={sheet.use}
                onChange={(event) => changeSheet(at, { use: event.target.checked })}
              />
              <span>{sheet.name}</span>
            </label>
            {sheet.use && (
              <QuantityField
                id={`sheet.${at}.thickness`}
                label="measures"
                kind="length"
                value={sheet.thickness_m}
                min={0.0005}
                max={0.2}
                step={0.0001}
                onCommit={(value) => value !== null && changeSheet(at, { thickness_m: value })}
              />
            )}
          </li>
        ))}
      </ul>
      <label className="check-row">
        <input
          type="checkbox"
          checked={habits.mayTrimTube}
          onChange={(event) => change({ mayTrimTube: event.target.checked })}
        />
        <span>The tube may be trimmed</span>
      </label>
      <QuantityField
        id="sheet.glue"
        label="Glue line"
        kind="length"
        value={habits.glueLine_m}
        min={0}
        max={0.005}
        step={0.00005}
        onCommit={(value) => value !== null && change({ glueLine_m: value })}
      />
      <QuantityField
        id="sheet.trim"
        label="Least the saw takes"
        kind="length"
        value={habits.trimLoss_m}
        min={0}
        max={0.02}
        step={0.0005}
        onCommit={(value) => value !== null && change({ trimLoss_m: value })}
      />
    </details>
  );
}
