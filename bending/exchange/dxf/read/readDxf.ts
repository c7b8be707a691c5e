import { fail, ok, type Result } from "../../../core/result";
import { createTagReader, type DxfTag, type TagReader } from "./createTagReader";
import type { DxfBlock, DxfDrawing, DxfEntity, DxfHeader, DxfLayer, DxfLineType, DxfNote } from "./dxfDrawing";
import { DXF_LIMITS } from "./dxfLimits";
import type { RawEntity } from "./rawEntity";
import { entityFields } from "./entityFields";
import { readEntity } from "./readEntity";
import { readText } from "./readText";

/**
 * A drawing out of the text of a DXF file (ASCII, R12 and later). A file that breaks is refused with the line and what was expected
 * there; an entity that cannot be read is left out and noted. Nothing is thrown; `DXF_LIMITS` bounds the work.
 */
export function readDxf(text: string): Result<DxfDrawing, string> {
  if (text.length > DXF_LIMITS.characters) return fail(`the file has ${(text.length / 1e6).toFixed(0)} MB; at most ${DXF_LIMITS.characters / 1e6} MB are read`);
  const reader = createTagReader(text);
  const state: State = { header: { units: null, measurement: null, version: null }, layers: new Map(), lineTypes: new Map(), blocks: new Map(), entities: [], notes: [], moreNotes: 0, read: 0 };
  const found = readSections(reader, state);
  const problem = reader.problem();
  if (problem) return fail(`line ${problem.line}: ${problem.message}`);
  if (found !== null) return fail(found);
  const { read, ...drawing } = state;
  return read === 0 ? fail("the file holds no entities: there is nothing to read in its section ENTITIES") : ok(drawing);
}

interface State {
  header: DxfHeader;
  readonly layers: Map<string, DxfLayer>;
  readonly lineTypes: Map<string, DxfLineType>;
  readonly blocks: Map<string, DxfBlock>;
  readonly entities: DxfEntity[];
  readonly notes: DxfNote[];
  moreNotes: number;
  /** Entities met so far, in blocks too. */
  read: number;
}

const note = (state: State, one: DxfNote) => {
  if (state.notes.length < DXF_LIMITS.notes) state.notes.push(one);
  else state.moreNotes += 1;
};

/** Null, or why the file is refused. */
function readSections(reader: TagReader, state: State): string | null {
  let first = true;
  for (let tag = reader.next(); tag !== null; tag = reader.next()) {
    if (first && !(tag.code === 0)) return `line ${tag.line}: this is not a DXF file: it must begin with group 0, SECTION`;
    first = false;
    if (tag.code !== 0) continue;
    if (tag.value.trim() === "EOF") return null;
    if (tag.value.trim() !== "SECTION") continue;
    const name = reader.next();
    if (name === null) break;
    const problem = readSection(name, reader, state);
    if (problem !== null) return problem;
  }
  return first ? "the file is empty" : "the file ends in the middle: the group 0, EOF was expected at its end";
}

function readSection(name: DxfTag, reader: TagReader, state: State): string | null {
  const blocks = name.value.trim() === "BLOCKS";
  switch (name.code === 2 ? name.value.trim() : "") {
    case "HEADER": return readHeader(reader, state);
    case "TABLES": return eachRecord(reader, name.line, (raw) => { readTableEntry(raw, state); return null; });
    case "BLOCKS":
    case "ENTITIES": return readEntities(reader, name.line, state, blocks);
    default: return eachRecord(reader, name.line, () => null);
  }
}

function readHeader(reader: TagReader, state: State): string | null {
  let variable = "";
  for (let tag = reader.next(); tag !== null; tag = reader.next()) {
    if (tag.code === 0) return tag.value.trim() === "ENDSEC" ? null : `line ${tag.line}: ENDSEC was expected at the end of the header, but there stands "${tag.value.trim().slice(0, 30)}"`;
    if (tag.code === 9) variable = tag.value.trim();
    else if (variable === "$INSUNITS" && tag.code === 70) state.header = { ...state.header, units: whole(tag.value) };
    else if (variable === "$MEASUREMENT" && tag.code === 70) state.header = { ...state.header, measurement: whole(tag.value) };
    else if (variable === "$ACADVER" && tag.code === 1) state.header = { ...state.header, version: tag.value.trim().slice(0, 12) };
  }
  return reader.problem() ? null : "the file ends in the middle of its header";
}

