import { z } from "zod";

const wholeNumber = (least: number, most: number, standard: number) =>
  z.coerce.number().int().min(least).max(most).default(standard);

const environmentSchema = z.object({
  NODE_ENV: z.enum(["development", "production", "test"]).default("production"),
  DATABASE_URL: z.string().regex(/^postgres(ql)?:\/\//, "must be a postgres:// address"),
  NEXTAUTH_SECRET: z.string().min(16, "must be a secret of at least 16 characters"),
  NEXTAUTH_URL: z.url({ protocol: /^https?$/, error: "must be an http:// or https:// address" }).optional(),
  BCRYPT_ROUNDS: wholeNumber(4, 15, 12),
  TRUSTED_PROXIES: wholeNumber(0, 10, 0),
});

type Settings = z.infer<typeof environmentSchema>;

const read = new Map<keyof Settings, unknown>();

/** Each setting is read and checked when it is first asked for, so that a build needs none. */
function setting<Name extends keyof Settings>(name: Name): Settings[Name] {
  const known = read.get(name) as Settings[Name];
  if (known !== undefined) return known;
  const given = process.env[name] || undefined;
  const checked = environmentSchema.shape[name].safeParse(given);
  if (!checked.success) {
    const fault = given === undefined ? "is not set" : checked.error.issues.map((issue) => issue.message).join("; ");
    throw new Error(`The environment variable ${name} ${fault}.`);
  }
  read.set(name, checked.data);
  return checked.data as Settings[Name];
}

/** The only door to the settings of this process. */
export const env = {
  get development(): boolean {
    return setting("NODE_ENV") === "development";
  },
  get databaseUrl(): string {
    return setting("DATABASE_URL");
  },
  get authSecret(): string {
    return setting("NEXTAUTH_SECRET");
  },
  /** The address that people type; absent, the host of each request is taken. */
  get publicUrl(): string | undefined {
    return setting("NEXTAUTH_URL");
  },
  /** Cost of a password hash, as a power of two. */
  get bcryptRounds(): number {
    return setting("BCRYPT_ROUNDS");
  },
  /** How many reverse proxies stand in front and append to X-Forwarded-For. */
  get trustedProxies(): number {
    return setting("TRUSTED_PROXIES");
  },
} as const;

/** next-auth reads its own variables; without an address of ours it must be told to take the host of the request. */
export function prepareNextAuthEnvironment(): void {
  if (env.publicUrl === undefined) process.env["AUTH_TRUST_HOST"] ??= "true";
}
