import type { Page } from "@playwright/test";

/** Keeps a picture for the README when `PICTURES=1`. */
export async function keepPicture(page: Page, name: string): Promise<void> {
  if (process.env.PICTURES !== "1") return;
  await page.mouse.move(0, 0);
  await page.screenshot({ path: `tests/e2e/pictures/${name}.png`, animations: "disabled" });
}
