import { AirCheck } from "../features/air/index.ts";
import { SystemChoice, useChosenSystem } from "../features/systems/index.ts";
import { useWorkspace, useWorkspaceKeys } from "../features/workspace/index.ts";
import { EmptyState } from "../ui/empty-state.tsx";

export function Component() {
  const { systems } = useWorkspace();
  const { system, choose } = useChosenSystem();
  useWorkspaceKeys();
  if (!system)
    return (
      <main className="p-4">
        <h1 className="sr-only">Air check</h1>
        <EmptyState title="Nothing to check yet">Draw a system first; its air is checked as you draw.</EmptyState>
      </main>
    );
  return (
    <>
      <div className="border-b border-line bg-sheet px-4 py-1.5">
        <SystemChoice systems={systems} value={system.id} onChange={choose} />
      </div>
      <AirCheck systemId={system.id} />
    </>
  );
}
