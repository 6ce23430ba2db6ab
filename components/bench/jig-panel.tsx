"use client";

import { useMemo, useState } from "react";
import { jigCircles } from "@/lib/bench/jig-circles";
import { cuttingCaution } from "@/lib/margins/cautions";
import { formatQuantity } from "@/lib/units/format";
import { jigCard } from "@/lib/workshop/jig";
import { QuantityField } from "@/components/ui/quantity-field";
import { useUnitPreferences } from "@/components/shell/unit-preferences";
import { useBench } from "./bench-context";
import { useSettled } from "./use-settled";

/** Pivot and template settings of each circle in the vent, for the bit in hand. */
export function JigPanel() {
  const { design } = useSettled();
  const ventIndex = useBench((state) => state.ventIndex);
  const [preferences] = useUnitPreferences();
  const [bit_m, setBit] = useState(0.00635);
  const [bushing_m, setBushing] = useState<number | null>(null);
  const cards = useMemo(
    () =>
      jigCircles(design, ventIndex).map((circle) => ({
        circle,
        card: jigCard({
          bore_m: circle.bore_m,
          outer_diameter_m: circle.outer_diameter_m,
          bit_diameter_m: bit_m,
          ...(bushing_m === null ? {} : { bushing_diameter_m: bushing_m }),
          ...(circle.round_over_radius_m > 0
            ? {
                round_over_radius_m: circle.round_over_radius_m,
                stack_depth_m: circle.stack_depth_m,
              }
            : {}),
        }),
      })),
    [design, ventIndex, bit_m, bushing_m],
  );
  const length = (value: number | null | undefined) =>
    value == null ? "–" : formatQuantity(value, "length", preferences, { digits: 2 }).value;
  const unit = formatQuantity(0, "length", preferences).unit;
  return (
    <section aria-labelledby="jig-title" className="bench-part">
      <header className="part-head">
        <h2 id="jig-title">Jig card</h2>
      </header>
      <QuantityField
        id="jig.bit"
        label="Bit, as it cuts"
        kind="length"
        value={bit_m}
        min={0.001}
        max={0.06}
        step={0.0001}
        onCommit={(value) => value !== null && setBit(value)}
      />
      <QuantityField
        id="jig.bushing"
        label="Guide bushing, outside"
        kind="length"
        value={bushing_m}
        min={0.003}
        max={0.1}
        step={0.0005}
        emptyMeaning="none"
        onCommit={setBushing}
      />
      {cards.length === 0 ? (
        <p className="py-2 text-sm text-ink-2">No rings, plate or round cut-out to cut here.</p>
      ) : (
        <div className="table-scroll">
          <table className="figures-table">
            <caption className="sr-only">Pivot to bit centre for each circle</caption>
            <thead>
              <tr>
                <th scope="col">Circle</th>
                <th scope="col">Ø, {unit}</th>
                <th scope="col">Pivot to centre, {unit}</th>
                {bushing_m !== null && <th scope="col">Template Ø, {unit}</th>}
              </tr>
            </thead>
            <tbody>
              {cards.flatMap(({ circle, card }) => [
                <JigRow
                  key={`${circle.name}-in`}
                  name={`${circle.name}, hole`}
                  cells={[circle.bore_m, card.inside.pivot_to_bit_centre_m].map(length)}
                  template={
                    bushing_m === null ? null : length(card.inside.bushing_template_diameter_m)
                  }
                />,
                circle.hasOutside && (
                  <JigRow
                    key={`${circle.name}-out`}
                    name={`${circle.name}, outside`}
                    cells={[circle.outer_diameter_m, card.outside.pivot_to_bit_centre_m].map(
                      length,
                    )}
                    template={
                      bushing_m === null ? null : length(card.outside.bushing_template_diameter_m)
                    }
                  />
                ),
              ])}
            </tbody>
          </table>
        </div>
      )}
      <ul className="text-sm">
        {[...new Set(cards.flatMap(({ card }) => card.warnings))].map((warning) => (
          <li key={warning} className="py-1 text-near">
            {warning}
          </li>
        ))}
      </ul>
      {cards.length > 0 && <p className="text-sm text-ink-2">{cuttingCaution.text}</p>}
    </section>
  );
}

interface JigRowProps {
  name: string;
  cells: string[];
  template: string | null;
}

function JigRow({ name, cells, template }: JigRowProps) {
  return (
    <tr>
      <th scope="row">{name}</th>
      {cells.map((cell, index) => (
        <td key={index}>{cell}</td>
      ))}
      {template !== null && <td>{template}</td>}
    </tr>
  );
}
