/** What can be done on the screen that is open: for the palette, the shortcut sheet and the keys themselves. */
import { useEffect, useRef, useSyncExternalStore } from "react";

export interface Action {
  readonly id: string;
  readonly label: string;
  /** The heading it stands under in the palette and on the shortcut sheet. */
  readonly group: string;
  /** `mod k`, `g p`, `?`, `[`: parts separated by a space; `mod` is ⌘ or Ctrl. A shifted sign is written as itself. */
  readonly keys?: string;
  /** Other words that people may search it by. */
  readonly words?: string;
  readonly run: () => void;
}

let actions: readonly Action[] = [];
const listeners = new Set<() => void>();
const tell = () => listeners.forEach((listener) => listener());

export function registerActions(added: readonly Action[]): () => void {
  actions = [...actions, ...added];
  tell();
  return () => {
    actions = actions.filter((action) => !added.includes(action));
    tell();
  };
}

/**
 * Offers these while the component is on the screen. Later ones win over earlier ones with the same keys. What an action
 * does is always its newest version; labels and keys are taken again when their text changes.
 */
export function useActions(offered: readonly Action[]) {
  const newest = useRef(offered);
  useEffect(() => {
    newest.current = offered;
  });
  const shape = JSON.stringify(offered.map(({ id, label, group, keys, words }) => [id, label, group, keys, words]));
  useEffect(
    () =>
      registerActions(
        newest.current.map((action) => ({
          ...action,
          run: () => newest.current.find(({ id }) => id === action.id)?.run(),
        })),
      ),
    [shape],
  );
}

export const useAllActions = (): readonly Action[] =>
  useSyncExternalStore(
    (listener) => {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    () => actions,
  );

export const allActions = () => actions;
