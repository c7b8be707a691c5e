import type { Problem } from "@/lib/schemas/problem";
import { ApiProblem } from "./apiProblem";

export interface RequestFacts {
  readonly method?: "GET" | "POST" | "PATCH" | "DELETE";
  readonly body?: unknown;
  /** A file, sent as it is instead of a JSON body. */
  readonly file?: Blob;
  readonly signal?: AbortSignal;
}

/** Asks the API; answers its JSON, or throws an `ApiProblem` that can be shown. */
export async function request<T>(path: string, { method = "GET", body, file, signal }: RequestFacts = {}): Promise<T> {
  const response = await reach(path, {
    method,
    ...(signal ? { signal } : {}),
    ...(file ? { body: file, headers: { "content-type": "application/octet-stream" } } : {}),
    ...(body === undefined ? {} : { body: JSON.stringify(body), headers: { "content-type": "application/json" } }),
  });
  if (!response.ok) throw new ApiProblem(await problemOf(response));
  if (response.status === 204) return undefined as T;
  return (await response.json()) as T;
}

async function reach(path: string, init: RequestInit): Promise<Response> {
  try {
    return await fetch(path, { ...init, credentials: "same-origin" });
  } catch (thrown) {
    if (thrown instanceof DOMException && thrown.name === "AbortError") throw thrown;
    throw new ApiProblem({
      status: 0,
      title: "No connection",
      detail: "The server cannot be reached. What you entered is still here; try again when the network is back.",
    });
  }
}

async function problemOf(response: Response): Promise<Problem> {
  const fallback: Problem = { type: "about:blank", title: response.statusText || "Problem", status: response.status, detail: `The server answered with status ${response.status}.` };
  if (!(response.headers.get("content-type") ?? "").includes("json")) return fallback;
  try {
    return { ...fallback, ...((await response.json()) as Partial<Problem>), status: response.status };
  } catch {
    return fallback;
  }
}
