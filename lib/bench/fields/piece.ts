import type { Design } from "@/lib/document/schema";
import { airwayAt, editPiece } from "../edits";
import type { Field } from "./field";

/** The numbers of one piece of an airway. */
export function pieceFields(ventIndex: number, pieceIndex: number): Field[] {
  const piece = (design: Design) => airwayAt(design, ventIndex)?.pieces[pieceIndex];
  const number = (
    key:
      | "length_m"
      | "thickness_m"
      | "outer_diameter_m"
      | "glue_line_m"
      | "bore_m"
      | "count"
      | "angle_deg"
      | "centre_radius_m",
    rest: Omit<Field, "id" | "read" | "write">,
  ): Field => ({
    id: `piece.${pieceIndex}.${key}`,
    ...rest,
    read: (design) => {
      const old = piece(design);
      if (!old) return undefined;
      const optional =
        key === "bore_m" ||
        (key === "outer_diameter_m" && old.kind !== "rings" && old.kind !== "plate");
      const value = (old as Partial<Record<typeof key, number>>)[key];
      return (
        value ?? (optional || (key === "centre_radius_m" && old.kind === "bend") ? null : undefined)
      );
    },
    write: (design, value) => {
      if (value === null && !rest.empty) return design;
      return editPiece(design, ventIndex, pieceIndex, (old) => ({
        ...old,
        [key]: key === "count" && value !== null ? Math.round(value) : (value ?? undefined),
      }));
    },
  });
  return [
    number("count", { label: "Rings", kind: "count", min: 0, max: 100, step: 1, term: "rings" }),
    number("length_m", {
      label: "Length",
      kind: "length",
      min: 0,
      max: 10,
      step: 0.001,
      term: "tube",
    }),
    number("angle_deg", { label: "Angle", kind: "angle", min: 1, max: 180, step: 5, term: "bend" }),
    number("centre_radius_m", {
      label: "Centre radius",
      kind: "length",
      min: 0.005,
      max: 5,
      step: 0.005,
      term: "bend",
      empty: "mitred",
    }),
    number("thickness_m", {
      label: "Thickness, measured",
      kind: "length",
      min: 0.0005,
      max: 0.2,
      step: 0.0001,
      term: "sheet-thickness",
    }),
    number("outer_diameter_m", {
      label: "Outside",
      kind: "length",
      min: 0.005,
      max: 3,
      step: 0.001,
      term: "outer-diameter",
      empty: "not known",
    }),
    number("glue_line_m", {
      label: "Glue line",
      kind: "length",
      min: 0,
      max: 0.005,
      step: 0.00005,
      term: "glue-line",
    }),
    number("bore_m", {
      label: "Own bore",
      kind: "length",
      min: 0.005,
      max: 2,
      step: 0.0005,
      term: "bore-step",
      empty: "the vent's",
    }),
  ];
}
