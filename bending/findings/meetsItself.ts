import type { FindingsContext } from "./context";
import type { Finding, FindingMark } from "./finding";
import type { FoldedBody } from "./foldedBodies";
import { selfMeetings } from "./selfMeetings";
import { shownLength } from "./shownLength";

/** Told one by one up to so many; a part with more is told what they have in common. */
const TOLD_MOST = 24;

/** Where the finished part would stand in itself. */
export function meetsItself(context: FindingsContext): readonly Finding[] {
  const { part, units } = context;
  const pairs = new Map<string, { readonly faces: readonly [number, number]; readonly bodies: FoldedBody[]; depth: number }>();
  for (const { one, other, depth } of selfMeetings(part)) {
    // A bend is told by the face that it carries; a face that meets a bend's own face as well is told once.
    const faces = [carried(one), carried(other)].sort((a, b) => a - b) as [number, number];
    const key = faces.join(" ");
    const pair = pairs.get(key) ?? { faces, bodies: [], depth: 0 };
    pair.depth = Math.max(pair.depth, depth);
    pair.bodies.push(one, other);
    pairs.set(key, pair);
  }
  return [...pairs.values()].sort((a, b) => b.depth - a.depth).slice(0, TOLD_MOST).map(({ faces, bodies, depth }): Finding => {
    const ids = [...new Set(faces)].map((index) => part.faces[index]?.id ?? "");
    return {
      key: `meets-itself ${ids.join(" ")}`,
      rule: "meets-itself",
      severity: "stop",
      title: "Meets itself when folded",
      message: `${ids.length > 1 ? `Faces ${ids[0] ?? ""} and ${ids[1] ?? ""} stand in one another` : `Face ${ids[0] ?? ""} stands in itself`} in the finished part, and would have to be ${shownLength(depth, units, "up")} farther apart; shorten one, inset it, or turn it the other way.`,
      source: "the part folded to its angles as plates of its thickness",
      faces: ids,
      bends: bodies.filter(({ of }) => of === "bend").map(({ index }) => part.bends[index]?.id ?? "").filter((id, i, all) => all.indexOf(id) === i),
      paths: faces.flatMap((index) => pathOf(context, index)),
      marks: [...new Set(bodies)].map((body): FindingMark => ({ kind: "region", outline: (body.of === "face" ? part.faces[body.index]?.outline : part.bends[body.index]?.zone) ?? [] })),
      measure: { value: depth, wanted: 0, unit: "mm" },
      cure: null,
    };
  });

  function carried(body: FoldedBody): number {
    return body.of === "face" ? body.index : (part.bends[body.index]?.child ?? 0);
  }
}

function pathOf({ part, fields }: FindingsContext, face: number): readonly string[] {
  const bend = part.bends[part.faces[face]?.bend ?? -1];
  const own = bend ? fields.ofBend.get(bend.id) : undefined;
  return own ? [own.length?.path ?? own.path] : [];
}
