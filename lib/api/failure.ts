import type { FieldProblem } from "@/bending/core/problem";

/** Why a service did not do what it was asked; each kind has its HTTP status. */
export type Failure =
  | { readonly kind: "invalid"; readonly message: string; readonly errors: readonly FieldProblem[] }
  | { readonly kind: "not-found"; readonly message: string }
  | { readonly kind: "forbidden"; readonly message: string }
  | { readonly kind: "conflict"; readonly message: string; readonly errors?: readonly FieldProblem[] }
  | { readonly kind: "busy"; readonly message: string; readonly retryAfterSeconds: number };

export const failureStatus = { invalid: 422, "not-found": 404, forbidden: 403, conflict: 409, busy: 429 } as const satisfies Record<Failure["kind"], number>;
