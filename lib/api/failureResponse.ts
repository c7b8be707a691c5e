import { failureStatus, type Failure } from "./failure";
import { problemResponse } from "./problemResponse";

export function failureResponse(failure: Failure): Response {
  return problemResponse({
    status: failureStatus[failure.kind],
    detail: failure.message,
    ...("errors" in failure && failure.errors ? { errors: failure.errors } : {}),
    ...("retryAfterSeconds" in failure ? { retryAfterSeconds: failure.retryAfterSeconds } : {}),
  });
}
