export { sessionQueries } from "./session.queries.ts";
export { SessionContext, sessionOf, useSession } from "./session-context.ts";
export { goSignIn, signOut } from "./leave.ts";
