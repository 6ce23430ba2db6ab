/**
 * Drivers: conversions, efficiency, sensitivity, coils and arrays.
 * Source: vented-box dossier 3.1, 3.2, 4.1 to 4.4, 6; rows 28, 29, 44, 52 to 56, 64, 65, 81 of its
 * section 11. Marks as there: S read in a source, C computed.
 */
import { describe, expect, it } from "vitest";
import {
  airProperties,
  checkDriver,
  coilImpedance,
  driverAnswer,
  driverArray,
  isobaricPair,
  mechanicalFrom,
  midBandLevel,
  referenceEfficiency,
  thieleSmallFrom,
  totalQ,
} from "@/lib/acoustics";
import { driverSchema } from "@/lib/document/schema";
import { near } from "../near";
import { driverA, smallsAir } from "../vented-box/system-a";

const expectNear = near("driver");

const small = airProperties(smallsAir);
const at = (...hertz: number[]) => Float64Array.from(hertz, (f) => 2 * Math.PI * f);
/** Level of one acoustic watt at 1 m into half space, with Small's air (row 44). */
const WATT = 112.095;

describe("System A (rows 28, 29, 44) [C]", () => {
  const answer = driverAnswer(driverSchema.parse(driverA), small);
  it("mechanical parameters", () => {
    expectNear("C_MS", answer.cms_m_n, 5.81224e-4, { relative: 1e-5 });
    expectNear("M_MS", answer.mms_kg, 0.0484233, { relative: 1e-5 });
    expectNear("R_MS", answer.rms_kg_s, 2.28189, { relative: 1e-5 });
    expectNear("Bl", answer.bl_t_m, 11.701, { relative: 1e-5 });
    expectNear("Q_TS", answer.qts, 0.36364, { digit: 1e-5 });
  });
  it("efficiency and sensitivity", () => {
    expectNear("efficiency", answer.efficiency, 0.0064894, { digit: 1e-7 });
    expectNear("2.83 V", answer.sensitivity_db, 91.471, { digit: 1e-3 });
    const watt =
      midBandLevel(mechanicalFrom(driverA, small), small, Math.sqrt(6)) -
      10 * Math.log10(answer.efficiency);
    expectNear("SPL constant", watt, WATT, { digit: 1e-3 });
  });
  it("there and back again", () => {
    const back = thieleSmallFrom(mechanicalFrom(driverA, small), small);
    expectNear("f_S", back.fs_hz, 30, { relative: 1e-12 });
    expectNear("Q_ES", back.qes, 0.4, { relative: 1e-12 });
    expectNear("Q_MS", back.qms, 4, { relative: 1e-12 });
    expectNear("V_AS", back.vas_m3, 0.1, { relative: 1e-12 });
  });
});

describe("data of others", () => {
  it("driver of a course report, 4.1 [S+C] (rows 52 to 54)", () => {
    const sd_m2 = (Math.PI / 4) * 0.105 ** 2;
    const mechanical = {
      mms_kg: 9.3e-3,
      cms_m_n: 0.735e-3,
      rms_kg_s: (2 * Math.PI * 60.9 * 9.3e-3) / 3.35,
      bl_t_m: 5.13,
      re_ohm: 5.9,
      sd_m2,
    };
    const ts = thieleSmallFrom(mechanical, small);
    expectNear("V_AS", ts.vas_m3, 7.7401e-3, { digit: 1e-7 });
    expectNear("f_S", ts.fs_hz, 60.874, { digit: 1e-3 });
    expectNear("Q_ES, at the printed f_S", ts.qes * (60.9 / ts.fs_hz), 0.7978, { digit: 1e-4 });
    const efficiency = referenceEfficiency(
      mechanicalFrom(
        { fs_hz: 60.9, qes: 0.796, qms: 3.35, vas_m3: 7.74e-3, re_ohm: 5.9, sd_m2 },
        small,
      ),
      small,
    );
    expectNear("efficiency", efficiency, 2.111e-3, { digit: 1e-6 });
    expectNear("1 W", WATT + 10 * Math.log10(efficiency), 85.34, { digit: 0.01 });
    expectNear("Q_TS", totalQ(0.796, 3.35), 0.64317, { digit: 1e-5 });
  });

  it("measured data sheet, 4.3 [S+C] (row 55)", () => {
    const cms = 1 / 18_650;
    const ts = thieleSmallFrom(
      {
        mms_kg: 38.839e-3,
        cms_m_n: cms,
        rms_kg_s: 5.932,
        bl_t_m: 11.325,
        re_ohm: 6.18,
        sd_m2: Math.sqrt(10.5303e-3 / (1.18 * 345 ** 2 * cms)),
      },
      small,
    );
    expectNear("f_S", ts.fs_hz, 110.29, { digit: 0.01 });
    expectNear("Q_MS", ts.qms, 4.5376, { relative: 1e-3 });
    expectNear("Q_ES", ts.qes, 1.297, { relative: 1e-3 });
    expectNear("Q_TS", totalQ(ts.qes, ts.qms), 1.0087, { relative: 1e-3 });
    expectNear("R_ES", (6.18 * ts.qms) / ts.qes, 21.621, { digit: 1e-3 });
  });

  it("driver list of a tutorial, 4.4 [S inputs, C] (row 56)", () => {
    const air = airProperties({ density_kg_m3: 1.2, speed_of_sound_m_s: 343 });
    const sd_m2 = Math.PI * 0.12 ** 2;
    const mechanical = {
      mms_kg: 33.4e-3 + (2 * sd_m2 ** 2 * 8 * 1.2) / (3 * Math.PI ** 2 * 0.12),
      cms_m_n: 1.18e-3,
      rms_kg_s: 1.85,
      bl_t_m: 11.4,
      re_ohm: 7,
      sd_m2,
    };
    expectNear("M_MS", mechanical.mms_kg, 44.459e-3, { digit: 1e-6 });
    const ts = thieleSmallFrom(mechanical, air);
    expectNear("f_S", ts.fs_hz, 21.973, { relative: 1e-4 });
    expectNear("Q_ES", ts.qes, 0.33062, { relative: 1e-4 });
    expectNear("Q_MS", ts.qms, 3.3179, { relative: 1e-4 });
    expectNear("V_AS", ts.vas_m3, 0.34094, { relative: 1e-4 });
    expectNear("efficiency", referenceEfficiency(mechanical, air), 0.010703, { relative: 1e-4 });
  });
});

