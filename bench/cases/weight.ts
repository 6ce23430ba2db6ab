/**
 * Compressed script of the front page: what has come when the drawing answers, before the charts'
 * code, and what has come in all. Sizes are of the bytes on the wire.
 */
import { chromium } from "@playwright/test";
import { serveBuilt } from "../serve-built";

export async function bench() {
  const server = await serveBuilt();
  const browser = await chromium.launch({
    executablePath: "/usr/bin/chromium",
    args: ["--no-sandbox", "--disable-gpu", "--disable-background-networking"],
  });
  try {
    const page = await browser.newPage();
    const session = await page.context().newCDPSession(page);
    await session.send("Network.enable");
    const scripts = new Map<string, string>();
    const sizes: { url: string; bytes: number; at: number }[] = [];
    session.on("Network.responseReceived", ({ requestId, response, type }) => {
      if (type === "Script") scripts.set(requestId, response.url);
    });
    session.on("Network.loadingFinished", ({ requestId, encodedDataLength, timestamp }) => {
      const url = scripts.get(requestId);
      if (url) sizes.push({ url, bytes: encodedDataLength, at: timestamp });
    });
    await page.goto(server.address);
    await page.waitForSelector(".recharts-surface");
    await page.waitForLoadState("networkidle");
    const marks = await page.evaluate(() =>
      performance.getEntriesByName("ventwright:bench-ready").map((mark) => mark.startTime),
    );
    const chartScripts = await page.evaluate(() =>
      performance
        .getEntriesByType("resource")
        .filter((entry) => entry.name.includes(".js"))
        .map((entry) => ({ url: entry.name, began: entry.startTime })),
    );
    const ready = marks[0];
    const late = new Set(
      chartScripts
        .filter(({ began }) => ready !== undefined && began >= ready)
        .map(({ url }) => url),
    );
    const kib = (bytes: number) => bytes / 1024;
    const all = kib(sizes.reduce((sum, { bytes }) => sum + bytes, 0));
    const first = kib(
      sizes.filter(({ url }) => !late.has(url)).reduce((sum, { bytes }) => sum + bytes, 0),
    );
    return {
      name: "weight",
      median_ms: ready ?? Number.NaN,
      ratio_to_c: null,
      notes: [
        `${first.toFixed(0)} KiB of compressed script until the drawing answers (at most 220)`,
        `${all.toFixed(0)} KiB in all, charts included (at most 330)`,
      ],
    };
  } finally {
    await browser.close();
    await server.stop();
  }
}
