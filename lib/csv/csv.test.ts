import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { choiceColumn } from "./choiceColumn";
import { csvLimits } from "./csvLimits";
import { dateColumn } from "./dateColumn";
import { dryRunCsv, type CsvImportRules, type Existing } from "./dryRunCsv";
import type { CsvRow } from "./csvColumn";
import { numberColumn } from "./numberColumn";
import { optionalColumn } from "./optionalColumn";
import { readCsv } from "./readCsv";
import { textColumn } from "./textColumn";
import { writeCsv } from "./writeCsv";

const columns = {
  code: textColumn("code", 20),
  thickness: numberColumn("thickness", { units: { mm: 1, in: 25.4 }, over: 0, upTo: 30 }),
  grain: choiceColumn("grain", ["along", "across"]),
  measured: optionalColumn(dateColumn("measured on", { also: ["date"] })),
  note: optionalColumn(textColumn("note", 40)),
};
type Row = CsvRow<typeof columns>;

const read = (text: string) => {
  const table = readCsv(text, columns);
  if (!table.ok) throw new Error(table.error.message);
  return table.value;
};
const refusal = (text: string) => {
  const table = readCsv(text, columns);
  return table.ok ? undefined : table.error;
};
const values = (text: string) => read(text).lines.map((line) => line.values);

describe("reading", () => {
  const plain = [{ code: "A", thickness: 1.5, grain: "along" }];

  it.each([
    ["commas", "code,thickness (mm),grain\nA,1.5,along\n"],
    ["semicolons and decimal commas", "code;thickness (mm);grain\r\nA;1,5;along\r\n"],
    ["semicolons and decimal points", "code;thickness;grain\nA;1.5;along"],
    ["tabs", "code\tthickness\tgrain\nA\t1.5\talong"],
    ["a separator said outright", "sep=;\r\ncode;thickness;grain\r\nA;1,5;along\r\n"],
    ["the mark of UTF-8", "\uFEFFcode,thickness,grain\nA,1.5,along"],
    ["quotes", '"code","thickness [mm]","grain"\r"A","1.5","along"\r'],
    ["other case, order and spaces", " GRAIN , Thickness (MM) ,Code\nAlong, 1.5 , A\n"],
    ["empty lines and empty cells at the end", "\n\ncode,thickness,grain,,\n,,,,\nA,1.5,along,,\n\n"],
  ])("takes %s", (_name, text) => { expect(values(text)).toEqual(plain); });

  it("carries another unit of the heading over", () => {
    expect(values("code,thickness (in),grain\nA,0.125,along")[0]?.thickness).toBeCloseTo(3.175, 12);
    expect(refusal("code,thickness (cm),grain\nA,1,along")?.message).toBe('The column "thickness" is given in "cm", which is not read here. Use mm or in.');
  });

  it("tells an empty cell from a column that is not there", () => {
    expect(values("code,thickness,grain,note\nA,1,along,")[0]).toEqual({ code: "A", thickness: 1, grain: "along", note: null });
    expect(values("code,thickness,grain\nA,1,along")[0]).not.toHaveProperty("note");
  });

  it("names the line where an entry begins, also after line ends inside quotes", () => {
    const { lines } = read('code,thickness,grain,note\r\nA,1,along,"two\r\nlines"\r\n\r\nB,2,across,x\r\n');
    expect(lines.map(({ line, values: { note } }) => [line, note])).toEqual([[2, "two\nlines"], [5, "x"]]);
  });

  it("says at each cell what would be right", () => {
    const [line] = read("code;thickness;grain;date\n;1.500,5;upwards;1.12.2026\n").lines;
    expect(line?.problems).toEqual([
      { field: "code", given: "", message: "must not be empty; it must be text of at most 20 characters" },
      { field: "thickness", given: "1.500,5", message: "is not a number; it must be a number over 0 and up to 30 mm" },
      { field: "grain", given: "upwards", message: "must be one of along, across" },
      { field: "date", given: "1.12.2026", message: "must be a day as 2026-12-01" },
    ]);
  });

  it("refuses a point among decimal commas and the other way round rather than guess", () => {
    expect(read("code;thickness;grain\nA;1,5;along\nB;1.5;along").lines[1]?.problems[0]?.message).toContain('decimals in this file are written with ","');
    expect(read('code,thickness,grain\nA,"1,5",along').lines[0]?.problems[0]?.message).toContain('decimals in this file are written with "."');
    expect(read("code;thickness;grain\nA;0;along\nB;30,1;along\nC;2026-02-30;along").lines.map(({ problems }) => problems.length)).toEqual([1, 1, 1]);
  });

  it("says what is wrong with the file as a whole", () => {
    expect(refusal("")?.message).toContain("nothing in it");
    expect(refusal("code,thickness,grain\n")).toEqual({ message: "There is only a line of headings in it, and no entry.", line: 1 });
    expect(refusal("code,grain\nA,along")).toEqual({ message: 'The column "thickness (mm)" is missing.', line: 1 });
    expect(refusal("code,code,thickness,grain\nA,B,1,along")?.message).toBe('The column "code" is there 2 times. Keep one.');
    expect(refusal('code,thickness,grain\nA,1,"along\n')).toEqual({ message: 'A quotation mark (") is opened here and never closed.', line: 2 });
    expect(refusal('code,thickness,grain\n3/4" x,1,along\n')?.line).toBe(2);
    const tooMany = `code,thickness,grain\n${"A,1,along\n".repeat(csvLimits.lines + 1)}`;
    expect(refusal(tooMany)?.message).toContain(`at most ${csvLimits.lines}`);
    expect(refusal(`code,thickness,grain\n${"ä".repeat(csvLimits.bytes / 2)},1,along`)?.message).toContain("larger than 2 MB");
  });

  it("leaves unknown headings aside and says so; counts the values of a line", () => {
    const table = read("code,colour,thickness,grain\nA,red,1,along\nB,2,along,extra,1,more");
    expect(table.unknown).toEqual(["colour"]);
    expect(table.lines[1]?.problems[0]).toMatchObject({ field: "", given: "6 values" });
  });
});

