import { RatesForm } from "../features/prices/index.ts";
import { useSession } from "../features/session/index.ts";

export function Component() {
  const { company } = useSession();
  return (
    <main className="min-h-0 flex-1 overflow-auto px-4 pt-4">
      <title>{`Labor and percentages, ${company.name}`}</title>
      <RatesForm />
    </main>
  );
}
