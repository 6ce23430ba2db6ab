/** The demo shop: a scenario of our own, put in once. */
import { eq } from "drizzle-orm";
import { hash } from "bcryptjs";
import { createDesign } from "@/lib/designs/mutations";
import { defaultPreferences } from "@/lib/accounts/preferences";
import { demoDesigns } from "@/lib/document/samples";
import { designSchema } from "@/lib/document/schema";
import { mintAuthorizedShopId } from "@/lib/shops/scope";
import type { Role } from "@/lib/shops/policy";
import { database } from "./client";
import { people } from "./schema/people";
import { memberships, shops } from "./schema/shops";

export const DEMO_PASSWORD = "sawdust-and-glue";

export const demoPeople: { name: string; email: string; role: Role }[] = [
  { name: "Ola Demo", email: "owner@demo.example", role: "owner" },
  { name: "Dana Demo", email: "designer@demo.example", role: "designer" },
  { name: "Bo Demo", email: "builder@demo.example", role: "builder" },
  { name: "Ines Demo", email: "installer@demo.example", role: "installer" },
];

/** Puts the demo shop in where its owner is not there yet. True where it did. */
export async function seedDemoShop(): Promise<boolean> {
  const owner = demoPeople[0]!;
  const present = await database()
    .select({ id: people.id })
    .from(people)
    .where(eq(people.email, owner.email));
  if (present.length > 0) return false;
  const passwordHash = await hash(DEMO_PASSWORD, Number(process.env.BCRYPT_COST ?? 12));
  const [shop] = await database()
    .insert(shops)
    .values({ name: "Tenon and Baffle" })
    .returning({ id: shops.id });
  if (!shop) throw new Error("The demo shop was not kept.");
  let designer = "";
  for (const { name, email, role } of demoPeople) {
    const [person] = await database()
      .insert(people)
      .values({ name, email, passwordHash, preferences: defaultPreferences })
      .returning({ id: people.id });
    if (!person) throw new Error(`${email} was not kept.`);
    await database().insert(memberships).values({ shopId: shop.id, personId: person.id, role });
    if (role === "designer") designer = person.id;
  }
  for (const document of demoDesigns)
    await createDesign(mintAuthorizedShopId(shop.id), designer, designSchema.parse(document));
  return true;
}
