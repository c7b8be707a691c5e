import { ApiProblem } from "./apiProblem";

/** For the query client: a question that was refused is not asked again, one that did not get through twice more. */
export function shouldRetry(failures: number, error: Error): boolean {
  const passing = !(error instanceof ApiProblem) || error.status === 0 || error.status >= 502;
  return passing && failures < 2;
}
