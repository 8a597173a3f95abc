import type { OrganizationId } from "@cleatwork/contracts";
import { createHash, randomUUID } from "node:crypto";
import { mkdir, readFile, rename, writeFile } from "node:fs/promises";
import { join } from "node:path";

/** Bytes by content hash, each company in a folder of its own, outside of what is served. */
export interface FileStore {
  put(organizationId: OrganizationId, bytes: Uint8Array): Promise<{ hash: string }>;
  get(organizationId: OrganizationId, hash: string): Promise<Buffer>;
}

export function fileStore(root: string): FileStore {
  const pathOf = (organizationId: OrganizationId, hash: string) => {
    if (!/^[0-9a-f]{64}$/.test(hash)) throw new Error("a file is named by its SHA-256");
    return join(root, organizationId, hash);
  };
  return {
    async put(organizationId, bytes) {
      const hash = createHash("sha256").update(bytes).digest("hex");
      const path = pathOf(organizationId, hash);
      await mkdir(join(root, organizationId), { recursive: true });
      // Written beside and renamed, so that a reader never sees half a file.
      const temporary = `${path}.${randomUUID()}`;
      await writeFile(temporary, bytes, { flush: true });
      await rename(temporary, path);
      return { hash };
    },
    get: (organizationId, hash) => readFile(pathOf(organizationId, hash)),
  };
}
