import AxeBuilder from "@axe-core/playwright";
import { expect, test, type Page } from "@playwright/test";
import type { PartDetail } from "../../lib/schemas/views";
import type { Role } from "../../lib/schemas/role";
import { demonstrationPassword } from "../../seeds/shop/demonstrationPassword";
import { api } from "./support/api";
import { emailOf } from "./support/emailOf";
import { enterAs } from "./support/enterAs";
import { releasedChannel, type ReleasedChannel } from "./support/releasedChannel";
import { typeChannel } from "./support/typeChannel";
import { watchPage } from "./support/watchPage";

test.describe.configure({ timeout: 240_000 });

let shop: ReleasedChannel;
test.beforeAll(async ({ baseURL }) => {
  shop = await releasedChannel(baseURL ?? "");
});

const pagesOf = (): Readonly<Record<Role, readonly string[]>> => ({
  engineer: ["/parts", "/parts/new", `/parts/${shop.part}`, `/parts/${shop.part}/edit`, "/plans", `/plans/${shop.plan}`, "/sheets", `/sheets/${shop.sheet}`, `/print/${shop.sheet}`],
  operator: ["/floor", `/floor/${shop.sheet}`, "/bend-table", "/forbidden"],
  toolroom: ["/tools", "/tools/new", `/tools/${shop.tool}`, "/machines", "/materials", "/bend-table/trials", "/bend-table/instruments"],
  manager: ["/people", "/activity"],
});

/** The page has drawn what it has to say. */
async function settled(page: Page, path: string): Promise<void> {
  await page.goto(path);
  await expect(page.getByRole("heading", { level: 1 }).or(page.getByRole("article"))).not.toHaveCount(0);
  await expect(page.getByText(/^Loading\b/)).toHaveCount(0);
}

async function graveFaults(page: Page): Promise<readonly string[]> {
  const { violations } = await new AxeBuilder({ page }).analyze();
  return violations
    .filter(({ impact }) => impact === "serious" || impact === "critical")
    .map(({ id, nodes }) => `${id}: ${nodes.map((node) => node.target.join(" ")).slice(0, 4).join(" | ")}`);
}

for (const role of ["engineer", "operator", "toolroom", "manager"] as const) {
  test(`the ${role}'s pages: no grave fault for people who read or steer otherwise, nothing on the console`, async ({ page }) => {
    const complaints = watchPage(page);
    await enterAs(page, role);
    for (const path of pagesOf()[role]) {
      await settled(page, path);
      expect.soft(await graveFaults(page), path).toEqual([]);
    }
    expect(complaints).toEqual([]);
  });
}

test("the sign-in page has no grave fault, also with its messages", async ({ page }) => {
  await page.goto("/sign-in");
  expect(await graveFaults(page)).toEqual([]);
  await page.getByRole("button", { name: "Sign in" }).click();
  await expect(page.getByLabel("E-mail address")).toHaveAttribute("aria-invalid", "true");
  expect(await graveFaults(page)).toEqual([]);
});

test("every screen at the brake has no grave fault", async ({ page }) => {
  await enterAs(page, "operator");
  await settled(page, `/floor/${shop.sheet}`);
  for (let screen = 0; screen < 5; screen += 1) {
    expect.soft(await graveFaults(page), `screen ${screen + 1}`).toEqual([]);
    await page.keyboard.press("ArrowRight");
  }
});

test("the planning dialog and the import dialog have no grave fault and give the focus back", async ({ page }) => {
  await enterAs(page, "engineer");
  await settled(page, `/parts/${shop.part}`);
  const plan = page.getByRole("button", { name: "Plan the bends" });
  await plan.press("Enter");
  await expect(page.getByRole("dialog")).toBeVisible();
  expect(await graveFaults(page)).toEqual([]);
  await page.keyboard.press("Escape");
  await expect(plan).toBeFocused();
  await settled(page, "/parts/new");
  const importing = page.getByRole("button", { name: "Import" });
  await importing.press("Enter");
  await expect(page.getByRole("dialog")).toBeVisible();
  expect(await graveFaults(page)).toEqual([]);
  await page.keyboard.press("Escape");
  await expect(importing).toBeFocused();
});

/** Presses Tab until this control has the focus. */
async function tabTo(page: Page, role: "button" | "link" | "textbox", name: RegExp): Promise<void> {
  for (let presses = 0; presses < 80; presses += 1) {
    const here = page.locator(":focus").and(page.getByRole(role, { name }));
    if ((await here.count()) > 0) return;
    await page.keyboard.press("Tab");
  }
  throw new Error(`the ${role} ${String(name)} is out of reach of the Tab key`);
}