describe("writing", () => {
  const row = fc.record({
    code: fc.string({ minLength: 1, maxLength: 20, unit: "grapheme-ascii" }).map((text) => text.trim()).filter((text) => text !== ""),
    thickness: fc.double({ min: 0.01, max: 29, noNaN: true }).map((value) => Number(value.toPrecision(10))),
    grain: fc.constantFrom("along" as const, "across" as const),
    measured: fc.option(fc.constantFrom("2024-02-29", "2026-12-01")),
    note: fc.option(fc.constantFrom("=1+1", "-5", "+x", "@y", "'=quoted", "''-", "\u00e4 \u00b3; \"so\", said\nhe", "plain")),
  });

  it("reads back what it wrote, with either separator, whatever the text", () => {
    fc.assert(fc.property(fc.array(row, { minLength: 1, maxLength: 8 }), fc.constantFrom("," as const, ";" as const), (rows, separator) => {
      expect(values(writeCsv(columns, rows, separator))).toEqual(rows);
    }));
  });

  it("lets no text begin like a formula, and no number lose its sign", () => {
    const signed = { code: textColumn("code", 20), offset: numberColumn("offset", { units: { mm: 1 } }) };
    expect(writeCsv(signed, [{ code: "=HYPERLINK(1)", offset: -1.5 }])).toBe("\uFEFFcode,offset (mm)\r\n'=HYPERLINK(1),-1.5\r\n");
    expect(writeCsv(signed, [{ code: "-x", offset: -1.5 }], ";")).toBe("\uFEFFcode;offset (mm)\r\n'-x;-1,5\r\n");
  });
});

describe("a dry run", () => {
  const rules: CsvImportRules<typeof columns> = {
    columns, blank: { note: null, measured: null },
    keyOf: ({ code }) => code, labelOf: ({ code }) => code ?? "",
    check: ({ thickness, grain }) => (grain === "along" && thickness > 20 ? [{ field: "thickness", message: "must be at most 20 mm along the grain" }] : []),
  };
  const row = (code: string, thickness: number, note: string | null = null): Row => ({ code, thickness, grain: "across", measured: null, note });
  const shop: readonly Existing<Row>[] = [row("A", 1), row("B", 1 / 3, "kept")].map((entry) => ({ key: entry.code, row: entry, stamp: "1" }));
  const run = (text: string, existing = shop) => {
    const decision = dryRunCsv(text, rules, existing);
    if (!decision.ok) throw new Error(decision.error.message);
    return decision.value;
  };

  it("says what each line would do", () => {
    const { dryRun, writes } = run("code,thickness,grain\nA,2,across\nB,0.333333333333333,across\nC,3,along\nD,25,along\nA,4,across\n");
    expect(dryRun.counts).toEqual({ add: 1, change: 1, same: 1, refused: 2 });
    expect(dryRun.lines.map(({ fate }) => fate)).toEqual(["change", "same", "add", "refused", "refused"]);
    expect(dryRun.lines[0]?.changes).toEqual([{ field: "thickness (mm)", from: "1", to: "2" }]);
    expect(dryRun.lines[3]?.problems).toEqual([{ field: "thickness (mm)", given: "25", message: "must be at most 20 mm along the grain" }]);
    expect(dryRun.lines[4]?.problems[0]?.message).toContain("line 2");
    expect(writes.map(({ after, before }) => [after.code, before?.code])).toEqual([["A", "A"], ["C", undefined]]);
  });

  it("keeps what the file does not say, and every digit of it", () => {
    const { writes } = run("code,thickness,grain,note\nB,0.3333333333,along,kept\n");
    expect(writes[0]?.after).toEqual({ ...row("B", 1 / 3, "kept"), grain: "along" });
  });

  it("changes nothing when its own export is read back", () => {
    expect(run(writeCsv(columns, shop.map((entry) => entry.row))).dryRun.counts).toEqual({ add: 0, change: 0, same: 2, refused: 0 });
  });

  it("has another digest as soon as the file or an entry that it is about is another", () => {
    const text = "code,thickness,grain\nA,2,across\n";
    const digest = run(text).dryRun.digest;
    expect(run(text).dryRun.digest).toBe(digest);
    expect(run(`${text}B,1,along\n`).dryRun.digest).not.toBe(digest);
    expect(run(text, shop.map((entry) => ({ ...entry, stamp: "2" }))).dryRun.digest).not.toBe(digest);
    expect(run(text, shop.map((entry) => ({ ...entry, row: { ...entry.row, thickness: 7 } }))).dryRun.digest).not.toBe(digest);
    expect(run(text, []).dryRun.digest).not.toBe(digest);
  });
});
