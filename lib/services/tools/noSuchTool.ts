import { fail } from "@/bending/core/result";
import type { Failure } from "@/lib/api/failure";

export const noSuchTool = (code: string): { readonly ok: false; readonly error: Failure } =>
  fail({ kind: "not-found", message: `There is no tool ${code}.` });