describe("coils, 3.1 [C] (row 81)", () => {
  const coil = { re_ohm: 6 };
  it.each([
    [20, 0.267623, 0.52524],
    [100, 0.825663, 1.620454],
    [1000, 4.138116, 8.12151],
  ])("semi-inductance K 0.02, n 0.7 at %s Hz", (frequency, re, im) => {
    const z = coilImpedance({ ...coil, semi_inductance: { k: 0.02, n: 0.7 } }, at(frequency));
    expectNear("re", z.re[0]! - 6, re, { digit: 1e-6 });
    expectNear("im", z.im[0]!, im, { digit: 1e-6 });
  });
  it("0.5 mH with 1 mH ∥ 4 Ω at 100 Hz", () => {
    const z = coilImpedance({ ...coil, le_h: 0.5e-3, l2_h: 1e-3, r2_ohm: 4 }, at(100));
    expectNear("re", z.re[0]! - 6, 0.09632, { digit: 1e-5 });
    expectNear("im", z.im[0]!, 0.92735, { digit: 1e-5 });
  });
});

describe("several of driver M, 6 [C] (rows 64, 65)", () => {
  const one = mechanicalFrom(
    { fs_hz: 28, qes: 0.42, qms: 5, vas_m3: 0.12, re_ohm: 5.6, sd_m2: 0.048 },
    small,
  );
  it.each([
    ["single", one, 5.6, 14.296, 0.12, 0.00603, 89.9, 91.45],
    [
      "2 parallel",
      driverArray(one, { series: 1, parallel: 2 }),
      2.8,
      14.296,
      0.24,
      0.01206,
      92.91,
      97.47,
    ],
    [
      "2 series",
      driverArray(one, { series: 2, parallel: 1 }),
      11.2,
      28.592,
      0.24,
      0.01206,
      92.91,
      91.45,
    ],
    [
      "4 series-parallel",
      driverArray(one, { series: 2, parallel: 2 }),
      5.6,
      28.592,
      0.48,
      0.02412,
      95.92,
      97.47,
    ],
    ["isobaric parallel", isobaricPair(one, "parallel"), 2.8, 14.296, 0.06, 0.003015, 86.89, 91.45],
    ["isobaric series", isobaricPair(one, "series"), 11.2, 28.592, 0.06, 0.003015, 86.89, 85.43],
  ] as const)("%s", (_, array, re, bl, vas, efficiency, watt, volts) => {
    const ts = thieleSmallFrom(array, small);
    expectNear("R_E", array.re_ohm, re, { relative: 1e-9 });
    expectNear("Bl", array.bl_t_m, bl, { digit: 1e-3 });
    expectNear("V_AS", ts.vas_m3, vas, { relative: 1e-9 });
    expectNear("f_S", ts.fs_hz, 28, { relative: 1e-9 });
    expectNear("Q_ES", ts.qes, 0.42, { relative: 1e-9 });
    expectNear("efficiency", referenceEfficiency(array, small), efficiency, { relative: 1e-3 });
    expectNear("1 W", midBandLevel(array, small, Math.sqrt(re)), watt, { digit: 0.01 });
    expectNear("2.83 V", midBandLevel(array, small, 2.83), volts, { digit: 0.01 });
  });
});

describe("consistency of a data sheet", () => {
  // The course report's driver, 4.1: all of its figures agree within 1.1 %.
  const sheet = {
    fs_hz: 60.9,
    qes: 0.796,
    qms: 3.35,
    qts: 0.643,
    vas_m3: 7.74e-3,
    re_ohm: 5.9,
    sd_m2: (Math.PI / 4) * 0.105 ** 2,
    mms_kg: 9.3e-3,
    cms_m_n: 0.735e-3,
    bl_t_m: 5.13,
    efficiency: 0.00209,
  };
  it("finds nothing wrong with good figures", () => {
    const { checks, suspects } = checkDriver(sheet, small);
    expect(checks.length).toBeGreaterThanOrEqual(7);
    expect(checks.every((check) => check.agrees)).toBe(true);
    expect(suspects).toEqual([]);
  });
  it("names a cone area taken from the frame's diameter, and by how much", () => {
    const { checks, suspects } = checkDriver({ ...sheet, sd_m2: 0.0154 }, small);
    const failing = checks.filter((check) => !check.agrees);
    expect(failing.map((check) => check.figure).sort()).toEqual(["efficiency", "mms_kg", "vas_m3"]);
    expect(suspects).toEqual(["sd_m2"]);
    const vas = failing.find((check) => check.figure === "vas_m3")!;
    expectNear("V_AS off by", vas.deviation, (8.659e-3 / 0.0154) ** 2 - 1, { relative: 2e-3 });
  });
  it("says nothing where nothing can be compared", () => {
    expect(checkDriver({ fs_hz: 30, vas_m3: 0.1 }, small)).toEqual({ checks: [], suspects: [] });
  });
});
