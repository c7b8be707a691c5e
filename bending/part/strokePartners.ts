import type { FieldProblem } from "../core/problem";
import { fail, ok, type Result } from "../core/result";
import type { Bend } from "./partModel";

/** What a document says of one bend: the bend to be formed in the same stroke, and where it says so. */
export interface StrokeWish {
  readonly strokeWith: string | null;
  readonly path: string;
}

/** The bends with those paired that are formed in one stroke: neighbours on one face, turned opposite ways (an offset). */
export function strokePartners(bends: readonly Bend[], wishes: ReadonlyMap<string, StrokeWish>): Result<readonly Bend[], readonly FieldProblem[]> {
  const index = new Map(bends.map(({ id }, i) => [id, i]));
  const partner = new Map<number, number>();
  const problems: FieldProblem[] = [];
  for (const [id, { strokeWith, path }] of wishes) {
    if (strokeWith === null) continue;
    const [i, k] = [index.get(id) ?? -1, index.get(strokeWith) ?? -1];
    const [a, b] = [bends[i], bends[k]];
    const say = (message: string) => problems.push({ path, message });
    if (!a) continue;
    if (!b) say(`there is no bend "${strokeWith}"`);
    else if (a === b || (a.parent !== b.child && b.parent !== a.child)) say(`"${strokeWith}" and "${id}" do not lie on one face, one behind the other; only such a pair is formed in one stroke`);
    else if (a.direction === b.direction) say(`"${strokeWith}" and "${id}" turn the same way; an offset turns one way and back`);
    else if ((partner.get(i) ?? k) !== k || (partner.get(k) ?? i) !== i) say("one of the two bends is already paired with another");
    else {
      partner.set(i, k);
      partner.set(k, i);
    }
  }
  if (problems.length > 0) return fail(problems);
  return ok(partner.size === 0 ? bends : bends.map((bend, i) => ({ ...bend, strokeWith: partner.get(i) ?? null })));
}
