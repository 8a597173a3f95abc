/** Debian's own packages: installed when they are missing and that is allowed, else named with the command to run. */
import { accessSync, constants } from "node:fs";
import { run } from "./children.mjs";
import { say, Stop } from "./say.mjs";

/** Core packages hold no service and no unit: installing them starts nothing. */
export const DATABASE = [
  { package: "mariadb-server-core", program: "/usr/sbin/mariadbd" },
  { package: "mariadb-client-core", program: "/usr/bin/mariadb" },
];
export const BROWSER = [
  { package: "chromium", program: "/usr/bin/chromium" },
  { package: "fonts-liberation", program: "/usr/share/fonts/truetype/liberation/LiberationSans-Regular.ttf" },
  { package: "poppler-utils", program: "/usr/bin/pdftotext" },
];

const exists = (path) => {
  try {
    accessSync(path, constants.R_OK);
    return true;
  } catch {
    return false;
  }
};

export const missing = (wanted, has = exists) =>
  wanted.filter(({ program }) => !has(program)).map((entry) => entry.package);

export async function ensureDebian(wanted) {
  const packages = missing(wanted);
  if (packages.length === 0) return;
  const command = `apt-get update && apt-get install -y --no-install-recommends ${packages.join(" ")}`;
  if (process.getuid?.() !== 0 || !exists("/usr/bin/apt-get")) {
    throw new Stop(
      `These packages are missing: ${packages.join(", ")}.\nInstall them, then start again:\n\n  sudo sh -c '${command}'\n`,
    );
  }
  say(`Installing ${packages.join(", ")} from Debian`);
  const env = { DEBIAN_FRONTEND: "noninteractive" };
  const install = () =>
    run("apt-get", ["-qq", "-o", "DPkg::Lock::Timeout=300", "install", "-y", "--no-install-recommends", ...packages], {
      env,
      quiet: true,
    });
  if ((await install()) === 0 && missing(wanted).length === 0) return;
  await run("apt-get", ["-qq", "-o", "DPkg::Lock::Timeout=300", "update"], { env, quiet: true });
  if ((await install()) !== 0 || missing(wanted).length > 0)
    throw new Stop(`Debian's packages could not be installed. Run this and look at what it says:\n\n  ${command}\n`);
}
