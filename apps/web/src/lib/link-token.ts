/** The token of a mailed link: in the fragment, which no server log sees, or in the query. */
export function linkToken(location: Pick<Location, "search" | "hash">): string {
  const fragment = location.hash.replace(/^#/, "");
  const named = new URLSearchParams(fragment).get("token");
  return named ?? new URLSearchParams(location.search).get("token") ?? (/^[\w-]{20,}$/.test(fragment) ? fragment : "");
}
