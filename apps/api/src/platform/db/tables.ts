/** Tables that belong to a company; every row names it, first in its key. */
export const TENANT_TABLES = [
  "memberships",
  "invitations",
  "idempotency_keys",
  "audit_entries",
  "clients",
  "client_contacts",
  "projects",
  "drawings",
  "specs",
  "standards",
  "layouts",
  "layout_records",
  "layout_changes",
  "price_items",
  "pricing_settings",
  "project_pricing",
  "quotes",
  "quote_revisions",
  "quote_links",
  "quote_responses",
  "approved_takeoffs",
] as const;
export type TenantTable = (typeof TENANT_TABLES)[number];

/** Tables above all companies: people and their sessions, the companies themselves, the post. */
export type SystemTable = "people" | "organizations" | "sessions" | "email_tokens" | "outbox";
