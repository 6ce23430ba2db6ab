/** The command line as its users run it: another process, JSON in, JSON out. */
import { spawn } from "node:child_process";
import { fileURLToPath } from "node:url";
import { describe, expect, it } from "vitest";
import { denSub } from "@/lib/document/samples";

const root = fileURLToPath(new URL("../../..", import.meta.url));

function run(args: string[], input: string) {
  return new Promise<{ code: number | null; out: string; err: string }>((resolve, reject) => {
    const child = spawn("node_modules/.bin/tsx", ["scripts/ventwright.ts", ...args], { cwd: root });
    let out = "";
    let err = "";
    child.stdout.on("data", (chunk: Buffer) => (out += chunk.toString()));
    child.stderr.on("data", (chunk: Buffer) => (err += chunk.toString()));
    child.stdin.on("error", () => undefined);
    child.on("error", reject);
    child.on("close", (code) => resolve({ code, out, err }));
    child.stdin.end(input);
  });
}

describe("ventwright", { timeout: 30_000 }, () => {
  it("answers: exit 0, JSON on standard output, nothing on standard error", async () => {
    const { code, out, err } = await run(["evaluate"], JSON.stringify({ design: denSub }));
    expect({ code, err }).toEqual({ code: 0, err: "" });
    const answer = JSON.parse(out) as object;
    expect(Object.keys(answer)).toEqual(["air", "driver", "tuning_hz", "vents", "curves", "notes"]);
  });

  it.each([
    ["no JSON", ["evaluate"], "{", "bad_json"],
    ["nothing", ["jig"], "", "bad_json"],
    ["an unknown command", ["template"], "{}", "unknown_command"],
    ["no command", [], "{}", "unknown_command"],
    ["a field out of range", ["jig"], '{"bore_m":9}', "out_of_range"],
    [
      "a refusal of the library",
      ["length"],
      JSON.stringify({ design: denSub, tuning_hz: 900 }),
      "tuning_out_of_reach",
    ],
  ])("%s: exit 2, one line on standard error alone", async (_, args, input, expected) => {
    const { code, out, err } = await run(args, input);
    expect({ code, out }).toEqual({ code: 2, out: "" });
    expect(err.trimEnd()).not.toContain("\n");
    const { error } = JSON.parse(err) as { error: Record<string, unknown> };
    expect(error.code).toBe(expected);
    expect(Object.keys(error).sort()).toEqual(["allowed", "code", "message", "path"]);
  });
});
