/** Runs once when the server starts; the condition is the framework's, replaced while it builds. */
export async function register(): Promise<void> {
  if (process.env.NEXT_RUNTIME === "nodejs") {
    const { stampAddress } = await import("./lib/auth/stampAddress");
    stampAddress();
  }
}
