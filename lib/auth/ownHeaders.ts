/** Set by the proxy on every page request: the path and query asked for. What a client sends under this name is overwritten. */
export const askedPathHeader = "x-foldwright-asked";

/** Set by the server on every request: the network address at the other end. What a client sends under this name is overwritten. */
export const addressHeader = "x-foldwright-address";
