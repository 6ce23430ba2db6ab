import { requireShop } from "@/lib/accounts/session";
import { duplicateDesign } from "@/lib/designs/mutations";
import { route } from "@/lib/platform/route";

export const POST = route<{ id: string }>(async ({ params }) => {
  const { shop, person } = await requireShop("designs.write");
  return Response.json(await duplicateDesign(shop, person.id, params.id), { status: 201 });
});
