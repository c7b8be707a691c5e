import { NextResponse, type NextRequest } from "next/server";
import { problemResponse } from "@/lib/api/problemResponse";
import { contentSecurityPolicy } from "@/lib/auth/contentSecurityPolicy";
import { askedPathHeader } from "@/lib/auth/ownHeaders";
import { overHttps } from "@/lib/auth/overHttps";
import { readToken } from "@/lib/auth/readToken";
import { setSecurityHeaders } from "@/lib/auth/setSecurityHeaders";
import { env } from "@/lib/env";

const open = (path: string): boolean => path === "/sign-in" || path.startsWith("/api/auth/");

/** The first gate: whoever carries no genuine session gets no further. What a role may do is decided by each page and route. */
export async function proxy(request: NextRequest): Promise<Response> {
  const { pathname, search } = request.nextUrl;
  const https = overHttps(request.headers);
  const nonce = Buffer.from(crypto.randomUUID()).toString("base64");
  const policy = contentSecurityPolicy(nonce, env.development, https);
  const response = open(pathname) || (await readToken(request.headers)) ? pass(request, policy) : refuse(request, pathname + search);
  setSecurityHeaders(response.headers, pathname.startsWith("/api/") ? "frame-ancestors 'self'" : policy, https);
  return response;
}

function pass(request: NextRequest, policy: string): Response {
  const headers = new Headers(request.headers);
  headers.set(askedPathHeader, request.nextUrl.pathname + request.nextUrl.search);
  headers.set("content-security-policy", policy);
  return NextResponse.next({ request: { headers } });
}

function refuse(request: NextRequest, asked: string): Response {
  if (asked.startsWith("/api/")) return problemResponse({ status: 401, detail: "Sign in first." });
  const signIn = request.nextUrl.clone();
  signIn.pathname = "/sign-in";
  signIn.search = asked === "/" ? "" : `?next=${encodeURIComponent(asked)}`;
  return NextResponse.redirect(signIn, 303);
}

export const config = { matcher: ["/((?!_next/static/|_next/image|fonts/|icon.svg|favicon.ico).*)"] };
