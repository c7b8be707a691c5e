import { expect, test } from "@playwright/test";
import type { Page as ListPage, PartDetail, PlanListItem } from "../../lib/schemas/views";
import { api } from "./support/api";
import { enterAs } from "./support/enterAs";

/** Fourteen bends keep the planner busy for as long as it is given. */
const legs = [20, ...Array<number>(13).fill(30), 20];
const bends = legs.slice(1).map((_, index) => ({ angle: 90, direction: index % 4 < 2 ? "up" : "down" }));

test("planning is stopped by hand, and leaves no plan behind", async ({ page }) => {
  test.setTimeout(120_000);
  await enterAs(page, "engineer");
  await page.goto("/parts");
  const name = `Long corrugation ${Date.now().toString(36)}`;
  const answer = await page.request.post("/api/parts", {
    headers: { origin: new URL(page.url()).origin },
    data: { note: "", document: { format: "part/1", name, units: "mm", material: "S235", thickness: 1, profile: { width: 100, legs, bends } } },
  });
  expect(answer.status()).toBe(201);
  const { id } = (await answer.json()) as PartDetail;

  await page.goto(`/parts/${id}`);
  await page.getByRole("button", { name: "Plan the bends" }).click();
  const dialog = page.getByRole("dialog");
  await expect(dialog.getByRole("combobox", { name: "Brake" })).toContainText(/\w/);
  await dialog.getByRole("button", { name: /plan/i }).last().click();
  await expect(dialog).toContainText("Looking for", { timeout: 30_000 });
  await dialog.getByRole("button", { name: "Stop planning" }).click();
  await expect(dialog).toContainText("Planning was stopped");
  await expect(dialog).toContainText("No plan was kept.");
  const plans = await api<ListPage<PlanListItem>>(page, `/api/plans?q=${encodeURIComponent(name)}`);
  expect(plans.total).toBe(0);
});
