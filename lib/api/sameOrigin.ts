const safeMethods = new Set(["GET", "HEAD", "OPTIONS"]);

/**
 * A page of another site must not make a signed-in browser write here. Browsers send Origin with every unsafe method;
 * a client that is no browser sends neither Origin nor Sec-Fetch-Site, and carries no one else's cookie.
 */
export function sameOrigin(request: Request): boolean {
  if (safeMethods.has(request.method)) return true;
  const origin = request.headers.get("origin");
  const host = request.headers.get("x-forwarded-host") ?? request.headers.get("host") ?? new URL(request.url).host;
  if (origin !== null) return URL.canParse(origin) && new URL(origin).host === host;
  const site = request.headers.get("sec-fetch-site");
  return site === null || site === "same-origin" || site === "none";
}
