import { PriceScreen } from "../features/price/index.ts";
import { useWorkspaceKeys } from "../features/workspace/index.ts";

export function Component() {
  useWorkspaceKeys();
  return <PriceScreen />;
}
