import { expect, test } from "vitest";
import { foundCompany } from "../../testing/found-company.ts";
import { fromJson, instantFromColumn, type InstantColumn } from "./columns.ts";
import { ask, type Question } from "./question.ts";
import type { TenantDb } from "./tenant-db.ts";

const namesOf = (tenant: TenantDb, order: string): Question<string[]> => ({
  from: tenant.from("specs"),
  columns: { name: "name" },
  order,
  read: (rows: readonly { name: string }[]) => rows.map(({ name }) => name),
});

async function aTenantWithSpecs(names: readonly string[]): Promise<TenantDb> {
  const { server, organizationId } = await foundCompany();
  const tenant = server.deps.db.tenant(organizationId);
  const rows = names.map((name, n) => ({
    id: tenant.newId(`spc`),
    name,
    construction: JSON.stringify({ note: `“${n}” \\ 0.1` }),
    version: 1,
    created_at: tenant.now(),
  }));
  await tenant.from("specs").delete();
  await tenant.insert("specs", rows);
  return tenant;
}

test("questions asked together answer what each answers alone, each in its own order", async () => {
  const tenant = await aTenantWithSpecs(["b", "c", "a"]);
  const up = namesOf(tenant, "name");
  const down = namesOf(tenant, "name desc");
  const together = await tenant.askTogether({ up, down });
  expect(together).toEqual({ up: await ask(up), down: await ask(down) });
  expect(together).toEqual({ up: ["a", "b", "c"], down: ["c", "b", "a"] });
});

test("a question that finds nothing is answered with no rows", async () => {
  const tenant = await aTenantWithSpecs(["a"]);
  const none = { ...namesOf(tenant, "name"), from: tenant.from("specs").where({ name: "missing" }) };
  expect(await tenant.askTogether({ none, all: namesOf(tenant, "name") })).toEqual({ none: [], all: ["a"] });
});

test("documents and instants come through as they are stored", async () => {
  const tenant = await aTenantWithSpecs(["a"]);
  const question: Question<unknown> = {
    from: tenant.from("specs"),
    columns: { construction: "construction", created_at: "created_at" },
    order: "name",
    read: ([row]: readonly { construction: unknown; created_at: InstantColumn }[]) =>
      row && { construction: fromJson(row.construction), at: instantFromColumn(row.created_at) },
  };
  const alone = await ask(question);
  expect(alone).toMatchObject({ construction: { note: "“0” \\ 0.1" } });
  expect(await tenant.askTogether({ stored: question })).toEqual({ stored: alone });
});

test("a question reaches no other company’s rows", async () => {
  await aTenantWithSpecs(["theirs"]);
  const tenant = await aTenantWithSpecs(["ours"]);
  expect(await tenant.askTogether({ specs: namesOf(tenant, "name") })).toEqual({ specs: ["ours"] });
});
