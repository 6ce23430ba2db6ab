import "server-only";
import { eq, lt } from "drizzle-orm";
import { database } from "@/db/client";
import { people } from "@/db/schema/people";
import { sessions } from "@/db/schema/sessions";
import { memberships, shops } from "@/db/schema/shops";
import { AppError } from "@/lib/platform/errors";
import { findCredentials } from "./data";
import { hashPassword, passwordMatches } from "./passwords";
import { defaultPreferences, type Preferences } from "./preferences";
import type { SignIn, SignUp } from "./schema";

/** A new person with a shop of their own. Throws email_taken. */
export async function createAccount(input: SignUp): Promise<{ personId: string; shopId: string }> {
  const passwordHash = await hashPassword(input.password);
  return database().transaction(async (tx) => {
    const [person] = await tx
      .insert(people)
      .values({
        email: input.email,
        name: input.name,
        passwordHash,
        preferences: defaultPreferences,
      })
      .onConflictDoNothing({ target: people.email })
      .returning({ id: people.id });
    if (!person)
      throw new AppError("email_taken", {
        fields: { email: "There is an account with this address. Sign in instead." },
      });
    const [shop] = await tx
      .insert(shops)
      .values({ name: input.shopName || `${input.name}'s shop` })
      .returning({ id: shops.id });
    if (!shop) throw new AppError("internal");
    await tx.insert(memberships).values({ shopId: shop.id, personId: person.id, role: "owner" });
    return { personId: person.id, shopId: shop.id };
  });
}

/** Checks credentials. Throws wrong_credentials, the same for a wrong password and no account. */
export async function checkCredentials(
  input: SignIn,
): Promise<{ personId: string; shopId: string }> {
  const found = await findCredentials(input.email);
  const right = await passwordMatches(input.password, found?.passwordHash ?? null);
  if (!found || !right) throw new AppError("wrong_credentials");
  return { personId: found.personId, shopId: found.shopId };
}

/** A new session's id; ended ones are cleared away on the way. */
export async function openSession(
  personId: string,
  shopId: string,
  length_s: number,
): Promise<string> {
  const now = Date.now();
  await database()
    .delete(sessions)
    .where(lt(sessions.expiresAt, new Date(now)));
  const [row] = await database()
    .insert(sessions)
    .values({ personId, shopId, expiresAt: new Date(now + length_s * 1000) })
    .returning({ id: sessions.id });
  if (!row) throw new AppError("internal");
  return row.id;
}

export async function closeSession(id: string): Promise<void> {
  await database().delete(sessions).where(eq(sessions.id, id));
}

/** Keeps a person's own preferences. */
export async function keepPreferences(personId: string, preferences: Preferences): Promise<void> {
  await database().update(people).set({ preferences }).where(eq(people.id, personId));
}
