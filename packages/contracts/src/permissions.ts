/** Who may do what. A role is a set of permissions; an owner can do all that an estimator can. */
import { z } from "zod";

export const ROLES = ["owner", "estimator", "foreman"] as const;
export type Role = (typeof ROLES)[number];
export const roleSchema = z.enum(ROLES);

const everyone = ["company.read", "field.read"] as const;
const estimating = [
  "people.read",
  "clients.read",
  "clients.write",
  "projects.read",
  "projects.write",
  "drawings.read",
  "drawings.write",
  "specs.read",
  "specs.write",
  "standards.read",
  "layouts.read",
  "layouts.write",
  "prices.read",
  "estimates.write",
  "quotes.read",
  "quotes.write",
  "quotes.issue",
  "mail.read",
] as const;
const owning = ["company.write", "people.manage", "prices.write", "standards.write", "audit.read"] as const;

export type Permission = (typeof everyone)[number] | (typeof estimating)[number] | (typeof owning)[number];

const granted: Readonly<Record<Role, ReadonlySet<Permission>>> = {
  foreman: new Set<Permission>(everyone),
  estimator: new Set<Permission>([...everyone, ...estimating]),
  owner: new Set<Permission>([...everyone, ...estimating, ...owning]),
};

export const roleMay = (role: Role, permission: Permission): boolean => granted[role].has(permission);
