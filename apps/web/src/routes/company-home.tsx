import { Navigate } from "react-router-dom";
import { useSession } from "../features/session/index.ts";
import { paths } from "../lib/paths.ts";

/** The foreman's day starts in the field, everyone else's with the bids. */
export function Component() {
  const { slug, may } = useSession();
  return <Navigate replace to={may("projects.read") ? paths.projects(slug) : paths.field(slug)} />;
}
