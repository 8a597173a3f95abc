import { roleMay, type Company, type CompanySlug, type Me, type Permission, type Role } from "@cleatwork/contracts";
import { createContext, useContext } from "react";

/** Who is working, in which company, and what their role allows. The server decides; this only spares useless buttons. */
export interface Session {
  readonly me: Me;
  readonly slug: CompanySlug;
  readonly company: Company;
  readonly role: Role;
  readonly may: (permission: Permission) => boolean;
}

export const SessionContext = createContext<Session | null>(null);

export function useSession(): Session {
  const session = useContext(SessionContext);
  if (!session) throw new Error("useSession is used outside of a company");
  return session;
}

export function sessionOf(me: Me, company: Company): Session | null {
  const membership = me.memberships.find((one) => one.company.slug === company.slug);
  if (!membership) return null;
  const { role } = membership;
  return { me, slug: company.slug, company, role, may: (permission) => roleMay(role, permission) };
}
