import { expect, test, type Page } from "@playwright/test";
import type { Page as ListPage, PlanDetail, SheetListItem, ToolDetail } from "../../lib/schemas/views";
import { api } from "./support/api";
import { enterAs } from "./support/enterAs";
import { pictureOf } from "./support/pictureOf";
import { keepPicture } from "./support/keepPicture";
import { planTexts } from "./support/planTexts";
import { readPdf } from "./support/readPdf";
import { shareChanged } from "./support/shareChanged";
import { signIn } from "./support/signIn";
import { channelLegs, typeChannel } from "./support/typeChannel";
import { watchPage } from "./support/watchPage";

/** From a typed part to good parts off the brake, by the people of the demonstration shop, one after another. */
test.describe.configure({ mode: "serial", timeout: 240_000 });

/** The pictures are taken on fresh data, where a plain name is nobody else's. */
const name = process.env.PICTURES === "1" ? "Mast channel" : `Mast channel ${Date.now().toString(36)}`;
const known = { part: "", plan: "", sheet: "", number: "", piece: "", tool: "" };
let complaints: readonly string[] = [];

test.beforeEach(({ page }) => {
  complaints = watchPage(page);
});
test.afterEach(() => {
  expect(complaints).toEqual([]);
});

const sheetsSeen = async (page: Page) => (await api<ListPage<SheetListItem>>(page, "/api/sheets?pageSize=100")).items;

test("the engineer types a U with returns; section, flat and 3D follow; it is saved", async ({ page }) => {
  await signIn(page, "engineer");
  await expect(page).toHaveURL(/\/parts$/);
  await page.getByRole("link", { name: "New part" }).click();
  await typeChannel(page, name);

  await expect(page.getByLabel(/^Leg \d length$/)).toHaveCount(channelLegs.length);
  await expect(page.getByRole("group", { name: "Flat pattern, 184.95 mm by 240 mm, 4 bend lines" })).toBeVisible();
  const folded = page.getByRole("figure").filter({ hasText: "Folded" }).locator("canvas");
  await expect.poll(async () => (await pictureOf(folded)).colours, { timeout: 60_000 }).toBeGreaterThan(20);
  const before = await pictureOf(folded);
  await page.getByLabel("Bend 1 direction").getByText("down").click();
  await expect.poll(async () => shareChanged(before, await pictureOf(folded))).toBeGreaterThan(0.005);
  await page.getByLabel("Bend 1 direction").getByText("up").click();
  await expect.poll(async () => shareChanged(before, await pictureOf(folded))).toBeLessThan(0.005);
  await keepPicture(page, "editor");

  await page.getByRole("button", { name: "Save part" }).click();
  await page.waitForURL(/\/parts\/[0-9a-f-]{36}$/);
  known.part = new URL(page.url()).pathname.split("/").at(-1) ?? "";
  await expect(page.getByRole("heading", { level: 1 })).toHaveText(name);
});

test("a plan is found on a brake, and the planner is followed while it works", async ({ page }) => {
  await enterAs(page, "engineer");
  await page.goto(`/parts/${known.part}`);
  await page.getByRole("button", { name: "Plan the bends" }).click();
  const dialog = page.getByRole("dialog");
  await expect(dialog.getByRole("combobox", { name: "Brake" })).toContainText(/\w/);
  await dialog.getByLabel("Batch").fill("25");
  await dialog.getByRole("button", { name: "Find a plan" }).click();
  await page.waitForURL(/\/plans\/[0-9a-f-]{36}$/, { timeout: 180_000 });
  known.plan = new URL(page.url()).pathname.split("/").at(-1) ?? "";

  const { plan } = await api<PlanDetail>(page, `/api/plans/${known.plan}`);
  expect(plan.steps.length).toBeGreaterThan(0);
  expect(plan.batch).toBe(25);
  expect(plan.steps.flatMap((step) => step.bends).toSorted()).toEqual(["b1", "b2", "b3", "b4"]);
  const rows = page.getByRole("region", { name: "Order of the bends" }).getByRole("row");
  await expect(rows).toHaveCount(plan.steps.length + 1);
  for (const [index, step] of planTexts(plan).steps.entries()) {
    for (const text of [step.bends, step.punch, step.die, step.x, step.r, ...step.z, step.demanded]) await expect(rows.nth(index + 1)).toContainText(text);
  }
});

