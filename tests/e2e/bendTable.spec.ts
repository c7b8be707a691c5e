import AxeBuilder from "@axe-core/playwright";
import { expect, test, type Page } from "@playwright/test";
import type { TrialView } from "../../lib/schemas/bendTableViews";
import type { Page as ListPage } from "../../lib/schemas/views";
import { api } from "./support/api";
import { enterAs } from "./support/enterAs";
import { watchPage } from "./support/watchPage";

let complaints: readonly string[] = [];
test.beforeEach(({ page }) => {
  complaints = watchPage(page);
});
test.afterEach(() => {
  expect(complaints).toEqual([]);
});

const trials = async (page: Page, query = "") => (await api<ListPage<TrialView>>(page, `/api/bend-table/trials?pageSize=100${query}`)).items;
const typed = async (page: Page, texts: readonly string[]) => {
  for (const [index, text] of texts.entries()) {
    if (index > 0) await page.keyboard.press("Tab");
    await page.keyboard.type(text);
  }
};

async function graveFaults(page: Page): Promise<readonly string[]> {
  const { violations } = await new AxeBuilder({ page }).analyze();
  return violations.filter(({ impact }) => impact === "serious" || impact === "critical").map(({ id, nodes }) => `${id}: ${nodes.map((node) => node.target.join(" ")).slice(0, 3).join(" | ")}`);
}

test("the toolroom types three trials by keyboard alone; a mistake is named, a reload loses nothing, and all are saved at once", async ({ page }) => {
  await enterAs(page, "toolroom");
  await page.goto("/bend-table/new");
  await expect(page.getByLabel("Material, line 1")).toBeFocused();
  // Material, batch, nominal, thickness, V, punch radius, angle, blank, flanges.
  await typed(page, ["DC04", "E-77", "", "1.48", "10", "0.8", "90", "100", "51.44", "51.44"]);
  await page.keyboard.press("Enter");
  await expect(page.getByLabel("Angle, line 2")).toBeFocused();
  await expect(page.getByLabel("Thickness, line 2")).toHaveValue("1.48");
  await typed(page, ["90.1", '"', "51.39", "5 1.5"]);
  await expect(page.getByLabel("Blank, line 2")).toHaveValue("100");
  await page.keyboard.press("Enter");
  await typed(page, ["90", "100.05", "51.5", "2.026 in"]);
  await page.keyboard.press("Control+Enter");

  const wrong = page.getByLabel("Flange 2, line 2");
  await expect(wrong).toBeFocused();
  await expect(wrong).toHaveAttribute("aria-invalid", "true");
  await expect(wrong).toHaveAccessibleDescription(/Flange 2.*is not a number/);
  expect(await graveFaults(page)).toEqual([]);
  expect(await trials(page, "&q=E-77")).toEqual([]);

  await expect.poll(() => page.evaluate(() => Object.entries(localStorage).some(([key, text]) => key.includes("bend-trials") && text.includes("2.026 in")))).toBe(true);
  await page.reload();
  await expect(page.getByLabel("Flange 2, line 3")).toHaveValue("2.026 in");
  await page.getByLabel("Flange 2, line 2").fill("51.5");
  await expect(page.getByRole("row").filter({ has: page.getByLabel("Angle, line 2") })).toContainText(/2\.89 ± 0\.0\d/);
  await page.keyboard.press("Control+Enter");
  await expect(page.getByRole("alert").getByText(/^3 trials saved, T-\d+ to T-\d+$/)).toBeVisible();
  await expect(page.getByLabel("Batch, line 1")).toHaveValue("E-77");
  await expect(page.getByLabel(/^Angle, line \d$/)).toHaveCount(1);
  expect((await trials(page, "&q=E-77&dir=asc")).map(({ angleDeg, flangesMm }) => [angleDeg, flangesMm[1]])).toEqual([[90, 51.44], [90.1, 51.5], [90, 51.4604]]);

  await page.getByRole("link", { name: "DC04 1.5 V10 R0.8 90°" }).click();
  await expect(page.getByRole("heading", { level: 1 })).toHaveText("DC04, 1.5 mm over V 10 at 90°");
  await expect(page.getByRole("img", { name: /^Deductions of 3 trials, mean 2\.\d+ mm/ })).toBeVisible();
  await expect(page.getByRole("button", { name: /^Exclude/ })).toHaveCount(0);
});

