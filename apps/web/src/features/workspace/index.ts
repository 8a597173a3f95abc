/** The door of the workspace: one project, open. */
export { useWorkspace } from "./workspace-context.ts";
export { WorkspaceProvider } from "./workspace-provider.tsx";
export { prefetchWorkspace, workspaceQueries } from "./workspace.queries.ts";
export { browserIds } from "./browser-ids.ts";
export { Tally } from "./tally.tsx";
export { useWorkspaceKeys } from "./use-workspace-keys.ts";
export { useStepFacts } from "./step-facts.tsx";
export { useTrial } from "./use-trial.ts";