test("every step is drawn in 3D, and moves when the stroke is scrubbed", async ({ page }) => {
  await enterAs(page, "engineer");
  await page.goto(`/plans/${known.plan}`);
  const canvas = page.locator("canvas");
  await expect.poll(async () => (await pictureOf(canvas)).colours, { timeout: 60_000 }).toBeGreaterThan(50);
  let last = await pictureOf(canvas);
  expect(last.ground).toBeLessThan(0.97);
  const steps = await page.getByRole("button", { name: /^Show step \d+$/ }).count();
  expect(steps).toBeGreaterThan(1);
  for (let number = 2; number <= steps; number += 1) {
    await page.getByRole("button", { name: `Show step ${number}` }).click();
    await expect(page.getByRole("button", { name: `Show step ${number}` })).toHaveAttribute("aria-pressed", "true");
    await expect.poll(async () => shareChanged(last, await pictureOf(canvas)), { message: `step ${number} looks like the one before` }).toBeGreaterThan(0.005);
    last = await pictureOf(canvas);
    expect(last.colours).toBeGreaterThan(50);
  }

  const slider = page.getByRole("slider", { name: "Place in the stroke" });
  await slider.fill("0");
  await expect(slider).toHaveAttribute("aria-valuetext", "0.0 degrees");
  await expect.poll(async () => shareChanged(last, await pictureOf(canvas))).toBeGreaterThan(0.005);
  const flat = await pictureOf(canvas);
  await slider.fill("0.6");
  await expect(slider).not.toHaveAttribute("aria-valuetext", "0.0 degrees");
  await expect.poll(async () => shareChanged(flat, await pictureOf(canvas))).toBeGreaterThan(0.005);
  await keepPicture(page, "plan");

  const solid = await pictureOf(canvas);
  await page.getByRole("button", { name: "Section", exact: true }).click();
  await expect.poll(async () => shareChanged(solid, await pictureOf(canvas))).toBeGreaterThan(0.005);
  await page.getByRole("button", { name: "Drawn view" }).click();
  await expect(page.getByRole("img", { name: /section through the bend$/ })).toBeVisible();
});

test("a draft is made, and nobody at the brake sees it", async ({ page, browser, baseURL }) => {
  await enterAs(page, "engineer");
  await page.goto(`/plans/${known.plan}`);
  await page.getByRole("button", { name: "Make setup sheet" }).click();
  await page.waitForURL(/\/sheets\/[0-9a-f-]{36}$/);
  known.sheet = new URL(page.url()).pathname.split("/").at(-1) ?? "";
  await expect(page.getByText("draft", { exact: true })).toBeVisible();
  known.number = (await sheetsSeen(page)).find((sheet) => sheet.id === known.sheet)?.number ?? "";
  expect(known.number).not.toBe("");

  const brake = await (await browser.newContext(baseURL ? { baseURL } : {})).newPage();
  await signIn(brake, "operator");
  await expect(brake.getByRole("searchbox")).toBeVisible();
  await expect(brake.getByText("Loading…")).toHaveCount(0);
  await expect(brake.getByText(name)).toHaveCount(0);
  expect((await sheetsSeen(brake)).filter((sheet) => sheet.id === known.sheet || sheet.state === "draft")).toEqual([]);
  for (const path of ["", "/pdf"]) expect((await brake.request.get(`/api/sheets/${known.sheet}${path}`)).status(), path).toBe(404);
  await brake.goto(`/floor/${known.sheet}`);
  await expect(brake.getByRole("alert").filter({ hasText: /\w/ })).toBeVisible();
  for (const path of [`/floor/${known.sheet}`, `/print/${known.sheet}`, `/sheets/${known.sheet}`]) {
    await brake.goto(path);
    await expect(brake.getByText("Loading…")).toHaveCount(0);
    await expect(brake.getByText(name)).toHaveCount(0);
  }
  await brake.context().close();
});

