import "server-only";
import { and, desc, eq, isNull, lt, or } from "drizzle-orm";
import { database } from "@/db/client";
import { designs } from "@/db/schema/designs";
import { people } from "@/db/schema/people";
import { AppError } from "@/lib/platform/errors";
import type { AuthorizedShopId } from "@/lib/shops/scope";
import type { DesignPage, SavedDesign } from "./contract";

const columns = {
  id: designs.id,
  name: designs.name,
  document: designs.document,
  tuningHz: designs.tuningHz,
  airSpeedMS: designs.airSpeedMS,
  ringCount: designs.ringCount,
  netVolumeM3: designs.netVolumeM3,
  version: designs.version,
  createdAt: designs.createdAt,
  updatedAt: designs.updatedAt,
  updatedBy: people.name,
};

type Row = { [K in keyof typeof columns]: (typeof columns)[K]["_"]["data"] | null };

const PAGE = 50;
const uuid = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/i;

function saved(row: Row): SavedDesign {
  const { id, name, document, version, createdAt, updatedAt, netVolumeM3, ringCount } = row;
  if (!id || name === null || !document || !version || !createdAt || !updatedAt)
    throw new AppError("internal");
  return {
    id,
    name,
    document,
    tuning_hz: row.tuningHz,
    air_speed_m_s: row.airSpeedMS,
    ring_count: ringCount ?? 0,
    net_volume_m3: netVolumeM3 ?? 0,
    version,
    created_at: createdAt.toISOString(),
    updated_at: updatedAt.toISOString(),
    updated_by: row.updatedBy,
  };
}

/** Throws not_found for an id that the database could not even read. */
export function requireId(id: string): void {
  if (!uuid.test(id)) throw new AppError("not_found");
}

/** One design of the shop. Throws not_found, also for another shop's. */
export async function getDesign(shop: AuthorizedShopId, id: string): Promise<SavedDesign> {
  requireId(id);
  const [row] = await database()
    .select(columns)
    .from(designs)
    .leftJoin(people, eq(people.id, designs.updatedBy))
    .where(and(eq(designs.shopId, shop), eq(designs.id, id), isNull(designs.deletedAt)));
  if (!row) throw new AppError("not_found");
  return saved(row);
}

/** The shop's designs, last changed first, a page at a time by the last row of the page before. */
export async function listDesigns(shop: AuthorizedShopId, after?: string): Promise<DesignPage> {
  const [time, id] = after?.split("~") ?? [];
  const before = time ? new Date(time) : null;
  if (after && (!before || Number.isNaN(before.getTime()) || !uuid.test(id ?? "")))
    throw new AppError("bad_request");
  const rows = await database()
    .select(columns)
    .from(designs)
    .leftJoin(people, eq(people.id, designs.updatedBy))
    .where(
      and(
        eq(designs.shopId, shop),
        isNull(designs.deletedAt),
        before && id
          ? or(
              lt(designs.updatedAt, before),
              and(eq(designs.updatedAt, before), lt(designs.id, id)),
            )
          : undefined,
      ),
    )
    .orderBy(desc(designs.updatedAt), desc(designs.id))
    .limit(PAGE + 1);
  const page = rows.slice(0, PAGE).map(saved);
  const last = page.at(-1);
  return {
    designs: page,
    next: rows.length > PAGE && last ? `${last.updated_at}~${last.id}` : null,
  };
}
