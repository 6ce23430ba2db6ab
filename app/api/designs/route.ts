import { requireShop } from "@/lib/accounts/session";
import { listDesigns } from "@/lib/designs/data";
import { createDesign } from "@/lib/designs/mutations";
import { createDesignSchema } from "@/lib/designs/schema";
import { parseForm } from "@/lib/platform/form-errors";
import { readJson, route } from "@/lib/platform/route";

export const GET = route(async ({ request }) => {
  const { shop } = await requireShop("designs.read");
  const after = new URL(request.url).searchParams.get("after") ?? undefined;
  return Response.json(await listDesigns(shop, after));
});

export const POST = route(async ({ request }) => {
  const { shop, person } = await requireShop("designs.write");
  const { document } = parseForm(createDesignSchema, await readJson(request));
  return Response.json(await createDesign(shop, person.id, document), { status: 201 });
});
