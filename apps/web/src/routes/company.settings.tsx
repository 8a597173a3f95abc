import { SettingsForm } from "../features/companies/index.ts";
import { useSession } from "../features/session/index.ts";

export function Component() {
  const { company } = useSession();
  return (
    <main className="min-h-0 flex-1 overflow-auto px-4 pt-4">
      <title>{`Settings, ${company.name}`}</title>
      <h1 className="sr-only">Settings of {company.name}</h1>
      <SettingsForm />
    </main>
  );
}
