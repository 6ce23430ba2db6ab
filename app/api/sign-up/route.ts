import { createAccount } from "@/lib/accounts/mutations";
import { signUpSchema } from "@/lib/accounts/schema";
import { startSession } from "@/lib/accounts/session";
import { parseForm } from "@/lib/platform/form-errors";
import { limitSignUp } from "@/lib/platform/rate-limit";
import { readJson, route } from "@/lib/platform/route";

export const POST = route(async ({ request, address }) => {
  await limitSignUp(address);
  const input = parseForm(signUpSchema, await readJson(request, 10_000));
  const { personId, shopId } = await createAccount(input);
  await startSession(personId, shopId);
  return Response.json({ ok: true }, { status: 201 });
});
