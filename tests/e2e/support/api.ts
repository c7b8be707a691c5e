import { expect, type Page } from "@playwright/test";

/** What the API answers to whoever is signed in on this page. */
export async function api<T>(page: Page, path: string): Promise<T> {
  const response = await page.request.get(path);
  expect(response.status(), path).toBe(200);
  return (await response.json()) as T;
}
