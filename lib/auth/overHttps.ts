import { env } from "@/lib/env";

/** Whether people reach this site over https: by its address, or by what the proxy in front says of the request. */
export function overHttps(headers: Headers): boolean {
  return env.publicUrl ? env.publicUrl.startsWith("https:") : headers.get("x-forwarded-proto")?.split(",")[0]?.trim() === "https";
}
