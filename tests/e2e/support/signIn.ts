import type { Page } from "@playwright/test";
import type { Role } from "../../../lib/schemas/role";
import { demonstrationPassword } from "../../../seeds/shop/demonstrationPassword";
import { emailOf } from "./emailOf";

/** Signs in on the page as people do, and waits for where the role works. */
export async function signIn(page: Page, role: Role): Promise<void> {
  await page.goto("/sign-in");
  await page.getByLabel("E-mail address").fill(emailOf(role));
  await page.getByLabel("Password").fill(demonstrationPassword);
  await page.getByRole("button", { name: "Sign in" }).click();
  await page.waitForURL((url) => url.pathname !== "/sign-in" && url.pathname !== "/");
}
