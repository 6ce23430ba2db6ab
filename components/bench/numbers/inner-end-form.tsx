"use client";

import { airwayAt, editAirway } from "@/lib/bench/edits";
import { SelectField } from "@/components/ui/select-field";
import { QuantityField } from "@/components/ui/quantity-field";
import { useBench, useBenchStore } from "../bench-context";

/** How the inner flare is made: cut into the last piece, or a moulded shell with a wall of its own. */
export function InnerEndForm() {
  const store = useBenchStore();
  const end = useBench((state) => airwayAt(state.design, state.ventIndex)?.inner_end);
  if (!end || end.flare_radius_m === 0) return null;
  const put = (change: Partial<typeof end>) => {
    const { design, ventIndex, change: commit } = store.getState();
    commit(
      editAirway(design, ventIndex, (vent) => ({
        ...vent,
        inner_end: { ...vent.inner_end, ...change },
      })),
      "commit",
    );
  };
  return (
    <>
      <SelectField
        id="vent.inner_form"
        label="Inner flare is"
        value={end.form}
        options={[
          { value: "cut", label: "cut in the last piece" },
          { value: "shell", label: "a moulded shell" },
        ]}
        onChange={(value) =>
          put(
            value === "shell"
              ? { form: "shell", wall_m: end.wall_m ?? 0.003 }
              : { form: "cut", wall_m: undefined },
          )
        }
      />
      {end.form === "shell" && (
        <QuantityField
          id="vent.shell_wall"
          label="Shell wall"
          kind="length"
          value={end.wall_m ?? 0.003}
          min={0.0001}
          max={0.1}
          step={0.0005}
          onCommit={(value) => value !== null && put({ wall_m: value })}
        />
      )}
    </>
  );
}
