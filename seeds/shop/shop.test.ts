import { describe, expect, it } from "vitest";
import { materialById } from "@/bending/handbook/materials";
import { buildPart } from "@/bending/part/buildPart";
import { readPartDocument } from "@/bending/part/readPartDocument";
import { readMachineDocument } from "@/bending/tooling/readMachineDocument";
import { readToolingDocument } from "@/bending/tooling/readToolingDocument";
import { roles } from "@/lib/schemas/role";
import { machines } from "./machines";
import { parts } from "./parts";
import { people } from "./people";
import { tooling } from "./tools";
import { pieceStates } from "./tools/pieceStates";

const pieces = tooling.tools.flatMap((tool) => tool.sections);
const marks = pieces.flatMap((piece) => piece.pieces ?? []);

describe("the demonstration shop", () => {
  it("has people of every role, at addresses that reach nobody", () => {
    expect(new Set(people.map((person) => person.role))).toEqual(new Set(roles));
    expect(people.filter((person) => !person.email.endsWith(".example"))).toEqual([]);
    expect(new Set(people.map((person) => person.email)).size).toBe(people.length);
  });

  it("has about sixty tools with about three hundred marked pieces, each with a place", () => {
    expect(tooling.tools).toHaveLength(62);
    expect(new Set(tooling.tools.map((tool) => tool.id)).size).toBe(62);
    expect(pieces.length).toBeGreaterThanOrEqual(280);
    expect(pieces.length).toBeLessThanOrEqual(340);
    expect(new Set(marks).size).toBe(pieces.length);
    expect(pieces.filter((piece) => !/^[A-K][1-6]-[1-3]$/.test(piece.rack ?? ""))).toEqual([]);
    expect(Object.keys(pieceStates).filter((mark) => !marks.includes(mark))).toEqual([]);
  });

  it("has tools that the library reads", () => {
    const read = readToolingDocument(tooling);
    expect(read.ok ? [] : read.error).toEqual([]);
  });

  it.each(machines.map((machine) => [machine.name, machine] as const))("has a brake that the library reads: %s", (_, machine) => {
    const read = readMachineDocument(machine);
    expect(read.ok ? [] : read.error).toEqual([]);
  });

  it.each(parts.map((part) => [part.document.name, part.document] as const))("has a part that can be made: %s", (_, document) => {
    const read = readPartDocument(document);
    expect(read.ok ? [] : read.error).toEqual([]);
    const built = buildPart(document, { materials: materialById });
    expect(built.ok ? [] : built.error).toEqual([]);
  });
});
