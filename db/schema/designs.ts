import { sql } from "drizzle-orm";
import {
  doublePrecision,
  index,
  integer,
  jsonb,
  pgTable,
  text,
  timestamp,
  uuid,
} from "drizzle-orm/pg-core";
import type { Design } from "@/lib/document/schema";
import { people } from "./people";
import { shops } from "./shops";

/** A design of a shop: its document, and the key figures that lists show. */
export const designs = pgTable(
  "designs",
  {
    id: uuid().primaryKey().defaultRandom(),
    shopId: uuid()
      .notNull()
      .references(() => shops.id, { onDelete: "cascade" }),
    name: text().notNull(),
    document: jsonb().$type<Design>().notNull(),
    tuningHz: doublePrecision(),
    airSpeedMS: doublePrecision(),
    ringCount: integer().notNull().default(0),
    netVolumeM3: doublePrecision().notNull(),
    /** Counts the saves: a save that does not name the latest is refused. */
    version: integer().notNull().default(1),
    createdBy: uuid().references(() => people.id, { onDelete: "set null" }),
    updatedBy: uuid().references(() => people.id, { onDelete: "set null" }),
    createdAt: timestamp({ withTimezone: true }).notNull().defaultNow(),
    updatedAt: timestamp({ withTimezone: true }).notNull().defaultNow(),
    deletedAt: timestamp({ withTimezone: true }),
  },
  (table) => [
    index("designs_shop_updated")
      .on(table.shopId, table.updatedAt.desc(), table.id)
      .where(sql`deleted_at is null`),
  ],
);
