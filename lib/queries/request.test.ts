import { createServer, type Server } from "node:http";
import type { AddressInfo } from "node:net";
import { afterAll, beforeAll, expect, it } from "vitest";
import { ApiProblem } from "./apiProblem";
import { queryText } from "./queryText";
import { request } from "./request";
import { shouldRetry } from "./shouldRetry";

let server: Server;
let origin: string;
beforeAll(async () => {
  server = createServer((asked, answer) => {
    const [, status = "200", kind = "json"] = (asked.url ?? "").split("/");
    const problem = { type: "about:blank", title: "Unprocessable Entity", status: Number(status), detail: "Change two fields.", errors: [{ path: "document.profile.legs[0]", message: "is too short" }, { path: "note", message: "is too long" }] };
    let body = "";
    asked.on("data", (chunk) => { body += String(chunk); });
    asked.on("end", () => {
      answer.writeHead(Number(status), { "content-type": kind === "html" ? "text/html" : "application/problem+json" });
      if (status === "200") answer.end(JSON.stringify({ method: asked.method, sent: body }));
      else answer.end(status === "204" ? undefined : kind === "html" ? "<h1>Bad gateway</h1>" : JSON.stringify(problem));
    });
  });
  await new Promise<void>((resolve) => server.listen(0, "127.0.0.1", resolve));
  origin = `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
});
afterAll(() => new Promise((resolve) => server.close(resolve)));

const problemOf = async (work: Promise<unknown>): Promise<ApiProblem> => {
  const thrown: unknown = await work.then(() => null, (error: unknown) => error);
  if (!(thrown instanceof ApiProblem)) throw new Error(`not a problem: ${String(thrown)}`);
  return thrown;
};

it("sends and answers JSON, and nothing for 204", async () => {
  expect(await request(`${origin}/200`, { method: "POST", body: { a: 1 } })).toEqual({ method: "POST", sent: '{"a":1}' });
  expect(await request(`${origin}/204`, { method: "DELETE" })).toBeUndefined();
});

it("makes an error with its fields of a problem response", async () => {
  const problem = await problemOf(request(`${origin}/422`));
  expect(problem).toMatchObject({ status: 422, message: "Change two fields.", title: "Unprocessable Entity" });
  expect(problem.messageAt("note")).toBe("is too long");
  expect(problem.errorsIn("document")).toEqual([{ path: "profile.legs[0]", message: "is too short" }]);
});

it("copes with an answer that is no problem response", async () => {
  expect(await problemOf(request(`${origin}/502/html`))).toMatchObject({ status: 502, message: "The server answered with status 502.", errors: [] });
});

it("says that nothing typed is lost when the server is out of reach", async () => {
  const problem = await problemOf(request("http://127.0.0.1:1/nowhere"));
  expect([problem.status, problem.message]).toEqual([0, expect.stringContaining("What you entered is still here")]);
  expect([shouldRetry(0, problem), shouldRetry(2, problem), shouldRetry(0, await problemOf(request(`${origin}/422`)))]).toEqual([true, false, false]);
});

it("writes queries without what is not given", () => {
  expect(queryText({ q: "a&b", page: 2, sort: undefined, dir: "" })).toBe("?q=a%26b&page=2");
  expect(queryText({})).toBe("");
});
