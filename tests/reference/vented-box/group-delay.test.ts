/**
 * Group delay without the path. Source: vented-box dossier 9, rows 78 and 80 of its section 11 [C].
 * A B4 box at 30 Hz: f_S = f_B = 30, Q_T 0.382683, α √2, no losses.
 */
import { describe, expect, it } from "vitest";
import { evaluate } from "@/lib/acoustics";
import { designSchema } from "@/lib/document/schema";
import { near } from "../near";
import { smallsAir } from "./system-a";

const expectNear = near("group delay");

const volume = 0.1 / Math.SQRT2;
const compliance = volume / (1.18 * 345 ** 2);
const qt = 1 / Math.sqrt(4 + 2 * Math.SQRT2);
const b4 = designSchema.parse({
  format: 1,
  air: smallsAir,
  driver: { fs_hz: 30, qms: 10, qes: 1 / (1 / qt - 1 / 10), vas_m3: 0.1, re_ohm: 6, sd_m2: 0.035 },
  enclosure: { net_volume_m3: volume, panel_thickness_m: 0.018 },
  vents: [
    { lumped: { inertance_kg_m4: 1 / ((2 * Math.PI * 30) ** 2 * compliance), area_m2: 0.008 } },
  ],
});
const delay = (frequency_hz: number[]) => evaluate(b4, { frequency_hz }).curves!.group_delay_s;

describe("B4 at 30 Hz", () => {
  it.each([
    [20, 18.062],
    [25, 20.496],
    [30, 19.605],
    [40, 10.93],
    [60, 3.953],
    [100, 1.299],
  ])("%s Hz: %s ms", (frequency, expected) =>
    expectNear("delay", 1000 * delay([frequency])[0]!, expected, { digit: 1e-3 }),
  );
  it("maximum 0.6222 cycles at 0.888 f_3", () => {
    const frequencies = Array.from({ length: 400 }, (_, i) => 25 + 0.01 * i);
    const delays = delay(frequencies);
    const most = Math.max(...delays);
    expectNear("delay", most * 30, 0.6222, { digit: 1e-4 });
    expectNear("where", frequencies[delays.indexOf(most)]! / 30, 0.888, { digit: 1e-3 });
  });
  it("does not depend on the caller's frequencies", () => {
    const [alone] = delay([31.4]);
    const [, among] = delay([400, 31.4, 12]);
    expect(among).toBe(alone);
  });
});
