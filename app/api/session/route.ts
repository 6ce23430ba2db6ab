import { currentSession } from "@/lib/accounts/session";
import { route } from "@/lib/platform/route";

/** Who is signed in, for the client; null for a visitor. */
export const GET = route(async () => {
  const session = await currentSession();
  if (!session) return Response.json(null);
  const { person, shop, role } = session;
  return Response.json({ person, shop, role });
});
