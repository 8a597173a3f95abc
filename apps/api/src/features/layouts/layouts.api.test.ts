import { inches } from "@cleatwork/calc";
import type { ChangeSet, SpecId } from "@cleatwork/contracts";
import { createConnection, type Connection, type RowDataPacket } from "mysql2/promise";
import { randomUUID } from "node:crypto";
import { describe, expect, test } from "vitest";
import { foundCompany } from "../../testing/found-company.ts";
import { aProject } from "../../testing/a-project.ts";
import { adding, aSmallSystem, changing, removing } from "../../testing/a-small-system.ts";

async function aLayout() {
  const company = await foundCompany();
  const { estimator } = company;
  const { project } = await aProject(estimator);
  const params = { projectId: project.id };
  const { items: specs } = await estimator.ok("listSpecs");
  const { records, sequence } = await estimator.ok("getLayout", { params });
  const [level] = records;
  const [spec] = specs;
  if (level?.kind !== "level" || !spec) throw new Error("a new project has a level, a founded company a spec");
  const save = (base: number, ...sets: ChangeSet[]) => ({
    params,
    body: { batchId: randomUUID(), baseSequence: base, sets },
  });
  return { company, estimator, params, level, spec, sequence, save, drawn: aSmallSystem(level.id, spec.id) };
}

async function aDrawnLayout() {
  const layout = await aLayout();
  const { sequence } = await layout.estimator.ok("saveLayout", layout.save(1, adding(...layout.drawn.records)));
  return { ...layout, sequence };
}

/** The connection whose insert into the log is waiting, once there is one. */
async function connectionThatAppends(watcher: Connection): Promise<number> {
  for (;;) {
    const [rows] = await watcher.query<RowDataPacket[]>(
      "SELECT id FROM information_schema.processlist WHERE db = DATABASE() AND info LIKE 'insert into `layout_changes`%'",
    );
    const [waiting] = rows;
    if (waiting) return Number(waiting["id"]);
    await new Promise((resolve) => setTimeout(resolve, 20));
  }
}

describe("a new project's layout", () => {
  test("starts with one level, through the log", async () => {
    const { estimator, params, level } = await aLayout();
    const log = await estimator.ok("listLayoutChanges", { params });
    expect(level).toMatchObject({ name: "Level 1", elevation_m: 0 });
    expect(log).toMatchObject({ items: [{ sequence: 1, label: "Start with Level 1" }], next: null });
  });
});

describe("saving edits", () => {
  test("what was saved is what is read", async () => {
    const { estimator, params, drawn, level, sequence } = await aDrawnLayout();
    const layout = await estimator.ok("getLayout", { params });
    expect(layout.sequence).toBe(sequence);
    expect(layout.records).toHaveLength(drawn.records.length + 1);
    expect(layout.records).toEqual(expect.arrayContaining([level, ...drawn.records]));
  });

  test("each change set moves the sequence by one", async () => {
    const { estimator, save, drawn } = await aLayout();
    const answer = await estimator.ok(
      "saveLayout",
      save(1, adding(...drawn.records), changing(drawn.main, { name: "Trunk" })),
    );
    expect(answer).toEqual({ sequence: 3, previousSequence: 1 });
  });

  test("a batch sent twice counts once", async () => {
    const { estimator, params, save, drawn } = await aLayout();
    const batch = save(1, adding(...drawn.records));
    const first = await estimator.ok("saveLayout", batch);
    const second = await estimator.ok("saveLayout", batch);
    expect(second).toEqual(first);
    expect((await estimator.ok("getLayout", { params })).sequence).toBe(2);
  });

  test("a batch sent twice at the same moment counts once", async () => {
    const { estimator, params, save, drawn } = await aLayout();
    const batch = save(1, adding(...drawn.records));
    const answers = await Promise.all([1, 2, 3, 4].map(() => estimator.ok("saveLayout", batch)));
    expect(new Set(answers.map((answer) => answer.sequence))).toEqual(new Set([2]));
    expect((await estimator.ok("getLayout", { params })).sequence).toBe(2);
  });

  test("a batch id used again for other edits is refused", async () => {
    const { estimator, save, drawn } = await aLayout();
    const batch = save(1, adding(...drawn.records));
    await estimator.ok("saveLayout", batch);
    const other = { ...batch, body: { ...batch.body, sets: [changing(drawn.main, { name: "Trunk" })] } };
    expect(await estimator.refused("saveLayout", other)).toMatchObject({
      status: 422,
      type: "/problems/idempotency-mismatch",
    });
  });

  test("a base that is not here yet is refused with what is allowed", async () => {
    const { estimator, save, drawn } = await aLayout();
    expect(await estimator.refused("saveLayout", save(9, adding(...drawn.records)))).toMatchObject({
      status: 422,
      errors: [{ pointer: "/baseSequence", value: 9, message: "at most 1, the present sequence" }],
    });
  });

  test("a batch of two thousand records is saved whole", async () => {
    const { estimator, params, save, level, spec } = await aLayout();
    const systems = Array.from({ length: 250 }, (_, index) => aSmallSystem(level.id, spec.id, `S${index}`));
    await estimator.ok("saveLayout", save(1, adding(...systems.flatMap((system) => system.records))));
    expect((await estimator.ok("getLayout", { params })).records).toHaveLength(250 * 8 + 1);
  });
});