test("the engineer releases it, asked once more, and signs out", async ({ page }) => {
  await enterAs(page, "engineer");
  await page.goto(`/sheets/${known.sheet}`);
  await page.getByRole("button", { name: "Release", exact: true }).click();
  await page.getByRole("button", { name: "Not yet" }).click();
  await expect(page.getByText("draft", { exact: true })).toBeVisible();
  await page.getByRole("button", { name: "Release", exact: true }).click();
  await page.getByRole("button", { name: "Release to the floor" }).click();
  await expect(page.getByText("released", { exact: true })).toBeVisible();
  await expect(page.getByRole("button", { name: "Release", exact: true })).toHaveCount(0);
  await expect(page.getByRole("article", { name: `Setup sheet ${known.number}` })).toBeVisible();
  await keepPicture(page, "sheet");
  await page.getByRole("button", { name: "Sign out" }).click();
  await page.waitForURL(/\/sign-in/);
  await page.goto(`/sheets/${known.sheet}`);
  await expect(page).toHaveURL(/\/sign-in/);
});

test("the operator opens the sheet at the brake and steps through it by key", async ({ page }) => {
  await signIn(page, "operator");
  await expect(page).toHaveURL(/\/floor$/);
  await expect(page.getByText(name)).toBeVisible();
  await page.getByRole("link", { name: new RegExp(known.number) }).click();
  const place = page.locator("header [aria-live]");
  await expect(place).toHaveText("Before you start");
  await expect(page.getByText(/guard/i).first()).toBeVisible();

  await page.keyboard.press("ArrowRight");
  await expect(place).toHaveText("Tools");
  const tools = page.getByRole("checkbox");
  expect(await tools.count()).toBeGreaterThan(1);
  await tools.first().click();
  await expect(tools.first()).toBeChecked();
  await page.keyboard.press("PageDown");
  await expect(place).toHaveText("Bed");

  const steps = page.getByRole("main");
  await page.keyboard.press("PageDown");
  for (let number = 1; number <= 4; number += 1) {
    await expect(place).toHaveText(`Bend ${number} of 4`);
    await expect(steps.getByText("Gauge X")).toBeVisible();
    if (number === 4) await keepPicture(page, "floor");
    await page.keyboard.press("ArrowRight");
  }
  await expect(place).toHaveText("First part");
  await page.keyboard.press("ArrowLeft");
  await expect(place).toHaveText("Bend 4 of 4");
});