test("the engineer finds the trial that lies apart, excludes it with a reason and brings it back", async ({ page }) => {
  await enterAs(page, "engineer");
  await page.goto("/bend-table?state=outlier");
  expect(await graveFaults(page)).toEqual([]);
  await page.getByRole("link", { name: "S235, 2 mm, V 16, punch 0.8, 90°" }).click();
  await expect(page.getByText("One trial lies apart from the others")).toBeVisible();
  const row = page.getByRole("row").filter({ hasText: "outlier, counts" });
  await expect(row).toHaveCount(1);
  const number = (await row.getByRole("rowheader").textContent()) ?? "";
  const deduction = page.locator("dl").first().locator("dd").first();
  const before = (await deduction.textContent()) ?? "";
  expect(await graveFaults(page)).toEqual([]);

  await row.getByRole("button", { name: `Exclude ${number}` }).press("Enter");
  const dialog = page.getByRole("dialog");
  await dialog.getByRole("button", { name: "Exclude it" }).click();
  await expect(dialog.getByLabel("Reason")).toHaveAccessibleDescription(/Say why/);
  await dialog.getByLabel("Reason").fill("stood askew at the gauge");
  await dialog.getByRole("button", { name: "Exclude it" }).click();
  const excluded = page.getByRole("row").filter({ hasText: number });
  await expect(excluded).toContainText("stood askew at the gauge");
  await expect(page.getByRole("button", { name: `Bring back ${number}` })).toBeFocused();
  await expect(page.getByText("One trial lies apart from the others")).toHaveCount(0);
  await expect(deduction).not.toHaveText(before);

  await excluded.getByRole("button", { name: `Bring back ${number}` }).press("Enter");
  await expect(deduction).toHaveText(before);
  await page.getByRole("link", { name: "Bend table" }).first().click();
  await page.getByRole("link", { name: "Coverage" }).click();
  await expect(page.getByRole("region", { name: /^Coverage of / })).toBeVisible();
  expect(await graveFaults(page)).toEqual([]);
});

test("a file of trials shows what each line would do, and writes what was confirmed", async ({ page }) => {
  await enterAs(page, "toolroom");
  const [known] = await trials(page, "&material=1.4301&dir=asc");
  await page.goto("/bend-table/import");
  const heads = "trial;material;batch;thickness (mm);v opening (mm);punch radius (mm);angle;blank (mm);flange 1 (mm);flange 2 (mm);length instrument;angle instrument;measured on;measured by";
  const ends = "Calliper 0.01;Protractor 5 minutes;2025-11-03;Greta Sommer";
  await page.getByLabel("Lines of trials, the headings first").fill([heads, `;DC04;F-9;0,99;8;0,8;90;100;50,98;50,97;${ends}`, `;DC04;F-9;0,99;8;0,8;90;100;70;50,97;${ends}`, `${known?.number};1.4301;X;1;6;0,8;90;100;51;51;${ends}`].join("\n"));
  await page.getByRole("button", { name: "See what it would do" }).click();
  await expect(page.getByText("Dry run, nothing written yet: 1 to be added, 2 refused")).toBeVisible();
  await expect(page.getByText("what was measured does not change")).toBeVisible();
  expect(await graveFaults(page)).toEqual([]);
  expect(await trials(page, "&q=F-9")).toEqual([]);
  await page.getByLabel(/Leave out the 2 refused lines/).check();
  await page.getByRole("button", { name: "Write 1 line" }).click();
  await page.waitForURL(/\/bend-table\/trials$/);
  expect((await trials(page, "&q=F-9")).map(({ thicknessMm, flangesMm }) => [thicknessMm, ...flangesMm])).toEqual([[0.99, 50.98, 50.97]]);
});
