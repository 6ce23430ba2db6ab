"use client";

import { driverFields } from "@/lib/bench/fields/driver";
import { startingDriver } from "@/lib/bench/starting-driver";
import type { Driver } from "@/lib/document/schema";
import { seriesPerString } from "@/lib/document/series-parallel";
import { SelectField } from "@/components/ui/select-field";
import { CountField } from "@/components/ui/count-field";
import { useBench, useBenchStore } from "../bench-context";
import { DriverSuggestions } from "../driver-suggestions";
import { FieldRows } from "./field-row";
import { NumbersPart } from "./numbers-part";

const wirings: { value: Driver["wiring"]; label: string }[] = [
  { value: "parallel", label: "in parallel" },
  { value: "series", label: "in series" },
  { value: "series-parallel", label: "series-parallel" },
];

/** The driver's figures, how many there are and how they are wired; or none. */
export function DriverNumbers() {
  const store = useBenchStore();
  const present = useBench((state) => state.design.driver !== null);
  const set = (driver: Driver | null) => {
    const { design, change } = store.getState();
    change({ ...design, driver }, "commit");
  };
  return (
    <NumbersPart id="driver" title="Driver">
      {present ? (
        <>
          <DriverArray />
          <FieldRows fields={driverFields} />
          <DriverSuggestions />
          <p className="py-2">
            <button type="button" className="link-quiet" onClick={() => set(null)}>
              Work without a driver
            </button>
          </p>
        </>
      ) : (
        <div className="py-2">
          <p className="text-sm text-ink-2">
            Without a driver the tuning, the vent and the rings still answer. Curves need one.
          </p>
          <button type="button" className="button-quiet mt-2" onClick={() => set(startingDriver)}>
            Add a driver
          </button>
        </div>
      )}
    </NumbersPart>
  );
}

function DriverArray() {
  const store = useBenchStore();
  const count = useBench((state) => state.design.driver?.count ?? 1);
  const wiring = useBench((state) => state.design.driver?.wiring ?? "parallel");
  const edit = (change: Partial<Driver>) => {
    const { design, change: commit } = store.getState();
    if (!design.driver) return;
    const driver = { ...design.driver, ...change };
    if (driver.wiring === "series-parallel" && seriesPerString(driver.count) === null)
      driver.wiring = "parallel";
    commit({ ...design, driver }, "commit");
  };
  return (
    <>
      <CountField
        id="driver.count"
        label="Drivers alike"
        value={count}
        min={1}
        max={64}
        onCommit={(next) => edit({ count: next })}
      />
      {count > 1 && (
        <SelectField
          id="driver.wiring"
          label="Wired"
          value={wiring}
          options={wirings.filter(
            ({ value }) => value !== "series-parallel" || seriesPerString(count) !== null,
          )}
          onChange={(next) => edit({ wiring: next })}
        />
      )}
    </>
  );
}
