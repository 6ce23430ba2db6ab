import { describe, expect, it } from "vitest";
import { InputError } from "@/lib/acoustics/input-error";
import { tuningOf } from "@/lib/acoustics/tuning";
import { denSub, hallTwelve } from "@/lib/document/samples";
import { designSchema, type Design } from "@/lib/document/schema";
import { ledgerOf, netFromGross } from "@/lib/workshop/ledger";

/** A box whose vent's envelope is plain: a tube of 60 mm outside, 100 mm of it inside the panel. */
const plain: Design = designSchema.parse({
  format: 1,
  driver: {
    count: 2,
    fs_hz: 30,
    qes: 0.4,
    qms: 5,
    vas_m3: 0.03,
    re_ohm: 5,
    sd_m2: 0.02,
    displacement_m3: 0.0012,
  },
  enclosure: {
    net_volume_m3: 0.03,
    inside_m: { width: 0.3, height: 0.4, depth: 0.3 },
    panel_thickness_m: 0.018,
  },
  vents: [
    {
      name: "Port",
      count: 2,
      bore: { shape: "round", diameter_m: 0.054 },
      pieces: [{ kind: "tube", length_m: 0.118, outer_diameter_m: 0.06 }],
    },
  ],
});

describe("ledgerOf", () => {
  it("takes drivers, vents and braces off the gross inside", () => {
    const ledger = ledgerOf(plain, { braces_m3: 0.0008 })!;
    const vent = Math.PI * 0.03 ** 2 * 0.1;
    expect(ledger.lines.map(({ kind, name }) => [kind, name])).toEqual([
      ["gross", "Gross inside"],
      ["driver", "Driver × 2"],
      ["vent", "Port × 2"],
      ["braces", "Braces"],
    ]);
    expect(ledger.lines[2]!.volume_m3 / (-2 * vent)).toBeCloseTo(1, 9);
    const net = 0.036 - 0.0024 - 2 * vent - 0.0008;
    expect(ledger.net_volume_m3 / net).toBeCloseTo(1, 9);
    expect(ledger.excess_m3 / (0.03 - net)).toBeCloseTo(1, 6);
  });

  it("is none where the inside is not given", () => {
    const open = { ...plain, enclosure: { ...plain.enclosure, inside_m: null } };
    expect(ledgerOf(open)).toBeNull();
    expect(() => netFromGross(open, 0, 40)).toThrow(InputError);
  });
});

describe("netFromGross", () => {
  it.each([
    [denSub, 32],
    [hallTwelve, 29],
  ])("closes the loop between vent and volume", (input, tuning_hz) => {
    const closed = netFromGross(designSchema.parse(input), 0, tuning_hz);
    const ledger = ledgerOf(closed)!;
    expect(Math.abs(ledger.excess_m3) / closed.enclosure.net_volume_m3).toBeLessThan(1e-7);
    expect(tuningOf(closed)! / tuning_hz).toBeCloseTo(1, 6);
  });

  it("only sets the volume where no tuning is asked for", () => {
    const closed = netFromGross(plain, 0, null);
    expect(closed.vents).toEqual(plain.vents);
    expect(closed.enclosure.net_volume_m3).not.toBe(plain.enclosure.net_volume_m3);
    expect(ledgerOf(closed)!.excess_m3).toBeCloseTo(0, 12);
  });

  it("says so where nothing is left", () => {
    expect(() => netFromGross(plain, 0, null, { braces_m3: 0.05 })).toThrow(/take up all/);
  });
});
