import { describe } from "vitest";
import { airProperties } from "@/lib/acoustics/air";
import { checkRows } from "../check";

/** Temperature °C, humidity, c m/s, ρ kg/m³, γ, Pr; at 101,325 Pa. */
const rows = [
  [0, 0, 331.448, 1.29305, 1.40284, 0.731],
  [15, 0, 340.423, 1.22552, 1.40235, 0.727],
  [20, 0, 343.359, 1.20456, 1.40217, 0.725],
  [20, 0.5, 343.987, 1.19931, 1.4011, 0.728],
  [20, 1, 344.614, 1.19409, 1.40003, 0.731],
  [23, 0.5, 345.867, 1.18608, 1.40076, 0.728],
  [30, 0.5, 350.31, 1.15551, 1.39977, 0.728],
  [10, 0.5, 337.781, 1.24438, 1.40198, 0.73],
] as const;

describe("moist air", () => {
  const of = (temperature_c: number, relative_humidity: number) =>
    airProperties({ temperature_c, pressure_pa: 101_325, relative_humidity });
  for (const [t, h, c, rho, gamma, prandtl] of rows)
    checkRows(
      {
        topic: "air",
        source: "Cramer 1993, CIPM-2007, IEC 61094-2 Annex F: coefficients, evaluated",
        mark: "secondary",
        tolerance: { digits: 3 },
      },
      [
        { name: `c at ${t} °C, ${100 * h} %`, actual: () => of(t, h).speedOfSound, expected: c },
        {
          name: `density at ${t} °C, ${100 * h} %`,
          actual: () => of(t, h).density,
          expected: rho,
          tolerance: { digits: 5 },
        },
        {
          name: `γ at ${t} °C, ${100 * h} %`,
          actual: () => of(t, h).heatCapacityRatio,
          expected: gamma,
          tolerance: { digits: 5 },
        },
        { name: `Pr at ${t} °C, ${100 * h} %`, actual: () => of(t, h).prandtl, expected: prandtl },
      ],
    );
  checkRows(
    {
      topic: "air",
      source: "IEC 61094-2 viscosity, CIPM density",
      mark: "secondary",
      tolerance: { relative: 0.001 },
    },
    [
      {
        name: "boundary layer at 30 Hz, 20 °C, 50 % [mm]",
        actual: () => 1000 * Math.sqrt((2 * of(20, 0.5).kinematicViscosity) / (2 * Math.PI * 30)),
        expected: 0.4005,
      },
    ],
  );
});
