import fc from "fast-check";
import { expect, test, vi } from "vitest";
import { arc, circle, dxfText, insert, lightPolyline, line, rectangle } from "./fixtures/dxfText";
import { decodeDxf } from "./read/decodeDxf";
import { importDxf } from "./import/importDxf";

vi.setConfig({ testTimeout: 300_000 });

const text = dxfText({
  layers: [{ name: "bend", lineType: "DASHED", colour: 4 }],
  blocks: { HOLES: [circle(0, 0, 2), circle(10, 0, 2), insert("DEEP", 0, 10)], DEEP: [lightPolyline([[0, 0], [4, 0, 1], [4, 4], [0, 4, 1]])] },
  entities: [
    ...rectangle(0, 0, 100, 60), line(30, 0, 30, 60, "bend"), insert("HOLES", 40, 20, [[50, 30], [41, 1.5]]), arc(80, 30, 5, 0, 180), line(75, 30, 85, 30),
    [[0, "ELLIPSE"], [8, "0"], [10, 60], [20, 50], [11, 4], [21, 0], [40, 0.5]],
    [[0, "SPLINE"], [8, "0"], [71, 2], ...[0, 0, 0, 1, 1, 1].map((knot) => [40, knot] as const), [10, 5], [20, 5], [10, 10], [20, 12], [10, 15], [20, 5]], line(5, 5, 15, 5),
    [[0, "TEXT"], [8, "0"], [10, 0], [20, 0], [1, "1.5 mm"]],
  ],
});
const bytes = new TextEncoder().encode(text);
const lines = text.split("\n");
const facts = { name: "part", material: "S235", thickness: 1 };
const says = (damaged: string) => {
  const read = importDxf(damaged, facts);
  return read.ok ? "read" : read.error;
};

/** Nothing is thrown, and a refusal says something. */
function expectCalm(damaged: string) {
  expect(says(damaged).length).toBeGreaterThan(3);
}

test("the whole file is read", () => expect(says(text)).toBe("read"));

test("cut anywhere it is refused, not read as if it were whole", () => {
  fc.assert(fc.property(fc.integer({ min: 1, max: text.lastIndexOf("EOF") }), (at) => { expect(says(text.slice(0, at))).not.toBe("read"); }), { numRuns: 250 });
});

test("bytes swapped and overwritten", () => {
  const swap = fc.tuple(fc.nat(bytes.length - 1), fc.nat(bytes.length - 1), fc.option(fc.nat(255), { nil: null }));
  fc.assert(fc.property(fc.array(swap, { minLength: 1, maxLength: 12 }), (swaps) => {
    const copy = Uint8Array.from(bytes);
    for (const [i, j, put] of swaps) [copy[i], copy[j]] = put === null ? [copy[j] ?? 0, copy[i] ?? 0] : [put, copy[j] ?? 0];
    const decoded = decodeDxf(copy);
    if (decoded.ok) expectCalm(decoded.value);
    else expect(decoded.error).toContain("file");
  }), { numRuns: 400 });
});

test("values made huge, tiny, endless or nonsense", () => {
  const wrong = fc.constantFrom("1e308", "-1e308", "1e-308", "NaN", "Infinity", "-0", "99999999999999999999", "0", "-1", "", "  ", "0x10", "1,5", "EOF", "SECTION", "ENDSEC", "BLOCK", "POLYLINE", "VERTEX", "HOLES", "\u0000");
  fc.assert(fc.property(fc.array(fc.tuple(fc.nat(lines.length - 2), wrong), { minLength: 1, maxLength: 6 }), (changes) => {
    const copy = [...lines];
    for (const [i, put] of changes) copy[i] = put;
    expectCalm(copy.join("\n"));
  }), { numRuns: 400 });
});

test("lines of the file taken out, doubled and moved", () => {
  fc.assert(fc.property(fc.array(fc.tuple(fc.nat(lines.length - 2), fc.integer({ min: 1, max: 40 }), fc.constantFrom("out", "twice", "away")), { minLength: 1, maxLength: 4 }), (changes) => {
    const copy = [...lines];
    for (const [at, count, what] of changes) {
      const taken = what === "twice" ? copy.slice(at, at + count) : copy.splice(at, count);
      if (what !== "out") copy.splice(what === "away" ? Math.floor(copy.length / 2) : at, 0, ...taken);
    }
    expectCalm(copy.join("\n"));
  }), { numRuns: 300 });
});

test("blocks that put themselves in, or grow beyond bounds, are refused by name", () => {
  const towers = Object.fromEntries(Array.from({ length: 12 }, (_, i) => [`T${i}`, i === 11 ? [circle(0, 0, 1)] : Array.from({ length: 10 }, () => insert(`T${i + 1}`, 1, 1))]));
  expect(says(dxfText({ blocks: towers, entities: [insert("T0", 0, 0)] }))).toContain("more than 200000 entities");
  const deep = Object.fromEntries(Array.from({ length: 40 }, (_, i) => [`D${i}`, i === 39 ? [circle(0, 0, 1)] : [insert(`D${i + 1}`, 1, 1)]]));
  expect(says(dxfText({ blocks: deep, entities: [insert("D0", 0, 0)] }))).toContain("16 deep");
});

test("many lines at one place, or far more than a flat has, come to an end", () => {
  const star = Array.from({ length: 600 }, (_, i) => line(0, 0, 50 * Math.cos(i), 50 * Math.sin(i)));
  expectCalm(dxfText({ entities: [...rectangle(-60, -60, 120, 120), ...star] }));
  const crossing = Array.from({ length: 600 }, (_, i) => line(i / 6, -1, 100 - i / 6, 61));
  expectCalm(dxfText({ entities: [...rectangle(0, 0, 100, 60), ...crossing] }));
});
