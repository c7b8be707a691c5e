import { PlainError } from "../plainError.mjs";

/** Node 20.9 or newer, on Linux. */
export function requireNode() {
  const [major = 0, minor = 0] = process.versions.node.split(".").map(Number);
  if (major < 20 || (major === 20 && minor < 9)) throw new PlainError(`Foldwright needs Node 20.9 or newer; this is ${process.versions.node}.`);
  if (process.platform !== "linux") throw new PlainError(`npm start and npm test are made for Linux (Debian 12); this is ${process.platform}.`);
}
