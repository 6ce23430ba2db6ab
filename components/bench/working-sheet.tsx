"use client";

import { workingOf } from "@/lib/working/working";
import { Sheet } from "@/components/ui/sheet";
import { useUnitPreferences } from "@/components/shell/unit-preferences";
import { useBench } from "./bench-context";

/** The working behind a figure: formula, values put in, source. */
export function WorkingSheet({ figure, onClose }: { figure: string; onClose: () => void }) {
  const design = useBench((state) => state.design);
  const answer = useBench((state) => state.answer);
  const ventIndex = useBench((state) => state.ventIndex);
  const [preferences] = useUnitPreferences();
  const working = answer ? workingOf(figure, design, answer, preferences, ventIndex) : null;
  return (
    <Sheet title={working?.title ?? "Working"} onClose={onClose}>
      {working ? (
        <div className="flex flex-col gap-4">
          <p className="lettering border-y border-rule py-3 text-lg">{working.formula}</p>
          <table className="figures-table">
            <tbody>
              {working.lines.map((line) => (
                <tr key={line.symbol}>
                  <th scope="row">{line.symbol}</th>
                  <td className="text-left text-ink-2">{line.meaning}</td>
                  <td className="whitespace-nowrap">{line.value}</td>
                </tr>
              ))}
            </tbody>
          </table>
          <p className="font-semibold">{working.result}</p>
          <p className="text-sm text-ink-2">Source: {working.source}</p>
          {working.note && <p className="text-sm text-ink-2">{working.note}</p>}
        </div>
      ) : (
        <p>There is nothing to work out until the margins&rsquo; first line is mended.</p>
      )}
    </Sheet>
  );
}
