/** The answer, or why there is none. Input that physics or geometry refuses is a problem; a broken promise of ours throws. */
export type Result<T, P> =
  { readonly ok: true; readonly value: T } | { readonly ok: false; readonly problems: readonly P[] };

export const ok = <T>(value: T): { readonly ok: true; readonly value: T } => ({ ok: true, value });
export const fail = <P>(...problems: readonly P[]): { readonly ok: false; readonly problems: readonly P[] } => ({
  ok: false,
  problems,
});
