import { describe, expect, it } from "vitest";
import { readSessionPreferences, writeSessionPreferences } from "@/lib/units/session-preferences";

describe("the preferences cookie", () => {
  it("reads what it wrote", () => {
    const kept = { system: "imperial", tape: 16, theme: "dark" } as const;
    expect(readSessionPreferences(writeSessionPreferences(kept))).toEqual(kept);
  });

  it("takes a default for each part it does not understand", () => {
    const plain = { system: "metric", tape: 32, theme: "system" };
    expect(readSessionPreferences(undefined)).toEqual(plain);
    expect(readSessionPreferences("imperial.17.<b>")).toEqual({ ...plain, system: "imperial" });
  });
});
