import { randomUUID } from "node:crypto";
import { describe, expect, test } from "vitest";
import { call, newPerson, PASSWORD, ownDatabase, type Person } from "./support/shop";

ownDatabase();

const signIn = async (email: string, password: string, address: string, as?: Person) => {
  const { POST } = await import("@/app/api/sign-in/route");
  return call(POST, { as, body: { email, password }, headers: { "x-forwarded-for": address } });
};

describe("accounts", () => {
  test("sign up, sign out, sign in: the same person and shop", async () => {
    const person = await newPerson();
    const { POST: signOut } = await import("@/app/api/sign-out/route");
    const { GET: session } = await import("@/app/api/session/route");
    await call(signOut, { as: person, method: "POST", body: {} });
    expect(await (await call(session, { as: person })).json()).toBeNull();
    const back = await signIn(person.email.toUpperCase(), PASSWORD, randomUUID(), person);
    expect(back.status).toBe(200);
    const now = await (await call(session, { as: person })).json();
    expect(now).toMatchObject({ role: "owner", shop: { id: person.shopId } });
  });

  test("a copied cookie is worth nothing after signing out", async () => {
    const person = await newPerson();
    const copy = { ...person, cookies: new Map(person.cookies) };
    const { POST: signOut } = await import("@/app/api/sign-out/route");
    await call(signOut, { as: person, method: "POST", body: {} });
    const { GET } = await import("@/app/api/designs/route");
    expect((await call(GET, { as: copy })).status).toBe(401);
  });

  test("a wrong password and a missing account read the same", async () => {
    const { email } = await newPerson();
    const wrong = await signIn(email, "not the password", randomUUID());
    const nobody = await signIn("nobody@example.org", "not the password", randomUUID());
    expect([wrong.status, nobody.status]).toEqual([401, 401]);
    const said = async (answer: Response) => (await answer.json()).error.message;
    expect(await said(wrong)).toBe(await said(nobody));
  });

  test("an e-mail address has one account", async () => {
    const { email } = await newPerson();
    const { POST } = await import("@/app/api/sign-up/route");
    const again = await call(POST, {
      body: { name: "Other", email, password: PASSWORD },
      headers: { "x-forwarded-for": randomUUID() },
    });
    expect(again.status).toBe(409);
  });

  test.each([
    ["short", "a short one", "short"],
    ["over 72 bytes", "a long one", "ä".repeat(40)],
  ])("a password %s is refused in its field", async (_, __, password) => {
    const { POST } = await import("@/app/api/sign-up/route");
    const answer = await call(POST, {
      body: { name: "Pat", email: `${randomUUID()}@example.org`, password },
      headers: { "x-forwarded-for": randomUUID() },
    });
    expect(answer.status).toBe(422);
    expect(Object.keys((await answer.json()).error.fields)).toEqual(["password"]);
  });

  test("tries at a password run out, and say when to come back", async () => {
    const { email } = await newPerson();
    const address = randomUUID();
    const statuses: number[] = [];
    for (let n = 0; n < 10; n++) statuses.push((await signIn(email, "wrong one", address)).status);
    expect(statuses.slice(0, 8)).toEqual(Array(8).fill(401));
    const refused = await signIn(email, PASSWORD, address);
    expect(refused.status).toBe(429);
    expect(Number(refused.headers.get("retry-after"))).toBeGreaterThan(0);
  });

  test("a write from another site is refused", async () => {
    const person = await newPerson();
    const { POST } = await import("@/app/api/sign-out/route");
    const foreign: Record<string, string>[] = [
      { origin: "http://elsewhere.example" },
      { origin: "null" },
      { "sec-fetch-site": "cross-site" },
    ];
    for (const headers of foreign)
      expect((await call(POST, { as: person, method: "POST", body: {}, headers })).status).toBe(
        403,
      );
  });
});
