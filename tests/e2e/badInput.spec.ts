import { expect, test, type Page } from "@playwright/test";
import type { Page as ListPage, PartListItem, ToolListItem } from "../../lib/schemas/views";
import { api } from "./support/api";
import { enterAs } from "./support/enterAs";

const total = async (page: Page, list: "parts" | "tools") => (await api<ListPage<PartListItem | ToolListItem>>(page, `/api/${list}`)).total;

/** The editor of a new part as a person meets it, signed in as an engineer. */
async function openEditor(page: Page): Promise<number> {
  await enterAs(page, "engineer");
  const before = await total(page, "parts");
  await page.goto("/parts/new");
  await page.getByLabel("Name", { exact: true }).fill("Trial");
  return before;
}

/** The save is refused: the page stays, the field is marked, nothing is stored. */
async function expectRefused(page: Page, before: number, field: string, message: RegExp): Promise<void> {
  const control = page.getByLabel(field, { exact: true });
  await expect(control).toHaveAttribute("aria-invalid", "true");
  await expect(control).toHaveAccessibleDescription(message);
  await page.getByRole("button", { name: "Save part" }).click();
  await expect(control).toBeFocused();
  await expect(page).toHaveURL(/\/parts\/new$/);
  expect(await total(page, "parts")).toBe(before);
}

async function importDocument(page: Page, document: unknown): Promise<void> {
  await page.getByRole("button", { name: "Import" }).click();
  await page.getByLabel("Or pasted").fill(typeof document === "string" ? document : JSON.stringify(document));
  await page.getByRole("button", { name: "Use this document" }).click();
}

test.describe("a part that cannot be", () => {
  test("thickness 0", async ({ page }) => {
    const before = await openEditor(page);
    await page.getByLabel("Thickness", { exact: true }).fill("0");
    await expectRefused(page, before, "Thickness", /greater than 0|more than 0|above 0|thicker than 0/i);
  });

  test("a leg shorter than its setbacks: the message names the least length", async ({ page }) => {
    const before = await openEditor(page);
    await page.getByLabel("Leg 2 length").fill("3");
    await expect(page.getByLabel("Leg 2 length")).toHaveAccessibleDescription(/\d/);
    const said = (await page.getByLabel("Leg 2 length").evaluate((input) => document.getElementById(input.getAttribute("aria-describedby") ?? "")?.textContent)) ?? "";
    const least = Math.max(...(said.match(/\d+(\.\d+)?/g) ?? []).map(Number));
    expect(least, said).toBeGreaterThan(3);
    await expectRefused(page, before, "Leg 2 length", /at least|longer than|more than/i);
    await page.getByLabel("Leg 2 length").fill(String(least + 0.1));
    await expect(page.getByLabel("Leg 2 length")).not.toHaveAttribute("aria-invalid", "true");
  });

  for (const angle of ["0", "181"]) {
    test(`an angle of ${angle} degrees`, async ({ page }) => {
      const before = await openEditor(page);
      await page.getByLabel("Bend 1 angle").fill(angle);
      await expectRefused(page, before, "Bend 1 angle", /180/);
    });
  }

  test("text where a number belongs", async ({ page }) => {
    const before = await openEditor(page);
    await page.getByLabel("Leg 1 length").fill("forty");
    await expectRefused(page, before, "Leg 1 length", /forty/);
  });
});

test.describe("a document that cannot be used", () => {
  const base = { format: "part/1", name: "Imported", units: "mm", material: "S235", thickness: 2 };
  const cases = [
    { what: "an outline that crosses itself", says: /cross/i, document: { ...base, base: { outline: [[0, 0], [100, 80], [100, 0], [0, 80]] } } },
    { what: "an unknown key", says: /colour/i, document: { ...base, colour: "red", profile: { width: 100, legs: [40, 40], bends: [{ angle: 90, direction: "up" }] } } },
    { what: "no JSON", says: /not JSON/i, document: "flange" },
  ];
  for (const { what, says, document } of cases) {
    test(`${what}: said in the dialog, and the form stays as it was`, async ({ page }) => {
      const before = await openEditor(page);
      await importDocument(page, document);
      await expect(page.getByRole("dialog").getByText(says).first()).toBeVisible();
      await page.getByRole("dialog").getByRole("button", { name: "Cancel" }).click();
      await expect(page.getByLabel("Name", { exact: true })).toHaveValue("Trial");
      expect(await total(page, "parts")).toBe(before);
    });
  }

  test("an unknown material: said at its field, and not saved", async ({ page }) => {
    const before = await openEditor(page);
    await importDocument(page, { ...base, material: "unobtainium", profile: { width: 100, legs: [40, 40], bends: [{ angle: 90, direction: "up" }] } });
    await expectRefused(page, before, "Material", /unobtainium/);
  });

  test("a file of 10 MB is named as too large, and what was typed stays", async ({ page }) => {
    const before = await openEditor(page);
    await page.getByRole("button", { name: "Import" }).click();
    await page.getByLabel("From a file").setInputFiles({ name: "big.json", mimeType: "application/json", buffer: Buffer.alloc(10_000_000, 32) });
    await expect(page.getByRole("dialog").getByText("at most 2 MB")).toBeVisible();
    await page.getByRole("dialog").getByRole("button", { name: "Cancel" }).click();
    await expect(page.getByLabel("Name", { exact: true })).toHaveValue("Trial");
    expect(await total(page, "parts")).toBe(before);
  });
});

