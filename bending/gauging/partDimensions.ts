import type { PartModel } from "../part/partModel";
import { holeDimensions } from "./holeDimensions";
import { legDimensions } from "./legDimensions";
import { overallDimensions } from "./overallDimensions";
import type { PartDimension } from "./partDimension";

/** The sizes of a part that bending decides. */
export const partDimensions = (part: PartModel): readonly PartDimension[] => [...legDimensions(part), ...holeDimensions(part), ...overallDimensions(part)];
