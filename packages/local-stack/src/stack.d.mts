export interface SignIn {
  readonly email: string;
  readonly password: string;
  readonly role: string;
  readonly company: string;
}
export interface WholeStack {
  readonly env: Readonly<Record<string, string>>;
  readonly ports: { readonly web: number; readonly database: number; readonly smtp: number; readonly mail: number };
  readonly publicUrl: string;
  readonly databaseUrl: string;
  readonly mailUrl: string;
  readonly folder: string;
  stop(): Promise<void>;
  kill(name: "api" | "worker" | "mail" | "database", signal?: NodeJS.Signals): Promise<void>;
  startApi(): Promise<void>;
  startMail(): Promise<void>;
  startWorker(): void;
  seed(): readonly SignIn[];
}
export function throwawayFolder(): string;
export function startWholeStack(options: {
  folder: string;
  throwaway?: boolean;
  watch?: boolean;
  env?: Readonly<Record<string, string>>;
}): Promise<WholeStack>;
