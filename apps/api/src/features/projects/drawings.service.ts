import type { Drawing, drawingFields, DrawingId, PersonId, ProjectId } from "@cleatwork/contracts";
import type { z } from "zod";
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import { problem } from "../../platform/http/problem.ts";
import type { Deps, UploadedFile } from "../../platform/http/route.ts";
import { DRAWING_MEDIA_TYPES, inspectDrawing } from "./drawing-file.ts";
import { drawingsRepository } from "./drawings.repository.ts";
import { getProject } from "./projects.service.ts";

const ACCEPTED = "a PDF, PNG or JPEG";

export async function uploadDrawing(
  tenant: TenantDb,
  upload: {
    projectId: ProjectId;
    fields: z.infer<typeof drawingFields>;
    file: UploadedFile | null;
    by: { id: PersonId; name: string };
  },
  deps: Pick<Deps, "clock" | "ids" | "files">,
): Promise<Drawing> {
  const { projectId, file, by } = upload;
  await getProject(tenant, projectId);
  if (!file)
    throw problem("not-valid", "The drawing's file is missing.", [
      { pointer: "/file", code: "missing", message: `${ACCEPTED} in the part named file` },
    ]);
  const inspected = await inspectDrawing(file.bytes);
  if (!inspected.accepted) throw refusal(inspected, file.name);

  const { hash } = await deps.files.put(tenant.organizationId, file.bytes);
  const uploadedAt = deps.clock.now();
  const fields = {
    id: deps.ids.make("drw"),
    ...upload.fields,
    fileName: file.name.slice(0, 255),
    mediaType: inspected.mediaType,
    byteCount: file.bytes.length,
    pageCount: inspected.pageCount,
  };
  await drawingsRepository(tenant).insert({ projectId, fields, fileHash: hash, uploadedBy: by.id, uploadedAt });
  return { ...fields, uploadedAt: uploadedAt.toISOString(), uploadedBy: by.name };
}

export async function deleteDrawing(tenant: TenantDb, projectId: ProjectId, id: DrawingId): Promise<void> {
  await tenant.transaction(async (tx) => {
    const drawings = drawingsRepository(tx);
    if ((await drawings.countUses(projectId, id)) > 0)
      throw problem("wrong-state", "This drawing lies under a level of the layout; take it out there first.");
    if (!(await drawings.delete(projectId, id))) throw problem("not-found", "There is no such drawing.");
  });
}

function refusal(inspected: { reason: "empty" | "other-type" | "damaged"; found: string }, fileName: string) {
  const detail = {
    empty: `${fileName} is empty.`,
    "other-type": `${fileName} is ${inspected.found} by its content; a drawing is ${ACCEPTED}.`,
    damaged: `${fileName} is a PDF without a readable page; it may have been cut off on its way.`,
  }[inspected.reason];
  return problem("file-type-refused", detail, [
    { pointer: "/file", code: inspected.reason, message: DRAWING_MEDIA_TYPES.join(", "), value: inspected.found },
  ]);
}
