"use client";

import { filterOf, setFilter } from "@/lib/bench/edits";
import type { Filter } from "@/lib/document/schema";
import { QuantityField } from "@/components/ui/quantity-field";
import { SelectField } from "@/components/ui/select-field";
import { TermHint } from "@/components/bench/term-hint";
import { useBench, useBenchStore } from "../bench-context";

const slopes: { value: string; label: string; family: Filter["family"]; order: number }[] = [
  { value: "none", label: "none", family: "butterworth", order: 0 },
  { value: "b1", label: "6 dB/oct", family: "butterworth", order: 1 },
  { value: "b2", label: "12 dB/oct Butterworth", family: "butterworth", order: 2 },
  { value: "l2", label: "12 dB/oct Linkwitz-Riley", family: "linkwitz-riley", order: 2 },
  { value: "b3", label: "18 dB/oct", family: "butterworth", order: 3 },
  { value: "b4", label: "24 dB/oct Butterworth", family: "butterworth", order: 4 },
  { value: "l4", label: "24 dB/oct Linkwitz-Riley", family: "linkwitz-riley", order: 4 },
  { value: "r2", label: "12 dB/oct, own Q", family: "resonant", order: 2 },
  { value: "b6", label: "36 dB/oct", family: "butterworth", order: 6 },
  { value: "l8", label: "48 dB/oct Linkwitz-Riley", family: "linkwitz-riley", order: 8 },
];

const usual = { highpass: 25, lowpass: 100 } as const;

/** One filter of the voltage: its slope, its corner, and its Q where it has one of its own. */
export function FilterNumbers({ kind, title }: { kind: Filter["kind"]; title: string }) {
  const store = useBenchStore();
  const filter = useBench((state) => filterOf(state.design, kind));
  const put = (next: Filter | null) => {
    const { design, change } = store.getState();
    change(setFilter(design, kind, next), "commit");
  };
  const chosen =
    slopes.find(({ family, order }) => family === filter?.family && order === filter.order)
      ?.value ?? "none";
  return (
    <>
      <SelectField
        id={`filter.${kind}`}
        label={title}
        hint={
          <TermHint term={kind === "highpass" ? "infrasonic-filter" : "low-pass"} label={title} />
        }
        value={chosen}
        options={slopes}
        onChange={(value) => {
          const slope = slopes.find((candidate) => candidate.value === value);
          if (!slope || slope.order === 0) return put(null);
          const { family, order } = slope;
          const frequency_hz = filter?.frequency_hz ?? usual[kind];
          put({
            kind,
            family,
            order,
            frequency_hz,
            ...(family === "resonant" ? { q: filter?.q ?? 1 } : {}),
          });
        }}
      />
      {filter && (
        <QuantityField
          id={`filter.${kind}.frequency`}
          label="at"
          kind="frequency"
          value={filter.frequency_hz}
          min={0.5}
          max={50_000}
          step={1}
          onCommit={(value) => value !== null && put({ ...filter, frequency_hz: value })}
        />
      )}
      {filter?.family === "resonant" && (
        <QuantityField
          id={`filter.${kind}.q`}
          label="Q"
          kind="ratio"
          value={filter.q ?? 1}
          min={0.1}
          max={20}
          step={0.05}
          onCommit={(value) => value !== null && put({ ...filter, q: value })}
        />
      )}
    </>
  );
}
