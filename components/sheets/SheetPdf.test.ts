import { getDocument } from "pdfjs-dist/legacy/build/pdf.mjs";
import { beforeAll, describe, expect, it } from "vitest";
import { buildSheetView } from "@/lib/sheet/buildSheetView";
import { channelPlan } from "@/lib/sheet/fixtures/channelPlan";
import { renderSheetPdf } from "./renderSheetPdf";

const view = buildSheetView({ ...channelPlan, part: { number: "RS-104", name: "Łódź channel <b>", revision: 3 }, sheet: { number: "S-0007" } });

async function read(file: Uint8Array): Promise<{ readonly pages: number; readonly text: string }> {
  const pdf = await getDocument({ data: file.slice(), useSystemFonts: false }).promise;
  const pages = await Promise.all(Array.from({ length: pdf.numPages }, async (_, i) => (await (await pdf.getPage(i + 1)).getTextContent()).items));
  return { pages: pdf.numPages, text: pages.flat().map((item) => ("str" in item ? item.str : "")).join(" ").replace(/\s+/g, " ") };
}

let released: Awaited<ReturnType<typeof read>>;
let draft: Awaited<ReturnType<typeof read>>;

beforeAll(async () => {
  const common = { view, address: "http://shop.example/floor/1" } as const;
  released = await read(await renderSheetPdf({ ...common, state: "released", released: "2026-12-01 07:30 UTC, Ines Okafor" }));
  draft = await read(await renderSheetPdf({ ...common, state: "draft", released: null }));
}, 60_000);

describe("the PDF, read back", () => {
  it("fits a small setup on one page", () => expect(released.pages).toBe(1));

  it("names every piece to fetch with its rack place", () => {
    for (const line of view.pickList) {
      expect(released.text).toContain(line.piece);
      expect(released.text).toContain(line.rack);
    }
  });

  it("states every step's gauge, angles and force to the digit", () => {
    for (const step of view.steps) {
      for (const text of [step.gaugeX, step.gaugeR, ...step.fingers.map((finger) => finger.z), step.angle, step.demandedAngle, step.force, step.depth]) expect(released.text).toContain(text);
    }
  });

  it("carries the number, the revision, who released it, and letters beyond Latin-1", () => {
    for (const text of ["S-0007", "RS-104", "Ines Okafor", "channel <b>"]) expect(released.text).toContain(text);
    expect(released.text.replaceAll(" ", "")).toContain("Łódźchannel");
  });

  it("numbers its pages and says on each that it is advice", () => {
    expect(released.text).toContain("Page 1 of 1");
    expect(released.text).toContain("Advice only");
  });

  it("says on a draft, and only there, that it is not for the floor", () => {
    expect(draft.text).toContain("not for the floor");
    expect(released.text).not.toContain("not for the floor");
  });
});
