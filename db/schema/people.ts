import { jsonb, pgTable, text, timestamp, uuid } from "drizzle-orm/pg-core";
import type { Preferences } from "@/lib/accounts/preferences";

/** A person with an account. E-mail addresses are kept in lower case. */
export const people = pgTable("people", {
  id: uuid().primaryKey().defaultRandom(),
  email: text().notNull().unique(),
  name: text().notNull(),
  passwordHash: text().notNull(),
  preferences: jsonb().$type<Preferences>().notNull(),
  createdAt: timestamp({ withTimezone: true }).notNull().defaultNow(),
});
