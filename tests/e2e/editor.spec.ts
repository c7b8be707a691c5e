import { expect, test, type Page } from "@playwright/test";
import type { Page as ListPage, PartListItem } from "../../lib/schemas/views";
import { api } from "./support/api";
import { enterAs } from "./support/enterAs";
import { watchPage } from "./support/watchPage";

/** Table and drawings as one thing, and nothing that was entered is lost. */
test.describe.configure({ mode: "serial", timeout: 120_000 });

const name = `Editor tray ${Date.now().toString(36)}`;
const partsNamed = async (page: Page) => (await api<ListPage<PartListItem>>(page, `/api/parts?q=${encodeURIComponent(name)}`)).items;
const flat = (page: Page) => page.getByRole("group", { name: /^Flat pattern/ });

test.beforeEach(async ({ page }) => enterAs(page, "engineer"));

test("an edge picked in the flat takes a flange whose length is typed at once; undo and redo go all the way", async ({ page }) => {
  const complaints = watchPage(page);
  await page.goto("/parts/new");
  await page.getByText("Tray", { exact: true }).click();
  await page.getByLabel("Name", { exact: true }).fill(name);
  await page.getByRole("button", { name: "Add a flange on front, edge 2" }).press("Enter");
  await expect(page.locator("#at-flanges-4-length")).toBeFocused();
  await page.keyboard.type("14");
  await expect(flat(page).getByRole("button", { name: "Work on flange1" })).toHaveAttribute("aria-pressed", "true");

  await flat(page).getByRole("button", { name: "Work on back" }).press("Enter");
  await expect(page.locator("#at-flanges-2-length")).toBeFocused();
  await page.keyboard.type("31");
  await expect(flat(page)).toHaveAccessibleName(/4 bend lines|5 bend lines/);

  const undo = page.getByRole("button", { name: /^Undo/ });
  while (await undo.isEnabled()) await page.keyboard.press("Control+z");
  await expect(page.getByLabel("Name", { exact: true })).toHaveValue("");
  await expect(page.getByLabel("Leg 1 length")).toHaveValue("40");
  const redo = page.getByRole("button", { name: /^Redo/ });
  while (await redo.isEnabled()) await page.keyboard.press("Control+y");
  await expect(page.locator("#at-flanges-2-length")).toHaveValue("31");
  await expect(page.locator("#at-flanges-4-length")).toHaveValue("14");
  expect(complaints).toEqual([]);
});

test("a face picked in 3D takes the cursor to its field", async ({ page }) => {
  await page.goto("/parts/new");
  await page.getByText("Tray", { exact: true }).click();
  const canvas = page.getByRole("figure").filter({ hasText: "Folded" }).locator("canvas");
  await canvas.scrollIntoViewIfNeeded();
  await expect(async () => {
    await canvas.click();
    await expect(page.getByLabel("Width (x)")).toBeFocused({ timeout: 500 });
  }).toPass({ timeout: 60_000 });
  await expect(flat(page).getByRole("button", { name: "Work on base" })).toHaveAttribute("aria-pressed", "true");
});

test("entries outlive a closed tab, and a save waits for the network and is made once", async ({ page, context }) => {
  await page.goto("/parts/new");
  await page.getByText("Tray", { exact: true }).click();
  await page.getByLabel("Name", { exact: true }).fill(name);
  await page.close();

  const again = await context.newPage();
  await again.goto("/parts/new");
  await expect(again.getByText("Your unsaved entries were brought back")).toBeVisible();
  await expect(again.getByLabel("Name", { exact: true })).toHaveValue(name);
  await context.setOffline(true);
  await again.waitForFunction(() => !navigator.onLine);
  await again.keyboard.press("Control+s");
  await expect(again.getByText("No connection: saving as soon as it is back")).toBeVisible();
  await context.setOffline(false);
  await again.waitForURL(/\/parts\/[0-9a-f-]{36}$/);
  expect(await partsNamed(again)).toHaveLength(1);
});

test("a copy with another width, and the two revisions of a part side by side", async ({ page }) => {
  const [part] = await partsNamed(page);
  await page.goto(`/parts/${part?.id ?? ""}`);
  await page.getByRole("link", { name: "Edit" }).click();
  await page.getByLabel("Depth (y)").fill("150");
  await page.keyboard.press("Control+s");
  await page.waitForURL(/\/parts\/[0-9a-f-]{36}$/);
  await page.getByRole("link", { name: "Compare two" }).click();
  const changed = page.getByRole("region", { name: "What was changed" });
  await expect(changed.getByRole("row", { name: /Base, corner 3/ })).toContainText("(200, 150)");
  await expect(page.getByRole("region", { name: "What follows from it" }).getByRole("row", { name: /Blank, along y/ })).toBeVisible();
  await expect(page.getByRole("img", { name: /^The flat of Revision 2/ })).toBeVisible();

  await page.goto(`/parts/${part?.id ?? ""}`);
  await page.getByRole("link", { name: "Copy" }).click();
  await expect(page.getByLabel("Name", { exact: true })).toHaveValue(`${name} copy`);
  await page.getByLabel("Width (x)").fill("333");
  await page.keyboard.press("Control+s");
  await page.waitForURL(/\/parts\/[0-9a-f-]{36}$/);
  expect((await partsNamed(page)).map((one) => one.name).toSorted()).toEqual([name, `${name} copy`]);
});
