"use client";

import { airFields, driveFields, targetFields } from "@/lib/bench/fields/room";
import { enclosureFields } from "@/lib/bench/fields/enclosure";
import { AirwayNumbers } from "./airway-numbers";
import { DriverNumbers } from "./driver-numbers";
import { EnclosureInside } from "./enclosure-inside";
import { FieldRows } from "./field-row";
import { FilterNumbers } from "./filter-numbers";
import { NumbersPart } from "./numbers-part";
import { WattsInto } from "./watts-into";

/** Every number of the design, in the order in which a box is thought up. */
export function NumbersColumn() {
  return (
    <div className="numbers" aria-label="Numbers" role="region">
      <NumbersPart id="target" title="Aim">
        <FieldRows fields={targetFields} />
      </NumbersPart>
      <DriverNumbers />
      <NumbersPart id="enclosure" title="Enclosure">
        <EnclosureInside />
        <FieldRows fields={enclosureFields} />
      </NumbersPart>
      <AirwayNumbers />
      <NumbersPart id="drive" title="Drive and filters">
        <FieldRows fields={driveFields} />
        <WattsInto />
        <FilterNumbers kind="highpass" title="Infrasonic filter" />
        <FilterNumbers kind="lowpass" title="Low-pass" />
      </NumbersPart>
      <NumbersPart id="air" title="Room air" closed>
        <FieldRows fields={airFields} />
      </NumbersPart>
    </div>
  );
}
