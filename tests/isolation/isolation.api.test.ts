/** Every route, as every role of every company: made from the table of endpoints, so that a new one is walked too. */
import {
  endpoints,
  roleMay,
  type Access,
  type EndpointName,
  type PathParameter,
  type Role,
} from "@cleatwork/contracts";
import { beforeAll, describe, expect, test } from "vitest";
import { anIssuedQuote } from "@cleatwork/api/testing/a-quotable-project";
import { foundCompany, type TestCompany, type TestPerson } from "@cleatwork/api/testing/found-company";
import { onePixel, drawingFields } from "@cleatwork/api/testing/a-project";

type Params = Record<PathParameter, string>;

/** One thing of each kind that an address can name. A new path parameter does not compile until it has one here. */
async function thingsOf(company: TestCompany): Promise<Params> {
  const issued = await anIssuedQuote(company);
  const { estimator, owner, foreman } = company;
  const drawing = await estimator.ok("uploadDrawing", {
    params: issued.params,
    body: drawingFields,
    file: { bytes: onePixel, name: "M-101.png" },
  });
  const invitation = await owner.ok("invitePerson", { body: { email: "new@tallgrass.example", role: "foreman" } });
  const [spec] = (await estimator.ok("listSpecs")).items;
  const [item] = (await owner.ok("getPriceBook")).items;
  const revision = issued.quote.revisions[0];
  return {
    company: company.slug,
    personId: foreman.id,
    invitationId: invitation.id,
    clientId: issued.project.clientId,
    projectId: issued.project.id,
    drawingId: drawing.id,
    specId: spec?.id ?? "",
    quoteId: issued.quote.id,
    revisionId: revision?.id ?? "",
    linkId: revision?.links[0]?.id ?? "",
    itemKey: item?.key ?? "",
    token: issued.token,
  };
}

let ours: TestCompany;
let theirs: TestCompany;
let ourThings: Params;
let theirThings: Params;

beforeAll(async () => {
  ours = await foundCompany();
  theirs = await foundCompany();
  ourThings = await thingsOf(ours);
  theirThings = await thingsOf(theirs);
}, 60_000);

const names = Object.keys(endpoints) as EndpointName[];
const accessOf = (name: EndpointName): Access => endpoints[name].access;
const parametersOf = (name: EndpointName): PathParameter[] =>
  [...endpoints[name].path.matchAll(/:(\w+)/g)].map(([, parameter]) => parameter as PathParameter);
const members = names.filter((name) => accessOf(name).kind === "member");

/** Asks without a body: who may not is told so before anything is read. */
async function statusFor(person: TestPerson, name: EndpointName, params: Params): Promise<number> {
  const chosen = Object.fromEntries(parametersOf(name).map((parameter) => [parameter, params[parameter]]));
  const { status } = await person.send(name, {
    params: chosen,
    version: 1,
    ...(endpoints[name].takes === "file" ? { form: true } : {}),
  });
  return status;
}

/** What a person who may gets without a body: an answer, or a complaint about what was sent; never a closed door. */
const DOOR_CLOSED = [401, 403];

describe("every company route", () => {
  test.each(members)("%s is closed to who is not signed in", async (name) => {
    expect(await statusFor(ours.stranger, name, ourThings)).toBe(401);
  });

  test.each(members)("%s is not there for another company", async (name) => {
    for (const person of [theirs.owner, theirs.estimator, theirs.foreman])
      expect(await statusFor(person, name, ourThings)).toBe(404);
  });

  // Reading comes first, so that what a deletion takes away is still there to be read.
  const byRole = members.flatMap((name) =>
    (["foreman", "estimator"] satisfies Role[]).map((role) => [name, role] as const),
  );
  test.each(byRole)("%s answers to a %s as the permission says", async (name, role) => {
    const access = accessOf(name);
    const may = access.kind === "member" && roleMay(role, access.permission);
    if (may) return;
    expect(await statusFor(ours[role], name, ourThings)).toBe(403);
  });

  const reads = members.filter((name) => endpoints[name].method === "get");
  test.each(reads)("%s is open to an owner", async (name) => {
    const status = await statusFor(ours.owner, name, ourThings);
    expect(DOOR_CLOSED).not.toContain(status);
    // A takeoff is there only after an acceptance.
    if (name !== "getFieldTakeoff") expect(status).toBe(200);
  });
});

describe("a thing of another company, named under one's own", () => {
  const named = members.flatMap((name) =>
    parametersOf(name)
      .filter((parameter) => parameter !== "company" && parameter !== "itemKey")
      .map((parameter) => [name, parameter] as const),
  );

  test.each(named)("%s does not find a foreign %s", async (name, parameter) => {
    const mixed = { ...ourThings, [parameter]: theirThings[parameter] };
    const made = endpoints[name].body.type === "undefined" ? undefined : bodies[name];
    const chosen = Object.fromEntries(parametersOf(name).map((each) => [each, mixed[each]]));
    const { status } = await ours.owner.send(name, {
      params: chosen,
      version: 1,
      ...(endpoints[name].takes === "file"
        ? { body: drawingFields as never, file: { bytes: onePixel, name: "M-101.png" } }
        : made === undefined
          ? {}
          : { body: made as never }),
    });
    expect(status).toBe(404);
  });

  const address = { line1: "", line2: "", city: "", region: "", postalCode: "" };
  /** Bodies that are good in themselves, so that only the foreign name can be what is wrong. Filled before the walk. */
  const bodies: Partial<Record<EndpointName, unknown>> = {};
  beforeAll(async () => {
    const { owner } = ours;
    const project = await owner.ok("getProject", { params: { projectId: ourThings.projectId as never } });
    const {
      id: _id,
      clientName: _client,
      state: _state,
      createdAt: _created,
      version: _version,
      ...projectBody
    } = project;
    const [spec] = (await owner.ok("listSpecs")).items;
    const { version: _pricingVersion, ...pricing } = await owner.ok("getProjectPricing", {
      params: { projectId: ourThings.projectId as never },
    });
    const [quote] = (await owner.ok("listQuotes", { params: { projectId: ourThings.projectId as never } })).items;
    Object.assign(bodies, {
      updateClient: { name: "Ours", address, notes: "", contacts: [] },
      updateProject: projectBody,
      updateSpec: { name: spec?.name, construction: spec?.construction },
      updateProjectPricing: pricing,
      changeRole: { role: "foreman" },
      updateQuoteDraft: quote?.draft,
      issueQuote: {
        recipients: [{ name: "A", email: "a@oxbow.example" }],
        message: "",
        layoutSequence: 1,
        price_minor: 1,
      },
      saveLayout: {
        batchId: crypto.randomUUID(),
        baseSequence: 0,
        sets: [
          {
            label: "x",
            changes: [
              {
                id: `lvl_${"0".repeat(26)}`,
                before: null,
                after: { kind: "level", id: `lvl_${"0".repeat(26)}`, name: "X", elevation_m: 0, underlay: null },
              },
            ],
          },
        ],
      },
    });
  });
});

describe("what a foreman can get", () => {
  const open = members.filter((name) => {
    const access = accessOf(name);
    return access.kind === "member" && endpoints[name].method === "get" && roleMay("foreman", access.permission);
  });

  test.each(open)("%s holds no cost", async (name) => {
    const chosen = Object.fromEntries(parametersOf(name).map((parameter) => [parameter, ourThings[parameter]]));
    const { bytes } = await ours.foreman.send(name, { params: chosen });
    expect(bytes.toString("utf8")).not.toMatch(/_minor"|_micro"|_bp"|"\w*(cost|price|margin|markup|amount)\w*"/i);
  });
});
