import { createHash, randomUUID } from "node:crypto";
import { describe, expect, test } from "vitest";
import { foundCompany, PASSWORD, tokenIn, type TestCompany } from "../../testing/found-company.ts";

const newcomer = () => ({
  companyName: `Quarry Duct ${randomUUID().slice(0, 8)}`,
  name: "Ines Calder",
  email: `ines-${randomUUID()}@quarry.example`,
  password: PASSWORD,
  timeZone: "America/Denver",
});
const systemOf = ({ server }: TestCompany) => server.deps.db.system("a test looks at what is stored");

describe("signing up", () => {
  test("founds a company that can be worked in, and signs its owner in", async () => {
    const { stranger } = await foundCompany();
    const body = newcomer();
    const me = await stranger.ok("signUp", { body });
    expect(me).toMatchObject({
      person: { email: body.email, emailVerified: false },
      memberships: [{ role: "owner", company: { name: body.companyName } }],
    });
    const params = { company: me.memberships[0]?.company.slug as never };
    expect((await stranger.ok("listSpecs", { params })).items.length).toBeGreaterThan(0);
    expect((await stranger.ok("getPricingSettings", { params })).labor).toHaveLength(2);
    expect((await stranger.ok("getPriceBook", { params })).items).toEqual([]);
  });

  test("is refused for an address that has an account", async () => {
    const company = await foundCompany();
    const body = { ...newcomer(), email: company.owner.email };
    expect(await company.stranger.refused("signUp", { body })).toMatchObject({
      status: 409,
      errors: [{ pointer: "/email", code: "email-taken" }],
    });
  });

  test("says which field, what was typed and what is allowed, and never repeats a password", async () => {
    const { stranger } = await foundCompany();
    const problem = await stranger.refused("signUp", {
      body: { ...newcomer(), email: "ines at quarry", password: "short", timeZone: "Mars/Olympus" },
    });
    expect(problem).toMatchObject({
      status: 422,
      errors: expect.arrayContaining([
        expect.objectContaining({
          pointer: "/email",
          value: "ines at quarry",
          message: "an e-mail address such as name@company.example",
        }),
        expect.objectContaining({ pointer: "/password", message: "12 characters or more" }),
        expect.objectContaining({ pointer: "/timeZone", value: "Mars/Olympus" }),
      ]) as unknown,
    });
    expect(JSON.stringify(problem)).not.toContain("short");
  });
});

describe("a session", () => {
  test("is a cookie that scripts cannot read, kept as a hash only", async () => {
    const company = await foundCompany();
    const { headers } = await company.stranger.send("signIn", {
      body: { email: company.owner.email, password: PASSWORD },
    });
    const [cookie = ""] = headers.getSetCookie().slice(-1);
    expect(cookie).toMatch(/^cleatwork_session=.*HttpOnly.*SameSite=Lax/i);
    const id = /cleatwork_session=([^;]+)/.exec(cookie)?.[1] ?? "";
    const rows: { id: string }[] = await systemOf(company)
      .from("sessions")
      .where({ person_id: company.owner.id })
      .select("id");
    const ids = rows.map((row) => row.id);
    expect(ids).toContain(createHash("sha256").update(id).digest("hex"));
    expect(ids).not.toContain(id);
  });

  test("has a new id with each sign-in, and ends with the sign-out", async () => {
    const { owner, stranger } = await foundCompany();
    await stranger.ok("signIn", { body: { email: owner.email, password: PASSWORD } });
    const first = stranger.cookie;
    await stranger.ok("signIn", { body: { email: owner.email, password: PASSWORD } });
    expect(stranger.cookie).not.toBe(first);
    const signedIn = stranger.cookie;
    await stranger.ok("signOut");
    stranger.cookie = signedIn;
    expect((await stranger.refused("getMe")).status).toBe(401);
    stranger.cookie = first;
    expect((await stranger.refused("getMe")).status).toBe(401);
  });

  test("is refused alike for a wrong password and an unknown address", async () => {
    const { owner, stranger } = await foundCompany();
    const wrong = await stranger.refused("signIn", { body: { email: owner.email, password: "not the password" } });
    const unknown = await stranger.refused("signIn", {
      body: { email: `nobody-${randomUUID()}@quarry.example`, password: "not the password" },
    });
    expect({ ...wrong, instance: "" }).toEqual({ ...unknown, instance: "" });
    expect(wrong.status).toBe(401);
  });
});

