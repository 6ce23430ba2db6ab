/**
 * From a hand's move to the painted frame, while the tube's end is dragged on the Bench with the
 * CPU throttled four times. Needs a built application; starts it on a port of its own.
 */
import { chromium, type Page } from "@playwright/test";
import { serveBuilt } from "../serve-built";

const MOVES = 120;

export async function bench() {
  const server = await serveBuilt();
  const browser = await chromium.launch({
    executablePath: "/usr/bin/chromium",
    args: ["--no-sandbox", "--disable-gpu", "--disable-background-networking"],
  });
  try {
    const page = await browser.newPage({ viewport: { width: 1440, height: 1000 } });
    await page.goto(server.address);
    await page.waitForSelector(".recharts-surface");
    const session = await page.context().newCDPSession(page);
    await session.send("Emulation.setCPUThrottlingRate", { rate: 4 });
    const times = await dragTube(page);
    times.sort((a, b) => a - b);
    const at = (share: number) =>
      times[Math.min(times.length - 1, Math.floor(share * times.length))]!;
    return {
      name: "drag",
      median_ms: at(0.5),
      ratio_to_c: null,
      notes: [
        `p95 ${at(0.95).toFixed(1)} ms from input to paint over ${times.length} frames, CPU throttled 4 times`,
      ],
    };
  } finally {
    await browser.close();
    await server.stop();
  }
}

/** Drags the tube's inner end to and fro and returns the time of each frame [ms]. */
async function dragTube(page: Page): Promise<number[]> {
  const handle = page.getByRole("slider", { name: /tube/i }).first();
  await handle.scrollIntoViewIfNeeded();
  const box = await handle.boundingBox();
  if (!box) throw new Error("The tube's handle is not on the page.");
  await page.evaluate(() => {
    const frames: number[] = [];
    Object.assign(window, { benchFrames: frames });
    window.addEventListener(
      "pointermove",
      (event) => {
        const began = event.timeStamp;
        requestAnimationFrame(() => {
          const channel = new MessageChannel();
          channel.port1.onmessage = () => frames.push(performance.now() - began);
          channel.port2.postMessage(null);
        });
      },
      { capture: true },
    );
  });
  const x = box.x + box.width / 2;
  const y = box.y + box.height / 2;
  await page.mouse.move(x, y);
  await page.mouse.down();
  for (let move = 0; move < MOVES; move++) {
    const swing = 40 * Math.sin((2 * Math.PI * move) / 60);
    await page.mouse.move(x + swing, y);
    await page.waitForTimeout(30);
  }
  await page.mouse.up();
  return page.evaluate(() => (window as unknown as { benchFrames: number[] }).benchFrames.slice(5));
}
