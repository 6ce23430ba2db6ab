/**
 * The largest clean level. Source: vented-box dossier 8, row 75 of its section 11 [C]: System A,
 * Q_L 7, x_max 8 mm peak, 300 W into R_E, 100 mm vent at 17 m/s peak.
 */
import { describe, expect, it } from "vitest";
import { evaluate } from "@/lib/acoustics";
import { near } from "../near";
import { systemA } from "../vented-box/system-a";

const expectNear = near("limits");

const frequencies = [16, 20, 25, 28, 30, 33, 36, 40, 45, 50, 63, 80, 100];
const table = {
  excursion: [
    75.19, 84.55, 95.55, 102.65, 108.02, 114.96, 113.27, 110.76, 109.93, 110.12, 112.03, 115.04,
    118.3,
  ],
  "air speed": [
    86.42, 92.24, 98.05, 101.01, 102.8, 105.29, 107.56, 110.3, 113.37, 116.12, 122.14, 128.36,
    134.18,
  ],
  power: [
    90.08, 97.29, 104.21, 107.44, 109.19, 111.25, 112.66, 113.76, 114.4, 114.66, 114.84, 114.88,
    114.9,
  ],
};
const xmax_m = 0.008;
const power_w = 300;
const target = { air_speed_limit_m_s: 17 };
const at = { frequency_hz: frequencies };

describe.each([
  ["excursion", { coil: { xmax_m } }],
  ["air speed", { target }],
  ["power", { coil: { power_w } }],
] as const)("%s alone", (limit, changes) => {
  const curves = evaluate(systemA({ ql: 7 }, changes), at).curves!;
  it.each(frequencies.map((f, i) => [f, i]))("%s Hz", (f, i) => {
    expectNear(`${f} Hz`, curves.max_spl_db[i]!, table[limit][i]!, { digit: 0.01 });
    expect(curves.max_spl_limit[i]).toBe(limit);
  });
});

describe("all three together", () => {
  const names = [
    ...Array<string>(3).fill("excursion"),
    ...Array<string>(5).fill("air speed"),
    ...Array<string>(3).fill("excursion"),
    ...Array<string>(2).fill("power"),
  ];
  const design = systemA({ ql: 7 }, { coil: { xmax_m, power_w }, target });
  it("the least of them limits, and is named", () => {
    const curves = evaluate(design, at).curves!;
    expect(curves.max_spl_limit).toEqual(names);
    frequencies.forEach((f, i) => {
      const least = Math.min(...Object.values(table).map((row) => row[i]!));
      expectNear(`${f} Hz`, curves.max_spl_db[i]!, least, { digit: 0.01 });
    });
  });
  it("does not depend on the drive or a filter, unless the amplifier limits", () => {
    const louder = systemA(
      { ql: 7 },
      {
        coil: { xmax_m, power_w },
        target,
        drive: { voltage_v: 37 },
        filters: [{ kind: "highpass", family: "butterworth", order: 4, frequency_hz: 24 }],
      },
    );
    const [a, b] = [evaluate(design, at).curves!, evaluate(louder, at).curves!];
    frequencies.forEach((f, i) =>
      expectNear(`${f} Hz`, b.max_spl_db[i]!, a.max_spl_db[i]!, { relative: 1e-9 }),
    );
  });
});

describe("the amplifier", () => {
  it("limits the voltage after the filter: at 42.43 V, the power row", () => {
    const amplifier = { voltage_limit_v: Math.sqrt(300 * 6) };
    const curves = evaluate(systemA({ ql: 7 }, { amplifier }), at).curves!;
    frequencies.forEach((f, i) =>
      expectNear(`${f} Hz`, curves.max_spl_db[i]!, table.power[i]!, { digit: 0.01 }),
    );
    expect(new Set(curves.max_spl_limit)).toEqual(new Set(["voltage"]));
  });
  it("below its least load the level falls with the load", () => {
    // |Z| of System A at 33 Hz is 7.6052 Ω (dossier 5).
    const amplifier = { voltage_limit_v: Math.sqrt(300 * 6), minimum_load_ohm: 8 };
    const curves = evaluate(systemA({ ql: 7 }, { amplifier }), at).curves!;
    const fall = 20 * Math.log10(7.6052 / 8);
    expectNear("33 Hz", curves.max_spl_db[5]!, 111.25 + fall, { digit: 0.01 });
    expect(curves.max_spl_limit[5]).toBe("load");
    expect(curves.max_spl_limit[9]).toBe("voltage");
  });
});

it("nothing limits where nothing is known", () => {
  const curves = evaluate(systemA({ ql: 7 }), at).curves!;
  expect(new Set(curves.max_spl_db)).toEqual(new Set([null]));
  expect(new Set(curves.max_spl_limit)).toEqual(new Set([null]));
});

describe("volume displacement alone, dossier 8 [C] (rows 71, 72): a closed box far below resonance", () => {
  it.each([
    [1.18, 345, 100.412],
    [1.2041, 343.2, 100.587],
  ])("1 L peak at 20 Hz, ρ %s", (density_kg_m3, speed_of_sound_m_s, level) => {
    // With x_max S_D = 1 L the cone's limit is that of the volume: no vent, no leak.
    const design = systemA(
      {},
      {
        air: { density_kg_m3, speed_of_sound_m_s },
        vents: [],
        coil: { sd_m2: 0.1, xmax_m: 0.01 },
      },
    );
    const curves = evaluate(design, { frequency_hz: [20] }).curves!;
    expectNear("level", curves.max_spl_db[0]!, level, { absolute: 1e-3 });
  });
});