describe("an address", () => {
  test("is confirmed by the link in the mail, once", async () => {
    const { stranger, mailTo } = await foundCompany();
    const body = newcomer();
    await stranger.ok("signUp", { body });
    const token = tokenIn((await mailTo(body.email))[0]);
    await stranger.ok("verifyEmail", { body: { token } });
    expect((await stranger.ok("getMe")).person.emailVerified).toBe(true);
    expect((await stranger.refused("verifyEmail", { body: { token } })).status).toBe(410);
  });
});

describe("a new password", () => {
  test("ends every session, and its link works once", async () => {
    const { owner, stranger, mailTo } = await foundCompany();
    await stranger.ok("requestPasswordReset", { body: { email: owner.email } });
    const token = tokenIn((await mailTo(owner.email))[0]);
    const password = "another copper lantern";
    await stranger.ok("resetPassword", { body: { token, password } });
    expect((await owner.refused("getMe")).status).toBe(401);
    expect((await stranger.refused("resetPassword", { body: { token, password } })).status).toBe(410);
    await stranger.ok("signIn", { body: { email: owner.email, password } });
  });

  test("cannot be set by a link of yesterday", async () => {
    const { server, owner, stranger, mailTo } = await foundCompany();
    await stranger.ok("requestPasswordReset", { body: { email: owner.email } });
    const token = tokenIn((await mailTo(owner.email))[0]);
    server.clock.advanceDays(1);
    expect(
      (await stranger.refused("resetPassword", { body: { token, password: "another copper lantern" } })).status,
    ).toBe(410);
  });

  test("is promised to no one in particular", async () => {
    const { owner, stranger } = await foundCompany();
    const known = await stranger.send("requestPasswordReset", { body: { email: owner.email } });
    const unknown = await stranger.send("requestPasswordReset", {
      body: { email: `nobody-${randomUUID()}@quarry.example` },
    });
    expect([unknown.status, unknown.bytes.toString()]).toEqual([known.status, known.bytes.toString()]);
  });
});

describe("an invitation", () => {
  async function anInvitation(email = `rosa-${randomUUID()}@quarry.example`) {
    const company = await foundCompany();
    const invitation = await company.owner.ok("invitePerson", { body: { email, role: "foreman" } });
    const [mail] = await company.mailTo(email);
    return { company, email, invitation, params: { token: tokenIn(mail) as never } };
  }

  test("lets a newcomer in with the role it names", async () => {
    const { company, params, email } = await anInvitation();
    expect(await company.stranger.ok("getInvitation", { params })).toMatchObject({
      email,
      role: "foreman",
      hasAccount: false,
      invitedBy: company.owner.name,
    });
    const me = await company.stranger.ok("acceptInvitation", {
      params,
      body: { name: "Rosa Quill", password: PASSWORD },
    });
    expect(me).toMatchObject({
      person: { name: "Rosa Quill", emailVerified: true },
      memberships: [{ role: "foreman" }],
    });
    expect(
      (await company.stranger.refused("acceptInvitation", { params, body: { name: "Again", password: PASSWORD } }))
        .status,
    ).toBe(410);
  });

  test("asks a newcomer for what is missing", async () => {
    const { company, params } = await anInvitation();
    expect(await company.stranger.refused("acceptInvitation", { params, body: { password: "short" } })).toMatchObject({
      status: 422,
      errors: [{ pointer: "/name" }, { pointer: "/password", message: "12 characters or more" }],
    });
  });

  test("takes a person with an account into a second company, which they can switch to", async () => {
    const { estimator } = await foundCompany();
    const { company, params } = await anInvitation(estimator.email);
    expect(
      (await company.stranger.refused("acceptInvitation", { params, body: { password: "wrong password" } })).status,
    ).toBe(401);
    const me = await company.stranger.ok("acceptInvitation", { params, body: { password: PASSWORD } });
    expect(me.memberships.map(({ role }) => role).toSorted()).toEqual(["estimator", "foreman"]);
    for (const { company: each } of me.memberships)
      await company.stranger.ok("getCompany", { params: { company: each.slug } });
  });

  test.each(["revoked", "expired"])("that is %s opens nothing", async (how) => {
    const { company, params, invitation } = await anInvitation();
    if (how === "revoked") await company.owner.ok("revokeInvitation", { params: { invitationId: invitation.id } });
    else company.server.clock.advanceDays(15);
    expect((await company.stranger.refused("getInvitation", { params })).status).toBe(410);
    expect(
      (await company.stranger.refused("acceptInvitation", { params, body: { name: "Rosa", password: PASSWORD } }))
        .status,
    ).toBe(410);
  });
});
