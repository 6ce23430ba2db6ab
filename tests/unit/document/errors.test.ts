import { describe, expect, it } from "vitest";
import { parseDocument } from "@/lib/document/errors";
import { evaluateRequestSchema, jigRequestSchema } from "@/lib/document/requests";

const enclosure = { net_volume_m3: 0.06, panel_thickness_m: 0.018 };
const vent = {
  bore: { shape: "round", diameter_m: 0.1 },
  pieces: [{ kind: "tube", length_m: 0.2 }],
};
const driver = { fs_hz: 28, qes: 0.45, qms: 7.2, vas_m3: 0.062, re_ohm: 3.6, sd_m2: 0.0346 };

function refusalOf(design: object, rest: object = {}) {
  const input = { design: { format: 1, enclosure, vents: [vent], ...design }, ...rest };
  const parsed = parseDocument(evaluateRequestSchema, JSON.parse(JSON.stringify(input)));
  if (parsed.ok) throw new Error("It was accepted.");
  return parsed.refusal;
}

describe("a refusal names the place, the range and the unit", () => {
  it.each([
    [
      { vents: [{ ...vent, bore: { shape: "round", diameter_m: 9 } }] },
      "out_of_range",
      "design.vents[0].bore.diameter_m",
      "0.005 to 2 m",
    ],
    [
      { enclosure: { ...enclosure, ql: 0.001 } },
      "out_of_range",
      "design.enclosure.ql",
      "0.01 to 100, or null",
    ],
    [
      { driver: { ...driver, xmax_m: 0 } },
      "out_of_range",
      "design.driver.xmax_m",
      "more than 0 and at most 0.2 m",
    ],
    [
      { driver: { ...driver, count: 2.5 } },
      "wrong_type",
      "design.driver.count",
      "a whole number, 1 to 64",
    ],
    [
      { enclosure: { ...enclosure, inside_m: { width: -1, height: 1, depth: 1 } } },
      "out_of_range",
      "design.enclosure.inside_m.width",
      "more than 0 and at most 10 m",
    ],
    [{ air: { temperature_c: 99 } }, "out_of_range", "design.air.temperature_c", "-40 to 80 °C"],
    [{ format: 2 }, "not_allowed", "design.format", "1"],
    [{ name: 7 }, "wrong_type", "design.name", "a text of 0 to 200 characters"],
    [{ driver: "big" }, "wrong_type", "design.driver", "an object with"],
    [{ vents: Array(17).fill(vent) }, "out_of_range", "design.vents", "a list of 0 to 16 entries"],
    [{ drive: { voltage_v: "35" } }, "wrong_type", "design.drive.voltage_v", "0 to 2000 V"],
  ])("%o", (design, code, path, allowed) => {
    const refusal = refusalOf(design);
    expect(refusal).toMatchObject({ code, path });
    expect(refusal.allowed).toContain(allowed);
    expect(refusal.message.length).toBeGreaterThan(5);
  });

  it("frequencies: each, and how many", () => {
    expect(refusalOf({}, { frequency_hz: [20, -3] })).toMatchObject({
      path: "frequency_hz[1]",
      allowed: "0.1 to 100000 Hz",
    });
    expect(refusalOf({}, { frequency_hz: Array(5001).fill(20) })).toMatchObject({
      path: "frequency_hz",
      allowed: "a list of 1 to 5000 entries",
    });
  });

  it("what is missing is asked for with its range", () => {
    expect(refusalOf({ enclosure: { net_volume_m3: 0.06 } })).toEqual({
      code: "missing",
      path: "design.enclosure.panel_thickness_m",
      message: "design.enclosure.panel_thickness_m is missing.",
      allowed: "0.0005 to 0.5 m",
    });
  });

  it("a misspelt name is named before what it leaves missing", () => {
    const refusal = refusalOf({ enclosure: { net_volume_m3: 0.06, panel_thicknes_m: 0.018 } });
    expect(refusal).toMatchObject({
      code: "unknown_field",
      path: "design.enclosure.panel_thicknes_m",
    });
    expect(refusal.allowed).toContain("panel_thickness_m");
  });

  it("a rule across fields speaks for itself", () => {
    expect(refusalOf({ driver: { ...driver, l2_h: 0.001 } })).toMatchObject({
      code: "invalid",
      path: "design.driver.r2_ohm",
    });
    const rings = { kind: "rings", count: 60, thickness_m: 0.018, outer_diameter_m: 0.16 };
    const tooMany = { ...vent, pieces: [rings, rings] };
    expect(refusalOf({ vents: [tooMany] }).message).toContain("100 rings");
  });
});

describe("unions are read as they were meant", () => {
  it("bare elements where `lumped` is there", () => {
    const refusal = refusalOf({
      vents: [vent, { lumped: { inertance_kg_m4: -1, area_m2: 0.01 } }],
    });
    expect(refusal.path).toBe("design.vents[1].lumped.inertance_kg_m4");
  });
  it("an airway where it is not", () => {
    const refusal = refusalOf({ vents: [{ ...vent, bore: { shape: "oval" } }] });
    expect(refusal).toMatchObject({
      path: "design.vents[0].bore.shape",
      allowed: "round or slot",
    });
  });
  it("both at once are one too many", () => {
    const refusal = refusalOf({
      vents: [{ ...vent, lumped: { inertance_kg_m4: 40, area_m2: 0.01 } }],
    });
    expect(refusal.code).toBe("unknown_field");
  });
  it("air given outright where its density or speed is there", () => {
    expect(refusalOf({ air: { density_kg_m3: 1.2 } })).toMatchObject({
      code: "missing",
      path: "design.air.speed_of_sound_m_s",
      allowed: "250 to 450 m/s",
    });
    expect(
      refusalOf({ air: { density_kg_m3: 1.2, speed_of_sound_m_s: 343, temperature_c: 20 } }),
    ).toMatchObject({ code: "unknown_field", path: "design.air.temperature_c" });
  });
  it("the kind of a piece", () => {
    const refusal = refusalOf({
      vents: [{ ...vent, pieces: [{ kind: "plate", thickness_m: 0.018 }] }],
    });
    expect(refusal).toMatchObject({
      code: "missing",
      path: "design.vents[0].pieces[0].outer_diameter_m",
    });
  });
});

describe("what is no number at all", () => {
  it("JSON's 1e999 is refused as not finite", () => {
    const input = JSON.parse('{"bore_m":1e999,"outer_diameter_m":0.2,"bit_diameter_m":0.008}');
    const parsed = parseDocument(jigRequestSchema, input);
    expect(parsed).toMatchObject({ ok: false, refusal: { code: "wrong_type", path: "bore_m" } });
  });
  it.each([[null], [[]], ["x"], [3], [undefined]])("a request of %o", (input) => {
    const parsed = parseDocument(jigRequestSchema, input);
    expect(parsed).toMatchObject({ ok: false, refusal: { path: "" } });
  });
});
