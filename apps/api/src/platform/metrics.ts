import type { RequestHandler } from "express";
import { collectDefaultMetrics, Histogram, Registry } from "prom-client";

const registry = new Registry();
collectDefaultMetrics({ register: registry });
const duration = new Histogram({
  name: "http_request_duration_seconds",
  help: "Time from request to answer",
  labelNames: ["method", "status"],
  registers: [registry],
});

export const measureRequests: RequestHandler = (request, response, next) => {
  const end = duration.startTimer({ method: request.method });
  response.once("finish", () => end({ status: String(response.statusCode) }));
  next();
};

export const metricsHandler: RequestHandler = async (_request, response) => {
  response.type(registry.contentType).send(await registry.metrics());
};
