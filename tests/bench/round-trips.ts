/** How often each read of a member goes to the database: round trips decide the throughput. */
import { endpoints, type EndpointName } from "@cleatwork/contracts";
import type { Figure } from "./figure.ts";
import type { Member } from "./member.ts";

export async function roundTripFigures(owner: Member): Promise<readonly Figure[]> {
  const parameters = await someOfEach(owner);
  const figures: Figure[] = [];
  for (const [name, { method, path, access }] of Object.entries(endpoints)) {
    if (method !== "get" || access.kind === "open") continue;
    const { databaseRoundTrips } = await owner.call(name as EndpointName, parametersFor(path, parameters));
    figures.push({
      what: `database round trips of ${name}`,
      figure: databaseRoundTrips,
      unit: "",
      most: 2,
    });
  }
  return figures;
}

interface Found {
  readonly sold: Readonly<Record<string, string>>;
  readonly any: Readonly<Record<string, string>>;
}

/** A quote and a field list need the project that was sold, drawings the one that has some. */
const parametersFor = (path: string, { sold, any }: Found) =>
  path.includes("/quotes") || path.includes("/field") ? sold : any;

async function someOfEach(owner: Member): Promise<Found> {
  const { body: projects } = await owner.call("listProjects");
  const { body: clients } = await owner.call("listClients");
  let any: Record<string, string> | undefined;
  let sold: Record<string, string> | undefined;
  for (const { id: projectId } of projects.items) {
    const { body: drawings } = await owner.call("listDrawings", { projectId });
    const drawingId = drawings.items[0]?.id;
    if (drawingId) any ??= { projectId, drawingId, clientId: clients.items[0]?.id ?? "" };
    const { body: quotes } = await owner.call("listQuotes", { projectId });
    const accepted = quotes.items.find(({ revisions }) => revisions.some(({ state }) => state === "accepted"));
    const revisionId = accepted?.revisions.find(({ state }) => state === "accepted")?.id;
    if (accepted && revisionId) sold ??= { projectId, quoteId: accepted.id, revisionId };
  }
  if (!any || !sold) throw new Error("the demo has no project with a drawing, or none that was sold");
  return { any, sold };
}
