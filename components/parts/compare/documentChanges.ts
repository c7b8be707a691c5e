import { documentInUnits } from "@/bending/part/documentInUnits";
import type { PartDocument } from "@/bending/part/partDocument";
import { formatAngle } from "@/lib/format/formatAngle";
import { formatNumber } from "@/lib/format/formatNumber";
import { unitName } from "@/lib/format/unitName";
import { draftFromDocument } from "../draft/draftFromDocument";
import { pathName } from "../editor/pathName";

/** One entry of a part document that is not the same in two revisions; `null`: not given there. */
export interface DocumentChange {
  readonly key: string;
  /** In the words of the form: "Flange left, length". */
  readonly name: string;
  readonly before: string | null;
  readonly after: string | null;
}

interface Entry { readonly path: string; readonly value: string }

/** What was changed, added or taken away between two documents, in the newer one's unit. Flanges and bends are told apart by name, not by place. */
export function documentChanges(older: PartDocument, newer: PartDocument): readonly DocumentChange[] {
  const old = documentInUnits(older, newer.units);
  const [before, after] = [entriesOf(old), entriesOf(newer)];
  const [oldDraft, newDraft] = [draftFromDocument(old), draftFromDocument(newer)];
  const units = older.units === newer.units ? [] : [{ key: "units", name: "Unit", before: unitName(older.units), after: unitName(newer.units) }];
  return [...units, ...[...new Set([...before.keys(), ...after.keys()])].flatMap((key): readonly DocumentChange[] => {
    const [was, is] = [before.get(key), after.get(key)];
    if (was?.value === is?.value) return [];
    const name = is !== undefined ? pathName(is.path, newDraft) : pathName(was?.path ?? "", oldDraft);
    return [{ key, name, before: was?.value ?? null, after: is?.value ?? null }];
  })];
}

const SAID_ELSEWHERE = new Set(["format", "units", "id"]);
const ANGLES = new Set(["angle", "startAngle", "endAngle", "toleranceAngle"]);
const PLAIN = new Set(["kFactor", "edge"]);

function entriesOf(document: PartDocument): ReadonlyMap<string, Entry> {
  const found = new Map<string, Entry>();
  const say = (name: string, value: number): string =>
    ANGLES.has(name) ? formatAngle(value) : PLAIN.has(name) ? formatNumber(value, 4) : `${formatNumber(value, document.units === "mm" ? 3 : 4)} ${document.units}`;
  const walk = (value: unknown, path: string, key: string, name: string): void => {
    if (SAID_ELSEWHERE.has(name)) return;
    if (typeof value === "number") found.set(key, { path, value: say(name, value) });
    else if (typeof value === "string") found.set(key, { path, value });
    else if (name !== "legs" && isPoint(value)) found.set(key, { path, value: `(${value.map((one) => formatNumber(one, 3)).join(", ")})` });
    else if (Array.isArray(value)) value.forEach((one: unknown, i) => walk(one, `${path}[${i}]`, `${key}/${nameOf(one) ?? i}`, name));
    else if (typeof value === "object" && value !== null) {
      for (const [field, one] of Object.entries(value)) walk(one, path === "" ? field : `${path}.${field}`, `${key}/${field}`, field);
    }
  };
  walk(document, "", "", "");
  return found;
}

const isPoint = (value: unknown): value is readonly number[] => Array.isArray(value) && (value.length === 2 || value.length === 3) && value.every((one) => typeof one === "number");

function nameOf(value: unknown): string | undefined {
  return typeof value === "object" && value !== null && "id" in value && typeof value.id === "string" ? value.id : undefined;
}
