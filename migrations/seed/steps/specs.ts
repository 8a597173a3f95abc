import { specs } from "../specs.ts";
import type { People } from "./people.ts";

export async function seedSpecs({ owner, company }: People): Promise<void> {
  const { items } = await owner.call("listSpecs", { params: { company } });
  for (const spec of specs)
    if (!items.some((item) => item.name === spec.name))
      await owner.call("createSpec", { params: { company }, body: spec });
}
