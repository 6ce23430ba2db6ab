import type { Design } from "@/lib/document/schema";
import {
  airwayAt,
  editAirway,
  setBore,
  setInnerFlare,
  setOuterFlare,
  setVentCount,
} from "../edits";
import type { Field } from "./field";

/** Bore, ends and surroundings of one vent. */
export function ventFields(ventIndex: number): Field[] {
  const vent = (design: Design) => airwayAt(design, ventIndex);
  const slotSide = (side: "width_m" | "height_m", label: string): Field => ({
    id: `vent.${side}`,
    label,
    kind: "length",
    min: 0.003,
    max: 5,
    step: 0.001,
    term: "slot",
    read: (design) => {
      const bore = vent(design)?.bore;
      return bore?.shape === "slot" ? bore[side] : undefined;
    },
    write: (design, value) =>
      value === null
        ? design
        : editAirway(design, ventIndex, (old) =>
            old.bore.shape === "slot" ? { ...old, bore: { ...old.bore, [side]: value } } : old,
          ),
  });
  return [
    {
      id: "vent.count",
      label: "Vents alike",
      kind: "count",
      min: 1,
      max: 16,
      step: 1,
      term: "vent-count",
      read: (design) => vent(design)?.count,
      write: (design, value) =>
        value === null ? design : setVentCount(design, ventIndex, Math.round(value)),
    },
    {
      id: "vent.bore",
      label: "Bore",
      kind: "length",
      min: 0.005,
      max: 2,
      step: 0.0005,
      term: "bore",
      read: (design) => {
        const bore = vent(design)?.bore;
        return bore?.shape === "round" ? bore.diameter_m : undefined;
      },
      write: (design, value) => (value === null ? design : setBore(design, ventIndex, value)),
    },
    slotSide("width_m", "Slot width"),
    slotSide("height_m", "Slot height"),
    {
      id: "vent.shared_walls",
      label: "Sides on panels",
      kind: "count",
      min: 0,
      max: 4,
      step: 1,
      term: "shared-walls",
      read: (design) => {
        const bore = vent(design)?.bore;
        return bore?.shape === "slot" ? bore.shared_walls : undefined;
      },
      write: (design, value) =>
        value === null
          ? design
          : editAirway(design, ventIndex, (old) =>
              old.bore.shape === "slot"
                ? { ...old, bore: { ...old.bore, shared_walls: Math.round(value) } }
                : old,
            ),
    },
    {
      id: "vent.outer_flare",
      label: "Outer flare radius",
      kind: "length",
      min: 0,
      max: 1,
      step: 0.0005,
      term: "flare",
      read: (design) => vent(design)?.outer_end.flare_radius_m,
      write: (design, value) => (value === null ? design : setOuterFlare(design, ventIndex, value)),
    },
    {
      id: "vent.inner_flare",
      label: "Inner flare radius",
      kind: "length",
      min: 0,
      max: 1,
      step: 0.0005,
      term: "flare",
      read: (design) => vent(design)?.inner_end.flare_radius_m,
      write: (design, value) => (value === null ? design : setInnerFlare(design, ventIndex, value)),
    },
    {
      id: "vent.proud",
      label: "Mouth stands proud",
      kind: "length",
      min: 0,
      max: 1,
      step: 0.0005,
      term: "proud",
      read: (design) => vent(design)?.outer_end.proud_m,
      write: (design, value) =>
        value === null
          ? design
          : editAirway(design, ventIndex, (old) => ({
              ...old,
              outer_end: { ...old.outer_end, proud_m: value },
            })),
    },
    {
      id: "vent.spacing",
      label: "Between centres",
      kind: "length",
      min: 0.001,
      max: 10,
      step: 0.005,
      term: "spacing",
      empty: "far apart",
      read: (design) => {
        const old = vent(design);
        return old && old.count > 1 ? old.spacing_m : undefined;
      },
      write: (design, value) =>
        editAirway(design, ventIndex, (old) => ({ ...old, spacing_m: value })),
    },
    {
      id: "vent.clearance",
      label: "Inner end to wall",
      kind: "length",
      min: 0,
      max: 20,
      step: 0.005,
      term: "clearance",
      empty: "from the inside depth",
      read: (design) => {
        const old = vent(design);
        return old ? old.clearance_m : undefined;
      },
      write: (design, value) =>
        editAirway(design, ventIndex, (old) => ({ ...old, clearance_m: value })),
    },
    {
      id: "vent.outer_clearance",
      label: "Mouth to room wall",
      kind: "length",
      min: 0.001,
      max: 100,
      step: 0.01,
      term: "outer-clearance",
      empty: "far",
      read: (design) => {
        const old = vent(design);
        return old ? old.outer_clearance_m : undefined;
      },
      write: (design, value) =>
        editAirway(design, ventIndex, (old) => ({ ...old, outer_clearance_m: value })),
    },
  ];
}
