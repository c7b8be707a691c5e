import { z } from "zod";
import type { Result } from "@/bending/core/result";
import { apiAccess, type ApiKey } from "@/lib/auth/accessTable";
import { mayEnter } from "@/lib/auth/mayEnter";
import { readPerson } from "@/lib/auth/readPerson";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";
import type { Failure } from "./failure";
import { failureResponse } from "./failureResponse";
import { fieldProblems } from "./fieldProblems";
import { plainWords } from "./plainWords";
import { problemResponse } from "./problemResponse";
import { readJson } from "./readJson";
import { sameOrigin } from "./sameOrigin";
import { thrownResponse } from "./thrownResponse";

export const bodyLimitBytes = 2_000_000;

/** What a handler is given: everything checked, and whoever asks. */
export interface Call<Params, Query, Body> {
  readonly person: SignedInPerson;
  readonly params: Params;
  readonly query: Query;
  readonly body: Body;
  readonly request: Request;
}

export interface RouteFacts<P extends z.ZodType, Q extends z.ZodType, B extends z.ZodType> {
  readonly params?: P;
  readonly query?: Q;
  readonly body?: B;
  readonly bodyLimit?: number;
  /** Status of a success; 200 unless said. A value of `undefined` answers 204. */
  readonly status?: number;
  readonly run: (call: Call<z.output<P>, z.output<Q>, z.output<B>>) => Promise<Result<unknown, Failure> | Response>;
}

export interface RouteHandler {
  (request: Request, context: { readonly params: Promise<Record<string, string | string[] | undefined>> }): Promise<Response>;
  /** The row of the access table that guards it. */
  readonly key: ApiKey;
}

type GuardedKey = Exclude<ApiKey, `${string} /api/auth/${string}`>;

/** A route handler: same origin, session, permission, schema, service, answer; the access is the table's row of that key. */
export function route<P extends z.ZodType = z.ZodUndefined, Q extends z.ZodType = z.ZodUndefined, B extends z.ZodType = z.ZodUndefined>(
  key: GuardedKey,
  facts: RouteFacts<P, Q, B>,
): RouteHandler {
  const handle: (...given: Parameters<RouteHandler>) => Promise<Response> = async (request, context) => {
    try {
      if (!sameOrigin(request)) return problemResponse({ status: 403, detail: "This request came from a page of another site and was refused." });
      const person = await readPerson(request.headers);
      if (!person) return problemResponse({ status: 401, detail: "Sign in first." });
      if (!mayEnter(person.role, apiAccess[key])) return problemResponse({ status: 403, detail: `The role ${person.role} may not do this.` });
      return await answer(facts, person, request, context);
    } catch (thrown) {
      return thrownResponse(thrown, key);
    }
  };
  return Object.assign(handle, { key });
}

async function answer<P extends z.ZodType, Q extends z.ZodType, B extends z.ZodType>(
  facts: RouteFacts<P, Q, B>,
  person: SignedInPerson,
  request: Request,
  context: Parameters<RouteHandler>[1],
): Promise<Response> {
  const params = check(facts.params, await context.params);
  if (!params.success) return problemResponse({ status: 404, detail: "There is nothing at this address.", errors: fieldProblems(params.error) });
  const query = check(facts.query, Object.fromEntries(new URL(request.url).searchParams));
  if (!query.success) return problemResponse({ status: 400, detail: "The query of this address is not right.", errors: fieldProblems(query.error) });
  const json = facts.body ? await readJson(request, facts.bodyLimit ?? bodyLimitBytes) : { ok: true as const, value: undefined };
  if (!json.ok) return problemResponse(json.error);
  const body = check(facts.body, json.value);
  if (!body.success) return problemResponse({ status: 422, detail: "Some fields must be changed. Nothing was saved.", errors: fieldProblems(body.error) });

  const result = await facts.run({ person, params: params.data, query: query.data, body: body.data, request });
  if (result instanceof Response) return result;
  if (!result.ok) return failureResponse(result.error);
  const headers = { "cache-control": "no-store" };
  return result.value === undefined
    ? new Response(null, { status: 204, headers })
    : Response.json(result.value, { status: facts.status ?? 200, headers });
}

/** Without a schema there is nothing to read, and the handler is given `undefined`. */
function check<S extends z.ZodType>(schema: S | undefined, given: unknown): z.ZodSafeParseResult<z.output<S>> {
  return schema ? schema.safeParse(given, { error: plainWords }) : (z.undefined().safeParse(undefined) as z.ZodSafeParseResult<z.output<S>>);
}
