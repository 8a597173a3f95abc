import { useQuery } from "@tanstack/react-query";
import { FieldTakeoffPage, fieldQueries } from "../features/field/index.ts";
import { useWorkspace } from "../features/workspace/index.ts";
import { EmptyState } from "../ui/empty-state.tsx";
import { ScreenSkeleton } from "../ui/skeleton.tsx";

/** The approved takeoff as the foreman sees it; nothing to see before a client has accepted. */
export function Component() {
  const { company, project } = useWorkspace();
  const { data, isPending } = useQuery({ ...fieldQueries.takeoff(company.slug, project.id), retry: false });
  if (isPending) return <ScreenSkeleton />;
  if (!data)
    return (
      <main className="p-4">
        <h1 className="sr-only">Field</h1>
        <EmptyState title="After acceptance">
          When the client accepts a quote, what was sold is frozen as the approved takeoff and shown here, as the
          foreman sees it.
        </EmptyState>
      </main>
    );
  return (
    <div className="min-h-0 grow overflow-auto">
      <FieldTakeoffPage company={company.slug} projectId={project.id} />
    </div>
  );
}
