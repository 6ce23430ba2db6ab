"use client";

import { useMemo } from "react";
import { pieceFields } from "@/lib/bench/fields/piece";
import { ventFields } from "@/lib/bench/fields/vent";
import { airwayAt } from "@/lib/bench/edits";
import {
  addPiece,
  addVent,
  movePiece,
  pieceNames,
  removePiece,
  removeVent,
  setBoreShape,
} from "@/lib/bench/pieces";
import type { Design, Piece } from "@/lib/document/schema";
import { IconButton } from "@/components/ui/icon-button";
import { SelectField } from "@/components/ui/select-field";
import { useBench, useBenchStore } from "../bench-context";
import { FieldRows } from "./field-row";
import { InnerEndForm } from "./inner-end-form";
import { NumbersPart } from "./numbers-part";

/** The vent shown: its bore and ends, and the pieces it is made of, from the mouth inwards. */
export function AirwayNumbers() {
  const store = useBenchStore();
  const ventIndex = useBench((state) => state.ventIndex);
  const names = useBench((state) => state.design.vents.map((vent) => vent.name).join("\n"));
  const shape = useBench((state) => airwayAt(state.design, state.ventIndex)?.bore.shape ?? null);
  const fields = useMemo(() => ventFields(ventIndex), [ventIndex]);
  const edit = (change: (design: Design) => Design) => {
    const { design, change: commit } = store.getState();
    commit(change(design), "commit");
  };
  const vents = names ? names.split("\n") : [];
  return (
    <NumbersPart id="airway" title="Airway">
      {vents.length > 1 && (
        <SelectField
          id="vent.shown"
          label="Vent shown"
          value={String(ventIndex)}
          options={vents.map((name, index) => ({ value: String(index), label: name }))}
          onChange={(value) => store.getState().showVent(Number(value))}
        />
      )}
      {shape && (
        <SelectField
          id="vent.shape"
          label="Form"
          value={shape}
          options={[
            { value: "round", label: "round" },
            { value: "slot", label: "slot" },
          ]}
          onChange={(value) =>
            edit((design) => setBoreShape(design, ventIndex, value === "slot" ? "slot" : "round"))
          }
        />
      )}
      {shape && <FieldRows fields={fields} />}
      {shape && <InnerEndForm />}
      {vents.length > 0 && !shape && (
        <p className="py-2 text-sm text-ink-2">
          This vent is given as a bare mass and resistance, as in a circuit. It has no pieces.
        </p>
      )}
      {shape && <Pieces />}
      <p className="flex flex-wrap gap-x-4 gap-y-1 py-2">
        {vents.length < 16 && (
          <button
            type="button"
            className="link-quiet"
            onClick={() => {
              edit(addVent);
              store.getState().showVent(vents.length);
            }}
          >
            {vents.length > 0 ? "Add an unlike vent" : "Add a vent"}
          </button>
        )}
        {vents.length > 0 && (
          <button
            type="button"
            className="link-quiet"
            onClick={() => edit((design) => removeVent(design, ventIndex))}
          >
            Take this vent away
          </button>
        )}
      </p>
    </NumbersPart>
  );
}

function Pieces() {
  const store = useBenchStore();
  const ventIndex = useBench((state) => state.ventIndex);
  const kinds = useBench(
    (state) =>
      airwayAt(state.design, state.ventIndex)
        ?.pieces.map(({ kind }) => kind)
        .join(" ") ?? "",
  );
  const edit = (change: (design: Design) => Design) => {
    const { design, change: commit } = store.getState();
    commit(change(design), "commit");
  };
  const pieces = kinds.split(" ") as Piece["kind"][];
  const shape = useBench((state) => airwayAt(state.design, state.ventIndex)?.bore.shape);
  const addable: Piece["kind"][] =
    shape === "slot" ? ["tube", "bend"] : ["tube", "rings", "plate", "bend"];
  return (
    <div className="py-2">
      <h3 className="text-sm font-semibold">Pieces, from the mouth inwards</h3>
      <ol>
        {pieces.map((kind, at) => (
          <PieceRows key={`${at}-${kind}`} at={at} kind={kind} of={pieces.length} edit={edit} />
        ))}
      </ol>
      <p className="mt-2 flex flex-wrap gap-2">
        {addable.map((kind) => (
          <button
            key={kind}
            type="button"
            className="button-quiet button-small"
            onClick={() => edit((design) => addPiece(design, ventIndex, kind))}
          >
            + {pieceNames[kind].toLowerCase()}
          </button>
        ))}
      </p>
    </div>
  );
}

interface PieceRowsProps {
  at: number;
  kind: Piece["kind"];
  of: number;
  edit: (change: (design: Design) => Design) => void;
}

function PieceRows({ at, kind, of, edit }: PieceRowsProps) {
  const store = useBenchStore();
  const ventIndex = useBench((state) => state.ventIndex);
  const selected = useBench((state) => state.selection?.piece === at);
  const fields = useMemo(() => pieceFields(ventIndex, at), [ventIndex, at]);
  const name = pieceNames[kind];
  return (
    <li
      className={`mt-2 border-l-2 pl-2 ${selected ? "border-scribe" : "border-rule"}`}
      onFocus={() => store.getState().select({ piece: at, kind })}
    >
      <div className="flex items-center justify-between">
        <span className="text-sm font-medium">
          {at + 1}. {name}
        </span>
        <span className="flex">
          <IconButton
            icon="up"
            label={`Move ${name.toLowerCase()} ${at + 1} towards the mouth`}
            disabled={at === 0}
            onClick={() => edit((design) => movePiece(design, ventIndex, at, -1))}
          />
          <IconButton
            icon="down"
            label={`Move ${name.toLowerCase()} ${at + 1} inwards`}
            disabled={at === of - 1}
            onClick={() => edit((design) => movePiece(design, ventIndex, at, 1))}
          />
          <IconButton
            icon="remove"
            label={`Take away ${name.toLowerCase()} ${at + 1}`}
            disabled={of === 1}
            onClick={() => edit((design) => removePiece(design, ventIndex, at))}
          />
        </span>
      </div>
      <div className="divide-y divide-rule">
        <FieldRows fields={fields} />
      </div>
    </li>
  );
}
