import { describe, expect, test } from "vitest";
import { foundCompany } from "../../testing/found-company.ts";

async function aCompany() {
  const company = await foundCompany();
  const { id: _id, slug: _slug, currency: _currency, version, ...fields } = await company.owner.ok("getCompany");
  return { ...company, fields, version };
}

describe("a company", () => {
  test("is changed on the version that was seen, and the audit says by whom", async () => {
    const { owner, fields, version } = await aCompany();
    const body = { ...fields, phone: "620 555 0142" };
    expect((await owner.refused("updateCompany", { body })).status).toBe(428);
    const saved = await owner.ok("updateCompany", { body, version });
    expect(saved).toMatchObject({ phone: "620 555 0142", version: version + 1 });
    expect((await owner.refused("updateCompany", { body, version })).status).toBe(412);
    const { items } = await owner.ok("listAudit");
    expect(items[0]).toMatchObject({ event: "company.changed", by: { id: owner.id } });
  });

  test("is read with its version as ETag", async () => {
    const { owner, version } = await aCompany();
    expect((await owner.send("getCompany")).headers.get("etag")).toBe(`"${version}"`);
  });
});

describe("the audit", () => {
  test("is refused any change by the database itself", async () => {
    const { server, organizationId } = await aCompany();
    const rows = () =>
      server.deps.db.system("a test tries to forge").from("audit_entries").where({ organization_id: organizationId });
    await expect(rows().update({ event: "nothing.happened" })).rejects.toThrow("only ever added");
    await expect(rows().delete()).rejects.toThrow("only ever added");
  });

  test("and the mail are read page by page, newest first, nothing twice", async () => {
    const { owner } = await aCompany();
    for (let n = 0; n < 5; n++)
      await owner.ok("invitePerson", { body: { email: `new-${n}-${owner.id}@tallgrass.example`, role: "foreman" } });
    for (const name of ["listAudit", "listMail"] as const) {
      const seen: string[] = [];
      let after: string | undefined;
      do {
        const page = await owner.ok(name, { query: { limit: 2, ...(after ? { after } : {}) } });
        seen.push(...page.items.map(({ id }) => id));
        after = page.next ?? undefined;
      } while (after);
      expect(seen.length).toBeGreaterThanOrEqual(5);
      expect(seen).toEqual([...new Set(seen)].toSorted().toReversed());
    }
  });
});

describe("the door", () => {
  test("takes changes from our own pages only", async () => {
    const { owner, fields, version } = await aCompany();
    const headers = { origin: "https://elsewhere.example" };
    expect(await owner.refused("updateCompany", { body: fields, version, headers })).toMatchObject({
      status: 403,
      type: "/problems/origin-refused",
    });
  });

  test("answers what it cannot read, and what is not there, with a problem", async () => {
    const { server } = await aCompany();
    const ask = async (path: string, init?: RequestInit) => {
      const response = await fetch(`${server.url}/api${path}`, init);
      expect(response.headers.get("content-type")).toContain("application/problem+json");
      return await response.json();
    };
    const headers = { "content-type": "application/json", origin: server.deps.config.publicUrl };
    expect(await ask("/open/sign-in", { method: "POST", headers, body: "{" })).toMatchObject({
      status: 400,
      type: "/problems/not-json",
    });
    expect(await ask("/nowhere")).toMatchObject({ status: 404, type: "/problems/not-found" });
    expect(await ask("/companies/..%2f/projects")).toMatchObject({ status: 401 });
  });

  test("lets no browser guess, frame or run what is not ours", async () => {
    const { server } = await aCompany();
    const { headers } = await fetch(`${server.url}/healthz`);
    expect(headers.get("content-security-policy")).toContain("script-src 'self'");
    expect(headers.get("content-security-policy")).not.toContain("unsafe-inline' 'self'");
    expect(headers.get("x-content-type-options")).toBe("nosniff");
    expect(headers.get("referrer-policy")).toBe("no-referrer");
    expect(headers.get("x-powered-by")).toBeNull();
  });

  test("describes itself as it is", async () => {
    const { server } = await aCompany();
    const document = (await (await fetch(`${server.url}/api/openapi.json`)).json()) as {
      openapi: string;
      paths: Record<string, unknown>;
    };
    expect(document.openapi).toBe("3.1.0");
    expect(document.paths["/companies/{company}/projects/{projectId}/layout/changes"]).toHaveProperty(
      "post.requestBody",
    );
  });
});
