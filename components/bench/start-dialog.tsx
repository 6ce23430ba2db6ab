"use client";

import { useState } from "react";
import { startFromAnswers, type DriverSize, type Use } from "@/lib/margins/start";
import { Dialog } from "@/components/ui/dialog";
import { QuantityField } from "@/components/ui/quantity-field";
import { useBenchStore } from "./bench-context";

const sizes: { value: DriverSize; label: string }[] = [
  { value: "6", label: "6½ inch" },
  { value: "8", label: "8 inch" },
  { value: "10", label: "10 inch" },
  { value: "12", label: "12 inch" },
  { value: "15", label: "15 inch" },
  { value: "none", label: "none yet, just the vent" },
];

const uses: { value: Use; label: string }[] = [
  { value: "music", label: "music at home" },
  { value: "film", label: "film, the lowest notes" },
  { value: "car", label: "in a car" },
];

/** Three questions; the answers are a design to begin with, and undo takes it back. */
export function StartDialog({ onClose }: { onClose: () => void }) {
  const store = useBenchStore();
  const [driver, setDriver] = useState<DriverSize>("10");
  const [use, setUse] = useState<Use>("music");
  const [volume, setVolume] = useState(0.06);
  const begin = () => {
    const design = startFromAnswers({ driver, use, net_volume_m3: volume });
    store.getState().load(design, { keepHistory: true });
    onClose();
  };
  return (
    <Dialog title="Start in three questions" onClose={onClose}>
      <form
        className="flex flex-col gap-5"
        onSubmit={(event) => {
          event.preventDefault();
          begin();
        }}
      >
        <Question
          legend="1. Which driver?"
          name="driver"
          options={sizes}
          value={driver}
          onChange={setDriver}
        />
        <Question
          legend="2. What is it for?"
          name="use"
          options={uses}
          value={use}
          onChange={setUse}
        />
        <fieldset>
          <legend className="font-semibold">3. How much air can the box hold?</legend>
          <QuantityField
            id="start.volume"
            label="Net volume"
            kind="volume"
            value={volume}
            min={0.002}
            max={2}
            step={0.005}
            onCommit={(value) => value !== null && setVolume(value)}
          />
        </fieldset>
        <p className="text-sm text-ink-2">
          The driver&rsquo;s figures are generic and invented. Type those of yours over them.
        </p>
        <div className="flex justify-end gap-2">
          <button type="button" className="button-quiet" onClick={onClose}>
            Cancel
          </button>
          <button type="submit" className="button-primary">
            Put it on the Bench
          </button>
        </div>
      </form>
    </Dialog>
  );
}

interface QuestionProps<Value extends string> {
  legend: string;
  name: string;
  options: { value: Value; label: string }[];
  value: Value;
  onChange: (value: Value) => void;
}

function Question<Value extends string>(props: QuestionProps<Value>) {
  const { legend, name, options, value, onChange } = props;
  return (
    <fieldset>
      <legend className="font-semibold">{legend}</legend>
      <div className="flex flex-wrap gap-x-5">
        {options.map((option) => (
          <label key={option.value} className="check-row">
            <input
              type="radio"
              name={name}
              checked={value === option.value}
              onChange={() => onChange(option.value)}
            />
            <span>{option.label}</span>
          </label>
        ))}
      </div>
    </fieldset>
  );
}
