import { afterEach, expect, it, vi } from "vitest";
import { addressHeader } from "./ownHeaders";

const read = async (proxies: string, connected: string, forwarded?: string) => {
  vi.stubEnv("TRUSTED_PROXIES", proxies);
  vi.resetModules();
  const { networkAddress } = await import("./networkAddress");
  return networkAddress(new Headers({ [addressHeader]: connected, ...(forwarded ? { "x-forwarded-for": forwarded } : {}) }));
};
afterEach(() => vi.unstubAllEnvs());

it("believes no forwarded address when no proxy stands in front", async () => {
  expect(await read("0", "192.0.2.7", "203.0.113.1")).toBe("192.0.2.7");
});

it("counts forwarded addresses from the right, so that an invented one on the left changes nothing", async () => {
  expect(await read("1", "127.0.0.1", "10.9.9.9, 203.0.113.1")).toBe("203.0.113.1");
  expect(await read("2", "127.0.0.1", "10.9.9.9, 203.0.113.1, 198.51.100.4")).toBe("203.0.113.1");
  expect(await read("2", "192.0.2.7", "203.0.113.1")).toBe("192.0.2.7");
});

it("takes the network of 64 bits for IPv6, however it is written, and the inner address of a mapped one", async () => {
  expect(await read("0", "2001:db8:1:2::5")).toBe("2001:db8:1:2::/64");
  expect(await read("0", "2001:0DB8:0001:0002:aaaa:bbbb:cccc:dddd")).toBe("2001:db8:1:2::/64");
  expect(await read("0", "2001:db8::5")).toBe("2001:db8:0:0::/64");
  expect(await read("0", "::ffff:192.0.2.7")).toBe("192.0.2.7");
});
