/** Filters against the closed forms. Source: vented-box dossier 7, row 66 of its section 11 [C]. */
import { describe, it } from "vitest";
import { butterworthQ, evaluate, filterGain } from "@/lib/acoustics";
import type { Filter } from "@/lib/document/schema";
import { near } from "../near";
import { systemA } from "../vented-box/system-a";

const expectNear = near("filters");

const gain = (filter: Filter, ratio: number) => {
  const omega = Float64Array.of(2 * Math.PI * filter.frequency_hz * ratio);
  const { re, im } = filterGain([filter], omega);
  return {
    decibels: 20 * Math.log10(Math.hypot(re[0]!, im[0]!)),
    angle: Math.atan2(im[0]!, re[0]!),
  };
};

const highpass = (family: Filter["family"], order: number, q?: number): Filter => ({
  kind: "highpass",
  family,
  order,
  frequency_hz: 24,
  q,
});

describe("section Qs", () => {
  it.each([
    [2, [0.7071]],
    [4, [1.306563, 0.541196]],
    [6, [1.931852, 0.707107, 0.517638]],
  ])("Butterworth of order %s", (order, expected) => {
    const digit = order === 2 ? 1e-4 : 1e-6;
    expected.forEach((q, i) => expectNear("Q", butterworthQ(order)[i]!, q, { digit }));
  });
});

describe("high-pass gain [dB]", () => {
  const kinds = [
    highpass("butterworth", 2),
    highpass("butterworth", 4),
    highpass("linkwitz-riley", 2),
    highpass("linkwitz-riley", 4),
    highpass("butterworth", 6),
  ];
  it.each([
    [0.25, [-24.099, -48.165, -24.609, -48.199, -72.247]],
    [0.5, [-12.305, -24.099, -13.979, -24.609, -36.125]],
    [1, [-3.01, -3.01, -6.021, -6.021, -3.01]],
    [2, [-0.263, -0.017, -1.938, -0.527, -0.001]],
  ])("at %s f_0", (ratio, expected) =>
    kinds.forEach((filter, i) =>
      expectNear(`${filter.family} ${filter.order}`, gain(filter, ratio).decibels, expected[i]!, {
        digit: 1e-3,
      }),
    ),
  );

  it("a low-pass is its mirror image", () => {
    for (const filter of [...kinds, highpass("butterworth", 3), highpass("linkwitz-riley", 6)]) {
      const low: Filter = { ...filter, kind: "lowpass" };
      const [up, down] = [gain(filter, 0.6), gain(low, 1 / 0.6)];
      expectNear("gain", down.decibels, up.decibels, { relative: 1e-9 });
      expectNear("angle", down.angle, -up.angle, { relative: 1e-9 });
    }
  });

  it("odd orders: |H|² = x^2n / (1 + x^2n)", () => {
    for (const order of [1, 3, 5, 7]) {
      const x = 0.7 ** (2 * order);
      const expected = 10 * Math.log10(x / (1 + x));
      expectNear(`order ${order}`, gain(highpass("butterworth", order), 0.7).decibels, expected, {
        relative: 1e-9,
      });
    }
  });

  it("a resonant section of Q 1.9319", () => {
    const section = highpass("resonant", 2, 1.9319);
    expectNear("at f_0", gain(section, 1).decibels, 5.72, { digit: 1e-3 });
    expectNear("at its peak", gain(section, 1.0746).decibels, 6.021, { digit: 1e-3 });
  });
});

describe("in the system they act on the voltage only", () => {
  it("level, excursion and air speed change by the gain, impedance stays", () => {
    const filter = highpass("butterworth", 4);
    const at = { frequency_hz: [12] };
    const bare = evaluate(systemA({ ql: 7 }), at).curves!;
    const filtered = evaluate(systemA({ ql: 7 }, { filters: [filter] }), at).curves!;
    expectNear("level", filtered.spl_db[0]! - bare.spl_db[0]!, -24.099, { digit: 1e-3 });
    const ratio = filtered.excursion_peak_m[0]! / bare.excursion_peak_m[0]!;
    expectNear("excursion", 20 * Math.log10(ratio), -24.099, { digit: 1e-3 });
    expectNear("impedance", filtered.impedance_ohm[0]!, bare.impedance_ohm[0]!, {
      relative: 1e-12,
    });
  });
});
