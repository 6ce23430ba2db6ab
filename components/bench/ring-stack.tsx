"use client";

import { useMemo, useState } from "react";
import { planRings } from "@/lib/workshop/rings";
import { InputError } from "@/lib/acoustics/input-error";
import { applyRingPlan, ringRequest, type RingPlan } from "@/lib/bench/ring-plans";
import { keepRingHabits, readRingHabits, usualHabits, type RingHabits } from "@/lib/bench/sheets";
import { formatQuantity } from "@/lib/units/format";
import { useUnitPreferences } from "@/components/shell/unit-preferences";
import { useBench, useBenchStore } from "./bench-context";
import { RingNeighbours } from "./ring-neighbours";
import { SheetsAtHand } from "./sheets-at-hand";
import { useBrowserValue, type BrowserValue } from "./use-browser-value";
import { useSettled } from "./use-settled";

const ringHabits: BrowserValue<RingHabits> = {
  read: readRingHabits,
  keep: keepRingHabits,
  usual: usualHabits,
};

/** The rings of the vent shown: one more and one less beside it, and the plans that meet the target. */
export function RingStack() {
  const { design } = useSettled();
  const ventIndex = useBench((state) => state.ventIndex);
  const store = useBenchStore();
  const [habits, setHabits] = useBrowserValue(ringHabits);
  const [all, setAll] = useState(false);
  const planned = useMemo(() => {
    const request = ringRequest(design, ventIndex, habits);
    if (!request)
      return {
        plans: [],
        said: "Rings are planned for a round vent with a tube, once a tuning is wanted.",
      };
    try {
      return { plans: planRings(request).plans, said: null };
    } catch (error) {
      if (error instanceof InputError)
        return {
          plans: [],
          said: error.allowed ? `${error.message} ${error.allowed}` : error.message,
        };
      throw error;
    }
  }, [design, ventIndex, habits]);
  const apply = (plan: RingPlan) =>
    store.getState().change(applyRingPlan(design, ventIndex, plan, habits), "commit");
  return (
    <section aria-labelledby="rings-title" className="bench-part">
      <header className="part-head">
        <h2 id="rings-title">Ring stack</h2>
        {planned.plans.length > 3 && (
          <button
            type="button"
            className="link-quiet"
            aria-expanded={all}
            onClick={() => setAll(!all)}
          >
            {all ? "fewer plans" : `all ${planned.plans.length} plans`}
          </button>
        )}
      </header>
      <RingNeighbours />
      {planned.said ? (
        <p className="text-sm text-ink-2">{planned.said}</p>
      ) : (
        <ol className="divide-y divide-rule" aria-label="Ring plans, best first">
          {planned.plans.slice(0, all ? undefined : 3).map((plan, index) => (
            <PlanRow key={index} plan={plan} onApply={() => apply(plan)} />
          ))}
        </ol>
      )}
      <SheetsAtHand habits={habits} onChange={setHabits} />
    </section>
  );
}

function PlanRow({ plan, onApply }: { plan: RingPlan; onApply: () => void }) {
  const [preferences] = useUnitPreferences();
  const length = (value: number) => formatQuantity(value, "length", preferences).text;
  const rings =
    plan.rings.map(({ sheet, count }) => `${count} × ${sheet}`).join(" + ") || "No rings";
  const trim = plan.trim_tube_m > 0 ? `, tube − ${length(plan.trim_tube_m)}` : "";
  const tuning = formatQuantity(plan.tuning_hz, "frequency", preferences, { digits: 2 });
  const spread = formatQuantity(plan.tuning_sd_hz, "frequency", preferences, { digits: 2 });
  return (
    <li className="flex items-start justify-between gap-3 py-2">
      <div className="min-w-0">
        <p className="lettering font-semibold">
          {rings}
          {trim}
        </p>
        <p className="text-sm text-ink-2">
          {length(plan.overall_length_m)} overall, {tuning.value} ± {spread.text}. {plan.reason}
        </p>
      </div>
      <button type="button" className="button-quiet shrink-0" onClick={onApply}>
        Use
      </button>
    </li>
  );
}
