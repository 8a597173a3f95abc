import express, { Router } from "express";
import { join } from "node:path";

/** The built web: hashed files for a year, the page itself always asked for again, every unknown address to the page. */
export function serveWeb(folder: string): Router {
  const router = Router();
  router.use(
    "/assets",
    express.static(join(folder, "assets"), { immutable: true, maxAge: "365d", fallthrough: true, index: false }),
  );
  router.use("/assets", (_request, response) => void response.status(404).type("text/plain").send("not found"));
  router.use(
    express.static(folder, {
      index: false,
      setHeaders: (response) => void response.setHeader("cache-control", "no-cache"),
    }),
  );
  router.get("/{*path}", (_request, response) => {
    response.set("cache-control", "no-cache").sendFile(join(folder, "index.html"));
  });
  return router;
}
