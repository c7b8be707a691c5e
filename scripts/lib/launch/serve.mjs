import { PlainError } from "../plainError.mjs";
import { nextFreePort } from "../freePort.mjs";
import { say } from "../say.mjs";
import { startWeb } from "../web/startWeb.mjs";

/**
 * Serves on the wanted port, or aloud on the next free one above it.
 * @param {{ mode: "start" | "dev", host: string, wanted: number, env: Record<string, string> }} options
 */
export async function serve({ mode, host, wanted, env }) {
  const port = await nextFreePort(wanted, host);
  if (port === null) throw new PlainError(`No port from ${wanted} to ${wanted + 99} is free on ${host}. Set PORT to another one.`);
  if (port !== wanted) say(`Port ${wanted} is taken: using ${port} instead.`);
  const web = await startWeb({ mode, host, port, env: { ...env, PORT: String(port) } });
  return { ...web, port };
}
