import "server-only";
import { and, eq, isNotNull, isNull, sql } from "drizzle-orm";
import { database } from "@/db/client";
import { designs } from "@/db/schema/designs";
import { evaluate } from "@/lib/acoustics";
import { InputError } from "@/lib/acoustics/input-error";
import { keyFiguresOf } from "@/lib/bench/key-figures";
import type { Design } from "@/lib/document/schema";
import { AppError } from "@/lib/platform/errors";
import type { AuthorizedShopId } from "@/lib/shops/scope";
import type { SavedDesign } from "./contract";
import { getDesign, requireId } from "./data";

/** The key figures a list shows. A design that cannot be built has none, and may be kept all the same. */
function figuresOf(document: Design) {
  const vents = document.vents.length;
  let answer = null;
  try {
    answer = evaluate(document);
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
  }
  const figures = keyFiguresOf(document, answer);
  return {
    tuningHz: figures.tuning_hz,
    airSpeedMS: figures.air_speed_m_s,
    ringCount: vents > 0 ? figures.rings.reduce((sum, { count }) => sum + count, 0) : 0,
    netVolumeM3: figures.net_volume_m3,
  };
}

export async function createDesign(
  shop: AuthorizedShopId,
  personId: string,
  document: Design,
): Promise<SavedDesign> {
  const [row] = await database()
    .insert(designs)
    .values({
      shopId: shop,
      name: document.name,
      document,
      ...figuresOf(document),
      createdBy: personId,
      updatedBy: personId,
      // Whole milliseconds, so that a page's last time can be named exactly.
      updatedAt: new Date(),
    })
    .returning({ id: designs.id });
  if (!row) throw new AppError("internal");
  return getDesign(shop, row.id);
}

/**
 * Saves a design over the version named. Throws conflict, with what stands now, when someone else
 * has saved in between; nothing is overwritten unseen.
 */
export async function saveDesign(
  shop: AuthorizedShopId,
  personId: string,
  id: string,
  version: number,
  document: Design,
): Promise<SavedDesign> {
  requireId(id);
  const [row] = await database()
    .update(designs)
    .set({
      name: document.name,
      document,
      ...figuresOf(document),
      version: version + 1,
      updatedBy: personId,
      updatedAt: new Date(),
    })
    .where(
      and(
        eq(designs.shopId, shop),
        eq(designs.id, id),
        eq(designs.version, version),
        isNull(designs.deletedAt),
      ),
    )
    .returning({ id: designs.id });
  // Read after the try: what stands now, or not_found where nothing of that id is the shop's.
  const present = await getDesign(shop, id);
  if (!row)
    throw new AppError("conflict", {
      details: {
        version: present.version,
        updated_by: present.updated_by,
        updated_at: present.updated_at,
      },
    });
  return present;
}

export async function renameDesign(
  shop: AuthorizedShopId,
  personId: string,
  id: string,
  name: string,
): Promise<SavedDesign> {
  const present = await getDesign(shop, id);
  return saveDesign(shop, personId, id, present.version, { ...present.document, name });
}

export async function duplicateDesign(
  shop: AuthorizedShopId,
  personId: string,
  id: string,
): Promise<SavedDesign> {
  const { document } = await getDesign(shop, id);
  const name = `${document.name}, copy`.slice(0, 200);
  return createDesign(shop, personId, { ...document, name });
}

/** Puts a design away; it can be taken back. */
export async function deleteDesign(shop: AuthorizedShopId, id: string): Promise<void> {
  await getDesign(shop, id);
  await database()
    .update(designs)
    .set({ deletedAt: sql`now()` })
    .where(and(eq(designs.shopId, shop), eq(designs.id, id), isNull(designs.deletedAt)));
}

/** Takes a deleted design back. Throws not_found where there is none of that id in the shop. */
export async function restoreDesign(shop: AuthorizedShopId, id: string): Promise<SavedDesign> {
  requireId(id);
  await database()
    .update(designs)
    .set({ deletedAt: null })
    .where(and(eq(designs.shopId, shop), eq(designs.id, id), isNotNull(designs.deletedAt)));
  return getDesign(shop, id);
}
