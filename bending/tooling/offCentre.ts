import type { Machine, MachineSettings } from "./machine";

/** What of a machine says how much it bears where. */
type Rated = Pick<Machine, "maxForce"> & { readonly settings: Pick<MachineSettings, "offCentre"> };

/** The diagram as points, from the middle of the bed, where the whole rating holds. */
const pointsOf = ({ settings }: Rated): readonly (readonly [number, number])[] => [[0, 1], ...(settings.offCentre ?? [])];

/**
 * The force that the machine may press with when the load's middle is so far from the bed's, kN: the rating times the diagram's share,
 * with straight lines between its points and the last share from there on. Without a diagram the rating everywhere. The
 * diagram is the maker's; by the law of the lever alone a ram on two cylinders 2c apart bears 1 / (1 + z / c) of it at z.
 */
export function offCentreLimit(machine: Rated, z: number): number {
  const points = pointsOf(machine);
  const away = Math.abs(z);
  const next = points.findIndex(([distance]) => distance > away);
  const [to, from] = [points[next], points[next < 0 ? points.length - 1 : next - 1] ?? [0, 1]];
  if (to === undefined) return machine.maxForce * from[1];
  return machine.maxForce * (from[1] + ((to[1] - from[1]) * (away - from[0])) / (to[0] - from[0]));
}

/** How far from the middle of the bed the middle of such a load may be, mm: as shares never rise outwards, all that is nearer will do. Infinite where nothing limits it. */
export function offCentreReach(machine: Rated, forceKN: number): number {
  const points = pointsOf(machine);
  const share = forceKN / machine.maxForce;
  const next = points.findIndex((point) => point[1] < share);
  const [to, from] = [points[next], points[next - 1]];
  if (to === undefined) return Infinity;
  if (from === undefined) return 0;
  return from[0] + ((to[0] - from[0]) * (from[1] - share)) / (from[1] - to[1]);
}
