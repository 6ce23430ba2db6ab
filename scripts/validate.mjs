/** Format, lint with its layer rules, types. Every fault is shown before the script fails. */
import { spawnSync } from "node:child_process";
import { join } from "node:path";
import { next, projectRoot, requirePackages } from "./shell.mjs";

requirePackages();
const program = (name, path) => [process.execPath, join(projectRoot, "node_modules", name, path)];
const steps = [
  ["format", ...program("prettier", "bin/prettier.cjs"), "--check", "--log-level=warn", "."],
  ["lint", ...program("eslint", "bin/eslint.js"), "--max-warnings=0", "."],
  ["route types", process.execPath, next, "typegen"],
  ["types", ...program("typescript", "bin/tsc"), "--noEmit"],
  ["pure acoustics", ...program("typescript", "bin/tsc"), "-p", "lib/acoustics/tsconfig.json"],
];
let failed = 0;
for (const [name, command, ...args] of steps) {
  const done = spawnSync(command, args, {
    cwd: projectRoot,
    stdio: ["ignore", "inherit", "inherit"],
    env: { ...process.env, NEXT_TELEMETRY_DISABLED: "1" },
  });
  console.log(`${done.status === 0 ? "ok    " : "FAILED"} ${name}`);
  if (done.status !== 0) failed++;
}
process.exit(failed > 0 ? 1 : 0);
