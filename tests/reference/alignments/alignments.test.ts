/**
 * Standard alignments to the dossier's printed digits, and the boxes that come of them.
 * Source: vented-box dossier 2, 4.4 to 4.7, 7; rows 1 to 19, 47 to 50, 57 to 59, 69, 70 of its
 * section 11. Marks as there: C computed, M+C remembered and confirmed by calculation.
 */
import { describe, expect, it } from "vitest";
import {
  airProperties,
  alignmentFor,
  chebyshevPeak,
  fixedAlignment,
  mechanicalFrom,
  referenceEfficiency,
  sixthOrderButterworth,
  suggestBoxes,
} from "@/lib/acoustics";
import { driverSchema } from "@/lib/document/schema";
import { near } from "../near";
import { smallsAir } from "../vented-box/system-a";
import { alignments, type AlignmentRow } from "./alignments.data";

const expectNear = near("alignments");

const member = (family: AlignmentRow[0], qt: number, ql: number | null) =>
  family === "B4" || family === "BE4" ? fixedAlignment(family, ql)! : alignmentFor(family, qt, ql)!;

describe("tables of 2.3 [C]", () => {
  it.each(alignments)("%s, Q_L %s, Q_T %s", (family, ql, qt, h, alpha, volume, ...rest) => {
    const [f3, f10, peak, displacement, powerRating, efficiency] = rest;
    const got = member(family, qt, ql);
    expectNear("Q_T", got.qt, qt, { digit: 1e-4 });
    expectNear("h", got.h, h, { digit: 1e-4 });
    expectNear("α", got.alpha, alpha, { digit: 1e-4 });
    expectNear("V_B/V_AS", 1 / got.alpha, volume, { digit: 1e-4 });
    expectNear("f3", got.f3, f3, { digit: 1e-4 });
    expectNear("f10", got.f10, f10, { digit: 1e-4 });
    expectNear("peak", got.peak_db, peak, { digit: 1e-3 });
    expectNear("|X|", got.displacement, displacement, { digit: 1e-4 });
    const kP = (4 * Math.PI ** 3 * 1.18) / 345 / (got.f3 ** 4 * got.displacement ** 2);
    expectNear("k_P", kP, powerRating, { digit: 1e-3 });
    const kEta = (((4 * Math.PI ** 2) / 345 ** 3) * got.alpha) / (got.qt * got.f3 ** 3);
    expectNear("k_η", kEta * 1e6, efficiency, { digit: 1e-3 });
  });
});

describe("closed forms", () => {
  it("B4 against Q_L, 2.3 [C] (rows 1 to 4)", () => {
    for (const [ql, qt, alpha] of [
      [null, 0.382683, 1.414214],
      [20, 0.39015, 1.28606],
      [15, 0.3927, 1.24445],
      [10, 0.397911, 1.1629],
      [7, 0.404814, 1.06132],
      [5, 0.4144, 0.93159],
      [3, 0.43864, 0.65428],
    ] as const) {
      const got = fixedAlignment("B4", ql)!;
      expectNear("Q_T", got.qt, qt, { absolute: ql === null ? 1e-6 : 1e-5 });
      expectNear("α", got.alpha, alpha, { absolute: ql === null ? 1e-6 : 1e-5 });
      expectNear("h", got.h, 1, { absolute: 1e-12 });
    }
  });
  it("BE4 without leakage [C] (row 17)", () => {
    const got = fixedAlignment("BE4", null)!;
    expectNear("Q_T", got.qt, 1 / Math.sqrt(10), { relative: 1e-12 });
    expectNear("α", got.alpha, 7 / 3, { relative: 1e-12 });
    expectNear("h", got.h, 10 / Math.sqrt(105), { relative: 1e-12 });
    expectNear("f3", got.f3, 1.4959, { digit: 1e-4 });
  });
  it("peak of C4 at k 0.5 [C] (row 19)", () =>
    expectNear("peak", chebyshevPeak(0.5), 0.21448, { digit: 1e-5 }));
  it("largest efficiency constant over C4 [M+C] (row 48)", () => {
    const constants = Array.from({ length: 40 }, (_, i) => {
      const got = alignmentFor("C4", 0.4 + 0.005 * i, null)!;
      return (((4 * Math.PI ** 2) / 345 ** 3) * got.alpha) / (got.qt * got.f3 ** 3);
    });
    expectNear("k_η", Math.max(...constants), 3.93e-6, { relative: 1e-2 });
  });
});

describe("Thiele's table recomputed, 2.2 [C]", () => {
  it.each([
    ["QB3", 0.209, 2.2738, 1.7298, 7.4543, 0],
    ["QB3", 0.259, 1.7721, 1.4133, 4.4563, 0],
    ["QB3", 0.303, 1.4481, 1.2244, 2.9469, 0],
    ["C4", 0.415, 0.8663, 0.9277, 1.0528, 0.003],
    ["C4", 0.466, 0.726, 0.827, 0.7243, 0.071],
    ["C4", 0.518, 0.6414, 0.7553, 0.5578, 0.277],
    ["C4", 0.557, 0.6001, 0.7177, 0.4858, 0.509],
  ] as const)("%s %s", (family, qt, f3, h, alpha, peak) => {
    const got = alignmentFor(family, qt, null)!;
    expectNear("f3", got.f3, f3, { digit: 1e-4 });
    expectNear("h", got.h, h, { digit: 1e-4 });
    expectNear("α", got.alpha, alpha, { digit: 1e-4 });
    expectNear("peak", got.peak_db, peak, { digit: 1e-3 });
  });
});

