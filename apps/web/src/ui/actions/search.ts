import type { Action } from "./registry.ts";

/** Actions in which every typed word begins a word, the closest first; all of them when nothing is typed. */
export function searchActions(actions: readonly Action[], typed: string): readonly Action[] {
  const wanted = typed.toLowerCase().split(/\s+/).filter(Boolean);
  if (wanted.length === 0) return actions;
  return actions
    .map((action) => ({ action, score: score(action, wanted) }))
    .filter(({ score }) => score > 0)
    .sort((a, b) => b.score - a.score)
    .map(({ action }) => action);
}

function score(action: Action, wanted: readonly string[]): number {
  const label = action.label.toLowerCase();
  const words = `${label} ${action.words ?? ""} ${action.group}`.toLowerCase().split(/[^\p{L}\p{N}]+/u);
  let total = 0;
  for (const want of wanted) {
    if (!words.some((word) => word.startsWith(want))) return 0;
    total += label.startsWith(want) ? 3 : label.includes(want) ? 2 : 1;
  }
  return total;
}
