const lostCodes = new Set([
  "ECONNREFUSED", "ECONNRESET", "ETIMEDOUT", "EPIPE", "ENOTFOUND", "EHOSTUNREACH", "EAI_AGAIN",
  // SQLSTATE: administrator shutdown, crash shutdown, cannot connect now, too many connections
  "57P01", "57P02", "57P03", "53300",
]);
const lostWords = /connection terminated|timeout acquiring a connection|connection ended|client has encountered a connection error|not queryable/i;

/** Whether this was thrown because PostgreSQL cannot be reached (SQLSTATE class 08 or the network), not because of what was asked. */
export function isConnectionLost(thrown: unknown): boolean {
  if (thrown instanceof AggregateError) return thrown.errors.some(isConnectionLost);
  if (!(thrown instanceof Error)) return false;
  const code = "code" in thrown && typeof thrown.code === "string" ? thrown.code : "";
  return lostCodes.has(code) || code.startsWith("08") || lostWords.test(thrown.message);
}
