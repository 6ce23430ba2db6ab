import AxeBuilder from "@axe-core/playwright";
import { expect, test } from "@playwright/test";
import { benchReady, signIn } from "./support";

const DEMO = "sawdust-and-glue";

for (const scheme of ["light", "dark"] as const)
  test(`nothing serious for axe, nothing wider than the page: ${scheme}`, async ({
    browser,
  }, info) => {
    const { viewport, isMobile, hasTouch, baseURL } = info.project.use;
    const context = await browser.newContext({
      viewport,
      isMobile,
      hasTouch,
      baseURL: baseURL ?? process.env.BASE_URL,
      colorScheme: scheme,
      reducedMotion: "reduce",
    });
    const page = await context.newPage();
    const faults: string[] = [];
    page.on("pageerror", (error) => faults.push(String(error)));
    page.on("console", (line) => {
      if (line.type() === "error" && !/404/.test(line.text())) faults.push(line.text());
    });
    const visit = async (path: string) => {
      await page.goto(path);
      if (path === "/" || path.startsWith("/bench/")) await benchReady(page);
      await page.waitForLoadState("networkidle");
      const { violations } = await new AxeBuilder({ page }).analyze();
      const serious = violations.filter(
        ({ impact }) => impact === "serious" || impact === "critical",
      );
      expect(
        serious.map(
          ({ id, nodes }) =>
            `${path} ${id}: ${nodes.map(({ html }) => html.slice(0, 120)).join(" | ")}`,
        ),
      ).toEqual([]);
      const over = await page.evaluate(
        () => document.documentElement.scrollWidth - window.innerWidth,
      );
      expect(over, `${path} is wider than the page`).toBeLessThanOrEqual(0);
    };
    for (const path of ["/", "/sign-in", "/sign-up", "/nothing-here"]) await visit(path);
    await signIn(page, "designer@demo.example", DEMO);
    await page.waitForURL(/\/designs/);
    await visit("/designs");
    const saved = page.getByRole("link", { name: "Den sub" }).first();
    await visit((await saved.getAttribute("href")) ?? "");
    expect(faults).toEqual([]);
    await context.close();
  });

test("a builder reads and may not change", async ({ page }) => {
  await signIn(page, "builder@demo.example", DEMO);
  await page.waitForURL(/\/designs/);
  await page.getByRole("link", { name: "Den sub" }).first().click();
  await benchReady(page);
  await expect(page.locator('[id="target.tuning_hz"]')).toBeDisabled();
  await expect(page.getByRole("slider", { name: "Tube length" })).toHaveCount(0);
});

test("security headers stand on pages and routes", async ({ request }) => {
  for (const path of ["/", "/api/health"]) {
    const { headers } = { headers: (await request.get(path)).headers() };
    const policy = headers["content-security-policy"] ?? "";
    expect(policy).toContain("script-src 'self' 'nonce-");
    expect(/script-src[^;]*unsafe-inline/.test(policy)).toBe(false);
    expect(headers["x-request-id"]).toBeTruthy();
  }
  expect(await (await request.get("/api/health")).json()).toEqual({
    ok: true,
    database: "answers",
    migrations: "up to date",
  });
});
