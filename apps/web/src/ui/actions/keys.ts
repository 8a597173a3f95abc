import type { Action } from "./registry.ts";

/** One press in the spelling of `Action.keys`, without sequences: `mod k`, `?`, `arrowup`. */
export function pressOf(event: Pick<KeyboardEvent, "key" | "ctrlKey" | "metaKey" | "altKey" | "shiftKey">): string {
  const key = event.key === " " ? "space" : event.key.toLowerCase();
  const named = key.length > 1;
  return [
    event.ctrlKey || event.metaKey ? "mod" : "",
    event.altKey ? "alt" : "",
    // Shift changes the sign itself; only with named keys and mod does it count on its own.
    event.shiftKey && (named || event.ctrlKey || event.metaKey) ? "shift" : "",
    key,
  ]
    .filter(Boolean)
    .join(" ");
}

const MODIFIERS = /^(?:(?:mod|alt|shift) )+/;

/** Where people write, a bare key belongs to the text. */
export function belongsToText(event: KeyboardEvent): boolean {
  if (event.ctrlKey || event.metaKey) return false;
  const target = event.target;
  if (!(target instanceof HTMLElement)) return false;
  return target.isContentEditable || /^(input|textarea|select)$/i.test(target.tagName);
}

/**
 * The action that this press, after the pending ones, completes; or whether it may begin a sequence such as `g p`.
 */
export function match(actions: readonly Action[], pending: string, press: string): Action | "begins" | null {
  const typed = pending ? `${pending} ${press}` : press;
  let begins = false;
  for (let i = actions.length - 1; i >= 0; i--) {
    const action = actions[i];
    if (!action?.keys) continue;
    const keys = action.keys.toLowerCase();
    if (keys === typed) return action;
    if (!MODIFIERS.test(keys) && keys.startsWith(`${typed} `)) begins = true;
  }
  return begins ? "begins" : null;
}
