/**
 * System A against the dossier's closed forms and its independent nodal solution [C].
 * Source: vented-box dossier 1.1 to 1.3, 3, 5, rows 20 to 42 of its section 11.
 */
import { describe, expect, it } from "vitest";
import {
  closedBoxResonance,
  coefficientsOf,
  driverArray,
  enclosureCompliance,
  evaluate,
  mechanicalFrom,
  airProperties,
} from "@/lib/acoustics";
import type { Design } from "@/lib/document/schema";
import { near } from "../near";
import { areaA, driverA, smallsAir, systemA } from "./system-a";

const expectNear = near("vented box");

const at = (design: Design, frequency_hz: number[]) => evaluate(design, { frequency_hz }).curves!;
/** Mid-band level (dossier 1.4: η_0 from f_S, V_AS, Q_ES) and static excursion (1.3), to refer to. */
const EFFICIENCY = ((4 * Math.PI ** 2) / 345 ** 3) * ((30 ** 3 * 0.1) / 0.4);
const MID_BAND =
  10 * Math.log10(((EFFICIENCY * 1.18 * 345) / (2 * Math.PI) / 4e-10) * (2.83 ** 2 / 6));
const STATIC_PEAK = (Math.SQRT2 * 2.83 * 11.701 * 5.81224e-4) / 6;
const MM_RMS = 1000 / Math.SQRT2;

const noLoss = {};
const leak7 = { ql: 7 };
const mixed = { ql: 9, qa: 50, qp: 40 };

describe("normalised response, dossier 1.2 [C]", () => {
  // f, losses, |G| dB, arg G, |X|, |Z|, arg Z
  it.each([
    [20, noLoss, -17.1275, -98.49, 0.53947, 34.6976, -50.18],
    [20, leak7, -17.7007, -105.37, 0.50972, 31.0005, -35.34],
    [20, mixed, -17.8734, -108.05, 0.50167, 29.9718, -31.61],
    [25, leak7, -10.7741, -132.89, 0.31906, 11.4407, -37.4],
    [33, leak7, -3.739, 179.08, 0.07677, 7.6052, -0.25],
    [33, mixed, -3.9256, 177.85, 0.08211, 7.7495, -0.27],
    [40, noLoss, 0.582, 135.22, 0.1921, 8.4184, 39.62],
    [40, leak7, -1.2287, 141.93, 0.16623, 9.9458, 28.84],
    [60, leak7, -0.1689, 86.74, 0.1721, 28.6067, -43.65],
    [100, leak7, -0.0834, 50.41, 0.07954, 8.8101, -41.23],
  ])("%s Hz, %o", (frequency, losses, gain, phase, displacement, impedance, impedancePhase) => {
    const curves = at(systemA(losses), [frequency]);
    // The vent's own resistance moves the tuning, to which leak and absorption refer, by 3e-4.
    const shifted = losses === mixed ? 8e-4 : 1e-4;
    expectNear("G", curves.spl_db[0]! - MID_BAND, gain, { absolute: shifted });
    expectNear("arg G", curves.phase_deg[0]!, phase, {
      absolute: losses === mixed ? 0.02 : 0.0056,
    });
    expectNear("X", curves.excursion_peak_m[0]! / STATIC_PEAK, displacement, {
      absolute: losses === mixed ? 5e-5 : 1e-5,
    });
    expectNear("Z", curves.impedance_ohm[0]!, impedance, {
      absolute: losses === mixed ? 3e-3 : 1e-4,
    });
    expectNear("arg Z", curves.impedance_phase_deg[0]!, impedancePhase, {
      absolute: losses === mixed ? 0.02 : 0.0056,
    });
  });

  it("at 33 Hz without losses the cone stands still and the impedance is R_E", () => {
    const curves = at(systemA(), [33]);
    expectNear("G", curves.spl_db[0]! - MID_BAND, -1.4423, { absolute: 1e-4 });
    expect(curves.excursion_peak_m[0]! / STATIC_PEAK).toBeLessThan(1e-6);
    expectNear("Z", curves.impedance_ohm[0]!, 6, { absolute: 1e-4 });
  });

  it("coefficients a1, a2, a3 (rows 20 and 21)", () => {
    const box = { qt: 0.4 / 1.1, h: 1.1, alpha: 0.1 / 0.07 };
    for (const [ql, a1, a2, a3] of [
      [null, 2.62202, 3.30779, 2.88422],
      [7, 2.77185, 3.70065, 3.02043],
    ] as const) {
      const got = coefficientsOf({ ...box, ql });
      expectNear("a1", got.a1, a1, { digit: 1e-5 });
      expectNear("a2", got.a2, a2, { digit: 1e-5 });
      expectNear("a3", got.a3, a3, { digit: 1e-5 });
    }
  });

  it("the tuning, and f3 of the leaky box (row 23)", () => {
    expectNear("tuning", evaluate(systemA(leak7)).tuning_hz!, 33, { relative: 1e-6 });
    let [low, high] = [33, 36];
    for (let step = 0; step < 40; step++) {
      const middle = (low + high) / 2;
      if (at(systemA(leak7), [middle]).spl_db[0]! - MID_BAND < -10 * Math.log10(2)) low = middle;
      else high = middle;
    }
    expectNear("f3", low, 34.4, { absolute: 0.01 });
  });
});

