export { companyQueries } from "./companies.queries.ts";
export { AuditScreen } from "./audit-screen.tsx";
export { MailScreen } from "./mail-screen.tsx";
export { SettingsForm } from "./settings-form.tsx";
