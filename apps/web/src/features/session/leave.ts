import { endpoints } from "@cleatwork/contracts";
import { api } from "../../lib/http.ts";
import { paths } from "../../lib/paths.ts";

/** Ends the session. A full page load follows, so that nothing of it stays in memory. */
export async function signOut() {
  await api(endpoints.signOut, {});
  window.location.assign(paths.signIn());
}

/** To the sign-in page, and afterwards back to where the person was. */
export function goSignIn() {
  const { pathname, search, hash } = window.location;
  window.location.replace(paths.signIn(pathname + search + hash));
}
