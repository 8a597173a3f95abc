import type { QueryClient } from "@tanstack/react-query";
import { useParams, type LoaderFunctionArgs } from "react-router-dom";
import { FieldTakeoffPage, fieldQueries } from "../features/field/index.ts";
import { useSession } from "../features/session/index.ts";
import { companyParam, projectParam } from "../lib/route-params.ts";
import { TopBar } from "../ui/top-bar.tsx";

export const loader =
  (client: QueryClient) =>
  ({ params }: LoaderFunctionArgs) => {
    void client.prefetchQuery(fieldQueries.takeoff(companyParam(params), projectParam(params)));
    return null;
  };

export function Component() {
  const { slug, company } = useSession();
  return (
    <>
      <title>{`Approved takeoff, ${company.name}`}</title>
      <TopBar heading={false} title="Field" fact={company.name} />
      <div className="min-h-0 flex-1 overflow-auto print:overflow-visible">
        <FieldTakeoffPage company={slug} projectId={projectParam(useParams())} />
      </div>
    </>
  );
}