describe("a save that is cut off after its first writes", () => {
  test("leaves nothing behind, and the same batch then counts once", async () => {
    const { company, estimator, params, save, drawn } = await aLayout();
    const batch = save(1, adding(...drawn.records));
    const before = await estimator.ok("getLayout", { params });
    const other = await createConnection(company.server.deps.config.databaseUrl);
    try {
      // Someone else holds the log's end: the save writes its records, then waits to append, and is killed there.
      await other.query("START TRANSACTION");
      await other.query("SELECT sequence FROM layout_changes WHERE project_id = ? FOR UPDATE", [params.projectId]);
      const cutOff = estimator.send("saveLayout", batch);
      await other.query(`KILL CONNECTION ${await connectionThatAppends(other)}`);
      expect((await cutOff).status).toBe(500);
      await other.query("ROLLBACK");
    } finally {
      await other.end();
    }
    expect(await estimator.ok("getLayout", { params })).toEqual(before);
    expect(await estimator.ok("saveLayout", batch)).toEqual({ sequence: 2, previousSequence: 1 });
    expect((await estimator.ok("getLayout", { params })).records).toHaveLength(drawn.records.length + 1);
  });
});

describe("two people in one layout", () => {
  test("edits of different records from the same base are both kept", async () => {
    const { company, estimator, params, save, drawn, sequence } = await aDrawnLayout();
    await company.owner.ok("saveLayout", save(sequence, changing(drawn.runouts[0], { name: "Owner’s" })));
    const answer = await estimator.ok("saveLayout", save(sequence, changing(drawn.runouts[1], { name: "Teo’s" })));
    expect(answer).toEqual({ sequence: sequence + 2, previousSequence: sequence + 1 });
    const names = (await estimator.ok("getLayout", { params })).records.flatMap((record) =>
      record.kind === "segment" ? [record.name] : [],
    );
    expect(new Set(names)).toEqual(new Set(["Main", "Owner’s", "Teo’s"]));
  });

  test("edits of the same record are a conflict that shows the record as it stands", async () => {
    const { company, estimator, save, drawn, sequence } = await aDrawnLayout();
    await company.owner.ok("saveLayout", save(sequence, changing(drawn.main, { name: "Owner’s" })));
    expect(
      await estimator.refused("saveLayout", save(sequence, changing(drawn.main, { name: "Teo’s" }))),
    ).toMatchObject({
      status: 409,
      type: "/problems/layout-conflict",
      errors: [
        {
          pointer: "/sets/0/changes/0",
          code: "record-changed",
          value: { id: drawn.main.id, name: "Owner’s" },
        },
      ],
    });
  });

  test("a conflict in one set leaves the whole batch undone", async () => {
    const { company, estimator, params, save, drawn, sequence } = await aDrawnLayout();
    await company.owner.ok("saveLayout", save(sequence, changing(drawn.main, { name: "Owner’s" })));
    const before = await estimator.ok("getLayout", { params });
    await estimator.refused(
      "saveLayout",
      save(sequence, changing(drawn.runouts[0], { name: "Teo’s" }), changing(drawn.main, { name: "Teo’s" })),
    );
    expect(await estimator.ok("getLayout", { params })).toEqual(before);
  });

  test("twenty saves at once are all kept, one after the other", async () => {
    const { company, estimator, params, save, level, spec } = await aLayout();
    const people = [company.owner, estimator];
    const systems = Array.from({ length: 20 }, (_, index) => aSmallSystem(level.id, spec.id, `S${index}`));
    const answers = await Promise.all(
      systems.map((system, index) => people[index % 2]!.ok("saveLayout", save(1, adding(...system.records)))),
    );
    expect(answers.map((answer) => answer.sequence).toSorted((a, b) => a - b)).toEqual(
      Array.from({ length: 20 }, (_, index) => index + 2),
    );
    const { items } = await estimator.ok("listLayoutChanges", { params });
    expect(items.map((item) => item.sequence)).toEqual(Array.from({ length: 21 }, (_, index) => index + 1));
    expect((await estimator.ok("getLayout", { params })).records).toHaveLength(20 * 8 + 1);
  });
});

