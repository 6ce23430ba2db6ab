/** The air, the amplifier and what is aimed at. */
import type { Design } from "@/lib/document/schema";
import type { Field } from "./field";

export const airFields: Field[] = [
  {
    id: "air.temperature_c",
    label: "Air",
    kind: "temperature",
    min: -40,
    max: 80,
    step: 1,
    term: "air",
    read: ({ air }) => ("temperature_c" in air ? air.temperature_c : undefined),
    write: (design, value) =>
      value === null || !("temperature_c" in design.air)
        ? design
        : { ...design, air: { ...design.air, temperature_c: value } },
  },
  {
    id: "air.pressure_pa",
    label: "Pressure",
    kind: "pressure",
    min: 40_000,
    max: 110_000,
    step: 500,
    term: "pressure",
    read: ({ air }) => ("pressure_pa" in air ? air.pressure_pa : undefined),
    write: (design, value) =>
      value === null || !("pressure_pa" in design.air)
        ? design
        : { ...design, air: { ...design.air, pressure_pa: value } },
  },
  {
    id: "air.relative_humidity",
    label: "Humidity",
    kind: "humidity",
    min: 0,
    max: 1,
    step: 0.05,
    term: "humidity",
    read: ({ air }) => ("relative_humidity" in air ? air.relative_humidity : undefined),
    write: (design, value) =>
      value === null || !("relative_humidity" in design.air)
        ? design
        : { ...design, air: { ...design.air, relative_humidity: value } },
  },
];

export const driveFields: Field[] = [
  {
    id: "drive.voltage_v",
    label: "Drive",
    kind: "voltage",
    min: 0,
    max: 2_000,
    step: 1,
    term: "drive",
    read: ({ drive }) => drive.voltage_v,
    write: (design, value) =>
      value === null ? design : { ...design, drive: { ...design.drive, voltage_v: value } },
  },
  {
    id: "drive.source_resistance_ohm",
    label: "Source and leads",
    kind: "resistance",
    min: 0,
    max: 1_000,
    step: 0.05,
    term: "source-resistance",
    read: ({ drive }) => drive.source_resistance_ohm,
    write: (design, value) =>
      value === null
        ? design
        : { ...design, drive: { ...design.drive, source_resistance_ohm: value } },
  },
  {
    id: "amplifier.voltage_limit_v",
    label: "Amplifier at most",
    kind: "voltage",
    min: 0.1,
    max: 2_000,
    step: 1,
    term: "voltage-limit",
    empty: "no limit",
    read: ({ amplifier }) => amplifier?.voltage_limit_v ?? null,
    write: (design, value) => withAmplifier(design, { voltage_limit_v: value }),
  },
  {
    id: "amplifier.minimum_load_ohm",
    label: "Amplifier bears",
    kind: "resistance",
    min: 0,
    max: 1_000,
    step: 0.5,
    term: "minimum-load",
    empty: "not known",
    read: ({ amplifier }) => amplifier?.minimum_load_ohm ?? null,
    write: (design, value) => withAmplifier(design, { minimum_load_ohm: value }),
  },
];

function withAmplifier(design: Design, change: Partial<NonNullable<Design["amplifier"]>>): Design {
  const amplifier = {
    voltage_limit_v: null,
    minimum_load_ohm: null,
    ...design.amplifier,
    ...change,
  };
  const none = amplifier.voltage_limit_v === null && amplifier.minimum_load_ohm === null;
  return { ...design, amplifier: none ? null : amplifier };
}

export const targetFields: Field[] = [
  {
    id: "target.tuning_hz",
    label: "Tuning wanted",
    kind: "frequency",
    min: 0.1,
    max: 100_000,
    step: 0.5,
    term: "tuning",
    empty: "none",
    read: ({ target }) => target.tuning_hz,
    write: (design, value) => ({ ...design, target: { ...design.target, tuning_hz: value } }),
  },
  {
    id: "target.air_speed_limit_m_s",
    label: "Air speed, at most",
    kind: "speed",
    min: 0.1,
    max: 200,
    step: 0.5,
    term: "air-speed",
    empty: "none",
    read: ({ target }) => target.air_speed_limit_m_s,
    write: (design, value) => ({
      ...design,
      target: { ...design.target, air_speed_limit_m_s: value },
    }),
  },
];
