import pg from "pg";
import type { TestProject } from "vitest/node";
import { findBinaries } from "../../scripts/lib/postgres/findBinaries.mjs";
import { prepareDatabase } from "../../scripts/lib/postgres/prepareDatabase.mjs";
import { throwAwayCluster } from "../../scripts/lib/postgres/throwAwayCluster.mjs";
import { EMPTY_TEMPLATE, SHOP_TEMPLATE } from "./templates";

declare module "vitest" {
  export interface ProvidedContext {
    /** A migrated, empty database on this run's own PostgreSQL; test files that write take one of their own from freshDatabase(). */
    databaseUrl: string;
  }
}

export default async function setup(project: TestProject) {
  const binaries = findBinaries();
  if (!binaries) throw new Error("The integration tests need PostgreSQL's programs: install Debian's package `postgresql`, or run `npm test`, which does.");
  const cluster = await throwAwayCluster(binaries);
  try {
    prepareDatabase(withName(cluster.url, EMPTY_TEMPLATE), ["--create"]);
    await copy(cluster.url, EMPTY_TEMPLATE, SHOP_TEMPLATE);
    prepareDatabase(withName(cluster.url, SHOP_TEMPLATE), ["--seed"], { BCRYPT_ROUNDS: "4" });
    await copy(cluster.url, EMPTY_TEMPLATE, "foldwright");
  } catch (error) {
    await cluster.end();
    throw error;
  }
  project.provide("databaseUrl", withName(cluster.url, "foldwright"));
  return () => cluster.end();
}

function withName(url: string, name: string) {
  const address = new URL(url);
  address.pathname = `/${name}`;
  return address.href;
}

async function copy(url: string, template: string, name: string) {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  await client.query(`create database ${name} template ${template}`);
  await client.end();
}
