import { TakeoffScreen } from "../features/takeoff/index.ts";
import { useWorkspaceKeys } from "../features/workspace/index.ts";

export function Component() {
  useWorkspaceKeys();
  return <TakeoffScreen />;
}
