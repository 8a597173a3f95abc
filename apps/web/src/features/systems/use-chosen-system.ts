import type { SystemRecord } from "@cleatwork/contracts";
import { useCallback } from "react";
import { useSearchParams } from "react-router-dom";
import { useWorkspace } from "../workspace/index.ts";

/** The system in view, kept in the address so that it can be shared and gone back to. */
export function useChosenSystem(): { readonly system: SystemRecord | null; readonly choose: (id: string) => void } {
  const { systems } = useWorkspace();
  const [search, setSearch] = useSearchParams();
  const wanted = search.get("system");
  const system = systems.find(({ id }) => id === wanted) ?? systems[0] ?? null;
  const choose = useCallback(
    (id: string) =>
      setSearch(
        (before) => {
          const after = new URLSearchParams(before);
          after.set("system", id);
          return after;
        },
        { replace: true },
      ),
    [setSearch],
  );
  return { system, choose };
}