test("by keyboard alone: sign in, a new part typed and saved", async ({ page }) => {
  const name = `By keys ${Date.now().toString(36)}`;
  await page.goto("/sign-in");
  await tabTo(page, "textbox", /E-mail/);
  await page.keyboard.type(emailOf("engineer"));
  await page.keyboard.press("Tab");
  await page.keyboard.type(demonstrationPassword);
  await page.keyboard.press("Enter");
  await page.waitForURL(/\/parts$/);
  await tabTo(page, "link", /^New part$/);
  await page.keyboard.press("Enter");
  await page.waitForURL(/\/parts\/new$/);
  await tabTo(page, "textbox", /^Name$/);
  await page.keyboard.type(name);
  await tabTo(page, "textbox", /^Leg 1 length$/);
  for (const length of ["22", "44"]) {
    await page.keyboard.press("ControlOrMeta+a");
    await page.keyboard.type(length);
    await page.keyboard.press("Enter");
  }
  await page.keyboard.type("33");
  await expect(page.getByLabel(/^Leg \d length$/)).toHaveCount(5);
  await page.keyboard.press("Shift+Tab");
  for (let presses = 0; presses < 80; presses += 1) {
    if ((await page.locator(":focus").and(page.getByRole("button", { name: "Save part" })).count()) > 0) break;
    await page.keyboard.press("Shift+Tab");
  }
  await page.keyboard.press("Enter");
  await page.waitForURL(/\/parts\/[0-9a-f-]{36}$/);
  const { document } = await api<PartDetail>(page, `/api${new URL(page.url()).pathname}`);
  expect(document).toMatchObject({ name, profile: { legs: [22, 44, 33, 80, 40] } });
});

test.describe("enlarged to 200 %", () => {
  test.use({ viewport: { width: 720, height: 450 } });

  for (const [role, paths] of [["engineer", () => ["/parts", "/parts/new", `/plans/${shop.plan}`, `/sheets/${shop.sheet}`]], ["toolroom", () => ["/tools", `/tools/${shop.tool}`, "/bend-table/new", "/bend-table/coverage"]], ["operator", () => ["/floor", `/floor/${shop.sheet}`]]] as const) {
    test(`the ${role}'s pages do not scroll sideways`, async ({ page }) => {
      await enterAs(page, role);
      for (const path of paths()) {
        await settled(page, path);
        const { wide, shown } = await page.evaluate(() => ({ wide: document.documentElement.scrollWidth, shown: document.documentElement.clientWidth }));
        expect.soft(wide, path).toBeLessThanOrEqual(shown);
      }
    });
  }
});

test("without 3D a drawn view takes its place, in the editor, on the plan and at the brake", async ({ page }) => {
  await page.addInitScript(() => {
    const get = HTMLCanvasElement.prototype.getContext;
    HTMLCanvasElement.prototype.getContext = function (this: HTMLCanvasElement, ...given: Parameters<typeof get>) {
      return given[0].includes("webgl") ? null : get.apply(this, given);
    } as typeof get;
  });
  const complaints = watchPage(page);
  await enterAs(page, "engineer");
  await settled(page, "/parts/new");
  const name = "Drawn only";
  await typeChannel(page, name);
  await expect(page.getByRole("img", { name: `The part ${name}, folded` })).toBeVisible();

  await settled(page, `/plans/${shop.plan}`);
  await expect(page.getByText("This browser has no 3D: section through the bend")).toBeVisible();
  const drawn = page.getByRole("img", { name: "Step 1, section through the bend" });
  await expect(drawn).toBeVisible();
  const folded = await drawn.innerHTML();
  await page.getByRole("slider", { name: "Place in the stroke" }).fill("0");
  await expect.poll(() => drawn.innerHTML()).not.toBe(folded);
  await page.getByRole("button", { name: "Show step 2" }).click();
  await expect(page.getByRole("img", { name: "Step 2, section through the bend" })).toBeVisible();
  await expect(page.locator("canvas")).toHaveCount(0);

  await settled(page, `/floor/${shop.sheet}`);
  for (const place of ["Tools", "Bed", "Bend 1 of 4"]) {
    await page.keyboard.press("ArrowRight");
    await expect(page.locator("header [aria-live]")).toHaveText(place);
  }
  await page.getByRole("button", { name: "3D" }).click();
  await expect(page.getByRole("img", { name: "Step 1, section through the bend" })).toBeVisible();
  await expect(page.locator("canvas")).toHaveCount(0);
  expect(complaints).toEqual([]);
});
