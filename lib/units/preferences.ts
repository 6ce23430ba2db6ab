/** How a person reads and types numbers: the system, and the finest mark of their tape. */
export type UnitPreferences = {
  system: "metric" | "imperial";
  /** Parts of an inch on the tape: 16, 32 or 64. */
  tape: 16 | 32 | 64;
};

/**
 * What a number means. Values are SI, except the three that the design document itself writes
 * otherwise: temperature in °C, angle in degrees, level in dB.
 */
export type QuantityKind =
  | "length"
  | "area"
  | "volume"
  | "speed"
  | "frequency"
  | "resistance"
  | "voltage"
  | "power"
  | "temperature"
  | "pressure"
  | "humidity"
  | "mass"
  | "inductance"
  | "time"
  | "level"
  | "ratio"
  | "angle"
  | "count";

export const defaultUnitPreferences: UnitPreferences = { system: "metric", tape: 32 };
