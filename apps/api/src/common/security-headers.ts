import helmet from 'helmet';
import type { RequestHandler } from 'express';

/** Hash of the empty string: production builds of the style engine fill empty style elements through CSSOM. */
const emptyStyle = "'sha256-47DEQpj8HBSa+/TImW+5JCeuQeRkm5NMpJWZG3hSuFU='";

/** Headers of every answer. Scripts and styles come from our own files only; nothing inline, no eval, no frames. */
export function securityHeaders(): RequestHandler[] {
  const policy = helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        'default-src': ["'none'"],
        'script-src': ["'self'"],
        'style-src': ["'self'", emptyStyle],
        'img-src': ["'self'", 'blob:', 'data:'],
        'font-src': ["'self'"],
        'connect-src': ["'self'"],
        'manifest-src': ["'self'"],
        'worker-src': ["'self'"],
        'base-uri': ["'none'"],
        'form-action': ["'self'"],
        'frame-ancestors': ["'none'"],
        'object-src': ["'none'"],
        'require-trusted-types-for': ["'script'"],
        'trusted-types': ['rimeward'],
      },
    },
    strictTransportSecurity: { maxAge: 63_072_000, includeSubDomains: true },
    referrerPolicy: { policy: 'no-referrer' },
    frameguard: { action: 'deny' },
    crossOriginEmbedderPolicy: false,
  });
  const ownHeaders: RequestHandler = (request, response, next) => {
    // Answers of the API belong to one person; a route that may be kept says so itself.
    if (request.path.startsWith('/api/')) response.setHeader('Cache-Control', 'no-store');
    response.setHeader(
      'Permissions-Policy',
      'camera=(self), geolocation=(self), microphone=(), payment=(), usb=()',
    );
    next();
  };
  return [policy, ownHeaders];
}