const whole = (text: string): number | null => (/^\s*\d{1,4}\s*$/.test(text) ? Number(text) : null);

/** Calls back for each record (group 0 and what follows it) up to ENDSEC. */
function eachRecord(reader: TagReader, line: number, take: (raw: RawEntity) => string | null): string | null {
  let kind: DxfTag | null = null;
  let tags: DxfTag[] = [];
  for (let tag = reader.next(); tag !== null; tag = reader.next()) {
    if (tag.code !== 0) {
      if (tags.length >= DXF_LIMITS.tagsPerEntity) return `line ${tag.line}: ${kind?.value.trim() ?? "a record"} has more than ${DXF_LIMITS.tagsPerEntity} groups`;
      if (kind) tags.push(tag);
      continue;
    }
    if (kind) {
      const problem = take({ kind: kind.value.trim(), line: kind.line, tags });
      if (problem !== null) return problem;
    }
    if (tag.value.trim() === "ENDSEC") return null;
    if (tag.value.trim() === "EOF") return `line ${tag.line}: ENDSEC was expected before EOF`;
    kind = tag;
    tags = [];
  }
  return reader.problem() ? null : `the file ends in the middle of the section that begins on line ${line}: ENDSEC was expected`;
}

function readTableEntry(raw: RawEntity, state: State): void {
  const fields = entityFields(raw);
  const name = readText(fields.text(2) ?? "");
  if (name === "") return;
  if (raw.kind === "LTYPE" && state.lineTypes.size < DXF_LIMITS.names) {
    state.lineTypes.set(name.toUpperCase(), { name, dashed: fields.number(73, "the dashes", 0) > 0 });
  }
  if (raw.kind === "LAYER" && state.layers.size < DXF_LIMITS.names) {
    const [flags, colour] = [fields.number(70, "the flags", 0), fields.number(62, "the colour", 7)];
    const hidden = (flags & 1) !== 0 || colour < 0 || fields.text(290)?.trim() === "0";
    state.layers.set(name, { name, colour: Math.abs(Math.trunc(colour)) || 7, lineType: (fields.text(6) ?? "CONTINUOUS").trim(), hidden });
  }
}

function readEntities(reader: TagReader, line: number, state: State, inBlocks: boolean): string | null {
  let block: { name: string; base: readonly [number, number]; entities: DxfEntity[] } | null = null;
  let polyline: { readonly raw: RawEntity; readonly vertices: RawEntity[] } | null = null;
  const take = (raw: RawEntity, vertices: readonly RawEntity[]) => {
    const read = readEntity(raw, vertices);
    if (!read.ok) note(state, { ...read.error, message: `${read.error.message}; it is left out` });
    else if (read.value !== null) (inBlocks ? block?.entities : state.entities)?.push(read.value);
  };
  const finish = () => {
    if (polyline) take(polyline.raw, polyline.vertices);
    polyline = null;
  };
  const problem = eachRecord(reader, line, (raw) => {
    if (polyline && raw.kind === "VERTEX") { polyline.vertices.push(raw); return null; }
    finish();
    if (raw.kind === "POLYLINE") polyline = { raw, vertices: [] };
    else if (inBlocks && raw.kind === "BLOCK") {
      const fields = entityFields(raw);
      const base = [fields.number(10, "base x", 0), fields.number(20, "base y", 0)] as const;
      const name = readText(fields.text(2) ?? "");
      block = { name, base: base.every(Number.isFinite) ? base : [0, 0], entities: [] };
      if (state.blocks.size < DXF_LIMITS.names && name !== "") state.blocks.set(name.toUpperCase(), block);
      return null;
    } else if (inBlocks && raw.kind === "ENDBLK") { block = null; return null; }
    else take(raw, []);
    state.read += 1;
    return state.read > DXF_LIMITS.entities ? `line ${raw.line}: the file holds more than ${DXF_LIMITS.entities} entities` : null;
  });
  finish();
  return problem;
}
