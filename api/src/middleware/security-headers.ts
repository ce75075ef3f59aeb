import type { RequestHandler } from "express";
import helmet from "helmet";

/**
 * What a page may load and do: scripts and workers only from here and never inline. Inline styles are for the plots,
 * `data:` images for heat maps, `blob:` images for saving a plot as a picture.
 */
const policy = {
  "default-src": ["'none'"],
  "script-src": ["'self'"],
  "worker-src": ["'self'"],
  "connect-src": ["'self'"],
  "font-src": ["'self'"],
  "img-src": ["'self'", "data:", "blob:"],
  "style-src": ["'self'", "'unsafe-inline'"],
  "manifest-src": ["'self'"],
  "base-uri": ["'none'"],
  "form-action": ["'self'"],
  "frame-ancestors": ["'none'"],
};

export const securityHeaders: RequestHandler[] = [
  helmet({
    contentSecurityPolicy: { useDefaults: false, directives: policy },
    strictTransportSecurity: { includeSubDomains: false },
    xFrameOptions: { action: "deny" },
    referrerPolicy: { policy: "no-referrer" },
  }),
  (_request, response, next) => {
    response.set("Permissions-Policy", "camera=(), geolocation=(), microphone=(), payment=(), usb=()");
    next();
  },
];
