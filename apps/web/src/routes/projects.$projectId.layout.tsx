import { EmptyState } from "../ui/empty-state.tsx";

/** Filled by its feature. */
export function Component() {
  return (
    <main className="p-4">
      <EmptyState title="layout" />
    </main>
  );
}
