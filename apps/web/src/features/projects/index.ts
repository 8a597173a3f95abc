export { projectQueries } from "./projects.queries.ts";
export { ProjectsScreen } from "./projects-screen.tsx";
export { NewProject } from "./new-project.tsx";
export { ProjectSetup } from "./project-setup.tsx";
