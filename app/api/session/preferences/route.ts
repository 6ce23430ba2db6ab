import { keepPreferences } from "@/lib/accounts/mutations";
import { preferencesSchema } from "@/lib/accounts/preferences";
import { currentSession } from "@/lib/accounts/session";
import { AppError } from "@/lib/platform/errors";
import { parseForm } from "@/lib/platform/form-errors";
import { readJson, route } from "@/lib/platform/route";

export const PATCH = route(async ({ request }) => {
  const session = await currentSession();
  if (!session) throw new AppError("signed_out");
  const change = await readJson(request, 10_000);
  if (typeof change !== "object" || change === null) throw new AppError("bad_request");
  const preferences = parseForm(preferencesSchema, { ...session.person.preferences, ...change });
  await keepPreferences(session.person.id, preferences);
  return Response.json(preferences);
});
