import { join, sep } from "node:path";
import express, { type RequestHandler, Router } from "express";

/** The built pages: files as they are, and the one page for every other address. */
export function pages(webRoot: string): Router {
  const router = Router();
  router.use(express.static(webRoot, { index: false, setHeaders: (response, path) => response.set(cachingOf(path)) }));
  router.get("/{*path}", servePage(join(webRoot, "index.html")));
  return router;
}

/** Names of built assets carry a hash of their content: what is once fetched stays right for ever. */
function cachingOf(path: string) {
  const isHashed = path.includes(`${sep}assets${sep}`);
  return { "Cache-Control": isHashed ? "public, max-age=31536000, immutable" : "no-cache" };
}

function servePage(file: string): RequestHandler {
  return (request, response, next) => {
    if (request.path.startsWith("/assets/")) return next();
    response.set("Cache-Control", "no-cache").sendFile(file, { cacheControl: false }, (error) => error && next(error));
  };
}
