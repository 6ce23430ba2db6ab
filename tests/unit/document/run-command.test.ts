import { describe, expect, it } from "vitest";
import { answerCommand } from "@/lib/document/answer-command";
import { designJsonSchema, requestJsonSchema } from "@/lib/document/json-schema";
import { unitOfPath } from "@/lib/document/name-units";
import { LARGEST_REQUEST } from "@/lib/document/requests";
import { parseJson, runCommand } from "@/lib/document/run-command";
import { demoDesigns, denSub } from "@/lib/document/samples";
import type { Answer } from "@/lib/acoustics";

describe("commands", () => {
  it.each(demoDesigns.map((design) => [design.name, design]))("evaluate %s", async (_, design) => {
    const result = await runCommand("evaluate", { design });
    if (!result.ok) throw new Error(result.refusal.message);
    const answer = result.answer as Answer;
    expect(answer.tuning_hz).toBeGreaterThan(20);
    expect(answer.vents).toHaveLength(1);
    if (answer.curves) expect(answer.curves.frequency_hz).toHaveLength(400);
  });

  it("length, rings and jig answer with the contract's names", async () => {
    const length = await runCommand("length", { design: denSub, vent: 0, tuning_hz: 33 });
    expect(length).toMatchObject({ ok: true, answer: { tuning_hz: expect.closeTo(33, 6) } });
    const rings = await runCommand("rings", {
      design: denSub,
      vent: 0,
      tuning_hz: 33,
      sheets: [{ name: "18 mm birch", thickness_m: 0.0177, thickness_sd_m: 0.0001 }],
      ring_outer_diameter_m: 0.16,
      glue_line_m: 0.0001,
      glue_line_sd_m: 0.00005,
    });
    if (!rings.ok) throw new Error(rings.refusal.message);
    const { plans } = rings.answer as { plans: object[] };
    expect(Object.keys(plans[0]!).sort()).toEqual(
      [
        "added_length_m",
        "error_hz",
        "overall_length_m",
        "reason",
        "rings",
        "trim_tube_m",
        "tuning_hz",
        "tuning_sd_hz",
      ].sort(),
    );
    const jig = await runCommand("jig", {
      bore_m: 0.102,
      outer_diameter_m: 0.152,
      bit_diameter_m: 0.008,
    });
    expect(jig).toMatchObject({
      answer: { inside: { pivot_to_bit_centre_m: expect.closeTo(0.047, 9) }, round_over: null },
    });
  });

  it("an unknown command and an unreachable tuning are refused", async () => {
    expect(await runCommand("evaluat", {})).toMatchObject({
      ok: false,
      refusal: { code: "unknown_command", allowed: "evaluate, length, rings, jig" },
    });
    const result = await runCommand("length", { design: denSub, vent: 0, tuning_hz: 900 });
    expect(result).toMatchObject({ ok: false, refusal: { code: "tuning_out_of_reach" } });
    if (!result.ok) expect(result.refusal.allowed).toMatch(/^[\d.]+ to [\d.]+ Hz$/);
  });

  it("text that is no JSON", () => {
    expect(parseJson("{")).toMatchObject({ ok: false, refusal: { code: "bad_json" } });
    expect(parseJson(" ")).toMatchObject({ refusal: { message: "The request is empty." } });
    expect(parseJson("[1]")).toEqual({ ok: true, value: [1] });
  });
});

describe("over HTTP", () => {
  const post = (body: string, headers: Record<string, string> = {}) =>
    answerCommand(
      "jig",
      new Request("http://localhost/api/jig", { method: "POST", body, headers }),
    );

  it("200 with the same answer as the command", async () => {
    const body = { bore_m: 0.102, outer_diameter_m: 0.152, bit_diameter_m: 0.008 };
    const response = await post(JSON.stringify(body));
    expect(response.status).toBe(200);
    const command = await runCommand("jig", body);
    expect({ ok: true, answer: await response.json() }).toEqual(command);
  });
  it("400, 413 and 422 with one body", async () => {
    for (const [body, status, code] of [
      ["{", 400, "bad_json"],
      [`"${"x".repeat(LARGEST_REQUEST)}"`, 413, "too_large"],
      ["{}", 422, "missing"],
    ] as const) {
      const response = await post(body);
      expect(response.status).toBe(status);
      const { error } = (await response.json()) as { error: object };
      expect(error).toMatchObject({ code });
      expect(Object.keys(error).sort()).toEqual(["allowed", "code", "message", "path"]);
    }
  });
  it("a declared length is believed before it is read", async () => {
    const response = await post("{}", { "content-length": String(LARGEST_REQUEST + 1) });
    expect(response.status).toBe(413);
  });
});

describe("JSON Schema and units", () => {
  it("comes from the one definition", () => {
    const schema = designJsonSchema();
    expect(schema.required).toEqual(["format", "enclosure"]);
    expect(schema.properties?.enclosure?.properties?.net_volume_m3).toMatchObject({
      type: "number",
      minimum: 1e-5,
      maximum: 100,
    });
    expect(requestJsonSchema("length").required).toEqual(["design", "tuning_hz"]);
  });
  it("units stand in the names", () => {
    expect(unitOfPath(["design", "enclosure", "inside_m", "width"])).toBe("m");
    expect(unitOfPath(["lumped", "inertance_kg_m4"])).toBe("kg/m⁴");
    expect(unitOfPath(["lumped", "resistance_pa_s_m3"])).toBe("Pa·s/m³");
    expect(unitOfPath(["target", "air_speed_limit_m_s"])).toBe("m/s");
    expect(unitOfPath(["frequency_hz", 3])).toBe("Hz");
    expect(unitOfPath(["enclosure", "ql"])).toBeNull();
  });
});
