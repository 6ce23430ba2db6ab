/** Migrates one template database; each test file works on a copy of it. */
import { spawnSync } from "node:child_process";
import { Client } from "pg";

const PREPARE = ["--import", "tsx", "--conditions=react-server", "db/prepare.ts"];

export async function setup() {
  const url = process.env.DATABASE_URL;
  if (!url) throw new Error("Integration tests need a database: run them with npm test.");
  const server = new URL(url);
  server.pathname = "/postgres";
  const client = new Client({ connectionString: server.href });
  await client.connect();
  await client.query("drop database if exists template with (force)");
  await client.query("create database template");
  await client.end();
  const done = spawnSync(process.execPath, PREPARE, { encoding: "utf8", env: process.env });
  if (done.status !== 0) throw new Error(`The template could not be migrated.\n${done.stderr}`);
}
