import type { projectRequest } from "@cleatwork/contracts";
import type { z } from "zod";

/** A project as its form holds it. */
export type ProjectValues = z.input<typeof projectRequest>;
