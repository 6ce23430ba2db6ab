/**
 * The scope of every query on a shop's rows. A value of this type proves that the session gate has
 * looked up the membership; a plain id does not compile where it is asked for.
 */
declare const authorized: unique symbol;
export type AuthorizedShopId = string & { readonly [authorized]: true };

/** For the session gate, and for scripts and tests that stand in its place. */
export function mintAuthorizedShopId(id: string): AuthorizedShopId {
  return id as AuthorizedShopId;
}
