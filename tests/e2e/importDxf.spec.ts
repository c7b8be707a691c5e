import { readFile } from "node:fs/promises";
import { expect, test } from "@playwright/test";
import { importDxf } from "../../bending/exchange/dxf/import/importDxf";
import { dxfText, line, rectangle } from "../../bending/exchange/dxf/fixtures/dxfText";
import { enterAs } from "./support/enterAs";

// A gap in the contour, bend lines on a layer whose name says nothing, and a unit that the sizes gainsay.
const drawing = dxfText({
  header: [[9, "$INSUNITS"], [70, 1]],
  layers: [{ name: "LAYER_7" }],
  entities: [line(0, 0, 199.95, 0), ...rectangle(0, 0, 200, 100).slice(1), ...[40, 100, 160].map((x) => line(x, 0, x, 100, "LAYER_7"))],
});

test("a drawing becomes a part: unit confirmed, layer picked, angles filled down, saved, drawn again", async ({ page }) => {
  await enterAs(page, "engineer");
  await page.goto("/parts");
  await page.getByRole("link", { name: "Import drawings" }).click();
  await page.getByLabel("Drawings of flats, one part a file").setInputFiles([
    { name: "broken.dxf", mimeType: "image/vnd.dxf", buffer: Buffer.from(drawing.slice(0, 400)) },
    { name: "Channel_2mm.dxf", mimeType: "image/vnd.dxf", buffer: Buffer.from(drawing) },
  ]);
  await expect(page.getByText(/^The file ends in the middle|was expected/)).toBeVisible();
  await page.getByRole("button", { name: "Leave this file out" }).click();

  await expect(page.getByRole("button", { name: "A gap of 0.050 mm at 200, 0 was closed" })).toBeVisible();
  await page.getByRole("combobox", { name: /Lines on LAYER_7/ }).click();
  await page.getByRole("option", { name: "Bend up" }).click();
  await expect(page.getByRole("button", { name: /^Bend line b3/ })).toBeVisible();
  const first = page.getByRole("textbox", { name: "Angle of b1" });
  await first.fill("60");
  await first.press("ControlOrMeta+d");
  await expect(page.getByRole("textbox", { name: "Angle of b3" })).toHaveValue("60");
  await page.getByRole("radio", { name: "down" }).last().click();
  await expect(page.getByRole("button", { name: "Bend line b3 D 60°" })).toBeVisible();
  await expect(page.getByRole("textbox", { name: "Thickness" })).toHaveValue("2");

  await page.getByRole("button", { name: "Save part" }).click();
  await expect(page.getByText("Say which unit the drawing is in")).toBeVisible();
  await page.getByRole("button", { name: "It is in mm" }).click();
  await page.getByRole("button", { name: "Save part" }).click();
  await page.getByRole("list", { name: "Files" }).getByRole("link").click();

  await expect(page.getByText(/From Channel_2mm\.dxf.*its header says inches.*1 gap/)).toBeVisible();
  await page.getByRole("button", { name: "Download" }).click();
  const [download] = await Promise.all([page.waitForEvent("download"), page.getByRole("menuitem", { name: "Flat, DXF contours" }).click()]);
  const read = importDxf(await readFile(await download.path(), "utf8"), { name: "back", material: "S235", thickness: 2 });
  expect(read.ok && read.value.document.flat?.bends.map(({ angle, direction }) => `${angle} ${direction}`)).toEqual(["60 up", "60 up", "60 down"]);
});
