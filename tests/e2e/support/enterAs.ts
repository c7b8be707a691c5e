import type { Page } from "@playwright/test";
import type { Role } from "../../../lib/schemas/role";
import { demonstrationPassword } from "../../../seeds/shop/demonstrationPassword";
import { emailOf } from "./emailOf";

/** Signs in without the form: quicker, where the form is not what is looked at. */
export async function enterAs(page: Page, role: Role): Promise<void> {
  const { csrfToken } = (await (await page.request.get("/api/auth/csrf")).json()) as { csrfToken: string };
  const form = { email: emailOf(role), password: demonstrationPassword, csrfToken, json: "true" };
  const response = await page.request.post("/api/auth/callback/credentials", { form });
  if (!response.ok()) throw new Error(`sign-in of the ${role} answered ${response.status()}`);
}
