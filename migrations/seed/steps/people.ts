import type { CompanySlug, Me } from "@cleatwork/contracts";
import { ApiClient, Refused } from "../api-client.ts";
import { company, invited, owner, TIME_ZONE, type DemoPerson } from "../company.ts";
import { tokenFromMail } from "../inbox.ts";

export interface Doors {
  readonly apiUrl: string;
  readonly mailApiUrl: string;
}

/** The owner and the estimator at the front door, and the company's name in addresses. */
export interface People {
  readonly apiUrl: string;
  readonly company: CompanySlug;
  readonly owner: ApiClient;
  readonly estimator: ApiClient;
}

export async function signInEveryone(doors: Doors): Promise<People> {
  const ownerClient = new ApiClient(doors.apiUrl);
  const me = (await signIn(ownerClient, owner)) ?? (await signUp(ownerClient));
  const slug = me.memberships[0]?.company.slug;
  if (!slug) throw new Error(`${owner.email} belongs to no company`);
  if (!me.person.emailVerified) {
    const token = await tokenFromMail(doors.mailApiUrl, owner.email, /\/verify-email\?token=/);
    await ownerClient.call("verifyEmail", { params: {}, body: { token } });
  }
  await describeCompany(ownerClient, slug);

  let estimator: ApiClient | null = null;
  for (const person of invited) {
    const client = new ApiClient(doors.apiUrl);
    if ((await signIn(client, person)) === null) await invite(ownerClient, client, { person, slug, doors });
    if (person.role === "estimator") estimator = client;
  }
  if (!estimator) throw new Error("the demo has no estimator");
  return { apiUrl: doors.apiUrl, company: slug, owner: ownerClient, estimator };
}

/** Null when there is no such account yet. */
async function signIn(client: ApiClient, person: DemoPerson): Promise<Me | null> {
  try {
    return await client.call("signIn", { params: {}, body: { email: person.email, password: person.password } });
  } catch (error) {
    if (error instanceof Refused && error.code === "credentials-wrong") return null;
    throw error;
  }
}

const signUp = (client: ApiClient): Promise<Me> =>
  client.call("signUp", {
    params: {},
    body: {
      companyName: company.name,
      name: owner.name,
      email: owner.email,
      password: owner.password,
      timeZone: TIME_ZONE,
    },
  });

async function describeCompany(client: ApiClient, slug: CompanySlug): Promise<void> {
  const { version, licenseNumber } = await client.call("getCompany", { params: { company: slug } });
  if (licenseNumber === "") await client.call("updateCompany", { params: { company: slug }, body: company, version });
}

async function invite(
  ownerClient: ApiClient,
  client: ApiClient,
  guest: { person: DemoPerson; slug: CompanySlug; doors: Doors },
): Promise<void> {
  const { person, slug, doors } = guest;
  const { invitations } = await ownerClient.call("listPeople", { params: { company: slug } });
  if (!invitations.some((invitation) => invitation.email === person.email))
    await ownerClient.call("invitePerson", {
      params: { company: slug },
      body: { email: person.email, role: person.role },
    });
  const token = await tokenFromMail(doors.mailApiUrl, person.email, /\/invitations\//);
  await client.call("acceptInvitation", {
    params: { token },
    body: { name: person.name, password: person.password },
  });
}
