import { describe, expect, test } from "vitest";
import { denSub } from "@/lib/document/samples";
import { call, newPerson, ownDatabase, type Person } from "./support/shop";

ownDatabase();

const routes = async () => ({
  list: await import("@/app/api/designs/route"),
  one: await import("@/app/api/designs/[id]/route"),
  restore: await import("@/app/api/designs/[id]/restore/route"),
  duplicate: await import("@/app/api/designs/[id]/duplicate/route"),
});

async function saved(as: Person) {
  const { list } = await routes();
  return (await call(list.POST, { as, body: { document: denSub } })).json();
}

describe("designs", () => {
  test("a saved design comes back as it was, with its key figures", async () => {
    const as = await newPerson();
    const made = await saved(as);
    const { one } = await routes();
    const read = await (await call(one.GET, { as, params: { id: made.id } })).json();
    expect(read.document).toMatchObject(denSub);
    expect(read).toMatchObject({ name: "Den sub", ring_count: 5, net_volume_m3: 0.06, version: 1 });
    expect(read.tuning_hz).toBeGreaterThan(28);
    expect(read.tuning_hz).toBeLessThan(36);
  });

  test("a save over an older version is refused and changes nothing", async () => {
    const as = await newPerson();
    const { id } = await saved(as);
    const { one } = await routes();
    const put = (version: number, name: string) =>
      call(one.PUT, {
        as,
        method: "PUT",
        params: { id },
        body: { version, document: { ...denSub, name } },
      });
    expect((await put(1, "first")).status).toBe(200);
    const late = await put(1, "second");
    expect(late.status).toBe(409);
    expect((await late.json()).error.details).toMatchObject({ version: 2, updated_by: "Pat" });
    const read = await (await call(one.GET, { as, params: { id } })).json();
    expect(read).toMatchObject({ name: "first", version: 2 });
  });

  test("two saves at once: one stands, one is told", async () => {
    const as = await newPerson();
    const { id } = await saved(as);
    const { saveDesign } = await import("@/lib/designs/mutations");
    const { designSchema } = await import("@/lib/document/schema");
    const { mintAuthorizedShopId } = await import("@/lib/shops/scope");
    const save = (name: string) =>
      saveDesign(
        mintAuthorizedShopId(as.shopId),
        as.personId,
        id,
        1,
        designSchema.parse({ ...denSub, name }),
      );
    const results = await Promise.allSettled([save("a"), save("b"), save("c")]);
    expect(results.filter(({ status }) => status === "fulfilled")).toHaveLength(1);
  });

  test("deleted, then taken back", async () => {
    const as = await newPerson();
    const { id } = await saved(as);
    const { one, restore } = await routes();
    const read = async () => (await call(one.GET, { as, params: { id } })).status;
    await call(one.DELETE, { as, method: "DELETE", params: { id } });
    expect(await read()).toBe(404);
    expect((await call(restore.POST, { as, method: "POST", params: { id } })).status).toBe(200);
    expect(await read()).toBe(200);
  });

  test("a duplicate is its own design", async () => {
    const as = await newPerson();
    const { id } = await saved(as);
    const { duplicate } = await routes();
    const copy = await (await call(duplicate.POST, { as, method: "POST", params: { id } })).json();
    expect(copy.id).not.toBe(id);
    expect(copy.name).toBe("Den sub, copy");
  });

  test("pages follow each other without a gap", async () => {
    const as = await newPerson();
    const { list } = await routes();
    for (let n = 0; n < 53; n++)
      await call(list.POST, { as, body: { document: { ...denSub, name: `Design ${n}` } } });
    const first = await (await call(list.GET, { as, path: "/api/designs" })).json();
    const second = await (
      await call(list.GET, { as, path: `/api/designs?after=${encodeURIComponent(first.next)}` })
    ).json();
    const names = [...first.designs, ...second.designs].map(({ name }: { name: string }) => name);
    expect(new Set(names).size).toBe(53);
    expect(second.next).toBeNull();
  });

  test("a document outside its ranges is refused with the field named", async () => {
    const as = await newPerson();
    const { list } = await routes();
    const bad = { ...denSub, enclosure: { ...denSub.enclosure, net_volume_m3: -1 } };
    const answer = await call(list.POST, { as, body: { document: bad } });
    expect(answer.status).toBe(422);
    expect(Object.keys((await answer.json()).error.fields)).toEqual([
      "document.enclosure.net_volume_m3",
    ]);
  });
});
