import { createServer, connect, type AddressInfo, type Socket } from "node:net";

/** A TCP door in front of a database that can be shut: open connections are cut, new ones are refused. */
export async function cuttableGate(target: string) {
  const database = new URL(target);
  const open = new Set<Socket>();
  const server = createServer((near) => {
    const far = connect(Number(database.port || 5432), database.hostname);
    for (const socket of [near, far]) {
      open.add(socket);
      socket.on("error", () => socket.destroy());
      socket.on("close", () => {
        open.delete(socket);
        near.destroy();
        far.destroy();
      });
    }
    near.pipe(far).pipe(near);
  });
  const listen = (port: number) => new Promise<void>((resolve) => server.listen(port, "127.0.0.1", resolve));
  await listen(0);
  const { port } = server.address() as AddressInfo;
  const url = new URL(target);
  url.hostname = "127.0.0.1";
  url.port = String(port);
  const shut = () => new Promise<void>((resolve) => {
    server.close(() => resolve());
    for (const socket of open) socket.destroy();
  });
  return { url: url.href, shut, reopen: () => listen(port) };
}
