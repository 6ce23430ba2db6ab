/**
 * Everything from a clone to a served page: packages, PostgreSQL, migrations, the demo shop, the
 * build, the server. Stops all it started when it is told to stop. With --dev, serves with reloading.
 */
import { randomBytes } from "node:crypto";
import { existsSync, mkdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import {
  fail,
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
const development = process.argv.includes("--dev");
const folder = join(projectRoot, ".data");
const owner = join(folder, "owner");
/** Who serves: this script's process and the server's, so that a killed start leaves no orphan for long. */
const served = join(folder, "served");

requirePackages();
const { clusterFolder, makeDatabase, newPassword, portIsFree, startCluster } =
  await import("./database.mjs");

/** What was started, to be stopped in the opposite order. */
const stops = [];
let stopping = false;
function stopAll(code) {
  if (stopping) return;
  stopping = true;
  for (const stop of stops.reverse()) stop();
  process.exit(code);
}
for (const signal of ["SIGINT", "SIGTERM", "SIGHUP"]) process.on(signal, () => stopAll(0));

const secrets = readSecrets();
const databaseUrl = process.env.DATABASE_URL ?? (await ownDatabase());
const environment = {
  ...process.env,
  NODE_ENV: development ? "development" : "production",
  DATABASE_URL: databaseUrl,
  SESSION_SECRET: process.env.SESSION_SECRET ?? secrets.sessionSecret,
};

if (!development) requireBuild();
run(process.execPath, [...tsx, "db/prepare.ts", "--seed"], { env: environment });

stopOrphan();
const host = process.env.HOST ?? "127.0.0.1";
const port = await choosePort();
const address = `http://${host === "0.0.0.0" ? "127.0.0.1" : host}:${port}`;
const server = start(
  process.execPath,
  [next, development ? "dev" : "start", "-H", host, "-p", String(port)],
  { env: environment },
);
writeFileSync(served, `${process.pid} ${server.pid}`);
stops.push(() => {
  rmSync(served, { force: true });
  server.kill("SIGTERM");
});
server.on("exit", (code) => {
  if (!stopping) console.error("The server has ended.");
  stopAll(code ?? 1);
});
if (!(await untilHealthy(address, server))) {
  console.error("The server did not become healthy within a minute.");
  stopAll(1);
}
say(`
Ventwright is at  ${address}

The demo shop's people, all with the password  sawdust-and-glue
  owner@demo.example      designer@demo.example
  builder@demo.example    installer@demo.example

Ctrl-C stops everything.`);

/** The project's own cluster; left running only where another start still uses it. */
async function ownDatabase() {
  const cluster = await startCluster({
    folder: clusterFolder(),
    password: secrets.databasePassword,
    durable: true,
  });
  if (cluster.started || !otherOwnerLives()) {
    writeFileSync(owner, String(process.pid));
    stops.push(() => {
      rmSync(owner, { force: true });
      cluster.stop();
    });
  }
  await makeDatabase(cluster, "ventwright");
  return cluster.url("ventwright");
}

function otherOwnerLives() {
  if (!existsSync(owner)) return false;
  try {
    process.kill(Number(readFileSync(owner, "utf8")), 0);
    return true;
  } catch {
    return false;
  }
}

/** Ends a server whose start script was killed before it could stop it. */
function stopOrphan() {
  if (!existsSync(served)) return;
  const [script, orphan] = readFileSync(served, "utf8").split(" ").map(Number);
  try {
    process.kill(script, 0);
  } catch {
    const command = `/proc/${orphan}/cmdline`;
    if (existsSync(command) && readFileSync(command, "utf8").includes("next"))
      process.kill(orphan, "SIGTERM");
  }
}

/** Secrets of this checkout, made once, readable by their owner only. */
function readSecrets() {
  const file = join(folder, "secrets.json");
  if (existsSync(file)) return JSON.parse(readFileSync(file, "utf8"));
  mkdirSync(folder, { recursive: true });
  const made = {
    databasePassword: newPassword(),
    sessionSecret: randomBytes(48).toString("base64url"),
  };
  writeFileSync(file, JSON.stringify(made), { mode: 0o600 });
  return made;
}

/** The port asked for, or the first free one from 3000. */
async function choosePort() {
  if (process.env.PORT) {
    const asked = Number(process.env.PORT);
    if (!(await portIsFree(asked, host)))
      fail(`Port ${asked} is in use. Choose another with PORT.`);
    return asked;
  }
  for (let candidate = 3000; candidate < 3100; candidate++)
    if (await portIsFree(candidate, host)) return candidate;
  return fail("No port between 3000 and 3099 is free. Choose one with PORT.");
}
