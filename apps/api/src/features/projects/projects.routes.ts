import type { projectEndpoints } from "@cleatwork/contracts";
import { problem } from "../../platform/http/problem.ts";
import type { Handlers } from "../../platform/http/route.ts";
import { drawingsRepository } from "./drawings.repository.ts";
import { deleteDrawing, uploadDrawing } from "./drawings.service.ts";
import { projectsRepository } from "./projects.repository.ts";
import { createProject, getProject, updateProject } from "./projects.service.ts";

export const projectHandlers = {
  listProjects: async ({ tenant }) => ({ items: await projectsRepository(tenant).list() }),
  createProject: ({ tenant, body, person, deps }) => createProject(tenant, body, person.id, deps),
  getProject: ({ tenant, params }) => getProject(tenant, params.projectId),
  updateProject: ({ tenant, params, body, version }) => updateProject(tenant, params.projectId, body, version),

  listDrawings: async ({ tenant, params }) => {
    const items = await drawingsRepository(tenant).list(params.projectId);
    if (!items) throw problem("not-found", "There is no such project.");
    return { items };
  },

  uploadDrawing: ({ tenant, params, body, person, request, deps }) =>
    uploadDrawing(
      tenant,
      { projectId: params.projectId, fields: body, file: request.file, by: { id: person.id, name: person.name } },
      deps,
    ),

  getDrawingFile: async ({ tenant, params, deps }) => {
    const drawing = await drawingsRepository(tenant).find(params.projectId, params.drawingId);
    if (!drawing) throw problem("not-found", "There is no such drawing.");
    const bytes = await deps.files.get(tenant.organizationId, drawing.fileHash);
    return { bytes, mediaType: drawing.mediaType, fileName: drawing.fileName, inline: true };
  },

  deleteDrawing: ({ tenant, params }) => deleteDrawing(tenant, params.projectId, params.drawingId),
} satisfies Handlers<typeof projectEndpoints>;
