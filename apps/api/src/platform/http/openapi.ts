/** OpenAPI 3.1 made from the endpoint table, so that it cannot say anything else than what is served. */
import { endpoints, PROBLEMS, problemDetail, type Endpoint } from "@cleatwork/contracts";
import { z } from "zod";

let cached: object | null = null;

export function openApiDocument(): object {
  cached ??= {
    openapi: "3.1.0",
    info: {
      title: "Cleatwork",
      version: "1",
      description: "Errors are problem details (RFC 9457); codes: " + Object.keys(PROBLEMS).join(", "),
    },
    servers: [{ url: "/api" }],
    paths: pathsOf(endpoints),
    components: {
      schemas: { Problem: schemaOf(problemDetail, "output") },
      securitySchemes: { session: { type: "apiKey", in: "cookie", name: "cleatwork_session" } },
    },
  };
  return cached;
}

function pathsOf(table: Readonly<Record<string, Endpoint>>): Record<string, Record<string, object>> {
  const paths: Record<string, Record<string, object>> = {};
  for (const [name, row] of Object.entries(table)) {
    const path = row.path.replace(/:(\w+)/g, "{$1}");
    (paths[path] ??= {})[row.method] = operation(name, row);
  }
  return paths;
}

function operation(name: string, row: Endpoint): object {
  const parameters = [...row.path.matchAll(/:(\w+)/g)].map(([, parameter]) => ({
    name: parameter,
    in: "path",
    required: true,
    schema: { type: "string" },
  }));
  const headers = row.guards.map((guard) => ({
    name: guard === "if-match" ? "If-Match" : "Idempotency-Key",
    in: "header",
    required: true,
    schema: { type: "string" },
  }));
  const body = isNothing(row.body) ? null : schemaOf(row.body, "input");
  return {
    operationId: name,
    summary: row.summary,
    parameters: [...parameters, ...headers],
    ...(row.access.kind === "open" ? { security: [] } : { security: [{ session: [] }] }),
    ...(row.access.kind === "member" ? { "x-permission": row.access.permission } : {}),
    ...(body
      ? {
          requestBody: {
            required: true,
            content: { [row.takes === "file" ? "multipart/form-data" : "application/json"]: { schema: body } },
          },
        }
      : {}),
    responses: {
      [row.status]: {
        description: row.summary,
        ...(row.answers === "file"
          ? { content: { "application/octet-stream": {} } }
          : isNothing(row.response)
            ? {}
            : { content: { "application/json": { schema: schemaOf(row.response, "output") } } }),
      },
      default: {
        description: "A problem",
        content: { "application/problem+json": { schema: { $ref: "#/components/schemas/Problem" } } },
      },
    },
  };
}

const isNothing = (schema: z.ZodType) => schema.type === "undefined";
const schemaOf = (schema: z.ZodType, io: "input" | "output") => z.toJSONSchema(schema, { io, unrepresentable: "any" });
