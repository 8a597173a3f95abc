/** The environment, read once. A person who made a mistake in it is told which and how. */
import { z } from "zod";

const schema = z.object({
  NODE_ENV: z.enum(["production", "development", "test"]).default("production"),
  HOST: z.string().default("127.0.0.1"),
  PORT: z.coerce.number<string>().int().min(0).max(65_535).default(8080),
  /** What people type into their browser; links in mail begin with it. */
  PUBLIC_URL: z.url({ protocol: /^https?$/ }),
  DATABASE_URL: z.url({ protocol: /^mysql$/ }),
  DATABASE_POOL: z.coerce.number<string>().int().min(1).max(200).default(10),
  SMTP_URL: z.url({ protocol: /^smtps?$/ }),
  MAIL_FROM: z.string().min(3),
  FILES_DIR: z.string().min(1),
  /** The built web; without it only the API is served. */
  WEB_DIST: z.string().optional(),
  LOG_LEVEL: z.enum(["fatal", "error", "warn", "info", "debug", "silent"]).default("info"),
  /** How many proxies stand in front and may name the caller's address. */
  TRUSTED_PROXIES: z.coerce.number<string>().int().min(0).max(5).default(0),
  /** Multiplies the allowed tries; tests of other things raise it. */
  RATE_LIMIT_FACTOR: z.coerce.number<string>().positive().default(1),
});

export interface Config {
  readonly environment: "production" | "development" | "test";
  readonly host: string;
  readonly port: number;
  readonly publicUrl: string;
  readonly databaseUrl: string;
  readonly databasePool: number;
  readonly smtpUrl: string;
  readonly mailFrom: string;
  readonly filesDir: string;
  readonly webDist: string | null;
  readonly logLevel: z.infer<typeof schema>["LOG_LEVEL"];
  readonly trustedProxies: number;
  readonly rateLimitFactor: number;
  /** Cookies go over https only, except on this machine. */
  readonly secureCookies: boolean;
}

export class ConfigError extends Error {}

export function readConfig(environment: Readonly<Record<string, string | undefined>>): Config {
  const parsed = schema.safeParse(environment);
  if (!parsed.success) {
    const lines = parsed.error.issues.map((issue) => `  ${issue.path.join(".")}: ${issue.message}`);
    throw new ConfigError(
      `The environment cannot be used:\n${lines.join("\n")}\nThe table in README.md says what each is for.`,
    );
  }
  const value = parsed.data;
  const publicUrl = value.PUBLIC_URL.replace(/\/+$/, "");
  const { protocol, hostname } = new URL(publicUrl);
  const loopback = ["127.0.0.1", "localhost", "[::1]"].includes(hostname);
  if (protocol === "http:" && !loopback)
    throw new ConfigError(
      "PUBLIC_URL must be https unless it is this machine: cookies and private links would be readable on the way.",
    );
  return {
    environment: value.NODE_ENV,
    host: value.HOST,
    port: value.PORT,
    publicUrl,
    databaseUrl: value.DATABASE_URL,
    databasePool: value.DATABASE_POOL,
    smtpUrl: value.SMTP_URL,
    mailFrom: value.MAIL_FROM,
    filesDir: value.FILES_DIR,
    webDist: value.WEB_DIST ?? null,
    logLevel: value.LOG_LEVEL,
    trustedProxies: value.TRUSTED_PROXIES,
    rateLimitFactor: value.RATE_LIMIT_FACTOR,
    secureCookies: protocol === "https:",
  };
}
