/**
 * The unit each kind of quantity is shown in, per system, and how finely. Factors are exact by
 * definition: inch 25.4 mm, pound 0.453 592 37 kg, inch of mercury by convention 3386.389 Pa.
 */
import type { QuantityKind, UnitPreferences } from "./preferences";

export interface ShownUnit {
  unit: string;
  /** SI (or the document's unit) per shown unit. */
  per: number;
  /** Added after the factor: value = shown × per + offset. */
  offset?: number;
  /** Decimal places for a figure of this size, given as shown. */
  places: (size: number) => number;
  /** Trailing zeros go: figures a person sets rather than measures. */
  trim?: boolean;
  /** No space before the unit. */
  tight?: boolean;
}

const fixed = (places: number) => () => places;
const finerBelow =
  (...steps: [limit: number, places: number][]) =>
  (size: number) =>
    steps.find(([limit]) => size < limit)?.[1] ?? 0;

const INCH = 0.0254;
const FOOT = 0.3048;

const both = (shown: ShownUnit) => ({ metric: shown, imperial: shown });

export const shownUnits: Record<QuantityKind, Record<UnitPreferences["system"], ShownUnit>> = {
  length: {
    metric: { unit: "mm", per: 1e-3, places: finerBelow([1, 2], [Infinity, 1]) },
    imperial: { unit: "in", per: INCH, places: fixed(3) },
  },
  area: {
    metric: { unit: "cm²", per: 1e-4, places: finerBelow([10, 2], [1_000, 1]) },
    imperial: { unit: "in²", per: INCH ** 2, places: finerBelow([10, 2], [1_000, 1]) },
  },
  volume: {
    metric: { unit: "L", per: 1e-3, places: finerBelow([1, 3], [10, 2], [1_000, 1]) },
    imperial: { unit: "ft³", per: FOOT ** 3, places: finerBelow([0.1, 4], [1, 3], [100, 2]) },
  },
  speed: {
    metric: { unit: "m/s", per: 1, places: fixed(1) },
    imperial: { unit: "ft/s", per: FOOT, places: fixed(1) },
  },
  frequency: both({ unit: "Hz", per: 1, places: finerBelow([10, 2], [200, 1]) }),
  resistance: both({ unit: "Ω", per: 1, places: finerBelow([10, 2], [100, 1]), trim: true }),
  voltage: both({ unit: "V", per: 1, places: finerBelow([10, 2], [100, 1]), trim: true }),
  power: both({ unit: "W", per: 1, places: finerBelow([10, 2], [100, 1]), trim: true }),
  temperature: {
    metric: { unit: "°C", per: 1, places: fixed(1), trim: true },
    imperial: { unit: "°F", per: 5 / 9, offset: -160 / 9, places: fixed(1), trim: true },
  },
  pressure: {
    metric: { unit: "hPa", per: 100, places: finerBelow([100, 2], [1_000, 1]), trim: true },
    imperial: { unit: "inHg", per: 3386.389, places: fixed(2) },
  },
  humidity: both({ unit: "%", per: 0.01, places: fixed(0) }),
  mass: {
    metric: { unit: "g", per: 1e-3, places: finerBelow([100, 1]) },
    imperial: { unit: "oz", per: 0.45359237 / 16, places: finerBelow([10, 2], [100, 1]) },
  },
  inductance: both({ unit: "mH", per: 1e-3, places: finerBelow([10, 2], [100, 1]), trim: true }),
  time: both({ unit: "ms", per: 1e-3, places: finerBelow([10, 2], [100, 1]) }),
  level: both({ unit: "dB", per: 1, places: fixed(1) }),
  ratio: both({ unit: "", per: 1, places: finerBelow([10, 2], [100, 1]), trim: true }),
  angle: both({ unit: "°", per: 1, places: fixed(1), trim: true, tight: true }),
  count: both({ unit: "", per: 1, places: fixed(0) }),
};

/** The figure as shown, from the value. */
export function toShown(value: number, { per, offset = 0 }: ShownUnit): number {
  return (value - offset) / per;
}

/** The value, from the figure as shown. */
export function fromShown(figure: number, { per, offset = 0 }: ShownUnit): number {
  return figure * per + offset;
}