describe("sixth-order Butterworth, 7 [C] (rows 69, 70)", () => {
  it.each([
    [1, 1.9319, 0.2989, 2.7321, 0.3122, 2.2744],
    [2, 0.7071, 0.4082, 1, 0.4335, 0.6705],
    [3, 0.5176, 0.5176, 0.7321, 0.559, 0.4765],
  ] as const)("class %s", (kind, section, qt, alpha, qt7, alpha7) => {
    const [lossless, leaky] = [sixthOrderButterworth(kind, null)!, sixthOrderButterworth(kind, 7)!];
    expectNear("section", lossless.sectionQ, section, { digit: 1e-4 });
    expectNear("Q_T", lossless.qt, qt, { digit: 1e-4 });
    expectNear("α", lossless.alpha, alpha, { digit: 1e-4 });
    expectNear("Q_T, Q_L 7", leaky.qt, qt7, { digit: 1e-4 });
    expectNear("α, Q_L 7", leaky.alpha, alpha7, { digit: 1e-4 });
  });
});

describe("families end where they must", () => {
  it("QB3 and SC4 below the Q_T of B4, C4 above", () => {
    expect(alignmentFor("QB3", 0.41, 7)).toBeNull();
    expect(alignmentFor("SC4", 0.41, 7)).toBeNull();
    expect(alignmentFor("C4", 0.4, 7)).toBeNull();
    expect(alignmentFor("C4", 0.41, 7)).not.toBeNull();
  });
  it("at its end QB3 and C4 meet in B4", () => {
    const b4 = fixedAlignment("B4", 7)!;
    for (const family of ["QB3", "C4"] as const) {
      const near = alignmentFor(family, b4.qt * (family === "C4" ? 1.00001 : 0.99999), 7)!;
      expectNear(family, near.alpha, b4.alpha, { relative: 1e-4 });
      expectNear(family, near.h, 1, { relative: 1e-4 });
    }
  });
});

describe("boxes for a driver", () => {
  const of = (figures: object, ql = 7) => suggestBoxes(driverSchema.parse(figures), { ql });
  it("the tutorial's driver, 4.4 [C] (row 57)", () => {
    const [flat] = of({
      fs_hz: 21.973,
      qes: 0.33062,
      qms: 3.3179,
      vas_m3: 0.34094,
      re_ohm: 7,
      sd_m2: 0.045239,
    });
    expect(flat!.alignment).toBe("QB3");
    expectNear("V_B", flat!.net_volume_m3, 0.12056, { relative: 1e-4 });
    expectNear("f_B", flat!.tuning_hz!, 28.825, { relative: 1e-4 });
    expectNear("f_3", flat!.f3_hz, 34.47, { relative: 1e-4 });
  });
  it("after Small's Part III, 4.5 [C] (row 58)", () => {
    const driver = { fs_hz: 33, qes: 0.45, qms: 2, vas_m3: 0.057, re_ohm: 6, sd_m2: 0.02 };
    const [flat] = of(driver);
    expectNear("V_B", flat!.net_volume_m3, 0.0373, { digit: 1e-4 });
    expectNear("f_B", flat!.tuning_hz!, 35.99, { digit: 0.01 });
    expectNear("f_3", flat!.f3_hz, 38.89, { digit: 0.01 });
    const air = airProperties(smallsAir);
    const efficiency = referenceEfficiency(mechanicalFrom(driver, air), air);
    expectNear("η", efficiency, 0.00438, { digit: 1e-5 });
  });
  it("a textbook's driver, 4.7 [C]: QB3, SC4 and SBB4", () => {
    const boxes = of({ fs_hz: 30, qes: 0.35, qms: 2.75, vas_m3: 0.1, re_ohm: 6, sd_m2: 0.03 });
    for (const [alignment, f3, tuning] of [
      ["QB3", 45.12, 38.19],
      ["SC4", 48.31, 33.22],
      ["SBB4", 50.63, 30],
    ] as const) {
      const box = boxes.find((one) => one.alignment === alignment)!;
      expectNear(`${alignment} f3`, box.f3_hz, f3, { digit: 0.01 });
      expectNear(`${alignment} f_B`, box.tuning_hz!, tuning, { digit: 0.01 });
    }
  });
  it("a source resistance raises Q_T (1.3: 0.3 Ω on System A, 0.3801)", () => {
    const driver = driverSchema.parse({
      fs_hz: 30,
      qes: 0.4,
      qms: 4,
      vas_m3: 0.1,
      re_ohm: 6,
      sd_m2: 0.035,
    });
    const [got] = suggestBoxes(driver, { ql: null, source_resistance_ohm: 0.3 });
    const expected = alignmentFor("QB3", 0.3801, null)!;
    expectNear("V_B", got!.net_volume_m3, 0.1 / expected.alpha, { relative: 5e-4 });
  });
  it("two drivers want twice the box", () => {
    const one = { fs_hz: 30, qes: 0.4, qms: 4, vas_m3: 0.1, re_ohm: 6, sd_m2: 0.035 };
    const [single, pair] = [of(one), of({ ...one, count: 2 })];
    expectNear("V_B", pair[0]!.net_volume_m3, 2 * single[0]!.net_volume_m3, { relative: 1e-12 });
    expectNear("f_B", pair[0]!.tuning_hz!, single[0]!.tuning_hz!, { relative: 1e-12 });
  });
});
