import { checkCredentials } from "@/lib/accounts/mutations";
import { signInSchema } from "@/lib/accounts/schema";
import { startSession } from "@/lib/accounts/session";
import { parseForm } from "@/lib/platform/form-errors";
import { forgiveSignIn, limitSignIn } from "@/lib/platform/rate-limit";
import { readJson, route } from "@/lib/platform/route";

export const POST = route(async ({ request, address }) => {
  const input = parseForm(signInSchema, await readJson(request, 10_000));
  await limitSignIn(address, input.email);
  const { personId, shopId } = await checkCredentials(input);
  await forgiveSignIn(address, input.email);
  await startSession(personId, shopId);
  return Response.json({ ok: true });
});
