/** Messages as raw files in a folder, newest first; what is in the folder is what there is. */
import { randomUUID } from "node:crypto";
import { mkdir, readdir, readFile, rename, rm, writeFile } from "node:fs/promises";
import { join } from "node:path";
import { simpleParser } from "mailparser";

export async function openMailbox(folder) {
  await mkdir(folder, { recursive: true });
  const messages = [];
  for (const name of (await readdir(folder)).filter((file) => file.endsWith(".json")).sort()) {
    const id = name.slice(0, -5);
    const meta = JSON.parse(await readFile(join(folder, name), "utf8"));
    messages.unshift(await read(id, await readFile(join(folder, `${id}.eml`)), meta));
  }
  return {
    all: () => messages,
    find: (id) => messages.find((message) => message.id === id),
    async add(raw, envelope) {
      const id = `${String(Date.now()).padStart(14, "0")}-${randomUUID()}`;
      const meta = { ...envelope, at: new Date().toISOString() };
      const message = await read(id, raw, meta);
      await writeFile(join(folder, `${id}.eml`), raw);
      await writeFile(join(folder, `${id}.new`), JSON.stringify(meta));
      await rename(join(folder, `${id}.new`), join(folder, `${id}.json`));
      messages.unshift(message);
    },
    async remove(id) {
      const at = messages.findIndex((message) => message.id === id);
      if (at < 0) return false;
      messages.splice(at, 1);
      await rm(join(folder, `${id}.json`), { force: true });
      await rm(join(folder, `${id}.eml`), { force: true });
      return true;
    },
    async clear() {
      for (const { id } of [...messages]) await this.remove(id);
    },
  };
}

async function read(id, raw, { from, to, at }) {
  return { id, raw, from, to, at, parsed: await simpleParser(raw) };
}
