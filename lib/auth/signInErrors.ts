/** What `signIn("credentials", { redirect: false })` puts into `error`, and what the page says. */
export const signInErrors = {
  CredentialsSignin: "The e-mail address or the password is not right.",
  "account-off": "This account is switched off. Ask the manager to switch it on again.",
  "database-lost": "The database cannot be reached just now. Nothing is lost; try again in a minute.",
  "too-many-attempts": "Too many failed attempts to sign in.",
  Configuration: "Signing in is not set up on this server. Whoever runs it finds the reason in its log.",
} as const;

export type SignInErrorCode = keyof typeof signInErrors;

/** `too-many-attempts:420` carries the seconds until the next attempt. */
export function signInMessage(error: string | null | undefined): string | null {
  if (!error) return null;
  const [code, seconds] = error.split(":");
  if (code === "too-many-attempts") {
    const minutes = Math.max(1, Math.ceil(Number(seconds) / 60) || 15);
    return `${signInErrors["too-many-attempts"]} Try again in ${minutes} ${minutes === 1 ? "minute" : "minutes"}.`;
  }
  return code && Object.hasOwn(signInErrors, code) ? signInErrors[code as SignInErrorCode] : "Signing in failed. Try again.";
}
