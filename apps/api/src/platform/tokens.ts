import { createHash, randomBytes } from "node:crypto";

export interface Token {
  /** Goes into one link and nowhere else. */
  readonly token: string;
  /** What we keep. */
  readonly hash: string;
}

/** 256 bits of chance for a link; only its hash is stored, so that a copy of the database opens nothing. */
export function newToken(): Token {
  const token = randomBytes(32).toString("base64url");
  return { token, hash: hashOfToken(token) };
}

/** Looked up by hash, so that no comparison of secrets takes place that could be timed. */
export const hashOfToken = (token: string): string => createHash("sha256").update(token).digest("hex");
