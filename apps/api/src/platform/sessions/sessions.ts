/**
 * Sessions, behind one door: Lucia is no longer developed, and could be replaced here without anyone else noticing.
 * The cookie holds the session's id; the database only its hash.
 */
import { Lucia, TimeSpan, type Adapter, type DatabaseSession, type DatabaseUser } from "lucia";
import type { PersonId } from "@cleatwork/contracts";
import type { Database } from "../db/database.ts";
import { hashOfToken } from "../tokens.ts";
import type { Membership, Person } from "../http/route.ts";
import { sessionsRepository } from "./sessions.repository.ts";
import type { UserAttributes } from "./user-attributes.ts";

declare module "lucia" {
  interface Register {
    Lucia: ReturnType<typeof createLucia>;
    UserId: PersonId;
    DatabaseUserAttributes: UserAttributes;
    DatabaseSessionAttributes: SessionAttributes;
  }
}

export interface SessionAttributes {
  readonly ip: string | null;
  readonly userAgent: string | null;
}

const COOKIE = "cleatwork_session";
const LASTS = new TimeSpan(30, "d");

const createLucia = (adapter: Adapter, secure: boolean) =>
  new Lucia(adapter, {
    sessionExpiresIn: LASTS,
    sessionCookie: { name: COOKIE, attributes: { secure, sameSite: "lax", path: "/" } },
    getUserAttributes: (attributes) => attributes,
  });

export interface Caller {
  readonly person: Person;
  readonly memberships: readonly Membership[];
  readonly sessionId: string;
  /** Set when the session was prolonged and the browser should know. */
  readonly freshCookie: string | null;
}

export interface Sessions {
  /** Who sent this cookie header; null for no one. One statement. */
  read(cookieHeader: string): Promise<Caller | null>;
  /** A new session under a new id; answers the Set-Cookie header. */
  start(personId: PersonId, attributes: SessionAttributes): Promise<string>;
  /** Ends the session of this cookie header; answers the Set-Cookie header that clears it. */
  end(cookieHeader: string): Promise<string>;
  endAllOf(personId: PersonId): Promise<void>;
  sweep(): Promise<void>;
}

export function createSessions(db: Database, options: { secureCookies: boolean }): Sessions {
  const lucia = createLucia(adapterFor(db), options.secureCookies);
  return {
    async read(cookieHeader) {
      const sessionId = lucia.readSessionCookie(cookieHeader);
      if (!sessionId) return null;
      const { session, user } = await lucia.validateSession(sessionId);
      if (!session) return null;
      const { id, name, email, emailVerified, memberships } = user;
      return {
        person: { id, name, email, emailVerified },
        memberships,
        sessionId,
        freshCookie: session.fresh ? lucia.createSessionCookie(sessionId).serialize() : null,
      };
    },
    async start(personId, attributes) {
      const session = await lucia.createSession(personId, attributes);
      return lucia.createSessionCookie(session.id).serialize();
    },
    async end(cookieHeader) {
      const sessionId = lucia.readSessionCookie(cookieHeader);
      if (sessionId) await lucia.invalidateSession(sessionId);
      return lucia.createBlankSessionCookie().serialize();
    },
    endAllOf: (personId) => lucia.invalidateUserSessions(personId),
    sweep: () => lucia.deleteExpiredSessions(),
  };
}

/** Ids are hashed on the way in, and the raw one handed back on the way out, since Lucia wants to see what it asked for. */
function adapterFor(db: Database): Adapter {
  const repository = sessionsRepository(db.system("sessions belong to people, not to companies"));
  return {
    async getSessionAndUser(id): Promise<[DatabaseSession | null, DatabaseUser | null]> {
      const found = await repository.find(hashOfToken(id));
      if (!found) return [null, null];
      return [
        { id, userId: found.personId, expiresAt: found.expiresAt, attributes: { ip: null, userAgent: null } },
        { id: found.personId, attributes: found.attributes },
      ];
    },
    async getUserSessions(personId) {
      const sessions = await repository.listOf(personId);
      return sessions.map((session) => ({
        id: session.id,
        userId: personId,
        expiresAt: session.expiresAt,
        attributes: { ip: session.ip, userAgent: session.userAgent },
      }));
    },
    setSession: (session) =>
      repository.insert({
        id: hashOfToken(session.id),
        personId: session.userId,
        expiresAt: session.expiresAt,
        ...session.attributes,
      }),
    updateSessionExpiration: (id, expiresAt) => repository.prolong(hashOfToken(id), expiresAt),
    deleteSession: (id) => repository.delete(hashOfToken(id)),
    deleteUserSessions: (personId) => repository.deleteOf(personId),
    deleteExpiredSessions: () => repository.deleteExpired(),
  };
}
