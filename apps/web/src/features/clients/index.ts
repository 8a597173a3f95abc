export { clientQueries } from "./clients.queries.ts";
export { ClientDialog } from "./client-dialog.tsx";
export { ClientsScreen } from "./clients-screen.tsx";
