import type { ProjectId, Quote } from "@cleatwork/contracts";
import { ApiClient } from "../api-client.ts";
import { clients as demoClients } from "../clients.ts";
import { tokenFromMail } from "../inbox.ts";
import type { DemoProject } from "../projects.ts";
import type { People } from "./people.ts";
import { priceAsTheBrowserWould } from "./price.ts";
import type { ProjectSeed } from "./project-seed.ts";

export async function seedQuote(people: People, projectId: ProjectId, seed: ProjectSeed): Promise<void> {
  const { estimator, company } = people;
  const { project } = seed;
  if (project.quote === "none") return;
  const params = { company, projectId };

  const { items } = await estimator.call("listQuotes", { params });
  let quote = items[0] ?? (await startQuote(people, projectId, project));
  if (project.quote === "draft") return;
  if (quote.revisions.length === 0) quote = await issue(people, projectId, quote, project);
  if (project.quote === "accepted" && quote.revisions.every((revision) => revision.response === null))
    await accept(people, seed, quote);
}

async function startQuote(people: People, projectId: ProjectId, project: DemoProject): Promise<Quote> {
  const params = { company: people.company, projectId };
  const started = await people.estimator.call("createQuote", { params });
  return people.estimator.call("updateQuoteDraft", {
    params: { ...params, quoteId: started.id },
    version: started.version,
    body: {
      ...started.draft,
      greeting: `Thank you for asking us to price ${project.name}.`,
      inclusions: [
        "Ductwork, fittings, hangers and sealing as drawn",
        "Diffusers, grilles and louver as scheduled",
        "Insulation as specified",
        "Testing and balancing, with report",
      ],
      exclusions: [
        "Cutting, patching, painting and fire-stopping of other trades’ openings",
        "Electrical work, controls and power to dampers",
        "Roof curbs and roofing",
      ],
      clarifications: ["Priced from sheet M-101; work in regular hours on weekdays."],
      addenda: ["Addendum 1"],
      validDays: 30,
      priceDetail: "by-system",
    },
  });
}

async function issue(people: People, projectId: ProjectId, quote: Quote, project: DemoProject): Promise<Quote> {
  const { estimator, company } = people;
  const contact = contactOf(project);
  const { sequence, price_minor } = await priceAsTheBrowserWould(people, projectId);
  return estimator.call("issueQuote", {
    params: { company, projectId, quoteId: quote.id },
    version: quote.version,
    body: {
      recipients: [{ name: contact.name, email: contact.email }],
      message: `Our quote for ${project.name} is ready for you.`,
      layoutSequence: sequence,
      price_minor,
    },
  });
}

async function accept(people: People, seed: ProjectSeed, quote: Quote): Promise<void> {
  const contact = contactOf(seed.project);
  const token = await tokenFromMail(seed.mailApiUrl, contact.email, /\/q\//);
  const client = new ApiClient(people.apiUrl);
  const letter = await client.call("getClientQuote", { params: { token } });
  if (letter.quoteNumber !== quote.number)
    throw new Error(`the mail to ${contact.email} is about ${letter.quoteNumber}`);
  await client.call("acceptQuote", {
    params: { token },
    body: {
      name: contact.name,
      title: contact.title,
      poNumber: "PO-2210",
      consent: true,
      snapshotHash: letter.snapshotHash,
    },
  });
}

function contactOf(project: DemoProject) {
  const contact = demoClients
    .find((client) => client.name === project.client)
    ?.contacts.find((person) => person.name === project.contact);
  if (!contact) throw new Error(`${project.name} has no contact`);
  return contact;
}
