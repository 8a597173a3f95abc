import { endpoints, type CompanySlug, type ProjectId } from "@cleatwork/contracts";
import { afterEach, describe, expect, it, vi } from "vitest";
import { answerWith, problemBody } from "../testing/answers.ts";
import { api, apiUrl } from "./http.ts";
import { AnswerProblem, HttpProblem, NetworkProblem } from "./problem.ts";

const company = "tallgrass" as CompanySlug;
const projectId = "prj_01m8rr0g388e6gqf15fagw4tj9" as ProjectId;
afterEach(() => vi.unstubAllGlobals());

const client = {
  name: "Oxbow",
  address: { line1: "", line2: "", city: "", region: "", postalCode: "" },
  notes: "",
  contacts: [],
};
const saved = { ...client, id: "cli_01m8rr0g388e6gqf15fagw4tj9", projectCount: 0, version: 3 };

describe("the client of the API", () => {
  it("fills the path and sends what was read as If-Match", async () => {
    const asked = answerWith({ status: 200, body: saved });
    const params = { company, clientId: saved.id as never };
    await api(endpoints.updateClient, { params, body: client, version: 2 });
    expect(asked[0]?.url).toBe(`/api/companies/tallgrass/clients/${saved.id}`);
    expect(asked[0]?.method).toBe("PUT");
    expect(asked[0]?.headers.get("if-match")).toBe('"2"');
  });

  it("refuses to write over something without saying which version it read", async () => {
    answerWith({ status: 200, body: saved });
    const params = { company, clientId: saved.id as never };
    await expect(api(endpoints.updateClient, { params, body: client })).rejects.toThrow("version");
  });

  it("gives each creating request a key of its own, and keeps one that is given", async () => {
    const asked = answerWith({ status: 201, body: saved });
    const call = { params: { company }, body: client };
    await api(endpoints.createClient, call);
    await api(endpoints.createClient, call);
    await api(endpoints.createClient, { ...call, idempotencyKey: "mine" });
    const keys = asked.map((one) => one.headers.get("idempotency-key"));
    expect(new Set(keys).size).toBe(3);
    expect(keys[2]).toBe("mine");
  });

  it("throws what the API refused as a typed problem with its fields", async () => {
    const errors = [{ pointer: "/name", code: "too-short", message: "at least one letter" }];
    answerWith({ status: 422, body: problemBody("not-valid", 422, errors) });
    const refused = await api(endpoints.createClient, { params: { company }, body: client }).catch((e: unknown) => e);
    expect(refused).toBeInstanceOf(HttpProblem);
    expect(refused).toMatchObject({ code: "not-valid", status: 422, request: "req_1", errors });
  });

  it("tells a missing connection from a refusal", async () => {
    answerWith("no connection");
    await expect(api(endpoints.getMe, {})).rejects.toBeInstanceOf(NetworkProblem);
  });

  it("does not pass on an answer that breaks the contract", async () => {
    answerWith({ status: 200, body: { ...saved, version: "three" } });
    const params = { company, clientId: saved.id as never };
    await expect(api(endpoints.getClient, { params })).rejects.toBeInstanceOf(AnswerProblem);
  });

  it("makes a problem of an answer that is no problem document", async () => {
    answerWith({ status: 502 });
    await expect(api(endpoints.getMe, {})).rejects.toMatchObject({ code: "went-wrong", status: 502 });
  });

  it("sends a file as multipart with its fields before it", async () => {
    const asked = answerWith({ status: 422, body: problemBody("not-valid", 422) });
    const body = { sheetNumber: "M-101", title: "", revision: "", datedOn: "2026-06-01" };
    const file = new File(["x"], "plan.pdf");
    await api(endpoints.uploadDrawing, { params: { company, projectId }, body, file }).catch(() => undefined);
    const form = asked[0]?.body as FormData;
    expect([...form.keys()]).toEqual(["sheetNumber", "title", "revision", "datedOn", "file"]);
    expect(asked[0]?.headers.has("content-type")).toBe(false);
  });

  it("writes the address of a file, with every part encoded", () => {
    expect(apiUrl(endpoints.putPriceItem, { company, itemKey: "metal:galvanized:24 ga" })).toBe(
      "/api/companies/tallgrass/price-book/items/metal%3Agalvanized%3A24%20ga",
    );
  });
});
