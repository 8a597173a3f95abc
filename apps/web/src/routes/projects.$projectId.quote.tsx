import type { QueryClient } from "@tanstack/react-query";
import type { LoaderFunctionArgs } from "react-router-dom";
import { QuoteScreen, quoteQueries } from "../features/quote-editor/index.ts";
import { companyParam, projectParam } from "../lib/route-params.ts";

export const loader =
  (client: QueryClient) =>
  ({ params }: LoaderFunctionArgs) => {
    void client.prefetchQuery(quoteQueries.list(companyParam(params), projectParam(params)));
    return null;
  };

export function Component() {
  return <QuoteScreen />;
}
