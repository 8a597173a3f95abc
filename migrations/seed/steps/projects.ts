import { feet } from "@cleatwork/calc";
import type { ChangeSet, LevelRecord, ProjectId } from "@cleatwork/contracts";
import { randomUUID } from "node:crypto";
import { TIME_ZONE } from "../company.ts";
import { layoutOfSystem } from "../layout-builder.ts";
import { drawLibraryPlan, sheet } from "../library/plan-drawing.ts";
import { library, type DemoProject } from "../projects.ts";
import type { People } from "./people.ts";
import type { ProjectSeed } from "./project-seed.ts";
import { seedQuote } from "./quotes.ts";

export async function seedProject(people: People, seed: ProjectSeed): Promise<void> {
  const projectId = await findOrStart(people, seed);
  await seedLayout(people, projectId, seed);
  await seedAdds(people, projectId, seed.project);
  await seedQuote(people, projectId, seed);
}

async function findOrStart(
  { estimator, company }: People,
  { project, clients, today }: ProjectSeed,
): Promise<ProjectId> {
  const { items } = await estimator.call("listProjects", { params: { company } });
  const known = items.find((item) => item.name === project.name);
  if (known) return known.id;
  const client = clients.get(project.client);
  const contact = client?.contacts.find((person) => person.name === project.contact);
  if (!client || !contact) throw new Error(`${project.name}: no ${project.contact} at ${project.client}`);
  const started = await estimator.call("createProject", {
    params: { company },
    body: {
      name: project.name,
      number: project.number,
      clientId: client.id,
      contactId: contact.id,
      siteAddress: project.site,
      altitude_m: feet(project.altitude_ft),
      dueAt: dueAt(today, project.due),
      dueZone: TIME_ZONE,
      unitSystem: "inch-pound",
    },
  });
  return started.id;
}

/** An hour of the company's wall clock, some days from today; weekends move to Monday. */
function dueAt(today: Date, due: { days: number; hour: number }): string {
  const day = new Date(today.getTime() + due.days * 86_400_000);
  while (due.days > 0 && [0, 6].includes(day.getUTCDay())) day.setTime(day.getTime() + 86_400_000);
  const guess = new Date(`${day.toISOString().slice(0, 10)}T${String(due.hour).padStart(2, "0")}:00:00Z`);
  const wall = new Intl.DateTimeFormat("en-US", { timeZone: TIME_ZONE, hour: "numeric", hourCycle: "h23" });
  const offset_h = (due.hour - Number(wall.format(guess)) + 24) % 24;
  return new Date(guess.getTime() + offset_h * 3_600_000).toISOString();
}

async function seedLayout(people: People, projectId: ProjectId, seed: ProjectSeed): Promise<void> {
  const { estimator, company } = people;
  const params = { company, projectId };
  const layout = await estimator.call("getLayout", { params });
  const level = layout.records.find((record): record is LevelRecord => record.kind === "level");
  if (!level) throw new Error(`${seed.project.name} has no level`);
  const sets: ChangeSet[] = [];

  if (seed.project === library && level.underlay === null) sets.push(await planUnderLevel(people, params, level, seed));

  const { items: specs } = await estimator.call("listSpecs", { params: { company } });
  for (const system of seed.project.systems) {
    if (layout.records.some((record) => record.kind === "system" && record.tag === system.tag)) continue;
    const spec = specs.find((item) => item.name === system.spec);
    if (!spec) throw new Error(`no spec ${system.spec}`);
    sets.push(layoutOfSystem(system, { levelId: level.id, specId: spec.id, altitude_ft: seed.project.altitude_ft }));
  }
  if (sets.length > 0)
    await estimator.call("saveLayout", {
      params,
      body: { batchId: randomUUID(), baseSequence: layout.sequence, sets },
    });
}

async function planUnderLevel(
  { estimator }: People,
  params: { company: People["company"]; projectId: ProjectId },
  level: LevelRecord,
  seed: ProjectSeed,
): Promise<ChangeSet> {
  const { items } = await estimator.call("listDrawings", { params });
  const drawing =
    items[0] ??
    (await estimator.call("uploadDrawing", {
      params,
      body: {
        sheetNumber: "M-101",
        title: "Level 1 mechanical plan",
        revision: "2",
        datedOn: new Date(seed.today.getTime() - 20 * 86_400_000).toISOString().slice(0, 10),
      },
      file: {
        name: "M-101 level 1.pdf",
        mediaType: "application/pdf",
        bytes: new Uint8Array(await drawLibraryPlan({ on: seed.today })),
      },
    }));
  const { corner_pt, metersPerPoint } = sheet;
  const after: LevelRecord = {
    ...level,
    underlay: {
      drawingId: drawing.id,
      page: 1,
      metersPerUnit: metersPerPoint,
      x_m: feet((-corner_pt.x * metersPerPoint) / 0.3048),
      y_m: feet((-corner_pt.y * metersPerPoint) / 0.3048),
      rotation_rad: 0,
    },
  };
  return { label: "Lay sheet M-101 under Level 1", changes: [{ id: level.id, before: level, after }] };
}

async function seedAdds({ estimator, company }: People, projectId: ProjectId, project: DemoProject): Promise<void> {
  const params = { company, projectId };
  const pricing = await estimator.call("getProjectPricing", { params });
  if (pricing.adds.length > 0) return;
  await estimator.call("updateProjectPricing", {
    params,
    version: pricing.version,
    body: {
      rates: null,
      conditionFactor: null,
      conditionReason: "",
      adds: project.adds.map(({ dollars, ...add }) => ({
        id: randomUUID(),
        ...add,
        unitPrice_micro: Math.round(dollars * 1_000_000),
      })),
    },
  });
}
