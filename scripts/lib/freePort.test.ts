import { createServer, type AddressInfo } from "node:net";
import { expect, it } from "vitest";
import { anyFreePort, nextFreePort, portIsFree } from "./freePort.mjs";

const freeBut = (taken: readonly number[]) => async (port: number) => !taken.includes(port);

it("takes the wanted port when it is free", async () => {
  expect(await nextFreePort(3000, "127.0.0.1", freeBut([]))).toBe(3000);
});

it("takes the next one above a taken port", async () => {
  expect(await nextFreePort(3000, "127.0.0.1", freeBut([3000, 3001]))).toBe(3002);
});

it("never leaves the range of port numbers", async () => {
  expect(await nextFreePort(65535, "127.0.0.1", freeBut([65535]))).toBeNull();
});

it("sees a port that is listened on", async () => {
  const server = createServer();
  await new Promise<void>((resolve) => server.listen(0, "127.0.0.1", resolve));
  const { port } = server.address() as AddressInfo;
  expect(await portIsFree(port, "127.0.0.1")).toBe(false);
  await new Promise((resolve) => server.close(resolve));
  expect(await portIsFree(port, "127.0.0.1")).toBe(true);
});

it("finds a port of the system's choosing", async () => {
  expect(await anyFreePort()).toBeGreaterThan(0);
});
