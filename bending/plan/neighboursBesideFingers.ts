import type { Interval } from "../geometry/interval";
import { toolHeights } from "../setup/createFingerAgainstTools";
import type { GaugeOption } from "../setup/gaugeOption";
import type { Layout, PlacedStation } from "../setup/layout";
import type { Tool } from "../tooling/tool";
import type { Situation } from "./situation";

/**
 * Where the middle of a finger may not stand because of the tools of the other stations, from the stroke's middle at `hitZ`. Before the stroke the punch
 * touches the flat sheet, and all punches hang from one seat as all dies stand on one.
 */
export function neighboursBesideFingers({ machine, pairs, part, fingers }: Situation, layout: Layout, own: PlacedStation, option: GaugeOption, hitZ: number): readonly Interval[] {
  const tools = pairs[own.pair];
  if (tools === undefined || layout.stations.length < 2) return [];
  const heights = toolHeights(part.thickness, tools.punch, tools.die);
  const half = machine.gauge.fingerWidth / 2;
  return layout.stations.flatMap((other): readonly Interval[] => {
    const pair = pairs[other.pair];
    if (other === own || pair === undefined) return [];
    const standing: readonly (readonly [Tool, number])[] = [[pair.punch, other.punch.length], [pair.die, other.die.length]];
    return standing.flatMap(([tool, length]): readonly Interval[] => {
      const span: Interval = [other.z - length / 2 - half - hitZ, other.z + length / 2 + half - hitZ];
      const places = option.slope === 0 ? [0] : [span[0], (span[0] + span[1]) / 2, span[1]];
      return places.some((z) => fingers.tool(option.x + option.slope * z, option.r, tool, heights)) ? [span] : [];
    });
  });
}
