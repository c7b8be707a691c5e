import type { Section } from "./section";
import { allowance } from "./sections/allowance";
import { demanded } from "./sections/demanded";
import { depth } from "./sections/depth";
import { flange } from "./sections/flange";
import { flat } from "./sections/flat";
import { force } from "./sections/force";
import { gauge } from "./sections/gauge";
import { hem } from "./sections/hem";
import { holes } from "./sections/holes";
import { leastRadius } from "./sections/leastRadius";
import { mass } from "./sections/mass";
import { measured } from "./sections/measured";
import { radius } from "./sections/radius";
import { steps } from "./sections/steps";
import { vOpening } from "./sections/vOpening";

/** The trade's daily questions, in the order of the page. */
export const sections: readonly Section[] = [allowance, flat, measured, force, vOpening, radius, leastRadius, flange, depth, demanded, holes, hem, steps, gauge, mass];
