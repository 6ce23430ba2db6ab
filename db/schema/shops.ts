import { index, pgEnum, pgTable, primaryKey, text, timestamp, uuid } from "drizzle-orm/pg-core";
import { people } from "./people";

export const role = pgEnum("role", ["owner", "designer", "builder", "installer"]);

/** A shop owns designs; people belong to it by membership, with a role. */
export const shops = pgTable("shops", {
  id: uuid().primaryKey().defaultRandom(),
  name: text().notNull(),
  createdAt: timestamp({ withTimezone: true }).notNull().defaultNow(),
});

export const memberships = pgTable(
  "memberships",
  {
    shopId: uuid()
      .notNull()
      .references(() => shops.id, { onDelete: "cascade" }),
    personId: uuid()
      .notNull()
      .references(() => people.id, { onDelete: "cascade" }),
    role: role().notNull(),
    createdAt: timestamp({ withTimezone: true }).notNull().defaultNow(),
  },
  (table) => [
    primaryKey({ columns: [table.shopId, table.personId] }),
    index("memberships_person").on(table.personId),
  ],
);
