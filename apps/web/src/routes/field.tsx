import { FieldHome, fieldQueries } from "../features/field/index.ts";
import { useSession } from "../features/session/index.ts";
import { companyParam } from "../lib/route-params.ts";
import { TopBar } from "../ui/top-bar.tsx";
import type { QueryClient } from "@tanstack/react-query";
import type { LoaderFunctionArgs } from "react-router-dom";

export const loader =
  (client: QueryClient) =>
  ({ params }: LoaderFunctionArgs) => {
    void client.prefetchQuery(fieldQueries.projects(companyParam(params)));
    return null;
  };

export function Component() {
  const { slug, company } = useSession();
  return (
    <>
      <title>{`Field, ${company.name}`}</title>
      <TopBar heading={false} title="Field" fact={company.name} />
      <div className="min-h-0 flex-1 overflow-auto">
        <FieldHome company={slug} units={company.unitSystem} />
      </div>
    </>
  );
}