describe("a layout that is not sound is refused with the record named, and nothing is lost", () => {
  test("a run that leads back to itself", async () => {
    const { estimator, params, save, drawn, sequence } = await aDrawnLayout();
    const before = await estimator.ok("getLayout", { params });
    // Main hangs on the far end of the east runout, which hangs on the main.
    const turned = { ...drawn.outlets[0], role: "junction" as const, airflow_m3s: null, requiredPressure_pa: null };
    const problem = await estimator.refused(
      "saveLayout",
      save(sequence, changing(drawn.outlets[0], turned), changing(drawn.main, { fromNodeId: turned.id })),
    );
    expect(problem).toMatchObject({
      status: 422,
      type: "/problems/layout-refused",
      errors: [{ code: "segment-loops", message: expect.stringMatching(/(Main|East runout) \(seg_/) as string }],
    });
    expect(await estimator.ok("getLayout", { params })).toEqual(before);
  });

  test("a node with two parents", async () => {
    const { estimator, save, drawn, sequence } = await aDrawnLayout();
    const second = { ...aSmallSystem(drawn.junction.levelId, drawn.system.specId).main };
    const doubled = { ...second, systemId: drawn.system.id, name: "Second way" };
    expect(
      await estimator.refused(
        "saveLayout",
        save(sequence, adding({ ...doubled, fromNodeId: drawn.equipment.id, toNodeId: drawn.junction.id })),
      ),
    ).toMatchObject({
      status: 422,
      errors: [
        {
          pointer: "/sets/0/changes/0/after/toNodeId",
          code: "node-has-two-parents",
          message: expect.stringMatching(/Second way.*seg_/) as string,
        },
      ],
    });
  });

  test("a duct into another system", async () => {
    const { estimator, save, drawn, level, spec, sequence } = await aDrawnLayout();
    const other = aSmallSystem(level.id, spec.id, "S2");
    expect(
      await estimator.refused(
        "saveLayout",
        save(
          sequence,
          adding(...other.records.filter((record) => record !== other.main)),
          adding({ ...other.main, fromNodeId: drawn.junction.id }),
        ),
      ),
    ).toMatchObject({
      status: 422,
      errors: [{ pointer: "/sets/1/changes/0/after/fromNodeId", code: "reference-other-system" }],
    });
  });

  test("a size of zero, by the contract", async () => {
    const { estimator, save, drawn, sequence } = await aDrawnLayout();
    const problem = await estimator.refused(
      "saveLayout",
      save(sequence, changing(drawn.main, { section: { shape: "round", diameter_m: inches(0) } })),
    );
    expect(problem).toMatchObject({
      status: 422,
      errors: [{ pointer: expect.stringContaining("/sets/0/changes/0/after") as string }],
    });
  });

  test("an annulus whose pipe is wider than its duct", async () => {
    const { estimator, save, drawn, sequence } = await aDrawnLayout();
    const section = { shape: "annular", outerDiameter_m: inches(8), innerDiameter_m: inches(10) } as const;
    expect(await estimator.refused("saveLayout", save(sequence, changing(drawn.main, { section })))).toMatchObject({
      status: 422,
      errors: [
        {
          pointer: "/sets/0/changes/0/after/section/innerDiameter_m",
          code: "inner-not-smaller-than-outer",
          message: expect.stringContaining("Main") as string,
        },
      ],
    });
  });

  test("a node that ducts still use cannot be removed alone", async () => {
    const { estimator, save, drawn, sequence } = await aDrawnLayout();
    const problem = await estimator.refused("saveLayout", save(sequence, removing(drawn.junction)));
    expect(problem.errors).toEqual(
      expect.arrayContaining([
        expect.objectContaining({ code: "reference-unknown", message: expect.stringContaining("Main") as string }),
      ]),
    );
  });

  test("a construction spec of another company", async () => {
    const { estimator, save, level } = await aLayout();
    const stranger = await foundCompany();
    const foreign = (await stranger.estimator.ok("listSpecs")).items[0]!.id;
    expect(
      await estimator.refused("saveLayout", save(1, adding(...aSmallSystem(level.id, foreign).records))),
    ).toMatchObject({
      status: 422,
      errors: [{ pointer: "/sets/0/changes/0/after/specId", code: "spec-unknown", value: foreign satisfies SpecId }],
    });
  });

  test("a drawing of another project", async () => {
    const { estimator, save, level } = await aLayout();
    const other = await aProject(estimator);
    const drawing = await other.uploadDrawing();
    const underlay = {
      drawingId: drawing.id,
      page: 1,
      metersPerUnit: 0.03,
      x_m: level.elevation_m,
      y_m: level.elevation_m,
      rotation_rad: 0,
    };
    expect(await estimator.refused("saveLayout", save(1, changing(level, { underlay })))).toMatchObject({
      status: 422,
      errors: [{ pointer: "/sets/0/changes/0/after/underlay/drawingId", code: "drawing-unknown" }],
    });
  });
});

describe("the log", () => {
  test("is read on from where one is", async () => {
    const { estimator, params, save, drawn, sequence } = await aDrawnLayout();
    await estimator.ok("saveLayout", save(sequence, changing(drawn.main, { name: "A" })));
    const page = await estimator.ok("listLayoutChanges", { params, query: { after: 1, limit: 1 } });
    expect(page).toMatchObject({ items: [{ sequence: 2 }], next: 2 });
    const last = await estimator.ok("listLayoutChanges", { params, query: { after: 2, limit: 1 } });
    expect(last).toMatchObject({ items: [{ sequence: 3, label: "Change" }], next: null });
  });

  test("of nothing new is an empty page", async () => {
    const { estimator, params, sequence } = await aDrawnLayout();
    const page = await estimator.ok("listLayoutChanges", { params, query: { after: sequence } });
    expect(page).toEqual({ items: [], next: null });
  });

  test("replayed from the beginning gives the layout", async () => {
    const { estimator, params, save, drawn, sequence } = await aDrawnLayout();
    await estimator.ok("saveLayout", save(sequence, changing(drawn.main, { name: "A" }), removing(drawn.runouts[1])));
    const { items } = await estimator.ok("listLayoutChanges", { params });
    const records = new Map<string, unknown>();
    for (const { changes } of items)
      for (const change of changes) {
        if (change.after) records.set(change.id, change.after);
        else records.delete(change.id);
      }
    const layout = await estimator.ok("getLayout", { params });
    expect(new Map(layout.records.map((record) => [record.id as string, record]))).toEqual(records);
  });
});

describe("another company's layout", () => {
  test("is not there", async () => {
    const { params, save, drawn } = await aDrawnLayout();
    const stranger = await foundCompany();
    const { owner } = stranger;
    expect((await owner.refused("getLayout", { params })).status).toBe(404);
    expect((await owner.refused("listLayoutChanges", { params })).status).toBe(404);
    expect((await owner.refused("saveLayout", save(1, changing(drawn.main, { name: "Mine" })))).status).toBe(404);
  });
});
