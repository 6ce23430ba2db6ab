import { editEnclosure } from "../edits";
import type { Field } from "./field";

export const enclosureFields: Field[] = [
  {
    id: "enclosure.net_volume_m3",
    label: "Net volume",
    kind: "volume",
    min: 1e-5,
    max: 100,
    step: 0.0005,
    term: "net-volume",
    read: ({ enclosure }) => enclosure.net_volume_m3,
    write: (design, value) =>
      value === null ? design : editEnclosure(design, { net_volume_m3: value }),
  },
  ...(["width", "height", "depth"] as const).map((side): Field => ({
    id: `enclosure.inside_m.${side}`,
    label: `Inside ${side}`,
    kind: "length",
    min: 0.01,
    max: 10,
    step: 0.005,
    term: side === "depth" ? "inside-depth" : "inside",
    read: ({ enclosure }) => (enclosure.inside_m ? enclosure.inside_m[side] : undefined),
    write: (design, value) =>
      value === null || !design.enclosure.inside_m
        ? design
        : editEnclosure(design, { inside_m: { ...design.enclosure.inside_m, [side]: value } }),
  })),
  {
    id: "enclosure.panel_thickness_m",
    label: "Panel, all layers",
    kind: "length",
    min: 0.0005,
    max: 0.5,
    step: 0.0005,
    term: "panel",
    read: ({ enclosure }) => enclosure.panel_thickness_m,
    write: (design, value) =>
      value === null ? design : editEnclosure(design, { panel_thickness_m: value }),
  },
  {
    id: "enclosure.ql",
    label: "Leakage Q_L",
    kind: "ratio",
    min: 0.01,
    max: 100,
    step: 1,
    term: "ql",
    empty: "no leak",
    read: ({ enclosure }) => enclosure.ql,
    write: (design, value) => editEnclosure(design, { ql: value }),
  },
  {
    id: "enclosure.qa",
    label: "Absorption Q_A",
    kind: "ratio",
    min: 0.01,
    max: 100,
    step: 5,
    term: "qa",
    empty: "none",
    read: ({ enclosure }) => enclosure.qa,
    write: (design, value) => editEnclosure(design, { qa: value }),
  },
];
