/** Projects for tests: `aProject(estimator)` adds a client and starts a project for it. */
import { makeId, type BodyOf, type endpoints } from "@cleatwork/contracts";
import { meters } from "@cleatwork/calc";
import type { TestPerson } from "./found-company.ts";

type ProjectBody = BodyOf<(typeof endpoints)["createProject"]>;

export const anAddress = {
  line1: "77 Cottonwood Street",
  line2: "",
  city: "Marrow Creek",
  region: "KS",
  postalCode: "",
};

export const aContact = (name = "Priya Lindqvist") => ({
  id: makeId("con", { now: Date.now(), random: (bytes) => crypto.getRandomValues(bytes) }),
  name,
  email: "priya@oxbow.example",
  phone: "",
  title: "Project manager",
});

export async function aProject(estimator: TestPerson, fields: Partial<ProjectBody> = {}) {
  const client = await estimator.ok("createClient", {
    body: { name: "Oxbow Builders", address: anAddress, notes: "", contacts: [aContact()] },
  });
  const body: ProjectBody = {
    name: "Marrow Creek Branch Library",
    number: "26-031",
    clientId: client.id,
    contactId: client.contacts[0]?.id ?? null,
    siteAddress: anAddress,
    altitude_m: meters(408),
    dueAt: "2026-12-18T20:00:00.000Z",
    dueZone: "America/Chicago",
    unitSystem: "inch-pound",
    ...fields,
  };
  const project = await estimator.ok("createProject", { body });
  const params = { projectId: project.id };
  return {
    client,
    body,
    project,
    params,
    uploadDrawing: (bytes: Uint8Array<ArrayBuffer> = onePixel, name = "M-101.png") =>
      estimator.ok("uploadDrawing", { params, body: drawingFields, file: { bytes, name } }),
  };
}

export const drawingFields = { sheetNumber: "M-101", title: "Level 1", revision: "2", datedOn: "2026-11-10" };

/** The smallest PNG there is. */
export const onePixel = new Uint8Array(
  Buffer.from(
    "iVBORw0KGgoAAAANSUhEUgAAAAEAAAABCAYAAAAfFcSJAAAADUlEQVR42mNk+M9QDwADhgGAWjR9awAAAABJRU5ErkJggg==",
    "base64",
  ),
);
