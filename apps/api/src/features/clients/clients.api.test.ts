import { describe, expect, test } from "vitest";
import { foundCompany } from "../../testing/found-company.ts";
import { aContact, anAddress, aProject } from "../../testing/a-project.ts";

const aClient = (name = "Oxbow Builders") => ({ name, address: anAddress, notes: "", contacts: [aContact()] });

describe("clients", () => {
  test("are listed by name with their contacts and projects", async () => {
    const { estimator } = await foundCompany();
    await estimator.ok("createClient", { body: aClient("Quarry & Pell") });
    const { client } = await aProject(estimator);
    const { items } = await estimator.ok("listClients");
    expect(items.map(({ name, projectCount }) => [name, projectCount])).toEqual([
      ["Oxbow Builders", 1],
      ["Quarry & Pell", 0],
    ]);
    expect(items[0]?.contacts).toEqual(client.contacts);
  });

  test("keep the contacts that stay and drop those taken out", async () => {
    const { estimator } = await foundCompany();
    const client = await estimator.ok("createClient", { body: aClient() });
    const [first] = client.contacts;
    const second = aContact("Anselm Roe");
    const params = { clientId: client.id };
    const both = await estimator.ok("updateClient", {
      params,
      version: 1,
      body: { ...aClient(), contacts: [second, { ...first!, phone: "316 555 0171" }] },
    });
    expect(both.contacts).toEqual([second, { ...first, phone: "316 555 0171" }]);
    const one = await estimator.ok("updateClient", { params, version: 2, body: { ...aClient(), contacts: [second] } });
    expect(one).toMatchObject({ version: 3, contacts: [second] });
    expect(await estimator.ok("getClient", { params })).toEqual(one);
  });

  test("cannot lose a contact that a project names", async () => {
    const { estimator } = await foundCompany();
    const { client } = await aProject(estimator);
    const problem = await estimator.refused("updateClient", {
      params: { clientId: client.id },
      version: 1,
      body: { ...aClient(), contacts: [] },
    });
    expect(problem).toMatchObject({
      status: 422,
      errors: [{ pointer: "/contacts", code: "contact-named-by-project", value: client.contacts[0]?.id }],
    });
    expect((await estimator.ok("getClient", { params: { clientId: client.id } })).contacts).toHaveLength(1);
  });

  test("cannot take over a contact of another client", async () => {
    const { estimator } = await foundCompany();
    const first = await estimator.ok("createClient", { body: aClient() });
    const problem = await estimator.refused("createClient", { body: { ...aClient(), contacts: first.contacts } });
    expect(problem).toMatchObject({
      status: 422,
      errors: [{ pointer: "/contacts/0/id", code: "contact-of-another-client" }],
    });
    expect((await estimator.ok("listClients")).items).toHaveLength(1);
  });

  test("are refused with the field, the value and what is allowed", async () => {
    const { estimator } = await foundCompany();
    const contact = { ...aContact(), email: "not an address" };
    const problem = await estimator.refused("createClient", {
      body: { ...aClient(""), contacts: [contact] },
    });
    expect(problem).toMatchObject({ status: 422, type: "/problems/not-valid" });
    expect(problem.errors).toEqual(
      expect.arrayContaining([
        expect.objectContaining({ pointer: "/name", value: "" }),
        expect.objectContaining({ pointer: "/contacts/0/email", value: "not an address" }),
      ]),
    );
  });

  test("saved on an old version are refused, and nothing is overwritten", async () => {
    const { estimator, owner } = await foundCompany();
    const client = await estimator.ok("createClient", { body: aClient() });
    const params = { clientId: client.id };
    const theirs = await owner.ok("updateClient", { params, version: 1, body: aClient("Oxbow Builders, Inc.") });
    expect(await estimator.refused("updateClient", { params, version: 1, body: aClient("Oxbow") })).toMatchObject({
      status: 412,
      type: "/problems/stale",
    });
    expect(await estimator.ok("getClient", { params })).toEqual(theirs);
  });

  test("saved by two people at the same moment keep one and refuse the other", async () => {
    const { estimator, owner } = await foundCompany();
    const client = await estimator.ok("createClient", { body: aClient() });
    const params = { clientId: client.id };
    const answers = await Promise.all(
      [estimator, owner].map((person, index) =>
        person.send("updateClient", { params, version: 1, body: aClient(`Name ${index}`) }),
      ),
    );
    expect(answers.map((answer) => answer.status).toSorted()).toEqual([200, 412]);
  });

  test("of another company are not there", async () => {
    const { estimator } = await foundCompany();
    const stranger = await foundCompany();
    const client = await estimator.ok("createClient", { body: aClient() });
    const params = { clientId: client.id };
    expect((await stranger.owner.refused("getClient", { params })).status).toBe(404);
    expect((await stranger.owner.refused("updateClient", { params, version: 1, body: aClient() })).status).toBe(404);
    expect((await stranger.owner.ok("listClients")).items).toEqual([]);
  });

  test("are read in two round trips, whatever their number", async () => {
    const { estimator } = await foundCompany();
    await aProject(estimator);
    await estimator.ok("createClient", { body: aClient("Second") });
    expect((await estimator.send("listClients")).headers.get("x-db-queries")).toBe("2");
  });
});
