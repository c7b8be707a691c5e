import { kiloNewtonPerMetre } from "../../core/units";
import type { Tool } from "../../tooling/tool";
import { newId, piecesLike } from "./asNew";

/** An owned tool's like with a higher rating, kN/m. */
export const strongerTool = (like: Tool, rating: number): Tool => ({ ...like, id: newId(like.kind), maxForcePerMetre: kiloNewtonPerMetre(rating), pieces: piecesLike(like) });
