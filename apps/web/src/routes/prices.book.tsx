import { PriceBookScreen } from "../features/prices/index.ts";
import { useSession } from "../features/session/index.ts";

export function Component() {
  const { company } = useSession();
  return (
    <>
      <title>{`Prices, ${company.name}`}</title>
      <PriceBookScreen />
    </>
  );
}
