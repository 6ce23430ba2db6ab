import { describe, expect, it } from "vitest";
import { tuningOf, tuningTolerance } from "@/lib/acoustics";
import { denSub } from "@/lib/document/samples";
import { designSchema } from "@/lib/document/schema";

const den = designSchema.parse(denSub);
const nothing = {
  net_volume: 0,
  bore_m: 0,
  tube_length_m: 0,
  sheet_thickness_m: 0,
  glue_line_m: 0,
  temperature_c: 0,
};
const lumped = designSchema.parse({
  format: 1,
  air: { density_kg_m3: 1.2, speed_of_sound_m_s: 343 },
  enclosure: { net_volume_m3: 0.06, panel_thickness_m: 0.018 },
  vents: [{ lumped: { inertance_kg_m4: 50, area_m2: 0.008 } }],
});

describe("tolerance of the tuning", () => {
  it("1 % of the volume is ½ % of a Helmholtz resonance, downwards", () => {
    const { tuning_hz, sd_hz, causes } = tuningTolerance(lumped, { ...nothing, net_volume: 0.01 })!;
    expect(sd_hz / tuning_hz).toBeCloseTo(0.005, 6);
    expect(causes).toEqual([{ cause: "net volume", effect_hz: -sd_hz, share: 1 }]);
  });
  it("bare elements in given air have no bore, length or temperature to vary", () => {
    expect(tuningTolerance(lumped)!.causes.map(({ cause }) => cause)).toEqual(["net volume"]);
  });
  it("the speed of sound grows by 0.17 % per kelvin at 20 °C, and the tuning with it", () => {
    const { tuning_hz, sd_hz } = tuningTolerance(den, { ...nothing, temperature_c: 1 })!;
    expect(sd_hz / tuning_hz).toBeGreaterThan(0.0016);
    expect(sd_hz / tuning_hz).toBeLessThan(0.0019);
  });
  it("a sheet's thickness moves all its rings and plates together", () => {
    const { causes } = tuningTolerance(den, { ...nothing, sheet_thickness_m: 0.0002 })!;
    const grown = structuredClone(den);
    for (const piece of (grown.vents[0] as { pieces: { kind: string; thickness_m?: number }[] })
      .pieces)
      if (piece.thickness_m !== undefined) piece.thickness_m += 0.0002;
    const expected = tuningOf(grown)! - tuningOf(den)!;
    expect(causes[0]!.cause).toBe("sheet thickness");
    expect(causes[0]!.effect_hz / expected).toBeCloseTo(1, 2);
  });
  it("six glue lines err independently: √6 of one", () => {
    const { sd_hz } = tuningTolerance(den, { ...nothing, glue_line_m: 0.0001 })!;
    const together = tuningTolerance(den, { ...nothing, sheet_thickness_m: 0.0001 })!.sd_hz;
    expect(sd_hz / together).toBeCloseTo(1 / Math.sqrt(6), 3);
  });
  it("causes are ranked, their shares make one, and the variances add", () => {
    const { causes, sd_hz } = tuningTolerance(den)!;
    const shares = causes.map(({ share }) => share);
    expect([...shares].sort((a, b) => b - a)).toEqual(shares);
    expect(shares.reduce((sum, share) => sum + share, 0)).toBeCloseTo(1, 12);
    const variance = causes.reduce((sum, { effect_hz }) => sum + effect_hz ** 2, 0);
    expect(sd_hz ** 2).toBeCloseTo(variance, 12);
  });
  it("none without a vent", () => expect(tuningTolerance({ ...lumped, vents: [] })).toBeNull());
});
