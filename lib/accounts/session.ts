import "server-only";
import { getIronSession, type SessionOptions } from "iron-session";
import { cookies } from "next/headers";
import { cache } from "react";
import { environment } from "@/lib/platform/environment";
import { AppError } from "@/lib/platform/errors";
import { may, type Action } from "@/lib/shops/policy";
import { mintAuthorizedShopId, type AuthorizedShopId } from "@/lib/shops/scope";
import { findSession, type SignedIn } from "./data";
import { closeSession, openSession } from "./mutations";

/** The cookie only names the session's row; everything else is looked up. */
interface SessionCookie {
  sessionId?: string;
}

/** Seconds a session lasts: thirty days. */
export const SESSION_LENGTH_S = 30 * 24 * 3600;

function options(): SessionOptions {
  const { SESSION_SECRET, SECURE_COOKIES } = environment();
  return {
    cookieName: "ventwright.session",
    password: SESSION_SECRET,
    ttl: SESSION_LENGTH_S,
    cookieOptions: {
      httpOnly: true,
      sameSite: "lax",
      secure: SECURE_COOKIES === "true",
      path: "/",
    },
  };
}

/** Who is signed in, in which shop and role; null for a visitor. Looked up once per request. */
export const currentSession = cache(async (): Promise<SignedIn | null> => {
  const jar = await cookies();
  if (!jar.has("ventwright.session")) return null;
  const { sessionId } = await getIronSession<SessionCookie>(jar, options());
  return sessionId ? findSession(sessionId) : null;
});

export interface ShopGate {
  person: SignedIn["person"];
  shop: AuthorizedShopId;
}

/**
 * The gate to a shop's rows: who is signed in, and may they do this? The only place that mints a
 * scope. Throws signed_out or forbidden.
 */
export async function requireShop(action: Action): Promise<ShopGate> {
  const session = await currentSession();
  if (!session) throw new AppError("signed_out");
  if (!may(session.role, action)) throw new AppError("forbidden");
  return { person: session.person, shop: mintAuthorizedShopId(session.shop.id) };
}

/** Signs a person in on this browser. */
export async function startSession(personId: string, shopId: string): Promise<void> {
  const cookie = await getIronSession<SessionCookie>(await cookies(), options());
  if (cookie.sessionId) await closeSession(cookie.sessionId);
  cookie.sessionId = await openSession(personId, shopId, SESSION_LENGTH_S);
  await cookie.save();
}

/** Signs this browser out; the row goes, so that a copied cookie is worth nothing. */
export async function endSession(): Promise<void> {
  const cookie = await getIronSession<SessionCookie>(await cookies(), options());
  if (cookie.sessionId) await closeSession(cookie.sessionId);
  cookie.destroy();
}
