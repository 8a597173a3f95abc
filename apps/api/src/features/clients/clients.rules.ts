import type { ClientId, Contact, ContactId } from "@cleatwork/contracts";

export interface ContactProblem {
  readonly pointer: string;
  readonly code: "contact-twice" | "contact-of-another-client" | "contact-named-by-project";
  readonly message: string;
  readonly value: unknown;
}

/** What stands against saving these contacts; empty when nothing does. */
export function contactProblems(input: {
  clientId: ClientId;
  contacts: readonly Contact[];
  owners: readonly { id: ContactId; clientId: ClientId }[];
  namedByProjects: readonly { id: ContactId; name: string; projectName: string }[];
}): ContactProblem[] {
  const problems: ContactProblem[] = [];
  const seen = new Set<ContactId>();
  const elsewhere = new Set(input.owners.filter((owner) => owner.clientId !== input.clientId).map((owner) => owner.id));
  for (const [index, contact] of input.contacts.entries()) {
    const pointer = `/contacts/${index}/id`;
    if (seen.has(contact.id))
      problems.push({ pointer, code: "contact-twice", message: "each contact once", value: contact.id });
    seen.add(contact.id);
    if (elsewhere.has(contact.id))
      problems.push({
        pointer,
        code: "contact-of-another-client",
        message: "a new id, or one of this client's own contacts",
        value: contact.id,
      });
  }
  for (const named of input.namedByProjects)
    problems.push({
      pointer: "/contacts",
      code: "contact-named-by-project",
      message: `${named.name} is the contact of the project ${named.projectName}; name another contact there first`,
      value: named.id,
    });
  return problems;
}
