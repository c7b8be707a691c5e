import { existsSync } from "node:fs";
import { installDebianPackage } from "./installDebianPackage.mjs";
import { PlainError } from "../plainError.mjs";

const PLACES = ["/usr/bin/chromium", "/usr/bin/chromium-browser", "/usr/bin/google-chrome"];

/** Debian's Chromium, installed when there is no browser of its kind. */
export async function ensureChromium() {
  const found = PLACES.find((place) => existsSync(place));
  if (found) return found;
  await installDebianPackage("chromium", "The browser test");
  const installed = PLACES.find((place) => existsSync(place));
  if (!installed) throw new PlainError("Debian's package chromium is installed, but /usr/bin/chromium is not there.");
  return installed;
}
