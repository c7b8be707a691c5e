import { fail } from "@/bending/core/result";
import type { Failure } from "@/lib/api/failure";

export const noSuchPlan = () => fail<Failure>({ kind: "not-found", message: "There is no such plan (any more)." });