describe("absolute level, excursion and air speed at 2.83 V, Q_L 7, dossier 3 [C]", () => {
  const semi = { semi_inductance: { k: 0.02, n: 0.7 } };
  // f, level without coil, with 1 mH, with semi-inductance, x rms mm, vent m/s rms, three |Z|
  const rows = [
    [20, 73.77, 73.79, 73.793, 1.6351, 1.434, 31.001, 30.928, 30.92],
    [33, 87.732, 87.73, 87.274, 0.2462, 1.593, 7.605, 7.607, 8.017],
    [50, 91.143, 91.091, 90.85, 0.6363, 0.678, 28.154, 28.32, 29.117],
    [100, 91.388, 91.792, 91.651, 0.2552, 0.087, 8.81, 8.409, 8.547],
    [200, 91.443, 91.914, 90.326, 0.07, 0.011, 6.544, 6.199, 7.442],
    [400, 91.463, 91.396, 88.341, 0.0179, 0.001, 6.129, 6.176, 8.78],
  ] as const;
  it.each(rows)("%s Hz", (frequency, plain, coil, lossy, x, speed, z, zCoil, zLossy) => {
    const bare = at(systemA(leak7), [frequency]);
    const inductive = at(systemA(leak7, { coil: { le_h: 1e-3 } }), [frequency]);
    const half = at(systemA(leak7, { coil: semi }), [frequency]);
    expectNear("level", bare.spl_db[0]!, plain, { digit: 1e-3 });
    expectNear("level with 1 mH", inductive.spl_db[0]!, coil, { digit: 1e-3 });
    expectNear("level with a lossy coil", half.spl_db[0]!, lossy, { digit: 1e-3 });
    expectNear("excursion", bare.excursion_peak_m[0]! * MM_RMS, x, { digit: 1e-4 });
    const rms = bare.air_speed_peak_m_s[0]![0]! / Math.SQRT2;
    expectNear("air speed", rms, speed, { digit: 1e-3 });
    expectNear("Z", bare.impedance_ohm[0]!, z, { digit: 1e-3 });
    expectNear("Z with 1 mH", inductive.impedance_ohm[0]!, zCoil, { digit: 1e-3 });
    expectNear("Z with a lossy coil", half.impedance_ohm[0]!, zLossy, { digit: 1e-3 });
  });

  it("vent speed at 33 Hz (row 34), and its peak below the tuning (1.3)", () => {
    const answer = evaluate(systemA(leak7), { frequency_hz: [33] });
    const speed = answer.curves!.air_speed_peak_m_s[0]![0]! / Math.SQRT2;
    expectNear("33 Hz", speed, 1.5927, { absolute: 1e-4 });
    const peak = answer.vents[0]!.peak_air_speed!;
    expect(peak.frequency_hz).toBeGreaterThan(27.5);
    expect(peak.frequency_hz).toBeLessThan(30.5);
  });

  it("with leakage alone the vent passes Q_L times the cone's flow at f_B (row 26)", () => {
    const curves = at(systemA(leak7), [33]);
    const vent = curves.air_speed_peak_m_s[0]![0]! * areaA;
    const cone = curves.excursion_peak_m[0]! * 2 * Math.PI * 33 * 0.035;
    expectNear("U_P/U_D", vent / cone, 7, { relative: 1e-5 });
  });
});

