/** A picture of every main screen, in `.screens/`: whoever changes a screen looks at it. */
import { chromium, type Page } from "@playwright/test";
import { startWholeStack, throwawayFolder, type SignIn } from "@cleatwork/local-stack/stack";
import { mkdirSync } from "node:fs";
import { join } from "node:path";
import { chromiumOptions } from "../support/chromium.ts";
import { linkInMail, type CaughtMail } from "../support/inbox.ts";

const out = join(import.meta.dirname, "..", "..", ".screens");
const DESK = { width: 1440, height: 900 };
const PHONE = { width: 390, height: 844 };
const only = process.argv[2];

mkdirSync(out, { recursive: true });
const running = process.env["SCREENS_URL"];
const stack = running ? null : await startWholeStack({ folder: throwawayFolder(), throwaway: true });
const url = running ?? stack?.publicUrl ?? "";
const mailUrl = process.env["SCREENS_MAIL_URL"] ?? stack?.mailUrl ?? "";
const signIns: readonly SignIn[] = stack
  ? stack.seed()
  : (JSON.parse(process.env["SCREENS_SIGN_INS"] ?? "[]") as SignIn[]);
const browser = await chromium.launch(chromiumOptions);

try {
  for (const theme of ["light", "dark"] as const) {
    const page = await open(theme, DESK);
    await shot(page, `sign-in-${theme}`, "/sign-in");
    await signIn(page, "owner");
    const company = await companyOf(page);
    const project = await projectOf(page, company, "Marrow Creek");
    const sold = await projectOf(page, company, "Tern Lake");
    for (const [name, path] of [
      ["projects", `/c/${company}/projects`],
      ["project-new", `/c/${company}/projects/new`],
      ["board-dye", `${project}/layout`],
      ["board-paper", `${project}/layout?ground=paper&heat=velocity`],
      ["schedule", `${project}/layout?view=schedule`],
      ["air-check", `${project}/air`],
      ["takeoff", `${project}/takeoff`],
      ["price", `${project}/price`],
      ["quote-editor", `${project}/quote`],
      ["quote-accepted", `${sold}/quote`],
      ["project-setup", `${project}/setup`],
      ["clients", `/c/${company}/clients`],
      ["prices", `/c/${company}/prices`],
      ["specs", `/c/${company}/specs`],
      ["people", `/c/${company}/company/people`],
      ["settings", `/c/${company}/company/settings`],
      ["audit", `/c/${company}/company/audit`],
      ["mail", `/c/${company}/company/mail`],
    ] as const)
      await shot(page, `${name}-${theme}`, path);
    await page.context().close();
  }

  const phone = await open("light", PHONE);
  await signIn(phone, "foreman");
  await shot(phone, "field-phone", "");
  await phone.getByRole("link", { name: /Tern Lake/ }).click();
  await phone.getByRole("heading", { level: 1 }).waitFor();
  await capture(phone, "field-takeoff-phone");
  await phone.context().close();

  const recipient = await clientWithLink();
  for (const [name, viewport] of [
    ["client-phone", PHONE],
    ["client-desk", DESK],
  ] as const) {
    const client = await open("light", viewport);
    await client.goto(await linkInMail(mailUrl, recipient, "/q/"));
    await client.getByRole("heading", { level: 1 }).waitFor();
    await capture(client, name);
    await client.context().close();
  }
  const inbox = await open("light", DESK);
  await inbox.goto(mailUrl);
  await capture(inbox, "inbox");
} finally {
  await browser.close();
  await stack?.stop();
}
console.log(`Look in ${out}`);

async function open(theme: "light" | "dark", viewport: { width: number; height: number }): Promise<Page> {
  const context = await browser.newContext({
    colorScheme: theme,
    viewport,
    deviceScaleFactor: 1,
    reducedMotion: "reduce",
  });
  const page = await context.newPage();
  page.on("pageerror", (error) => console.error(`page error: ${error.message}`));
  return page;
}

async function signIn(page: Page, role: string): Promise<void> {
  const who = signIns.find((each) => each.role === role);
  if (!who) throw new Error(`there is no demo ${role}`);
  await page.goto(`${url}/sign-in`);
  await page.getByLabel("E-mail").fill(who.email);
  await page.getByLabel("Password", { exact: true }).fill(who.password);
  await page.getByRole("button", { name: "Sign in" }).click();
  await page.waitForURL(/\/c\//);
}

async function companyOf(page: Page): Promise<string> {
  await page.waitForURL(/\/c\/[^/]+/);
  return /\/c\/([^/]+)/.exec(page.url())?.[1] ?? "";
}

async function projectOf(page: Page, company: string, name: string): Promise<string> {
  await page.goto(`${url}/c/${company}/projects`);
  const link = page.getByRole("link", { name: new RegExp(name) }).first();
  const href = (await link.getAttribute("href")) ?? "";
  return /(\/c\/[^/]+\/projects\/[^/]+)/.exec(href)?.[1] ?? "";
}

async function clientWithLink(): Promise<string> {
  const response = await fetch(`${mailUrl}/api/v2/search?kind=containing&query=${encodeURIComponent("Quill Street")}`);
  const { items } = (await response.json()) as { items: readonly CaughtMail[] };
  const to = items.find((mail) => mail.Content.Headers["Subject"]?.[0]?.startsWith("Quote"))?.To[0];
  if (!to) throw new Error("the demo mailed no open quote");
  return `${to.Mailbox}@${to.Domain}`;
}

async function shot(page: Page, name: string, path: string): Promise<void> {
  if (only && !name.startsWith(only)) return;
  if (path) await page.goto(`${url}${path}`);
  await page.waitForLoadState("networkidle");
  await page.waitForTimeout(400);
  await capture(page, name);
}

async function capture(page: Page, name: string): Promise<void> {
  await page.waitForTimeout(200);
  await page.screenshot({ path: join(out, `${name}.png`), fullPage: name.includes("phone") });
  console.log(name);
}
