import { endSession } from "@/lib/accounts/session";
import { route } from "@/lib/platform/route";

export const POST = route(async () => {
  await endSession();
  return Response.json({ ok: true });
});
