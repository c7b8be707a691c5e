import { isIPv6 } from "node:net";
import { env } from "@/lib/env";
import { addressHeader } from "./ownHeaders";

/** The network that an address belongs to: of IPv6 the first 64 bits, since one household or machine has them all. */
function network(address: string): string {
  const plain = address.replace(/^::ffff:/i, "").replace(/%.*$/, "");
  if (!isIPv6(plain)) return plain;
  const [head = "", tail] = plain.split("::");
  const left = head ? head.split(":") : [];
  const right = tail ? tail.split(":") : [];
  const groups = tail === undefined ? left : [...left, ...Array<string>(Math.max(0, 8 - left.length - right.length)).fill("0"), ...right];
  return `${groups.slice(0, 4).map((group) => group.toLowerCase().replace(/^0+(?=.)/, "")).join(":")}::/64`;
}

/**
 * Who is at the other end. X-Forwarded-For is believed only as far as our own proxies wrote it: each appends the address it
 * was called from, so with n of them the n-th from the right is the client's; anything further left may be invented.
 */
export function networkAddress(headers: Headers): string {
  const connected = headers.get(addressHeader) ?? "unknown";
  if (env.trustedProxies === 0) return network(connected);
  const forwarded = (headers.get("x-forwarded-for") ?? "").split(",").map((entry) => entry.trim()).filter(Boolean);
  return network(forwarded.at(-env.trustedProxies) ?? connected);
}
