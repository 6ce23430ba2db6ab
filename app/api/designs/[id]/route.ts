import { requireShop } from "@/lib/accounts/session";
import { getDesign } from "@/lib/designs/data";
import { deleteDesign, renameDesign, saveDesign } from "@/lib/designs/mutations";
import { renameDesignSchema, saveDesignSchema } from "@/lib/designs/schema";
import { parseForm } from "@/lib/platform/form-errors";
import { readJson, route } from "@/lib/platform/route";

type Params = { id: string };

export const GET = route<Params>(async ({ params }) => {
  const { shop } = await requireShop("designs.read");
  return Response.json(await getDesign(shop, params.id));
});

export const PUT = route<Params>(async ({ request, params }) => {
  const { shop, person } = await requireShop("designs.write");
  const { version, document } = parseForm(saveDesignSchema, await readJson(request));
  return Response.json(await saveDesign(shop, person.id, params.id, version, document));
});

export const PATCH = route<Params>(async ({ request, params }) => {
  const { shop, person } = await requireShop("designs.write");
  const { name } = parseForm(renameDesignSchema, await readJson(request));
  return Response.json(await renameDesign(shop, person.id, params.id, name));
});

export const DELETE = route<Params>(async ({ params }) => {
  const { shop } = await requireShop("designs.write");
  await deleteDesign(shop, params.id);
  return new Response(null, { status: 204 });
});
