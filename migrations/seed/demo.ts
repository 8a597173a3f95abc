/**
 * Fills an empty installation with the demo company, through the front door and the inbox as people would. Run again, it
 * looks before each step, changes nothing that is there, and prints the sign-ins.
 *
 *     API_URL=http://127.0.0.1:8080 MAIL_API_URL=http://127.0.0.1:8025 node --import tsx migrations/seed/demo.ts
 */
import { signInEveryone } from "./steps/people.ts";
import { seedClients } from "./steps/clients.ts";
import { seedPrices } from "./steps/prices.ts";
import { seedProject } from "./steps/projects.ts";
import { seedSpecs } from "./steps/specs.ts";
import { invited, owner } from "./company.ts";
import { projects } from "./projects.ts";

function required(name: string): string {
  const value = process.env[name];
  if (!value) throw new Error(`${name} is not set: the demo seed needs the address of the running product`);
  return value;
}

async function main(): Promise<void> {
  const doors = { apiUrl: required("API_URL"), mailApiUrl: required("MAIL_API_URL") };
  const today = new Date();

  const people = await signInEveryone(doors);
  await seedSpecs(people);
  await seedPrices(people, today);
  const clients = await seedClients(people);
  for (const project of projects) await seedProject(people, { project, clients, today, mailApiUrl: doors.mailApiUrl });

  const signIns = [owner, ...invited].map(({ email, password, role }) => ({
    email,
    password,
    role,
    company: people.company,
  }));
  console.log(JSON.stringify({ signIns }));
}

await main();
