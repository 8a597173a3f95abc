import { SettingsForm } from "../features/companies/index.ts";
import { useSession } from "../features/session/index.ts";

export function Component() {
  const { company, may } = useSession();
  return (
    <main
      className="min-h-0 flex-1 overflow-auto px-4 pt-4"
      // Where every field is closed, the keys still have to scroll.
      {...(may("company.write") ? {} : { tabIndex: 0 })}
    >
      <title>{`Settings, ${company.name}`}</title>
      <h1 className="sr-only">Settings of {company.name}</h1>
      <SettingsForm />
    </main>
  );
}
