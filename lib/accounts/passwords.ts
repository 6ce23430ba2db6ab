import "server-only";
import { compare, hash } from "bcryptjs";
import { environment } from "@/lib/platform/environment";

export async function hashPassword(password: string): Promise<string> {
  return hash(password, environment().BCRYPT_COST);
}

let stranger: Promise<string> | null = null;

/**
 * Whether a password is right. Without an account the same work is done against a hash of nothing,
 * so that the time taken does not tell which addresses have one.
 */
export async function passwordMatches(password: string, stored: string | null): Promise<boolean> {
  stranger ??= hashPassword(crypto.randomUUID());
  const matches = await compare(password, stored ?? (await stranger));
  return matches && stored !== null;
}
