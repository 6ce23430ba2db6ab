import "server-only";
import { and, eq, gt } from "drizzle-orm";
import { database } from "@/db/client";
import { people } from "@/db/schema/people";
import { sessions } from "@/db/schema/sessions";
import { memberships, shops } from "@/db/schema/shops";
import type { Role } from "@/lib/shops/policy";
import type { Preferences } from "./preferences";

export interface SignedIn {
  sessionId: string;
  person: { id: string; name: string; email: string; preferences: Preferences };
  shop: { id: string; name: string };
  role: Role;
}

/** The session of an id with its person, shop and role; null once it has ended or the membership has. */
export async function findSession(id: string): Promise<SignedIn | null> {
  const [row] = await database()
    .select({
      personId: people.id,
      name: people.name,
      email: people.email,
      preferences: people.preferences,
      shopId: shops.id,
      shopName: shops.name,
      role: memberships.role,
    })
    .from(sessions)
    .innerJoin(people, eq(people.id, sessions.personId))
    .innerJoin(shops, eq(shops.id, sessions.shopId))
    .innerJoin(
      memberships,
      and(eq(memberships.personId, sessions.personId), eq(memberships.shopId, sessions.shopId)),
    )
    .where(and(eq(sessions.id, id), gt(sessions.expiresAt, new Date())));
  if (!row) return null;
  return {
    sessionId: id,
    person: {
      id: row.personId,
      name: row.name,
      email: row.email,
      preferences: row.preferences,
    },
    shop: { id: row.shopId, name: row.shopName },
    role: row.role,
  };
}

/** The account of an e-mail address with what is needed to check a password. */
export async function findCredentials(email: string) {
  const [row] = await database()
    .select({ personId: people.id, passwordHash: people.passwordHash, shopId: memberships.shopId })
    .from(people)
    .innerJoin(memberships, eq(memberships.personId, people.id))
    .where(eq(people.email, email))
    .orderBy(memberships.createdAt)
    .limit(1);
  return row ?? null;
}