describe("impedance sweep, Q_L 7, dossier 5 [C]", () => {
  it.each([
    [10, 9.4887, 44.21],
    [15, 21.2579, 52.653],
    [18, 46.7378, 9.656],
    [20, 31.0005, -35.344],
    [22, 18.45, -43.668],
    [25, 11.4407, -37.404],
    [30, 7.9587, -15.194],
    [33, 7.6052, -0.247],
    [36, 8.0631, 13.767],
    [40, 9.9458, 28.839],
    [50, 28.1535, 31.78],
    [55, 41.5616, -10.808],
    [60, 28.6067, -43.645],
    [80, 11.6227, -49.299],
    [100, 8.8101, -41.227],
    [200, 6.5439, -21.312],
  ])("%s Hz", (frequency, ohms, degrees) => {
    const curves = at(systemA(leak7), [frequency]);
    expectNear("Z", curves.impedance_ohm[0]!, ohms, { absolute: 1e-4 });
    expectNear("arg Z", curves.impedance_phase_deg[0]!, degrees, { digit: 1e-3 });
  });

  /** Extreme of |Z| between two frequencies, from fine samples and a parabola. */
  function extreme(design: Design, from: number, to: number, sign: 1 | -1) {
    const n = 2000;
    const f = Array.from({ length: n }, (_, i) => from + ((to - from) * i) / (n - 1));
    const z = at(design, f).impedance_ohm;
    let top = 1;
    z.forEach((value, i) => {
      if (i > 0 && i < n - 1 && sign * value > sign * z[top]!) top = i;
    });
    const [a, b, c] = [z[top - 1]!, z[top]!, z[top + 1]!];
    const shift = (a - c) / (2 * (a - 2 * b + c));
    return { frequency: f[top]! + (shift * (to - from)) / (n - 1), ohms: b };
  }

  it("peaks and minimum (rows 38 to 40)", () => {
    const lossless = systemA();
    expectNear("f_L", extreme(lossless, 15, 22, 1).frequency, 18.2536, { absolute: 1e-3 });
    expectNear("f_H", extreme(lossless, 48, 60, 1).frequency, 54.2358, { absolute: 1e-3 });
    const leaky = systemA(leak7);
    const [low, dip, high] = [
      extreme(leaky, 15, 22, 1),
      extreme(leaky, 28, 38, -1),
      extreme(leaky, 48, 60, 1),
    ];
    expectNear("f_L", low.frequency, 18.1653, { absolute: 1e-3 });
    expectNear("f_M", dip.frequency, 32.7307, { absolute: 1e-3 });
    expectNear("f_H", high.frequency, 54.552, { absolute: 1e-3 });
    expectNear("peak", low.ohms, 46.987, { absolute: 1e-3 });
    expectNear("dip", dip.ohms, 7.602, { absolute: 1e-3 });
    expectNear("peak", high.ohms, 41.757, { absolute: 1e-3 });
  });

  it("f_C with the vent blocked (row 42), C_AB (row 35)", () => {
    const air = airProperties(smallsAir);
    const array = driverArray(mechanicalFrom(driverA, air), { series: 1, parallel: 1 });
    const compliance = enclosureCompliance(0.07, air);
    expectNear("C_AB", compliance, 4.984e-7, { relative: 1e-5 });
    expectNear("f_C", closedBoxResonance(array, compliance), 46.7516, { absolute: 1e-4 });
  });

  it("effective length of the 100 mm vent and its inertance (rows 36 and 37)", () => {
    const vent = evaluate(systemA()).vents[0]!;
    expectNear("M_AP", vent.inertance_kg_m4, 46.6697, { relative: 1e-5 });
    expectNear("L_eff", vent.effective_length_m, 0.31063, { digit: 1e-5 });
  });
});
