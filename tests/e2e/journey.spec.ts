import { randomUUID } from "node:crypto";
import { expect, test } from "@playwright/test";
import { benchReady, keyFigures, signIn, signUp, type } from "./support";

test("a new person: own driver and box, port from the bore map, rings, sign up, come back", async ({
  page,
}) => {
  const email = `${randomUUID()}@example.org`;
  await page.goto("/");
  await benchReady(page);
  const sample = await keyFigures(page);

  await test.step("own driver and box", async () => {
    await type(page, "target.tuning_hz", "34");
    await type(page, "driver.fs_hz", "30 Hz");
    await type(page, "driver.qes", "0,4");
    await type(page, "driver.vas_m3", "45 L");
    await type(page, "enclosure.net_volume_m3", "2 ft3");
    await expect(page.locator('[id="enclosure.net_volume_m3"]')).toHaveValue("56.63");
    expect(await keyFigures(page)).not.toEqual(sample);
  });

  await test.step("port from the bore map", async () => {
    await page.locator('[data-part="bore-map"]').scrollIntoViewIfNeeded();
    const map = page.getByRole("slider", { name: "Vent diameter and number of vents" }).first();
    await map.scrollIntoViewIfNeeded();
    await map.focus();
    const bore = await page.locator('[id="vent.bore"]').inputValue();
    for (let step = 0; step < 6; step++) await map.press("ArrowLeft");
    await map.press("Enter");
    await expect(page.locator('[id="vent.bore"]')).not.toHaveValue(bore);
  });

  await test.step("rings that meet the tuning", async () => {
    const plans = page.getByRole("list", { name: "Ring plans, best first" });
    await plans.scrollIntoViewIfNeeded();
    await plans.getByRole("button", { name: "Use" }).first().click();
    await expect(page.locator(".key-figure .figure-key").first()).toHaveText(/^34\.0/);
  });

  const made = await keyFigures(page);
  await page.reload();
  await benchReady(page);
  await expect.poll(() => keyFigures(page)).toEqual(made);

  await page.getByRole("link", { name: "Sign up to keep it" }).click();
  await signUp(page, email);
  await page.waitForURL(/\/bench\/[0-9a-f-]{36}/);
  await benchReady(page);
  expect(await keyFigures(page)).toEqual(made);

  await test.step("an edit is saved by itself", async () => {
    const name = page.getByRole("textbox", { name: "Name of the design" });
    await name.fill("My first box");
    await name.press("Enter");
    await expect(page.locator('[data-save="saved"]')).toBeVisible();
    await page.reload();
    await expect(page.getByRole("textbox", { name: "Name of the design" })).toHaveValue(
      "My first box",
    );
  });

  await page.getByRole("button", { name: /Account of/ }).click();
  await page.getByRole("button", { name: "Sign out" }).click();
  await expect(page.getByRole("link", { name: "Sign up to keep it" })).toBeVisible();
  await signIn(page, email);
  await page.waitForURL(/\/designs/);
  await page.getByRole("link", { name: "My first box" }).click();
  await page.waitForURL(/\/bench\//);
  await benchReady(page);
  expect(await keyFigures(page)).toEqual(made);
});

test("undo, redo, and a cure with one press", async ({ page }) => {
  await page.goto("/");
  await benchReady(page);
  const before = await keyFigures(page);
  await type(page, "drive.voltage_v", "26");
  await expect(page.locator('[data-margin="air-speed-0"]')).toContainText("−");
  const loud = await keyFigures(page);
  expect(loud).not.toEqual(before);
  await page.getByRole("button", { name: "Undo" }).click();
  expect(await keyFigures(page)).toEqual(before);
  await page.getByRole("button", { name: "Redo" }).click();
  expect(await keyFigures(page)).toEqual(loud);
  const cure = page.locator('[data-margin="air-speed-0"] .cure').first();
  await cure.scrollIntoViewIfNeeded();
  await cure.click();
  await expect(page.locator('[data-margin="air-speed-0"]')).toContainText("+");
});

test("the drawing is dragged by keyboard, and typed numbers are checked", async ({ page }) => {
  await page.goto("/");
  await benchReady(page);
  const tube = page.getByRole("slider", { name: "Tube length" });
  await tube.focus();
  await tube.press("ArrowRight");
  await expect(page.locator('[id="piece.0.length_m"]')).toHaveValue("221.0");
  await type(page, "driver.qes", "1000");
  await expect(page.locator('[data-field="driver.qes"]')).toContainText(/0\.01/);
});

test("the working of a figure, and three questions", async ({ page }, info) => {
  await page.goto("/");
  await benchReady(page);
  if (info.project.name === "desktop") {
    await page.getByRole("button", { name: "Working of Tuning f_B" }).click();
    await expect(page.getByRole("dialog")).toContainText("Source:");
    await page.keyboard.press("Escape");
  }
  await page.getByRole("button", { name: "Start in three questions" }).click();
  await page.getByLabel("8 inch").check();
  await page.getByRole("button", { name: "Put it on the Bench" }).click();
  await expect(page.getByRole("textbox", { name: "Name of the design" })).toHaveValue("New design");
});
