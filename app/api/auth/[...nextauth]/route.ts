import NextAuth from "next-auth";
import { problemResponse } from "@/lib/api/problemResponse";
import { authOptions } from "@/lib/auth/authOptions";
import { prepareNextAuthEnvironment } from "@/lib/env";

const formLimitBytes = 20_000;

interface Context {
  readonly params: Promise<{ readonly nextauth: string[] }>;
}

async function handle(request: Request, context: Context): Promise<Response> {
  if (request.method === "POST" && Number(request.headers.get("content-length") ?? Infinity) > formLimitBytes) {
    return problemResponse({ status: 413, detail: "This is far more than an e-mail address and a password." });
  }
  prepareNextAuthEnvironment();
  const answered: unknown = await NextAuth(authOptions(request.headers))(request, { params: await context.params });
  return answered as Response;
}

export { handle as GET, handle as POST };
