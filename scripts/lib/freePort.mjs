import { createConnection, createServer } from "node:net";

/** True when something on this machine already answers on the port. @param {number} port @param {string} host */
const answers = (port, host) =>
  new Promise((resolve) => {
    const socket = createConnection({ port, host });
    const end = (/** @type {boolean} */ value) => {
      socket.destroy();
      resolve(value);
    };
    socket.setTimeout(500, () => end(false));
    socket.once("connect", () => end(true));
    socket.once("error", () => end(false));
  });

/** True when the port can be listened on. @param {number} port @param {string} host */
const listens = (port, host) =>
  new Promise((resolve) => {
    const server = createServer();
    server.once("error", () => resolve(false));
    server.listen({ port, host, exclusive: true }, () => server.close(() => resolve(true)));
  });

/** @param {number} port @param {string} host */
export async function portIsFree(port, host) {
  if ((await answers(port, "127.0.0.1")) || (await answers(port, "::1"))) return false;
  return listens(port, host);
}

/** A port that nobody uses, chosen by the system. @param {string} host @returns {Promise<number>} */
export function anyFreePort(host = "127.0.0.1") {
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once("error", reject);
    server.listen({ port: 0, host }, () => {
      const address = server.address();
      const port = typeof address === "object" && address ? address.port : 0;
      server.close(() => resolve(port));
    });
  });
}

/**
 * The wanted port, or the next one above it that is free.
 * @param {number} wanted
 * @param {string} host
 * @param {(port: number, host: string) => Promise<boolean>} isFree
 * @returns {Promise<number | null>}
 */
export async function nextFreePort(wanted, host, isFree = portIsFree) {
  for (let port = wanted; port <= Math.min(wanted + 99, 65535); port += 1) {
    if (await isFree(port, host)) return port;
  }
  return null;
}
