/** A database of its own for a test file, and requests as people of different shops make them. */
import { randomUUID } from "node:crypto";
import { Client } from "pg";
import { afterAll, beforeAll, vi } from "vitest";
import type { Role } from "@/lib/shops/policy";

/** The cookie jar of the request being made: the routes read it through next/headers. */
const jar = new Map<string, string>();

vi.mock("next/headers", () => ({
  cookies: async () => ({
    has: (name: string) => jar.has(name),
    get: (name: string) => (jar.has(name) ? { name, value: jar.get(name) } : undefined),
    set: (name: string | { name: string; value: string }, value?: string) => {
      if (typeof name === "string") jar.set(name, value ?? "");
      else jar.set(name.name, name.value);
    },
    delete: (name: string) => jar.delete(name),
  }),
  headers: async () => new Headers(),
}));

// Outside of a rendered request React's cache has nothing to remember by.
vi.mock("react", async (original) => ({
  ...(await original<typeof import("react")>()),
  cache: <T>(work: T) => work,
}));

/** Copies the template into a database of this file's own. */
export function ownDatabase(): void {
  const name = `test_${randomUUID().replaceAll("-", "")}`;
  const template = new URL(process.env.DATABASE_URL ?? "");
  const server = new URL(template);
  server.pathname = "/postgres";
  beforeAll(async () => {
    const client = new Client({ connectionString: server.href });
    await client.connect();
    await client.query(`create database ${name} template template`);
    await client.end();
    const own = new URL(template);
    own.pathname = `/${name}`;
    process.env.DATABASE_URL = own.href;
  });
  afterAll(async () => {
    const { closeDatabase } = await import("@/db/client");
    await closeDatabase();
  });
}

export interface Person {
  email: string;
  cookies: Map<string, string>;
  shopId: string;
  personId: string;
}

export const PASSWORD = "a long enough password";

type Handler = (request: Request, segment: { params: Promise<never> }) => Promise<Response>;

interface Call {
  as?: Person | null;
  params?: Record<string, string>;
  body?: unknown;
  method?: string;
  path?: string;
  headers?: Record<string, string>;
}

/** Makes a request of a route as a person, or signed out. */
export async function call(handler: unknown, options: Call = {}): Promise<Response> {
  jar.clear();
  for (const [name, value] of options.as?.cookies ?? []) jar.set(name, value);
  const method = options.method ?? (options.body === undefined ? "GET" : "POST");
  const request = new Request(`http://127.0.0.1${options.path ?? "/"}`, {
    method,
    headers: { host: "127.0.0.1", ...options.headers },
    body: options.body === undefined ? undefined : JSON.stringify(options.body),
  });
  const segment = { params: Promise.resolve((options.params ?? {}) as never) };
  const response = await (handler as Handler)(request, segment);
  if (options.as) options.as.cookies = new Map(jar);
  return response;
}

/** Signs a new person up with a shop of their own. */
export async function newPerson(): Promise<Person> {
  const { POST } = await import("@/app/api/sign-up/route");
  const email = `${randomUUID()}@example.org`;
  const person: Person = { email, cookies: new Map(), shopId: "", personId: "" };
  const response = await call(POST, {
    as: person,
    body: { name: "Pat", email, password: PASSWORD },
    headers: { "x-forwarded-for": randomUUID() },
  });
  if (response.status !== 201) throw new Error(`Sign-up answered ${response.status}.`);
  const { GET } = await import("@/app/api/session/route");
  const session = await (await call(GET, { as: person })).json();
  return Object.assign(person, { shopId: session.shop.id, personId: session.person.id });
}

/** Gives a person another role in their shop. */
export async function setRole(person: Person, role: Role): Promise<void> {
  const { database } = await import("@/db/client");
  const { memberships } = await import("@/db/schema/shops");
  const { eq } = await import("drizzle-orm");
  await database()
    .update(memberships)
    .set({ role })
    .where(eq(memberships.personId, person.personId));
}
