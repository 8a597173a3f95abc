import { useSession } from "../features/session/index.ts";
import { paths } from "../lib/paths.ts";
import { TopBar } from "../ui/top-bar.tsx";

/** How duct is built: what a job's spec says, and what the company's schedules say where it does not. */
export function SpecTabs() {
  const { slug, company } = useSession();
  return (
    <TopBar
      title="Construction"
      fact={company.name}
      label="Construction"
      tabs={[
        { to: paths.specs(slug), end: true, label: "Construction specs", fact: "a job's choices" },
        { to: paths.schedules(slug), label: "Schedules", fact: "gauges, hours, conditions" },
      ]}
    />
  );
}
