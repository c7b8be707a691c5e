import AxeBuilder from "@axe-core/playwright";
import { expect, test, type Page } from "@playwright/test";
import { enterAs } from "./support/enterAs";
import { watchPage } from "./support/watchPage";

async function graveFaults(page: Page): Promise<readonly string[]> {
  const { violations } = await new AxeBuilder({ page }).analyze();
  return violations.filter(({ impact }) => impact === "serious" || impact === "critical").map(({ id, nodes }) => `${id}: ${nodes.map((node) => node.target.join(" ")).slice(0, 4).join(" | ")}`);
}

async function type(page: Page, label: string, text: string): Promise<void> {
  await page.getByRole("textbox", { name: label, exact: true }).first().focus();
  await page.keyboard.press("ControlOrMeta+a");
  await page.keyboard.type(text);
}

test("sums with units by keyboard: answer, formula with its numbers, copy, and all of it again after reload", async ({ page, context }) => {
  const complaints = watchPage(page);
  await context.grantPermissions(["clipboard-read", "clipboard-write"]);
  await enterAs(page, "engineer");
  await page.goto("/calculator#allowance");
  await expect(page.getByRole("heading", { level: 1, name: "Calculator" })).toBeVisible();
  await type(page, "Thickness", "16 ga");
  await expect(page.getByText("= 1.519 mm · 0.0598 in (steel gauge)")).toBeVisible();
  await type(page, "Thickness", "2*0.75 mm");
  await type(page, "Inside radius", "(1 + 1/2) mm");
  const section = page.getByRole("region", { name: "Allowance, deduction and K" });
  await expect(section.getByText("BD = 2 · SB − BA = 2 · 3 mm − 3.122 mm = 2.878 mm")).toHaveCount(1);

  const copy = section.getByRole("button", { name: "Copy Bend deduction BD, DIN 6935, the rule of S235" });
  await copy.focus();
  await page.keyboard.press("Enter");
  await expect(section.getByRole("status").filter({ hasText: "Copied 2.878 mm" })).toHaveCount(1);
  expect(await page.evaluate(() => navigator.clipboard.readText())).toBe("2.878 mm");

  await type(page, "Thickness", "3 kg");
  await expect(page.locator("#common-t-error")).toHaveText(/^Thickness is a mass\. Type a length, e\.g\. /);
  await expect(section.getByText("Waiting for Thickness")).toBeVisible();
  await type(page, "Thickness", "2*0.75 mm");
  await page.getByRole("radio", { name: "inch, tonf" }).focus();
  await page.keyboard.press("Enter");
  await expect(section.getByText("= 2.878 mm")).toHaveCount(0);
  await expect(section.getByRole("button", { name: "Copy Bend deduction BD, DIN 6935, the rule of S235" }).locator("xpath=../..").getByText("0.1133 in")).toBeVisible();

  await expect(page).toHaveURL(/u=in.*t=2\*0\.75\+mm/);
  await page.reload();
  await expect(page.getByRole("textbox", { name: "Thickness", exact: true })).toHaveValue("2*0.75 mm");
  await expect(page.getByRole("textbox", { name: "Inside radius", exact: true })).toHaveValue("(1 + 1/2) mm");
  await expect(page.getByRole("radio", { name: "inch, tonf" })).toBeChecked();
  expect(await graveFaults(page)).toEqual([]);
  expect(complaints).toEqual([]);
});

test("the operator reaches it from the brake, with the tools' limits and without the brakes'; enlarged it does not scroll sideways", async ({ page }) => {
  const complaints = watchPage(page);
  await enterAs(page, "operator");
  await page.setViewportSize({ width: 720, height: 450 });
  await page.goto("/floor");
  await page.getByRole("link", { name: "Calculator" }).press("Enter");
  await page.waitForURL(/\/calculator$/);
  const force = page.getByRole("region", { name: "Force", exact: true });
  await expect(force.getByRole("img", { name: /^Force falls from/ })).toBeVisible();
  await expect(force.getByRole("list", { name: "Punches over this length, for this V" })).toBeVisible();
  await expect(force.getByRole("list", { name: "Brakes, for this V" })).toHaveCount(0);
  await force.getByText("Force against V opening as a table").focus();
  await page.keyboard.press("Enter");
  await expect(force.getByRole("table", { name: "Force against V opening" })).toBeVisible();
  expect(await page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth)).toBeLessThanOrEqual(0);
  expect(await graveFaults(page)).toEqual([]);
  expect(complaints).toEqual([]);
});
