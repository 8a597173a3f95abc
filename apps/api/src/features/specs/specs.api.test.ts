import { inches } from "@cleatwork/calc";
import { describe, expect, test } from "vitest";
import { foundCompany } from "../../testing/found-company.ts";
import { DEFAULT_SPEC_NAME, defaultConstruction } from "./default-spec.ts";

const wrapped = {
  name: "Supply, wrapped",
  construction: { ...defaultConstruction, insulation: { kind: "wrap", thickness_m: inches(1.5) } as const },
};

describe("construction specs", () => {
  test("a new company starts with one, marked as common practice", async () => {
    const { estimator } = await foundCompany();
    const { items } = await estimator.ok("listSpecs");
    expect(items).toMatchObject([{ name: DEFAULT_SPEC_NAME, construction: defaultConstruction, version: 1 }]);
    expect(DEFAULT_SPEC_NAME).toMatch(/common practice/);
  });

  test("are added and changed", async () => {
    const { estimator } = await foundCompany();
    const spec = await estimator.ok("createSpec", { body: wrapped });
    const changed = await estimator.ok("updateSpec", {
      params: { specId: spec.id },
      version: 1,
      body: { ...wrapped, name: "Supply, bare" },
    });
    expect(changed).toEqual({ ...spec, name: "Supply, bare", version: 2 });
    expect((await estimator.ok("listSpecs")).items).toContainEqual(changed);
  });

  test("with an impossible value are refused with the field and the limit", async () => {
    const { estimator } = await foundCompany();
    const elbow = { ...defaultConstruction.elbow, radiusRatio: 9 };
    const problem = await estimator.refused("createSpec", {
      body: { ...wrapped, construction: { ...defaultConstruction, elbow } },
    });
    expect(problem).toMatchObject({
      status: 422,
      errors: [
        { pointer: "/construction/elbow/radiusRatio", value: 9, message: expect.stringContaining("5") as string },
      ],
    });
  });

  test("saved on an old version are refused", async () => {
    const { estimator, owner } = await foundCompany();
    const [spec] = (await estimator.ok("listSpecs")).items;
    const params = { specId: spec!.id };
    await owner.ok("updateSpec", { params, version: 1, body: wrapped });
    expect((await estimator.refused("updateSpec", { params, version: 1, body: wrapped })).status).toBe(412);
  });

  test("of another company are not there", async () => {
    const [first, second] = [await foundCompany(), await foundCompany()];
    const [spec] = (await first.estimator.ok("listSpecs")).items;
    const params = { specId: spec!.id };
    expect((await second.owner.refused("updateSpec", { params, version: 1, body: wrapped })).status).toBe(404);
  });
});
