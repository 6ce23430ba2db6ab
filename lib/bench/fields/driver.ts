import type { Driver } from "@/lib/document/schema";
import { editDriver } from "../edits";
import type { Field } from "./field";

/** A figure of the driver. */
function driverField(
  key: { [K in keyof Driver]-?: Driver[K] extends number | undefined ? K : never }[keyof Driver],
  rest: Omit<Field, "id" | "read" | "write">,
): Field {
  return {
    id: `driver.${key}`,
    ...rest,
    read: (design) => (design.driver ? (design.driver[key] ?? null) : undefined),
    write: (design, value) =>
      value === null && !rest.empty ? design : editDriver(design, { [key]: value ?? undefined }),
  };
}

export const driverFields: Field[] = [
  driverField("fs_hz", {
    label: "f_S",
    kind: "frequency",
    min: 1,
    max: 5_000,
    step: 0.5,
    term: "fs",
  }),
  driverField("qes", {
    label: "Q_ES",
    kind: "ratio",
    min: 0.01,
    max: 100,
    step: 0.01,
    term: "qes",
  }),
  driverField("qms", { label: "Q_MS", kind: "ratio", min: 0.01, max: 100, step: 0.1, term: "qms" }),
  driverField("vas_m3", {
    label: "V_AS",
    kind: "volume",
    min: 1e-6,
    max: 20,
    step: 0.001,
    term: "vas",
  }),
  driverField("re_ohm", {
    label: "R_E",
    kind: "resistance",
    min: 0.05,
    max: 1_000,
    step: 0.1,
    term: "re",
  }),
  driverField("sd_m2", { label: "S_D", kind: "area", min: 1e-5, max: 2, step: 1e-4, term: "sd" }),
  driverField("xmax_m", {
    label: "x max",
    kind: "length",
    min: 1e-5,
    max: 0.2,
    step: 0.0005,
    term: "xmax",
    empty: "no limit",
  }),
  driverField("le_h", {
    label: "L_E",
    kind: "inductance",
    min: 0,
    max: 0.5,
    step: 0.0001,
    term: "le",
    empty: "none",
  }),
  driverField("power_w", {
    label: "Power",
    kind: "power",
    min: 0.01,
    max: 100_000,
    step: 10,
    term: "power",
    empty: "no limit",
  }),
  driverField("displacement_m3", {
    label: "Own volume",
    kind: "volume",
    min: 0,
    max: 0.2,
    step: 1e-4,
    term: "driver-volume",
    empty: "none",
  }),
];
