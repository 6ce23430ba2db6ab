/** Who may do what, route by route: every route of the application has a row here. */
import { readdirSync, statSync } from "node:fs";
import { join } from "node:path";
import { describe, expect, test } from "vitest";
import { denSub } from "@/lib/document/samples";
import { roles } from "@/lib/shops/policy";
import { call, newPerson, setRole, ownDatabase, type Person } from "./support/shop";

ownDatabase();

type Reach = "anyone" | "signed in" | "readers" | "writers";
const document = denSub;

/** What each route's methods let through, and a request that works for who may. */
const table: Record<
  string,
  Record<string, { reach: Reach; body?: unknown; ofDesign?: boolean }>
> = {
  evaluate: { POST: { reach: "anyone", body: { design: document } } },
  length: { POST: { reach: "anyone", body: { design: document, vent: 0, tuning_hz: 33 } } },
  rings: {
    POST: {
      reach: "anyone",
      body: {
        design: document,
        vent: 0,
        tuning_hz: 33,
        sheets: [{ name: "18", thickness_m: 0.0177, thickness_sd_m: 0.0001 }],
        ring_outer_diameter_m: 0.16,
        glue_line_m: 0.0001,
        glue_line_sd_m: 0.00003,
        max_rings: 12,
        may_trim_tube: true,
        trim_loss_m: 0.001,
      },
    },
  },
  jig: {
    POST: {
      reach: "anyone",
      body: { bore_m: 0.102, outer_diameter_m: 0.152, bit_diameter_m: 0.00635 },
    },
  },
  health: { GET: { reach: "anyone" } },
  session: { GET: { reach: "anyone" } },
  "session/preferences": { PATCH: { reach: "signed in", body: { system: "imperial" } } },
  "sign-up": { POST: { reach: "anyone", body: {} } },
  "sign-in": { POST: { reach: "anyone", body: {} } },
  "sign-out": { POST: { reach: "anyone" } },
  designs: { GET: { reach: "readers" }, POST: { reach: "writers", body: { document } } },
  "designs/[id]": {
    GET: { reach: "readers", ofDesign: true },
    PUT: { reach: "writers", body: { version: 1, document }, ofDesign: true },
    PATCH: { reach: "writers", body: { name: "Renamed" }, ofDesign: true },
    DELETE: { reach: "writers", ofDesign: true },
  },
  "designs/[id]/restore": { POST: { reach: "writers", ofDesign: true } },
  "designs/[id]/duplicate": { POST: { reach: "writers", ofDesign: true } },
};

const folder = join(process.cwd(), "app", "api");

function routesBelow(path = ""): string[] {
  return readdirSync(join(folder, path)).flatMap((name) => {
    const inside = path ? `${path}/${name}` : name;
    if (statSync(join(folder, inside)).isDirectory()) return routesBelow(inside);
    return name === "route.ts" ? [path] : [];
  });
}

const METHODS = ["GET", "POST", "PUT", "PATCH", "DELETE"];

async function newDesign(person: Person): Promise<string> {
  const { POST } = await import("@/app/api/designs/route");
  const made = await call(POST, { as: person, body: { document } });
  expect(made.status).toBe(201);
  return (await made.json()).id;
}

describe("every route has a row", () => {
  test.each(routesBelow())("%s", async (path) => {
    const methods = Object.keys(await import(join(folder, path, "route.ts"))).filter((name) =>
      METHODS.includes(name),
    );
    expect(Object.keys(table[path] ?? {}).sort()).toEqual(methods.sort());
  });
});

for (const [path, methods] of Object.entries(table))
  for (const [method, { reach, body, ofDesign }] of Object.entries(methods))
    describe(`${method} /api/${path}`, () => {
      const handler = async () => (await import(join(folder, path, "route.ts")))[method];
      const ask = async (as: Person | null, id?: string) =>
        call(await handler(), {
          as,
          method,
          path: `/api/${path}`,
          params: id ? { id } : {},
          body: body ?? (method === "GET" || method === "DELETE" ? undefined : {}),
        });

      if (reach !== "anyone")
        test("signed out: 401", async () => {
          expect((await ask(null, "00000000-0000-4000-8000-000000000000")).status).toBe(401);
        });

      if (reach === "anyone")
        test("signed out: answered", async () => {
          expect([200, 400, 422]).toContain((await ask(null)).status);
        });

      if (ofDesign)
        test("another shop: 404, and nothing is changed", async () => {
          const owner = await newPerson();
          const stranger = await newPerson();
          const id = await newDesign(owner);
          expect((await ask(stranger, id)).status).toBe(404);
          const { GET } = await import("@/app/api/designs/[id]/route");
          const still = await call(GET, { as: owner, params: { id } });
          expect(await still.json()).toMatchObject({ name: document.name, version: 1 });
        });

      if (reach === "readers" || reach === "writers")
        test.each(roles)("%s of the own shop", async (role) => {
          const person = await newPerson();
          const id = ofDesign ? await newDesign(person) : undefined;
          if (path.endsWith("restore")) {
            const { DELETE } = await import("@/app/api/designs/[id]/route");
            await call(DELETE, { as: person, method: "DELETE", params: { id: id ?? "" } });
          }
          await setRole(person, role);
          const allowed = reach === "readers" || role === "owner" || role === "designer";
          const { status } = await ask(person, id);
          if (allowed) expect([200, 201, 204]).toContain(status);
          else expect(status).toBe(403);
        });
    });

describe("lists", () => {
  test("hold the own shop's designs only", async () => {
    const one = await newPerson();
    const other = await newPerson();
    const id = await newDesign(one);
    const { GET } = await import("@/app/api/designs/route");
    const ids = async (as: Person) =>
      (await (await call(GET, { as })).json()).designs.map((design: { id: string }) => design.id);
    expect(await ids(one)).toEqual([id]);
    expect(await ids(other)).toEqual([]);
  });
});
