"use client";

import { useState } from "react";
import { QuantityField } from "@/components/ui/quantity-field";
import { useBench, useBenchStore } from "../bench-context";

/** The drive told as watts into stated ohms: U = √(P R). Only another way of typing the voltage. */
export function WattsInto() {
  const store = useBenchStore();
  const voltage = useBench((state) => state.design.drive.voltage_v);
  const [load, setLoad] = useState(4);
  return (
    <>
      <QuantityField
        id="drive.watts"
        label="The same in watts"
        kind="power"
        value={voltage ** 2 / load}
        min={0}
        max={100_000}
        step={10}
        onCommit={(watts) => {
          if (watts === null) return;
          const { design, change } = store.getState();
          const voltage_v = Math.round(Math.sqrt(watts * load) * 1000) / 1000;
          change({ ...design, drive: { ...design.drive, voltage_v } }, "commit");
        }}
      />
      <QuantityField
        id="drive.watts-load"
        label="into"
        kind="resistance"
        value={load}
        min={0.5}
        max={64}
        step={0.5}
        onCommit={(ohms) => ohms !== null && setLoad(ohms)}
      />
    </>
  );
}
