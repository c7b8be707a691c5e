import { overHttps } from "./overHttps";

/** Over https the name carries the prefix that makes browsers refuse it from anywhere insecure. */
export function sessionCookieName(headers: Headers): string {
  return `${overHttps(headers) ? "__Secure-" : ""}foldwright.session`;
}
