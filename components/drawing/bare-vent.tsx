import type { Vent } from "@/lib/document/schema";
import { formatQuantity } from "@/lib/units/format";
import type { UnitPreferences } from "@/lib/units/preferences";

/** What stands in the drawing's room where there is no airway to cut: no vent, or one of bare elements. */
export function BareVent({
  vent,
  preferences,
}: {
  vent: Vent | null;
  preferences: UnitPreferences;
}) {
  if (!vent || !("lumped" in vent))
    return (
      <div className="flex h-full flex-col items-center justify-center gap-1 p-6 text-center">
        <p className="font-semibold">A closed box</p>
        <p className="max-w-prose text-sm text-ink-2">
          There is no vent to draw. Add one under Airway, and it stands here in section.
        </p>
      </div>
    );
  const { inertance_kg_m4, resistance_pa_s_m3, area_m2 } = vent.lumped;
  const rows = [
    ["Mass", `${inertance_kg_m4.toPrecision(4)} kg/m⁴`],
    ["Resistance", `${resistance_pa_s_m3.toPrecision(4)} Pa·s/m³`],
    ["Area", formatQuantity(area_m2, "area", preferences).text],
  ];
  return (
    <figure className="flex h-full flex-col items-center justify-center gap-3 p-6">
      <svg viewBox="0 0 240 60" className="w-60" aria-hidden="true">
        <path
          d="M10 30h30l6 -12l10 24l10 -24l10 24l10 -24l6 12h28m0 0a12 12 0 0 1 22 0a12 12 0 0 1 22 0a12 12 0 0 1 22 0h44"
          fill="none"
          stroke="currentColor"
          strokeWidth="1.4"
        />
      </svg>
      <figcaption className="text-center">
        <span className="font-semibold">{vent.name}: bare elements, as in a circuit</span>
        <dl className="lettering mt-2 grid grid-cols-2 gap-x-4 text-sm">
          {rows.map(([name, value]) => (
            <div key={name} className="contents">
              <dt className="text-right text-ink-2">{name}</dt>
              <dd className="text-left">{value}</dd>
            </div>
          ))}
        </dl>
      </figcaption>
    </figure>
  );
}