test("HTML in a name is text, everywhere", async ({ page }) => {
  const name = `<img src=x onerror="window.broken=true"><b>Bold ${Date.now().toString(36)}</b>`;
  await openEditor(page);
  await page.getByLabel("Name", { exact: true }).fill(name);
  await page.getByRole("button", { name: "Save part" }).click();
  await page.waitForURL(/\/parts\/[0-9a-f-]{36}$/);
  await expect(page.getByRole("heading", { level: 1 })).toHaveText(name);
  await page.goto("/parts");
  await expect(page.getByRole("link", { name })).toBeVisible();
  expect(await page.evaluate(() => "broken" in window)).toBe(false);
  expect(await page.locator("img[src=x]").count()).toBe(0);
});

test("a tool's cross-section that crosses itself is refused", async ({ page }) => {
  await enterAs(page, "toolroom");
  const before = await total(page, "tools");
  await page.goto("/tools/new");
  await page.getByLabel("Code", { exact: true }).fill("P-CROSSED");
  await page.getByRole("button", { name: "Draw a straight punch" }).click();
  const corners = page.getByLabel(/^Corners/);
  await expect(corners).not.toHaveValue("");
  await corners.fill("0 0\n10 10\n10 120\n-10 10\n-10 120");
  await page.getByRole("button", { name: "Save tool" }).click();
  await expect(corners).toHaveAttribute("aria-invalid", "true");
  await expect(corners).toHaveAccessibleDescription(/cross/i);
  await expect(page).toHaveURL(/\/tools\/new$/);
  expect(await total(page, "tools")).toBe(before);
});

test("the connection is lost while saving: nothing is half saved, what was typed is there, saving again works", async ({ page }) => {
  const before = await openEditor(page);
  const name = `Lost and found ${Date.now().toString(36)}`;
  await page.getByLabel("Name", { exact: true }).fill(name);
  await page.getByLabel("Leg 2 length").fill("77");
  await page.route("**/api/parts", (route) => (route.request().method() === "POST" ? route.abort("connectionfailed") : route.continue()));
  await page.getByRole("button", { name: "Save part" }).click();
  await expect(page.getByText("Nothing was saved; what you entered is still here")).toBeVisible();
  await expect(page.getByText(/server cannot be reached/)).toBeVisible();
  await expect(page.getByLabel("Name", { exact: true })).toHaveValue(name);
  await expect(page.getByLabel("Leg 2 length")).toHaveValue("77");
  expect(await total(page, "parts")).toBe(before);

  await page.reload();
  await expect(page.getByText("Your unsaved entries were brought back")).toBeVisible();
  await expect(page.getByLabel("Leg 2 length")).toHaveValue("77");
  await page.unroute("**/api/parts");
  await page.getByRole("button", { name: "Save part" }).click();
  await page.waitForURL(/\/parts\/[0-9a-f-]{36}$/);
  await expect(page.getByRole("heading", { level: 1 })).toHaveText(name);
  expect(await total(page, "parts")).toBe(before + 1);
});

test("a search that finds nothing says so, and the way back shows every part again", async ({ page }) => {
  await enterAs(page, "engineer");
  await page.goto("/parts");
  await page.getByRole("searchbox").fill("no part is called this");
  await expect(page.getByText("No part matches")).toBeVisible();
  await page.getByRole("button", { name: "Show every part" }).click();
  await expect(page.getByRole("searchbox")).toHaveValue("");
  await expect(page.getByRole("table").getByRole("row")).not.toHaveCount(1);
  await expect(page).toHaveURL(/\/parts$/);
});
