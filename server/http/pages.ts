import { existsSync } from "node:fs";
import { join, resolve } from "node:path";
import express, { Router } from "express";
import { AppError } from "../errors.ts";

/** The built pages. Files with a hash in their name never change; every other address is the application itself. */
export function pages(folder: string): Router {
  const root = resolve(folder);
  const router = Router();
  router.use(
    "/assets",
    express.static(join(root, "assets"), { immutable: true, maxAge: "1y", fallthrough: false }),
  );
  router.use(express.static(root, { index: false, maxAge: "1h" }));
  router.get("/{*any}", (_request, response, next) => {
    const page = join(root, "index.html");
    if (!existsSync(page)) return next(new AppError("not_found", 404, "The pages have not been built."));
    response.set("cache-control", "no-cache").sendFile(page);
  });
  return router;
}
