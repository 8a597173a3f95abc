import { useCallback, useMemo, useState } from "react";

/** One person's view: which things are chosen, which one is pointed at. Shared by board, schedule and grade line. */
export interface Selection {
  readonly ids: ReadonlySet<string>;
  /** The one chosen last. */
  readonly primary: string | null;
  readonly hovered: string | null;
  readonly select: (id: string | null, options?: { add?: boolean }) => void;
  readonly hover: (id: string | null) => void;
}

export function useSelection(): Selection {
  const [ids, setIds] = useState<readonly string[]>([]);
  const [hovered, hover] = useState<string | null>(null);
  const select = useCallback((id: string | null, { add = false } = {}) => {
    setIds((before) => {
      if (id === null) return add ? before : [];
      if (!add) return [id];
      return before.includes(id) ? before.filter((each) => each !== id) : [...before, id];
    });
  }, []);
  return useMemo(
    () => ({ ids: new Set(ids), primary: ids.at(-1) ?? null, hovered, select, hover }),
    [ids, hovered, select],
  );
}
