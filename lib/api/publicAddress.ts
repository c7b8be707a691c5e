import { env } from "@/lib/env";

/** Where people reach this site: as set, else as this request came in. Without a slash at the end. */
export function publicAddress(headers: Headers, url = "http://localhost"): string {
  if (env.publicUrl !== undefined) return new URL(env.publicUrl).origin;
  const asked = new URL(url);
  const host = headers.get("x-forwarded-host") ?? headers.get("host") ?? asked.host;
  const protocol = headers.get("x-forwarded-proto")?.split(",")[0]?.trim() ?? asked.protocol.replace(":", "");
  return `${protocol}://${host}`;
}
