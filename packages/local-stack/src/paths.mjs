import { dirname, join } from "node:path";
import { fileURLToPath } from "node:url";

/** The project's own folder, wherever it was cloned. */
export const root = join(dirname(fileURLToPath(import.meta.url)), "..", "..", "..");
export const inRoot = (...parts) => join(root, ...parts);

/** What this machine keeps between starts: database, mail, files, logs. Never committed. */
export const dataFolder = process.env.CLEATWORK_DATA ?? inRoot(".data");
