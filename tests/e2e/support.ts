import { expect, type Page } from "@playwright/test";

export const PASSWORD = "planed and sanded";

/** Types a quantity into a field of the numbers column and takes it. */
export async function type(page: Page, id: string, text: string): Promise<void> {
  const field = page.locator(`[id="${id}"]`);
  await field.scrollIntoViewIfNeeded();
  await field.fill(text);
  await field.press("Enter");
}

/** The Bench listens: its charts have come as well. */
export async function benchReady(page: Page): Promise<void> {
  await expect(page.locator('.bench[data-ready="true"]')).toBeVisible();
  await expect(page.locator(".recharts-surface").first()).toBeVisible();
}

/** The four key figures as they read. */
export async function keyFigures(page: Page): Promise<string[]> {
  return page.locator(".key-figure .figure-key").allTextContents();
}

export async function signUp(page: Page, email: string): Promise<void> {
  await page.getByLabel("Your name").fill("New Person");
  await page.getByLabel("E-mail").fill(email);
  await page.getByLabel("Password", { exact: true }).fill(PASSWORD);
  await page.locator("form button[type=submit]").click();
}

export async function signIn(page: Page, email: string, password = PASSWORD): Promise<void> {
  await page.goto("/sign-in");
  await page.getByLabel("E-mail").fill(email);
  await page.getByLabel("Password", { exact: true }).fill(password);
  await page.locator("form button[type=submit]").click();
}
