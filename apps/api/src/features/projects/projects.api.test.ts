import { describe, expect, test } from "vitest";
import { foundCompany } from "../../testing/found-company.ts";
import { aProject } from "../../testing/a-project.ts";

describe("projects", () => {
  test("are listed by bid date, undated last", async () => {
    const { estimator } = await foundCompany();
    await aProject(estimator, { name: "Undated", dueAt: null });
    await aProject(estimator, { name: "Later", dueAt: "2027-01-05T17:00:00.000Z" });
    await aProject(estimator, { name: "Sooner", dueAt: "2026-12-05T17:00:00.000Z" });
    const { items } = await estimator.ok("listProjects");
    expect(items.map((item) => item.name)).toEqual(["Sooner", "Later", "Undated"]);
    expect(items[0]).toMatchObject({
      clientName: "Oxbow Builders",
      state: "bidding",
      segmentCount: 0,
      price_minor: null,
      quoteState: null,
      currency: "USD",
    });
  });

  test("are read in two round trips", async () => {
    const { estimator } = await foundCompany();
    const { params } = await aProject(estimator);
    expect((await estimator.send("listProjects")).headers.get("x-db-queries")).toBe("2");
    expect((await estimator.send("getProject", { params })).headers.get("x-db-queries")).toBe("2");
    expect((await estimator.send("getLayout", { params })).headers.get("x-db-queries")).toBe("2");
    expect((await estimator.send("listDrawings", { params })).headers.get("x-db-queries")).toBe("2");
  });

  test("keep what was written", async () => {
    const { estimator } = await foundCompany();
    const { project, body, params } = await aProject(estimator);
    expect(project).toMatchObject({ ...body, state: "bidding", version: 1 });
    const changed = await estimator.ok("updateProject", {
      params,
      version: 1,
      body: { ...body, name: "Marrow Creek Library", dueAt: null, contactId: null },
    });
    expect(changed).toMatchObject({ name: "Marrow Creek Library", dueAt: null, contactId: null, version: 2 });
    expect(await estimator.ok("getProject", { params })).toEqual(changed);
  });

  test("for a client of another company are refused with the field named", async () => {
    const [ours, theirs] = [await foundCompany(), await foundCompany()];
    const foreign = await aProject(theirs.estimator);
    const { body } = await aProject(ours.estimator);
    const problem = await ours.estimator.refused("createProject", { body: { ...body, clientId: foreign.client.id } });
    expect(problem).toMatchObject({ status: 422, errors: [{ pointer: "/clientId", value: foreign.client.id }] });
    expect((await ours.estimator.ok("listProjects")).items).toHaveLength(1);
  });

  test("cannot name a contact of another client", async () => {
    const { estimator } = await foundCompany();
    const first = await aProject(estimator);
    const second = await aProject(estimator);
    const problem = await estimator.refused("updateProject", {
      params: first.params,
      version: 1,
      body: { ...first.body, contactId: second.body.contactId },
    });
    expect(problem).toMatchObject({ status: 422, errors: [{ pointer: "/contactId", code: "contact-unknown" }] });
  });

  test("with an unknown time zone are refused with what is allowed", async () => {
    const { estimator } = await foundCompany();
    const { body } = await aProject(estimator);
    const problem = await estimator.refused("createProject", { body: { ...body, dueZone: "Kansas" } });
    expect(problem).toMatchObject({
      status: 422,
      errors: [{ pointer: "/dueZone", value: "Kansas", message: expect.stringContaining("America/Chicago") as string }],
    });
  });

  test("saved on an old version are refused", async () => {
    const { estimator, owner } = await foundCompany();
    const { body, params } = await aProject(estimator);
    await owner.ok("updateProject", { params, version: 1, body });
    expect((await estimator.refused("updateProject", { params, version: 1, body })).status).toBe(412);
  });

  test("sent twice with one key are started once", async () => {
    const { estimator } = await foundCompany();
    const { body } = await aProject(estimator);
    const key = crypto.randomUUID();
    const first = await estimator.ok("createProject", { body, idempotencyKey: key });
    const second = await estimator.ok("createProject", { body, idempotencyKey: key });
    expect(second).toEqual(first);
    expect((await estimator.ok("listProjects")).items).toHaveLength(2);
  });

  test("of another company are not there", async () => {
    const [ours, theirs] = [await foundCompany(), await foundCompany()];
    const { body, params } = await aProject(ours.estimator);
    expect((await theirs.owner.refused("getProject", { params })).status).toBe(404);
    expect((await theirs.owner.refused("updateProject", { params, version: 1, body })).status).toBe(404);
    expect((await theirs.owner.refused("listDrawings", { params })).status).toBe(404);
  });
});
