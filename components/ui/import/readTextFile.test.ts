import { expect, it } from "vitest";
import { readTextFile } from "./readTextFile";

it.each([
  ["UTF-8", new TextEncoder().encode("Blech, weiß"), "Blech, weiß", false],
  ["UTF-8 with its mark", new TextEncoder().encode("\uFEFFBlech"), "Blech", false],
  ["UTF-16", new Uint8Array([0xff, 0xfe, 0x42, 0, 0xdf, 0]), "Bß", true],
  ["Windows-1252", new Uint8Array([0x42, 0xdf, 0x20, 0xfc]), "Bß ü", true],
])("reads %s", async (_name, bytes, text, noted) => {
  const read = await readTextFile(new Blob([bytes]));
  expect(read.text).toBe(text);
  expect(read.note !== undefined).toBe(noted);
});
