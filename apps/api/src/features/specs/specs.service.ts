import type { Spec, SpecId } from "@cleatwork/contracts";
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import { problem } from "../../platform/http/problem.ts";
import type { Deps } from "../../platform/http/route.ts";
import { specsRepository } from "./specs.repository.ts";
import type { SpecRequest } from "./specs.rows.ts";

export async function createSpec(
  tenant: TenantDb,
  request: SpecRequest,
  deps: Pick<Deps, "clock" | "ids">,
): Promise<Spec> {
  const id = deps.ids.make("spc");
  await specsRepository(tenant).insert(id, request, deps.clock.now());
  return { id, ...request, version: 1 };
}

export async function updateSpec(tenant: TenantDb, id: SpecId, request: SpecRequest, expected: number): Promise<Spec> {
  return tenant.transaction(async (tx) => {
    const specs = specsRepository(tx);
    const version = await specs.lock(id);
    if (version === null) throw problem("not-found", "There is no such construction spec.");
    if (version !== expected) throw problem("stale", "This spec was saved by someone else meanwhile.");
    await specs.update(id, request, expected);
    return { id, ...request, version: expected + 1 };
  });
}
