import { companySlug, projectId, type CompanySlug, type ProjectId } from "@cleatwork/contracts";
import type { Params } from "react-router-dom";
import { NotFoundProblem } from "./problem.ts";

/** An address that cannot be one of ours is not found, before anything is asked. */
function notFound(): never {
  throw new NotFoundProblem();
}

export function companyParam(params: Params): CompanySlug {
  const parsed = companySlug.safeParse(params.company);
  return parsed.success ? parsed.data : notFound();
}

export function projectParam(params: Params): ProjectId {
  const parsed = projectId.safeParse(params.projectId);
  return parsed.success ? parsed.data : notFound();
}
