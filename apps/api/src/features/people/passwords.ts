import { hash, verify } from "@node-rs/argon2";

/** argon2id at 19 MiB and 2 passes: the first choice of the OWASP Password Storage Cheat Sheet. */
const OPTIONS = { algorithm: 2, memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;

export const hashPassword = (password: string): Promise<string> => hash(password, OPTIONS);

/** A hash of nothing, so that an unknown address takes as long as a wrong password. */
const nobody = hashPassword("no one has this password");

export const passwordMatches = async (kept: string | null, password: string): Promise<boolean> => {
  const matches = await verify(kept ?? (await nobody), password);
  return kept !== null && matches;
};
