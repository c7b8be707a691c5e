import { expect, test, type Page } from "@playwright/test";
import { enterAs } from "./support/enterAs";

/** Tab until the control with this name has the focus, as somebody without a mouse does. */
async function tabTo(page: Page, name: RegExp, most = 80): Promise<void> {
  for (let i = 0; i < most; i += 1) {
    const focused = await page.evaluate(() => { const element = document.activeElement; return element?.getAttribute("aria-label") ?? element?.textContent ?? ""; });
    if (name.test(focused)) return;
    await page.keyboard.press("Tab");
  }
  throw new Error(`Tab does not lead to ${String(name)}`);
}

test("a leg that no die holds is found while it is typed, drawn, cured and taken back, by keyboard alone", async ({ page }) => {
  await enterAs(page, "engineer");
  await page.goto("/parts/new");
  const findings = page.getByRole("region", { name: "Findings" });
  const short = findings.getByRole("button", { name: /Flange too short/ });
  const leg = page.getByLabel("Leg 3 length");
  await leg.focus();
  await expect(findings).toBeVisible();
  await expect(short).toHaveCount(0);
  await page.keyboard.press("ControlOrMeta+A");
  await page.keyboard.type("5");
  await expect(short).toBeVisible();
  await expect(findings.getByRole("status")).toContainText(/stops it/);

  await tabTo(page, /Flange too short/);
  await expect(short).toHaveAttribute("aria-expanded", "true");
  await expect(findings).toContainText(/5 mm long.*is usual/);
  await expect(page.locator('[data-marks-of^="flange"] path[fill^="url"]')).toHaveCount(1);

  await page.keyboard.press("Tab");
  const cure = await page.evaluate(() => document.activeElement?.getAttribute("aria-label") ?? "");
  expect(cure).toMatch(/^Set leg 3 to [\d.]+ mm: Leg 3$/);
  await page.keyboard.press("Enter");
  await expect(short).toHaveCount(0);
  await expect(findings).toBeFocused();
  await expect(leg).toHaveValue(/([\d.]+)/.exec(cure.replace("leg 3", ""))?.[1] ?? "");

  await page.keyboard.press("ControlOrMeta+Z");
  await expect(leg).toHaveValue("5");
  await expect(short).toBeVisible();
});
