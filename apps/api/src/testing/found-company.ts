/** A company of its own for each test, so that tests run beside each other and prove the walls in passing. */
import { hash } from "@node-rs/argon2";
import type { CompanySlug, OrganizationId, PersonId, Role } from "@cleatwork/contracts";
import { fromJson } from "../platform/db/columns.ts";
import type { MailMessage } from "../platform/mail/outbox.ts";
import { testServer, type TestServer } from "./server.ts";
import { TestPerson } from "./test-person.ts";

export { TestPerson } from "./test-person.ts";

export const PASSWORD = "copper valley lantern";
/** One hash for all people of the tests: hashing is slow on purpose. */
let passwordHash: Promise<string> | null = null;

export interface TestCompany {
  readonly server: TestServer;
  readonly organizationId: OrganizationId;
  readonly slug: CompanySlug;
  readonly owner: TestPerson;
  readonly estimator: TestPerson;
  readonly foreman: TestPerson;
  /** Not signed in: a client behind a link, or anyone. */
  readonly stranger: TestPerson;
  /** What was written into the outbox for an address, newest first. */
  readonly mailTo: (email: string) => Promise<MailMessage[]>;
}

let count = 0;

export async function foundCompany(): Promise<TestCompany> {
  const server = await testServer();
  const system = server.deps.db.system("tests found companies");
  const tag = `${process.pid}-${++count}`;
  const newcomer = personAt(server, { name: "June Olsen", email: `june-${tag}@tallgrass.example` });
  const me = await newcomer.ok("signUp", {
    body: {
      companyName: `Tallgrass Sheet Metal ${tag}`,
      name: newcomer.name,
      email: newcomer.email,
      password: PASSWORD,
      timeZone: "America/Chicago",
    },
  });
  const company = me.memberships[0]?.company;
  if (!company) throw new Error("a sign-up founds a company");
  await system.from("people").where({ id: me.person.id }).update({ email_verified_at: server.clock.now() });

  const join = async (role: Role, name: string) => {
    const id = server.deps.ids.make("per");
    const email = `${role}-${tag}@tallgrass.example`;
    const now = server.clock.now();
    passwordHash ??= hash(PASSWORD, { algorithm: 2, memoryCost: 19_456, timeCost: 2, parallelism: 1 });
    const password_hash = await passwordHash;
    await system.insert("people", { id, email, name, password_hash, email_verified_at: now, created_at: now });
    await system.insert("memberships", { organization_id: company.id, person_id: id, role, joined_at: now });
    const cookie = await server.sessions.start(id, { ip: null, userAgent: null });
    return personAt(server, { company: company.slug, id, name, email, cookie: cookie.split(";")[0] ?? "" });
  };

  return {
    server,
    organizationId: company.id,
    slug: company.slug,
    owner: personAt(server, { ...newcomer, company: company.slug, id: me.person.id }),
    estimator: await join("estimator", "Teo Varga"),
    foreman: await join("foreman", "Rosa Quill"),
    stranger: personAt(server, { name: "", email: "" }),
    mailTo: async (email) => {
      const rows: { message: unknown }[] = await system
        .from("outbox")
        .where({ recipient: email })
        .orderBy("id", "desc")
        .select("message");
      return rows.map(({ message }) => fromJson<MailMessage>(message));
    },
  };
}

const personAt = (
  { url, deps }: TestServer,
  who: { company?: CompanySlug; id?: PersonId; name: string; email: string; cookie?: string },
) =>
  new TestPerson(
    { url, publicUrl: deps.config.publicUrl },
    who.company ?? ("" as CompanySlug),
    who.id ?? ("" as PersonId),
    who.name,
    who.email,
    who.cookie ?? "",
  );

/** The 43 characters of a private link in a mail. */
export function tokenIn(mail: MailMessage | undefined): string {
  const token = mail && /[A-Za-z0-9_-]{43}/.exec(mail.text)?.[0];
  if (!token) throw new Error("the mail holds no link");
  return token;
}