test("the PDF says what the plan says: tools, pieces, rack places, gauge", async ({ page, browser, baseURL }) => {
  await enterAs(page, "engineer");
  const { plan, document, partNumber } = await api<PlanDetail>(page, `/api/plans/${known.plan}`);
  expect(document.units).toBe("mm");
  const texts = planTexts(plan);
  expect(texts.pieces.length).toBeGreaterThan(1);
  const tools = await Promise.all([...new Set(texts.steps.flatMap((step) => [step.punch, step.die]))].map((code) => api<ToolDetail>(page, `/api/tools/${encodeURIComponent(code)}`)));
  const owned = tools.flatMap((tool) => tool.pieceList);

  const brake = await (await browser.newContext(baseURL ? { baseURL } : {})).newPage();
  await enterAs(brake, "operator");
  const answer = await brake.request.get(`/api/sheets/${known.sheet}/pdf`);
  expect(answer.headers()["content-type"]).toBe("application/pdf");
  const { words, pages } = await readPdf(await answer.body());
  await brake.goto(`/print/${known.sheet}`);
  const paper = (await brake.getByRole("article").innerText()).replace(/\s+/g, "");
  await brake.context().close();

  expect(pages).toBeGreaterThan(0);
  const bare = (text: string) => text.replace(/\s+/g, "");
  for (const [where, said] of Object.entries({ pdf: words, print: paper })) {
    for (const text of [name, known.number, partNumber]) expect(said, where).toContain(bare(text));
    for (const code of texts.pieces) {
      const piece = owned.find((one) => one.code === code);
      expect(piece, `the toolroom owns ${code}`).toBeDefined();
      expect(said.slice(said.indexOf(bare(code))), `${where}: the rack place of ${code}`).toContain(bare(piece?.rack ?? "none"));
      expect(said, where).toContain(bare(code));
    }
    const rows = said.slice(said.search(/Bendsinorder/i)).split(/GaugeX(?=-?\d)/i).slice(1);
    expect(rows, where).toHaveLength(texts.steps.length);
    for (const [index, step] of texts.steps.entries()) {
      for (const text of [step.x, step.r, step.z.join(" / "), step.angle, step.demanded, step.punch, step.die]) expect(rows[index], `${where}, step ${index + 1}`).toContain(bare(text));
      expect(rows[index]?.startsWith(step.x), `${where}: X of step ${index + 1}`).toBe(true);
    }
  }
  known.piece = texts.pieces[0] ?? "";
  known.tool = texts.steps[0]?.punch ?? "";
});

test("the office page leads to the PDF; the print page prints the sheet without its buttons", async ({ page }) => {
  await enterAs(page, "engineer");
  await page.goto(`/sheets/${known.sheet}`);
  const link = page.getByRole("link", { name: "PDF" });
  const file = await page.request.get((await link.getAttribute("href")) ?? "");
  expect(file.headers()["content-disposition"]).toContain(known.number);
  const read = await readPdf(await file.body());
  expect(read.words).toContain(known.number);
  await link.click();
  await page.waitForURL(/\/pdf$/);

  await page.goto(`/print/${known.sheet}`);
  await expect(page.getByRole("article", { name: `Setup sheet ${known.number}` })).toBeVisible();
  await page.emulateMedia({ media: "print" });
  await expect(page.getByRole("button", { name: "Print" })).toBeHidden();
  const printed = await readPdf(await page.pdf({ format: "A4" }));
  expect(printed.words).toContain(known.number);
});

test("the toolroom opens a tool that the sheet uses and moves a piece to another rack place", async ({ page }) => {
  await signIn(page, "toolroom");
  await expect(page).toHaveURL(/\/tools$/);
  await page.getByRole("searchbox").fill(known.tool);
  await page.getByRole("link", { name: known.tool, exact: true }).click();
  await expect(page.getByRole("heading", { level: 1 })).toHaveText(known.tool);
  const tool = await api<ToolDetail>(page, `/api/tools/${encodeURIComponent(known.tool)}`);
  const pieces = page.getByRole("table", { name: "Pieces of this tool" });
  await expect(pieces.getByRole("row")).toHaveCount(tool.pieceList.length + 1);
  const rack = page.getByRole("textbox", { name: `Rack place of ${known.piece}` });
  const old = tool.pieceList.find((piece) => piece.code === known.piece)?.rack ?? "";
  await expect(rack).toHaveValue(old);
  await keepPicture(page, "tool");
  await rack.fill("Z-99-9");
  await rack.press("Enter");
  await expect(page.getByText("Rack place saved").first()).toBeVisible();
  await page.reload();
  await expect(rack).toHaveValue("Z-99-9");

  const released = (await readPdf(await (await page.request.get(`/api/sheets/${known.sheet}/pdf`)).body())).words;
  expect(released, "a released sheet stays as it was").not.toContain("Z-99-9");
  await rack.fill(old);
  await rack.press("Enter");
  await expect.poll(async () => (await api<ToolDetail>(page, `/api/tools/${encodeURIComponent(known.tool)}`)).pieceList.find((piece) => piece.code === known.piece)?.rack).toBe(old);
});
