import type { Page } from "@playwright/test";

/** Not of this project: the 3D library's own notice about one of its classes. */
const known = /THREE\.Clock: This module has been deprecated/;

/** Collects what a page complains about: errors on the console and errors that nothing caught. */
export function watchPage(page: Page): readonly string[] {
  const complaints: string[] = [];
  page.on("console", (message) => {
    if (message.type() === "error" && !known.test(message.text())) complaints.push(`${new URL(page.url()).pathname}: ${message.text()}`);
  });
  page.on("pageerror", (error) => complaints.push(`${new URL(page.url()).pathname}: ${error.message}`));
  return complaints;
}
