import { expect, test } from "@playwright/test";
import { enterAs } from "./support/enterAs";
import { releasedChannel } from "./support/releasedChannel";

test("an order of one's own is tried while it is dragged, says where it fails, becomes a plan, and is looked over again", async ({ page, baseURL }) => {
  test.setTimeout(240_000);
  const shop = await releasedChannel(baseURL ?? "");
  await enterAs(page, "engineer");
  await page.goto(`/plans/${shop.plan}?view=own`);
  const steps = page.getByRole("list", { name: "Your order" }).locator(":scope > li");
  await expect(steps).toHaveCount(4);
  await expect(steps.nth(3)).toContainText("can be made", { timeout: 60_000 });
  // Rows grow when the best plan of the order is known: they are measured after that.
  await expect(page.getByText("This order works")).toBeVisible({ timeout: 60_000 });

  // The order is b1 b2 and the other side: the return inside first would shut the punch in.
  const from = await page.getByRole("button", { name: "Move step 1, b1" }).boundingBox();
  const to = await steps.nth(1).boundingBox();
  if (!from || !to) throw new Error("the steps are on the screen");
  await page.mouse.move(from.x + from.width / 2, from.y + from.height / 2);
  await page.mouse.down();
  await page.mouse.move(from.x + from.width / 2, to.y + to.height - 2, { steps: 4 });
  await expect(steps.nth(1)).toContainText("cannot be made here", { timeout: 60_000 });
  await expect(steps.nth(2)).toContainText("not looked at");
  await page.mouse.up();
  await expect(page.getByRole("img", { name: "Section through b1 where it meets something" })).toBeVisible({ timeout: 60_000 });
  await page.getByRole("button", { name: "Find what would make it work" }).click();
  await page.getByRole("button", { name: "Stop and keep what was found" }).click();
  await expect(page.getByRole("region", { name: "Changes that would make it work" }).or(page.getByText("No single change was found that would do"))).toBeVisible({ timeout: 60_000 });
  await page.getByRole("button", { name: "Undo" }).click();
  await expect(steps.nth(1)).toContainText("can be made", { timeout: 60_000 });

  await page.getByRole("button", { name: "Move step 3, b4" }).press("Alt+ArrowUp");
  await expect(page.getByText("This order works")).toBeVisible({ timeout: 60_000 });
  await page.getByRole("button", { name: "Plan this order" }).click();
  await page.waitForURL((url) => url.pathname.startsWith("/plans/") && !url.pathname.endsWith(shop.plan), { timeout: 120_000 });
  await expect(page.getByText("along a person’s own order")).toBeVisible();
  await page.getByRole("button", { name: "Check again" }).click();
  await expect(page.getByText("the plan holds")).toBeVisible({ timeout: 60_000 });
});
