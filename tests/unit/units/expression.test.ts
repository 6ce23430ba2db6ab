import { describe, expect, it } from "vitest";
import { looksLikeExpression, parseExpression } from "@/lib/units/expression";
import type { QuantityKind, UnitPreferences } from "@/lib/units/preferences";

const metric: UnitPreferences = { system: "metric", tape: 32 };

async function value(text: string, kind: QuantityKind = "length"): Promise<number | string> {
  const parsed = await parseExpression(text, kind, metric);
  return parsed.ok ? parsed.value : parsed.message;
}

describe("parseExpression", () => {
  // By hand, with 25.4 mm to the inch and 0.3048 m to the foot.
  it.each([
    ["18 mm + 3/8 in", 0.027525],
    ["3/8 in + 18 mm", 0.027525],
    ["2 * 17.7 mm", 0.0354],
    ["2 × 17,7 mm", 0.0354],
    ["5 x 17.7 mm", 0.0885],
    ["2 * 17.7", 0.0354],
    ["(2 + 3) * 4 mm", 0.02],
    ['3/8" + 1/2"', 0.022225],
    ["1 1/2 in + 3 mm", 0.0411],
    ["120 mm − 5 mm", 0.115],
  ])("%s", async (text, expected) => {
    expect(await value(text)).toBeCloseTo(expected as number, 10);
  });

  it("reads volumes", async () => {
    // (60 L + 28.316846592 L) / 2
    expect(await value("0.5 * (60 L + 1 cu ft)", "volume")).toBeCloseTo(0.044158423296, 10);
    expect(await value("120mm*100mm*10mm", "volume")).toBeCloseTo(0.00012, 12);
  });

  it("refuses with a reason", async () => {
    expect(await value("18 mm + 3 L")).toBe("“18 mm + 3 L” mixes units that do not make a length.");
    expect(await value("import(1)+2")).toBe("The unit “import” is not known here.");
    expect(await value("18 mm + 2 * ")).toContain("not understood");
  });

  it("is worth loading only for more than one number", () => {
    expect(looksLikeExpression("18 mm")).toBe(false);
    expect(looksLikeExpression("18 mm + 3/8 in")).toBe(true);
  });
});
