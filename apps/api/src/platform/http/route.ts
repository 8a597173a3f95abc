import type {
  BodyOf,
  CompanySlug,
  Endpoint,
  OrganizationId,
  ParamsOf,
  PersonId,
  QueryOf,
  ResponseOf,
  Role,
} from "@cleatwork/contracts";
import type { Readable } from "node:stream";
import type { Logger } from "pino";
import type { Config } from "../../config.ts";
import type { Clock } from "../clock.ts";
import type { Database } from "../db/database.ts";
import type { TenantDb } from "../db/tenant-db.ts";
import type { FileStore } from "../files.ts";
import type { Ids } from "../ids.ts";

/** What the app is built from; tests pass their own. */
export interface Deps {
  readonly db: Database;
  readonly clock: Clock;
  readonly ids: Ids;
  readonly files: FileStore;
  readonly config: Config;
  readonly log: Logger;
}

export interface Person {
  readonly id: PersonId;
  readonly name: string;
  readonly email: string;
  readonly emailVerified: boolean;
}

export interface Membership {
  readonly organizationId: OrganizationId;
  readonly slug: CompanySlug;
  readonly name: string;
  readonly currency: string;
  readonly role: Role;
}

export interface UploadedFile {
  readonly bytes: Buffer;
  readonly name: string;
}

export interface FileAnswer {
  readonly bytes: Buffer | Readable;
  readonly mediaType: string;
  readonly fileName: string;
  readonly inline?: boolean;
}

interface Common<E extends Endpoint> {
  readonly params: ParamsOf<E>;
  readonly query: QueryOf<E>;
  readonly body: BodyOf<E>;
  /** From If-Match; 0 where the endpoint has no such guard. */
  readonly version: number;
  readonly request: {
    readonly id: string;
    readonly ip: string;
    readonly userAgent: string;
    readonly file: UploadedFile | null;
  };
  readonly deps: Deps;
  /** Starts or ends the browser's session: sets the cookie of this answer. */
  readonly session: {
    start(personId: PersonId): Promise<void>;
    end(): Promise<void>;
  };
}

interface SignedIn {
  readonly person: Person;
  readonly memberships: readonly Membership[];
}

interface Member extends SignedIn {
  /** The company's database: exists only because the person is a member. */
  readonly tenant: TenantDb;
  readonly company: Membership;
  readonly role: Role;
}

export type Context<E extends Endpoint> = Common<E> &
  (E["access"]["kind"] extends "member" ? Member : E["access"]["kind"] extends "signed-in" ? SignedIn : unknown);

export type Answer<E extends Endpoint> = E["answers"] extends "file"
  ? FileAnswer
  : ResponseOf<E> extends undefined
    ? void
    : ResponseOf<E>;

/** A feature's handlers, one for each of its endpoints: a missing one does not compile. */
export type Handlers<T extends Record<string, Endpoint>> = {
  readonly [K in keyof T]: (context: Context<T[K]>) => Promise<Answer<T[K]>>;
};
