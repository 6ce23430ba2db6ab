/** What the start and test scripts share: where the project is, how to run and how to stop. */
import { spawn, spawnSync } from "node:child_process";
import { createHash } from "node:crypto";
import { existsSync, readFileSync, readdirSync, statSync, writeFileSync } from "node:fs";
import { dirname, join } from "node:path";
import { fileURLToPath } from "node:url";

export const projectRoot = dirname(dirname(fileURLToPath(import.meta.url)));
export const isRoot = process.getuid?.() === 0;

export const say = (text) => console.log(text);

export function fail(text) {
  console.error(text);
  process.exit(1);
}

/** Runs a command to its end and stops everything where it fails. */
export function run(command, args, options = {}) {
  const done = spawnSync(command, args, { cwd: projectRoot, stdio: "inherit", ...options });
  if (done.error) fail(`${command} could not be run: ${done.error.message}`);
  if (done.status !== 0) fail(`${command} ${args.join(" ")} ended with ${done.status}.`);
}

/** The Next.js program, run by this very Node. */
export const next = join(projectRoot, "node_modules", "next", "dist", "bin", "next");
export const tsx = ["--import", "tsx", "--conditions=react-server"];

/** Installs packages where they are missing or the lock file has changed since. */
export function requirePackages() {
  const stamp = join(projectRoot, "node_modules", ".ventwright-lock");
  const lock = hashOf([join(projectRoot, "package-lock.json")]);
  if (existsSync(stamp) && readFileSync(stamp, "utf8") === lock) return;
  say("Installing packages …");
  run("npm", ["ci", "--include=dev", "--no-audit", "--no-fund", "--loglevel=error"]);
  writeFileSync(stamp, lock);
}

function hashOf(files) {
  const hash = createHash("sha256");
  for (const file of files) hash.update(file.slice(projectRoot.length)).update(readFileSync(file));
  return hash.digest("hex");
}

/** Everything a build depends on. */
const SOURCES = ["app", "components", "lib", "db", "public"];
const FILES = [
  "next.config.ts",
  "package-lock.json",
  "postcss.config.mjs",
  "proxy.ts",
  "tsconfig.json",
];

/** Builds where the sources have changed since the last build. */
export function requireBuild(distDir = ".next") {
  const files = [...SOURCES.flatMap((folder) => filesBelow(join(projectRoot, folder)))]
    .concat(FILES.map((name) => join(projectRoot, name)))
    .filter((file) => existsSync(file));
  const wanted = hashOf(files);
  const stamp = join(projectRoot, distDir, "ventwright-sources");
  if (existsSync(stamp) && readFileSync(stamp, "utf8") === wanted) return;
  say("Building …");
  run(process.execPath, [next, "build"], {
    env: {
      ...process.env,
      NODE_ENV: "production",
      NEXT_TELEMETRY_DISABLED: "1",
      NEXT_DIST_DIR: distDir,
    },
  });
  writeFileSync(stamp, wanted);
}

function filesBelow(folder) {
  if (!existsSync(folder)) return [];
  return readdirSync(folder)
    .sort()
    .flatMap((name) => {
      const path = join(folder, name);
      return statSync(path).isDirectory() ? filesBelow(path) : [path];
    });
}

/** Starts a process that lives until it is stopped. */
export function start(command, args, options = {}) {
  return spawn(command, args, { cwd: projectRoot, stdio: "inherit", ...options });
}

/** Waits until an address answers with 200, or a process has ended before. */
export async function untilHealthy(address, child, seconds = 60) {
  const deadline = Date.now() + seconds * 1000;
  while (Date.now() < deadline) {
    if (child.exitCode !== null) return false;
    const answered = await fetch(`${address}/api/health`).then(
      (response) => response.ok,
      () => false,
    );
    if (answered) return true;
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  return false;
}
