import { endpoint, member } from "./endpoint.ts";
import {
  layoutChangesQuery,
  layoutChangesResponse,
  layoutResponse,
  saveLayoutRequest,
  saveLayoutResponse,
} from "./layout.ts";

export const layoutEndpoints = {
  getLayout: endpoint({
    method: "get",
    path: "/companies/:company/projects/:projectId/layout",
    access: member("layouts.read"),
    summary: "The whole layout and its sequence",
    response: layoutResponse,
  }),
  saveLayout: endpoint({
    method: "post",
    path: "/companies/:company/projects/:projectId/layout/changes",
    access: member("layouts.write"),
    summary: "Apply a batch of edits, all or none; a batch sent twice counts once",
    body: saveLayoutRequest,
    response: saveLayoutResponse,
  }),
  listLayoutChanges: endpoint({
    method: "get",
    path: "/companies/:company/projects/:projectId/layout/changes",
    access: member("layouts.read"),
    summary: "The change log after a sequence",
    query: layoutChangesQuery,
    response: layoutChangesResponse,
  }),
};
