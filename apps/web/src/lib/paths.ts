/** Every address of the browser, in one place. */
import type { CompanySlug, ProjectId } from "@cleatwork/contracts";

export const PROJECT_STEPS = ["layout", "air", "takeoff", "price", "quote", "field"] as const;
export type ProjectStep = (typeof PROJECT_STEPS)[number];

export const COMPANY_PAGES = ["people", "settings", "audit", "mail"] as const;
export type CompanyPage = (typeof COMPANY_PAGES)[number];

export const paths = {
  signIn: (next?: string) => (next ? `/sign-in?next=${encodeURIComponent(next)}` : "/sign-in"),
  signUp: "/sign-up",
  home: (company: CompanySlug) => `/c/${company}`,
  projects: (company: CompanySlug) => `/c/${company}/projects`,
  newProject: (company: CompanySlug) => `/c/${company}/projects/new`,
  project: (company: CompanySlug, project: ProjectId, step: ProjectStep | "setup" = "layout") =>
    `/c/${company}/projects/${project}/${step}`,
  clients: (company: CompanySlug) => `/c/${company}/clients`,
  prices: (company: CompanySlug) => `/c/${company}/prices`,
  rates: (company: CompanySlug) => `/c/${company}/prices/rates`,
  specs: (company: CompanySlug) => `/c/${company}/specs`,
  schedules: (company: CompanySlug) => `/c/${company}/specs/schedules`,
  company: (company: CompanySlug, page: CompanyPage = "people") => `/c/${company}/company/${page}`,
  field: (company: CompanySlug) => `/c/${company}/field`,
  fieldProject: (company: CompanySlug, project: ProjectId) => `/c/${company}/field/${project}`,
} as const;

/** Only our own addresses: a link must not lead a newly signed-in person elsewhere. */
export const ownPath = (wanted: string | null): string | null =>
  wanted !== null && /^\/(?![/\\])/.test(wanted) ? wanted : null;
