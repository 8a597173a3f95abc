/** Debian's Chromium, as Playwright starts it here: no download, nothing that calls home. */
export const chromiumOptions = {
  executablePath: process.env["CHROMIUM"] ?? "/usr/bin/chromium",
  chromiumSandbox: false,
  args: [
    "--disable-gpu",
    "--disable-quic",
    "--no-first-run",
    "--disable-background-networking",
    "--disable-component-update",
    "--disable-sync",
    "--disable-dev-shm-usage",
  ],
};
