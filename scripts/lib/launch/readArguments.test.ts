import { expect, it } from "vitest";
import { readArguments } from "./readArguments.mjs";

it("has defaults that suit a single machine", () => {
  expect(readArguments([], {})).toMatchObject({ port: 3000, host: "127.0.0.1", databaseUrl: null, dev: false, reset: false, yes: false });
});

it("takes the environment's port, host and database", () => {
  const wishes = readArguments(["--reset", "--yes"], { PORT: "8080", HOST: "0.0.0.0", DATABASE_URL: "postgresql://u:p@h:5432/d" });
  expect(wishes).toMatchObject({ port: 8080, host: "0.0.0.0", databaseUrl: "postgresql://u:p@h:5432/d", reset: true, yes: true });
});

it.each(["0", "65536", "80a", "-1", "3000.5"])("refuses the port %s by name", (port) => {
  expect(() => readArguments([], { PORT: port })).toThrow(/PORT is ".*whole number from 1 to 65535/);
});

it("refuses an address that is none of PostgreSQL", () => {
  expect(() => readArguments([], { DATABASE_URL: "mysql://h/d" })).toThrow(/DATABASE_URL must be an address like postgres/);
});

it("refuses a flag that it does not know", () => {
  expect(() => readArguments(["--rest"], {})).toThrow(/Unknown flag --rest/);
});
