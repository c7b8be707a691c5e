import { readFile } from "node:fs/promises";
import { join } from "node:path";
import { expect, test } from "@playwright/test";
import { api } from "./support/api";
import { enterAs } from "./support/enterAs";

/** A bracket of this project's own: 2 mm, bent 90° up and 60° down, two holes, and a stud that no bending makes. */
const bracket = join(import.meta.dirname, "fixtures/sensor-bracket.stp");

test("a STEP file becomes a part: cut off it is refused, whole it is recognised, rounded and saved", async ({ page }) => {
  await enterAs(page, "engineer");
  await page.goto("/parts/import-step");
  const box = page.getByLabel("STEP file of one folded part");
  const whole = await readFile(bracket);
  await box.setInputFiles({ name: "half.stp", mimeType: "model/step", buffer: whole.subarray(0, whole.length / 2) });
  await expect(page.getByText("The file is cut off: its closing line")).toBeVisible({ timeout: 60_000 });

  await box.setInputFiles(bracket);
  await expect(page.getByRole("heading", { name: "sensor-bracket.stp" })).toBeVisible({ timeout: 60_000 });
  await expect(page.getByText(/^Faces \d+, \d+: .*such as a stud/)).toBeVisible();
  await expect(page.getByRole("textbox", { name: "Thickness" })).toHaveValue("2");
  await page.getByRole("button", { name: "Round radii to 0.1 mm" }).click();
  await page.getByRole("textbox", { name: "Name" }).fill("Sensor bracket");
  await page.getByRole("button", { name: "Save part" }).click();
  await page.waitForURL(/\/parts\/[0-9a-f-]{36}$/);
  await expect(page.getByRole("heading", { name: "Sensor bracket" })).toBeVisible();
  const id = page.url().split("/").at(-1) ?? "";
  const part = await api<{ readonly document: { readonly thickness: number; readonly flanges: readonly { readonly angle: number; readonly insideRadius: number }[] } }>(page, `/api/parts/${id}`);
  expect(part.document.flanges.map(({ angle, insideRadius }) => `${angle}° r${insideRadius}`).sort()).toEqual(["60° r3", "90° r2"]);
});
