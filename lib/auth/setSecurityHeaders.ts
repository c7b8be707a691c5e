export function setSecurityHeaders(headers: Headers, policy: string, https: boolean): void {
  headers.set("content-security-policy", policy);
  headers.set("x-content-type-options", "nosniff");
  headers.set("referrer-policy", "same-origin");
  headers.set("x-frame-options", "SAMEORIGIN");
  headers.set("cross-origin-opener-policy", "same-origin");
  headers.set("permissions-policy", "camera=(), microphone=(), geolocation=(), payment=()");
  if (https) headers.set("strict-transport-security", "max-age=31536000");
}
