import AxeBuilder from "@axe-core/playwright";
import { expect, test, type Page } from "@playwright/test";
import type { MaterialDetail } from "../../lib/schemas/materialViews";
import { api } from "./support/api";
import { enterAs } from "./support/enterAs";
import { watchPage } from "./support/watchPage";

/** No part of the demonstration shop is of it. */
const id = "Cu-DHP-R240";

let complaints: readonly string[] = [];
test.beforeEach(async ({ page }) => {
  complaints = watchPage(page);
  await enterAs(page, "engineer");
});
test.afterEach(() => { expect(complaints).toEqual([]); });

const now = (page: Page) => api<MaterialDetail>(page, `/api/materials/${id}`);
const clean = async (page: Page) => { expect((await new AxeBuilder({ page }).analyze()).violations.map(({ id: rule, nodes }) => `${rule}: ${nodes[0]?.html ?? ""}`)).toEqual([]); };

test("an engineer changes a value, says where it is from, and sees the version beside the one before", async ({ page }) => {
  const { material: { version, density } } = await now(page);
  const next = density === 8950 ? 8940 : 8950;
  await page.goto(`/materials/${id}`);
  await page.getByRole("button", { name: "Change values" }).click();
  await page.getByLabel("Density", { exact: true }).fill(String(next / 1000));
  await page.getByRole("button", { name: "Save as a new version" }).click();
  await expect(page.getByText(`Must be 500 to 25000 kg/m³; ${next / 1000} looks like g/cm³, which is ${next} kg/m³.`)).toBeVisible();
  await expect(page.getByLabel("Density", { exact: true })).toBeFocused();
  await page.getByLabel("Density", { exact: true }).fill(String(next));
  await page.getByLabel("Density: source").fill("weighed sheet 1 m by 1 m");
  await page.getByLabel("Why, for the record").fill("own scale");
  await clean(page);
  await page.getByRole("button", { name: "Save as a new version" }).click();
  const versions = page.getByRole("main").getByRole("listitem").filter({ hasText: `Version ${version + 1}` });
  await expect(versions).toContainText(`density (kg/m³): ${density} →becomes ${next}`);
  await expect(versions).toContainText("own scale");
  await expect(page.getByRole("row", { name: /^Density/ })).toContainText(`${next} kg/m³`);
  await expect(page.getByRole("row", { name: /^Density/ })).toContainText("The shop’s own weighed sheet 1 m by 1 m");
  await expect(page.getByRole("heading", { name: "Compare two versions" })).toBeVisible();
  await clean(page);
});

test("a pasted table says what each line would do, and writes only what is confirmed", async ({ page }) => {
  const { material } = await now(page);
  const strength = material.yield === 185 ? 180 : 185;
  await page.goto("/materials");
  await expect(page.getByRole("link", { name: id })).toBeVisible();
  await page.getByRole("link", { name: "Import" }).click();
  const lines = page.getByLabel("Lines of materials, the headings first");
  await lines.fill([
    "short name;name;standard;group;tensile lowest (MPa);tensile highest (MPa);yield (MPa);modulus (GPa);density (kg/m³);straight length;natural radius per V;usual radius per thickness;K by",
    `${id};${material.name};EN 1652;copper;240;300;${strength};120;${material.density};medium;0,1;1;machinery`,
    "Odd;Odd;none;tin;500;400;280;210;7850;medium;0,2;1;k",
  ].join("\r\n"));
  await page.getByRole("button", { name: "See what it would do" }).click();
  await expect(page.getByText("Dry run, nothing written yet: 1 to be changed, 1 refused")).toBeVisible();
  await expect(page.getByRole("row", { name: /^3 Odd/ })).toContainText("must be one of steel, stainless, aluminium, copper, brass");
  const write = page.getByRole("button", { name: "Write 1 line" });
  await expect(write).toBeDisabled();
  await page.getByRole("radio", { name: "Change 1" }).click();
  await expect(page.getByRole("row", { name: new RegExp(`^2 ${id}`) })).toContainText(`yield (MPa) ${material.yield} →becomes ${strength}`);
  await clean(page);
  expect((await now(page)).material.version).toBe(material.version);
  await page.getByRole("button", { name: "Back to the text" }).click();
  await expect(lines).toHaveValue(/Odd/);
  await page.getByRole("button", { name: "See what it would do" }).click();
  await page.getByLabel("Leave out the refused line and write the rest").check();
  await write.click();
  await page.waitForURL(/\/materials$/);
  await expect(page.getByRole("row", { name: new RegExp(`^${id}`) })).toContainText(String(strength));
  expect((await now(page)).material).toMatchObject({ version: material.version + 1, yield: strength, origins: { yield: { kind: "shop", text: "imported from a table" } } });
});
