import "server-only";
import { drizzle, type NodePgDatabase } from "drizzle-orm/node-postgres";
import { Pool } from "pg";
import { environment } from "@/lib/platform/environment";
import * as designs from "./schema/designs";
import * as people from "./schema/people";
import * as sessions from "./schema/sessions";
import * as shops from "./schema/shops";

export const schema = { ...people, ...shops, ...sessions, ...designs };
export type Database = NodePgDatabase<typeof schema>;

/** One pool per process, also across reloads of the development server. */
const kept = globalThis as typeof globalThis & { ventwrightPool?: Pool };

function pool(): Pool {
  if (!kept.ventwrightPool) {
    kept.ventwrightPool = new Pool({
      connectionString: environment().DATABASE_URL,
      max: 10,
      connectionTimeoutMillis: 5_000,
    });
    // A connection that breaks while idle is replaced at the next query; that query reports.
    kept.ventwrightPool.on("error", () => undefined);
  }
  return kept.ventwrightPool;
}

let opened: Database | null = null;

/** The database; opened at the first use, so that a build needs none. */
export function database(): Database {
  opened ??= drizzle(pool(), { schema, casing: "snake_case" });
  return opened;
}

export async function closeDatabase(): Promise<void> {
  await kept.ventwrightPool?.end();
  kept.ventwrightPool = undefined;
  opened = null;
}
