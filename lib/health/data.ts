import "server-only";
import { sql } from "drizzle-orm";
import { database } from "@/db/client";
import journal from "@/db/migrations/meta/_journal.json";

export interface Health {
  ok: boolean;
  database: "answers" | "does not answer";
  migrations: "up to date" | "behind" | "unknown";
}

/** Asks the database whether it is there and at which migration it stands. */
export async function healthOf(): Promise<Health> {
  try {
    const { rows } = await database().execute<{ count: string }>(
      sql`select count(*) as count from drizzle.__drizzle_migrations`,
    );
    const upToDate = Number(rows[0]?.count ?? 0) >= journal.entries.length;
    return { ok: upToDate, database: "answers", migrations: upToDate ? "up to date" : "behind" };
  } catch {
    return { ok: false, database: "does not answer", migrations: "unknown" };
  }
}
