/**
 * Every test, on a throwaway database and a throwaway server. `npm test -- unit reference` runs
 * parts. The last line counts them all.
 */
import { existsSync, mkdirSync, mkdtempSync, readFileSync, rmSync } from "node:fs";
import { spawn } from "node:child_process";
import { dirname, join } from "node:path";
import {
  fail,
  isRoot,
  next,
  projectRoot,
  requireBuild,
  requirePackages,
  run,
  say,
  start,
  tsx,
  untilHealthy,
} from "./shell.mjs";

process.env.NEXT_TELEMETRY_DISABLED = "1";
const PARTS = ["validate", "unit", "reference", "integration", "e2e"];
const asked = process.argv.slice(2);
const unknown = asked.filter((part) => !PARTS.includes(part));
if (unknown.length > 0)
  fail(`There is no part called ${unknown.join(", ")}. Parts: ${PARTS.join(", ")}.`);
const parts = asked.length > 0 ? asked : PARTS;

requirePackages();
const { freePort, makeDatabase, newPassword, startCluster, throwawayFolder } =
  await import("./database.mjs");

const results = mkdtempSync(join(process.env.TMPDIR ?? "/tmp", "ventwright-results-"));
const stops = [() => rmSync(results, { recursive: true, force: true })];
let stopped = false;
function stopAll() {
  if (stopped) return;
  stopped = true;
  for (const stop of stops.reverse()) stop();
}
for (const signal of ["SIGINT", "SIGTERM", "SIGHUP"])
  process.on(signal, () => {
    stopAll();
    process.exit(130);
  });
process.on("exit", stopAll);

let passed = 0;
let failed = 0;

/** Runs a command to its end; its output is seen as it comes. */
function ended(command, args, env) {
  return new Promise((resolve) => {
    const child = spawn(command, args, { cwd: projectRoot, stdio: "inherit", env });
    child.on("exit", (code) => resolve(code ?? 1));
  });
}

const needsDatabase = parts.includes("integration") || parts.includes("e2e");
const cluster = needsDatabase ? await throwawayCluster() : null;
const environment = {
  ...process.env,
  SESSION_SECRET: newPassword() + newPassword(),
  BCRYPT_COST: "4",
  LOG_LEVEL: "error",
  // Far from everyone's habits, so that nothing rests on them.
  TZ: "Pacific/Chatham",
  LC_ALL: "C.UTF-8",
  ...(cluster ? { DATABASE_URL: cluster.url("template") } : {}),
};

if (parts.includes("validate")) {
  const code = await ended(process.execPath, ["scripts/validate.mjs"], process.env);
  count(code === 0 ? 1 : 0, code === 0 ? 0 : 1);
}
const projects = parts.filter((part) => ["unit", "reference", "integration"].includes(part));
if (projects.length > 0) await vitest(projects);
if (parts.includes("e2e")) await endToEnd();
stopAll();
console.log(`${passed} passed, ${failed} failed`);
process.exit(failed > 0 || passed === 0 ? 1 : 0);

function count(good, bad) {
  passed += good;
  failed += bad;
}

async function throwawayCluster() {
  const folder = throwawayFolder();
  stops.push(() => rmSync(dirname(folder), { recursive: true, force: true }));
  const made = await startCluster({ folder, password: newPassword(), durable: false });
  stops.push(() => made.stop());
  return made;
}

async function vitest(names) {
  const file = join(results, "vitest.json");
  const program = join(projectRoot, "node_modules", "vitest", "vitest.mjs");
  const code = await ended(
    process.execPath,
    [
      program,
      "run",
      ...names.flatMap((name) => ["--project", name]),
      "--reporter=dot",
      "--reporter=./tests/reference/summary-reporter.ts",
      "--reporter=json",
      `--outputFile.json=${file}`,
    ],
    { ...environment, NODE_ENV: "test" },
  );
  const report = existsSync(file) ? JSON.parse(readFileSync(file, "utf8")) : null;
  const good = report?.numPassedTests ?? 0;
  const bad = report?.numFailedTests ?? 0;
  // A file that could not even be loaded has no failed test in it, yet it failed.
  count(good, bad === 0 && code !== 0 ? 1 : bad);
}

async function endToEnd() {
  requireChromium();
  requireBuild();
  await makeDatabase(cluster, "e2e");
  const port = await freePort();
  const address = `http://127.0.0.1:${port}`;
  const env = {
    ...environment,
    NODE_ENV: "production",
    DATABASE_URL: cluster.url("e2e"),
  };
  run(process.execPath, [...tsx, "db/prepare.ts", "--seed"], { env });
  const server = start(process.execPath, [next, "start", "-H", "127.0.0.1", "-p", String(port)], {
    env,
  });
  stops.push(() => server.kill("SIGTERM"));
  if (!(await untilHealthy(address, server))) {
    say("The server for the end-to-end tests did not start.");
    return count(0, 1);
  }
  const file = join(results, "playwright.json");
  const code = await ended(
    process.execPath,
    [join(projectRoot, "node_modules", "@playwright", "test", "cli.js"), "test"],
    { ...process.env, BASE_URL: address, PLAYWRIGHT_JSON_OUTPUT_NAME: file },
  );
  const stats = existsSync(file) ? JSON.parse(readFileSync(file, "utf8")).stats : null;
  const bad = (stats?.unexpected ?? 0) + (stats?.flaky ?? 0);
  count(stats?.expected ?? 0, bad === 0 && code !== 0 ? 1 : bad);
  server.kill("SIGTERM");
}

function requireChromium() {
  if (existsSync("/usr/bin/chromium")) return;
  if (!isRoot) fail("Chromium is not installed. Run this once:\n  sudo apt-get install chromium");
  say("Installing Chromium from Debian's packages …");
  mkdirSync("/var/lib/apt/lists", { recursive: true });
  run("apt-get", ["update", "-qq"]);
  run("apt-get", ["install", "-y", "-qq", "--no-install-recommends", "chromium"], {
    env: { ...process.env, DEBIAN_FRONTEND: "noninteractive" },
  });
}
