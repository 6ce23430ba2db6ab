import { requireShop } from "@/lib/accounts/session";
import { restoreDesign } from "@/lib/designs/mutations";
import { route } from "@/lib/platform/route";

export const POST = route<{ id: string }>(async ({ params }) => {
  const { shop } = await requireShop("designs.write");
  return Response.json(await restoreDesign(shop, params.id));
});
