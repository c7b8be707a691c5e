import type { PlanDocument } from "../../../bending/plan/planDocument";

const fixed = (value: number, digits: number): string => {
  const text = value.toFixed(digits);
  return Number(text) === 0 ? (0).toFixed(digits) : text;
};

const place = (value: number): string => (Number(value.toFixed(1)) > 0 ? `+${value.toFixed(1)}` : fixed(value, 1));

export interface StepTexts {
  readonly bends: string;
  readonly punch: string;
  readonly die: string;
  readonly x: string;
  readonly r: string;
  readonly z: readonly string[];
  readonly angle: string;
  readonly demanded: string;
}

/** A plan's numbers (in mm) as they must stand on a sheet, written here anew: X and R to 0.01, Z and angles to 0.1. */
export function planTexts(plan: PlanDocument): { readonly steps: readonly StepTexts[]; readonly pieces: readonly string[] } {
  const steps = plan.steps.map((step) => ({
    bends: step.bends.join(" + "),
    punch: step.punch,
    die: step.die,
    x: fixed(step.gauge.x, 2),
    r: fixed(step.gauge.r, 2),
    z: step.gauge.fingers.map((finger) => place(finger.z)),
    angle: `${fixed(step.angle, 1)}°`,
    demanded: `${fixed(step.demandedAngle, 1)}°`,
  }));
  const sections = plan.stations.flatMap((station) => [...station.punchSections, ...station.dieSections]);
  const pieces = sections.flatMap((section) => (section.length !== undefined && section.piece !== undefined ? [section.piece] : []));
  return { steps, pieces };
}
