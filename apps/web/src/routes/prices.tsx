import type { QueryClient } from "@tanstack/react-query";
import { Outlet, type LoaderFunctionArgs } from "react-router-dom";
import { priceQueries } from "../features/prices/index.ts";
import { useSession } from "../features/session/index.ts";
import { paths } from "../lib/paths.ts";
import { companyParam } from "../lib/route-params.ts";
import { TopBar } from "../ui/top-bar.tsx";

export const loader =
  (client: QueryClient) =>
  ({ params }: LoaderFunctionArgs) => {
    const company = companyParam(params);
    void client.prefetchQuery(priceQueries.book(company));
    void client.prefetchQuery(priceQueries.settings(company));
    return null;
  };

/** The two halves of what a price is made of. */
export function Component() {
  const { slug, company } = useSession();
  return (
    <>
      <TopBar
        title="Prices"
        fact={company.name}
        label="Prices"
        tabs={[
          { to: paths.prices(slug), end: true, label: "Price book", fact: "metal, devices, sundries" },
          { to: paths.rates(slug), label: "Labor and percentages", fact: "hours, overhead, profit" },
        ]}
      />
      <Outlet />
    </>
  );
}
