import { subscribe } from "node:diagnostics_channel";
import type { IncomingMessage } from "node:http";
import { addressHeader } from "./ownHeaders";

/** Writes the address at the other end of the socket into every request before anything reads it. */
export function stampAddress(): void {
  subscribe("http.server.request.start", (message) => {
    const { request } = message as { readonly request: IncomingMessage };
    request.headers[addressHeader] = request.socket.remoteAddress ?? "unknown";
  });
}
