/** The whole app without a port. Tests build it with their own clock and database. */
import { endpoints, makeId, type EndpointName } from "@cleatwork/contracts";
import express, { type Express } from "express";
import helmet from "helmet";
import { pinoHttp } from "pino-http";
import { clientHandlers } from "./features/clients/index.ts";
import { companyHandlers } from "./features/companies/index.ts";
import { fieldHandlers } from "./features/field/index.ts";
import { layoutHandlers } from "./features/layouts/index.ts";
import { peopleHandlers } from "./features/people/index.ts";
import { pricingHandlers } from "./features/pricing/index.ts";
import { projectHandlers } from "./features/projects/index.ts";
import { quoteHandlers } from "./features/quotes/index.ts";
import { specHandlers } from "./features/specs/index.ts";
import { standardsHandlers } from "./features/standards/index.ts";
import { takeoffHandlers } from "./features/takeoffs/index.ts";
import { sendProblems } from "./platform/http/errors.ts";
import { mount, type AnyHandler } from "./platform/http/mount.ts";
import { openApiDocument } from "./platform/http/openapi.ts";
import { checkOrigin } from "./platform/http/origin.ts";
import { problem } from "./platform/http/problem.ts";
import { redactPath } from "./platform/http/redact.ts";
import type { Deps } from "./platform/http/route.ts";
import { serveWeb } from "./platform/http/web.ts";
import { measureRequests, metricsHandler } from "./platform/metrics.ts";
import { createSessions } from "./platform/sessions/sessions.ts";

/** Every endpoint has a handler, or this does not compile. */
const handlers = {
  ...peopleHandlers,
  ...companyHandlers,
  ...clientHandlers,
  ...projectHandlers,
  ...specHandlers,
  ...standardsHandlers,
  ...takeoffHandlers,
  ...layoutHandlers,
  ...pricingHandlers,
  ...quoteHandlers,
  ...fieldHandlers,
} satisfies Record<EndpointName, AnyHandler>;

export function buildApp(deps: Deps): Express {
  const { config, log, db } = deps;
  const sessions = createSessions(db, { secureCookies: config.secureCookies });
  const app = express();
  app.disable("x-powered-by");
  app.set("trust proxy", config.trustedProxies);
  app.set("query parser", "simple");

  app.use(
    pinoHttp({
      logger: log,
      genReqId: () => makeId("req", { now: Date.now(), random: (bytes) => crypto.getRandomValues(bytes) }),
      quietReqLogger: true,
      customLogLevel: (_request, response, error) =>
        error || response.statusCode >= 500 ? "error" : response.statusCode >= 400 ? "warn" : "info",
      // No header, no body, no query: they hold cookies, links and what people typed.
      serializers: {
        req: (request: { id: string; method: string; url: string }) => ({
          id: request.id,
          method: request.method,
          path: redactPath(request.url),
        }),
        res: (response: { statusCode: number }) => ({ status: response.statusCode }),
      },
    }),
  );
  app.use(measureRequests);
  app.use(
    helmet({
      contentSecurityPolicy: {
        useDefaults: false,
        directives: {
          defaultSrc: ["'self'"],
          scriptSrc: ["'self'"],
          workerSrc: ["'self'", "blob:"],
          styleSrc: ["'self'"],
          styleSrcAttr: ["'unsafe-inline'"],
          imgSrc: ["'self'", "data:", "blob:"],
          fontSrc: ["'self'"],
          connectSrc: ["'self'"],
          frameSrc: ["'self'", "blob:"],
          objectSrc: ["'none'"],
          baseUri: ["'none'"],
          formAction: ["'self'"],
          frameAncestors: ["'none'"],
          ...(config.secureCookies ? { upgradeInsecureRequests: [] } : {}),
        },
      },
      strictTransportSecurity: config.secureCookies,
      referrerPolicy: { policy: "no-referrer" },
    }),
  );

  app.get("/healthz", (_request, response) => void response.json({ ok: true }));
  app.get("/readyz", async (_request, response) => {
    await db.ping();
    response.json({ ok: true });
  });
  app.get("/metrics", metricsHandler);

  app.use("/api", checkOrigin(config.publicUrl));
  app.use("/api", express.json({ limit: "20mb", strict: true }));
  app.get("/api/openapi.json", (_request, response) => void response.json(openApiDocument()));
  app.use("/api", mount(endpoints, handlers, deps, sessions));
  app.use("/api", (request, _response, next) => {
    next(problem("not-found", `There is no ${request.method} at this address.`));
  });

  if (config.webDist !== null) app.use(serveWeb(config.webDist));
  app.use((_request, _response, next) => next(problem("not-found", "There is nothing at this address.")));
  app.use(sendProblems(log));
  return app;
}
