import { Worker, type WorkerOptions } from "node:worker_threads";
import { pathToFileURL } from "node:url";

/** Starts a thread on a TypeScript file outside the bundler. */
export function startWithTsx(path: string, options: WorkerOptions): Worker {
  const entry = JSON.stringify(pathToFileURL(path).href);
  return new Worker(`import("tsx/esm/api").then(({ register }) => { register(); return import(${entry}); })`, { ...options, eval: true });
}
