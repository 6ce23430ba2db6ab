import { index, pgTable, timestamp, uuid } from "drizzle-orm/pg-core";
import { people } from "./people";
import { shops } from "./shops";

/** One signed-in browser. The cookie only names the row, so that a row taken away signs out. */
export const sessions = pgTable(
  "sessions",
  {
    id: uuid().primaryKey().defaultRandom(),
    personId: uuid()
      .notNull()
      .references(() => people.id, { onDelete: "cascade" }),
    /** The shop the person works in at present. */
    shopId: uuid()
      .notNull()
      .references(() => shops.id, { onDelete: "cascade" }),
    createdAt: timestamp({ withTimezone: true }).notNull().defaultNow(),
    expiresAt: timestamp({ withTimezone: true }).notNull(),
  },
  (table) => [index("sessions_person").on(table.personId)],
);
