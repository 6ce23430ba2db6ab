"use client";

import { useMemo, useState } from "react";
import { marginsOf } from "@/lib/margins/margins";
import type { Margin } from "@/lib/margins/margin";
import { useUnitPreferences } from "@/components/shell/unit-preferences";
import { StatusMark } from "@/components/ui/status-mark";
import { useBench } from "./bench-context";
import { MarginCures } from "./margin-cures";

/** How many margins stand open before "all" is asked for; those that are over always do. */
const SHOWN = 6;

/** The checks of a design, worst first, each with its reason and its cheapest cures. */
export function MarginsList() {
  const design = useBench((state) => state.design);
  const answer = useBench((state) => state.answer);
  const problem = useBench((state) => state.problem);
  const [preferences] = useUnitPreferences();
  const [all, setAll] = useState(false);
  const margins = useMemo(
    () => (answer ? marginsOf(design, answer, { preferences }) : []),
    [design, answer, preferences],
  );
  const pressing = margins.filter(({ status }) => status === "over" || status === "near").length;
  const shown = all ? margins : margins.slice(0, Math.max(SHOWN, pressing));
  return (
    <section aria-labelledby="margins-title" className="bench-part">
      <header className="part-head">
        <h2 id="margins-title">Margins</h2>
        {margins.length > shown.length || all ? (
          <button
            type="button"
            className="link-quiet"
            onClick={() => setAll(!all)}
            aria-expanded={all}
          >
            {all ? "fewer" : `all ${margins.length}`}
          </button>
        ) : null}
      </header>
      {problem && (
        <div className="border-l-2 border-over py-1 pl-3" role="alert">
          <p className="flex items-start gap-2 font-semibold">
            <StatusMark status="over" />
            <span>{problem.message}</span>
          </p>
          {problem.allowed && <p className="text-sm text-ink-2">Allowed: {problem.allowed}.</p>}
        </div>
      )}
      <ul className="divide-y divide-rule">
        {shown.map((margin) => (
          <MarginRow key={margin.id} margin={margin} />
        ))}
      </ul>
    </section>
  );
}

function MarginRow({ margin }: { margin: Margin }) {
  const tone = {
    within: "text-within",
    near: "text-near",
    over: "text-over",
    unknown: "text-ink-2",
  }[margin.status];
  return (
    <li className="grid grid-cols-[1.25rem_1fr] gap-x-2 py-2.5" data-margin={margin.id}>
      <StatusMark status={margin.status} />
      <div className="min-w-0">
        <div className="flex items-baseline justify-between gap-3">
          <h3 className="font-semibold">{margin.title}</h3>
          <span className={`lettering whitespace-nowrap ${tone}`}>{margin.left}</span>
        </div>
        <p className="text-sm text-ink-2">{margin.reason}</p>
        {margin.caution && <p className="mt-1 text-sm text-ink-2">{margin.caution}</p>}
        {(margin.status === "over" || margin.status === "near") && <MarginCures id={margin.id} />}
      </div>
    </li>
  );
}
