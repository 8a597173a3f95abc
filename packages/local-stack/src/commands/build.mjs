import { ensurePackages } from "../packages.mjs";
import { buildWeb } from "../web-build.mjs";

export async function build() {
  await ensurePackages();
  await buildWeb({ quiet: false });
  return 0;
}
