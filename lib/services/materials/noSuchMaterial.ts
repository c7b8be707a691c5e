import { fail } from "@/bending/core/result";
import type { Failure } from "@/lib/api/failure";

export const noSuchMaterial = (id: string): { readonly ok: false; readonly error: Failure } =>
  fail({ kind: "not-found", message: `There is no material ${id}. Nothing was saved.` });
