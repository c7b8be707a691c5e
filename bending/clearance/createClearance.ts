import { invariant } from "../core/invariant";
import type { Rad } from "../core/units";
import type { Interval } from "../geometry/interval";
import { convexPieces } from "../geometry/convexPieces";
import { mergeIntervals } from "../geometry/mergeIntervals";
import type { PartModel } from "../part/partModel";
import type { Machine } from "../tooling/machine";
import type { Die, Punch } from "../tooling/tool";
import { createAccess } from "./createAccess";
import type { Clearance, ClearanceHit, ClearanceOptions } from "./clearance";
import { clearanceHit } from "./clearanceHit";
import { createKeys } from "./createKeys";
import { createObstacles } from "./createObstacles";
import type { Hit } from "./hit";
import { hitTable, type FaceMeeting, type HitTable } from "./hitTable";
import { meetOwnZone } from "./meetOwnZone";
import { meetStroke } from "./meetStroke";
import type { Obstacle } from "./obstacle";
import { selfMeetings } from "./selfMeetings";
import { strokePlacement } from "./strokePlacement";
import { strokeSamples } from "./strokeSamples";

export type { Clearance, ClearanceHit, ClearanceOptions } from "./clearance";

/** Bends that a bit mask can tell apart. */
const MOST_BENDS = 30;

/** See README.md of this folder. Lazy: nothing is worked out before it is asked. */
export function createClearance(part: PartModel, machine: Machine, options: ClearanceOptions = {}): Clearance {
  invariant(part.bends.length <= MOST_BENDS, `clearance tells at most ${MOST_BENDS} bends apart, the part has ${part.bends.length}`);
  const margin = options.margin ?? machine.settings.clearance;
  const counts = { clips: 0, entries: 0 };
  const clip = () => { counts.clips++; };
  const obstacles = createObstacles(machine, margin);
  const pieces = part.faces.map((face) => convexPieces(face.outline, face.holes));
  const tables = new Map<object, HitTable>();
  const keys = createKeys();
  const access = createAccess(part.thickness, machine, margin, obstacles, clip);

  const tableOf = (hit: Hit): HitTable => {
    const key = keys(hit.front, ...hit.bends);
    const known = tables.get(key);
    if (known) return known;
    const bend = part.bends[hit.bends[0] ?? -1];
    invariant(bend, "a hit forms at least one bend of the part");
    const made = hitTable(part, hit, bend, pieces, () => { counts.entries++; });
    tables.set(key, made);
    return made;
  };
  const demanded = (hit: Hit, die: Die): Rad => {
    const bend = hit.bends[0] ?? 0;
    return options.demandedAngle?.(bend, die) ?? ((part.bends[bend]?.angle ?? 0) as Rad);
  };
  const inStroke = (hit: Hit, die: Die, obstacle: Obstacle): readonly FaceMeeting[] => {
    const table = tableOf(hit);
    const { bend } = table;
    const end = demanded(hit, die);
    const place = obstacle.on === "ram" ? () => obstacle.lift
      : (h: number) => obstacle.lift - strokePlacement(bend, part.thickness, die, (2 * h) as Rad).tipHeight;
    const key = keys(obstacle, obstacle.on === "ram" ? null : die, end);
    return table.ask(key, hit.formed, (path, plates) => {
      const steps = strokeSamples(bend, part.thickness, obstacle.on === "ram" ? null : die, plates, end, margin);
      return meetStroke({ bend, thickness: part.thickness, plates, inFront: path.inFront, shape: obstacle.shape, lift: place, from: 0, to: end / 2, steps, margin, count: clip });
    });
  };
  const zones = new WeakMap<object, readonly FaceMeeting[]>();
  const ownZone = (hit: Hit, die: Die, obstacle: Obstacle): readonly FaceMeeting[] => {
    const [table, end] = [tableOf(hit), demanded(hit, die)];
    const key = keys(table, die, obstacle, end);
    const found = zones.get(key) ?? meetOwnZone(part, table, die, obstacle, end, margin);
    zones.set(key, found);
    return found;
  };
  const check = (hit: Hit, punch: Punch, die: Die, obstacle: Obstacle): { readonly hits: readonly ClearanceHit[]; readonly intervals: readonly Interval[] } => {
    const end = demanded(hit, die);
    const own = obstacle.tool === punch.id || obstacle.tool === die.id || obstacle.tool === null;
    const zone = own ? [] : ownZone(hit, die, obstacle);
    const met = [...inStroke(hit, die, obstacle), ...zone, ...access.meetings(tableOf(hit), hit.formed, punch, die, obstacle, end)];
    return {
      hits: met.map((meeting) => clearanceHit(obstacle.kind, obstacle.tool, meeting)),
      intervals: mergeIntervals(met.flatMap(({ meeting }) => meeting.intervals)),
    };
  };
  const blockers = (hit: Hit, punch: Punch, die: Die): readonly (() => readonly ClearanceHit[])[] => [
    ...[obstacles.ram(punch), obstacles.bed(die)].map((obstacle) => () => inStroke(hit, die, obstacle).map((meeting) => clearanceHit(obstacle.kind, null, meeting))),
    () => selfMeetings(part, tableOf(hit), hit.formed, margin, () => { counts.entries++; }),
    () => access.trapped(tableOf(hit), hit.formed, punch, die, demanded(hit, die)),
  ];
  return {
    forbidden: (hit, punch, die, tool) => check(hit, punch, die, obstacles.ofTool(tool, punch, die)).intervals,
    evidence: (hit, punch, die, tool) => check(hit, punch, die, obstacles.ofTool(tool, punch, die)).hits,
    blocked: (hit, punch, die) => blockers(hit, punch, die).flatMap((ask) => ask()),
    firstBlock: (hit, punch, die) => {
      for (const ask of blockers(hit, punch, die)) {
        const hits = ask();
        if (hits.length > 0) return hits;
      }
      return [];
    },
    counts: () => ({ ...counts }),
  };
}
