/** The built application, served as `npm start` serves it, on a port of its own. */
import { spawn } from "node:child_process";
import { once } from "node:events";
import { createServer, type AddressInfo } from "node:net";

const PATIENCE_S = 300;

async function freePort(): Promise<number> {
  const server = createServer();
  server.listen(0, "127.0.0.1");
  await once(server, "listening");
  const { port } = server.address() as AddressInfo;
  server.close();
  await once(server, "close");
  return port;
}

/** Starts the application, built first where its sources have changed. */
export async function serveBuilt(): Promise<{ address: string; stop: () => Promise<void> }> {
  const port = await freePort();
  const address = `http://127.0.0.1:${port}`;
  // What it says goes to standard error: standard output holds the figures alone.
  const child = spawn(process.execPath, ["scripts/start.mjs"], {
    env: { ...process.env, PORT: String(port), HOST: "127.0.0.1" },
    stdio: ["ignore", 2, 2],
  });
  const stop = async () => {
    if (child.exitCode !== null || child.signalCode !== null) return;
    child.kill("SIGTERM");
    await once(child, "exit");
  };
  const deadline = performance.now() + PATIENCE_S * 1000;
  while (performance.now() < deadline && child.exitCode === null) {
    const healthy = await fetch(`${address}/api/health`).then(
      (response) => response.ok,
      () => false,
    );
    if (healthy) return { address, stop };
    await new Promise((resolve) => setTimeout(resolve, 200));
  }
  await stop();
  throw new Error("The application did not come up to be measured.");
}
