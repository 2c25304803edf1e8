import type { RequestHandler, Response } from 'express';
import { existsSync, readdirSync, statSync } from 'node:fs';
import { extname, join, relative, resolve, sep } from 'node:path';

const types: Record<string, string> = {
  '.html': 'text/html; charset=utf-8',
  '.js': 'text/javascript; charset=utf-8',
  '.css': 'text/css; charset=utf-8',
  '.svg': 'image/svg+xml',
  '.png': 'image/png',
  '.woff2': 'font/woff2',
  '.woff': 'font/woff',
  '.webmanifest': 'application/manifest+json',
  '.json': 'application/json',
  '.txt': 'text/plain; charset=utf-8',
};
const encodings = [
  ['br', '.br'],
  ['gzip', '.gz'],
] as const;

/**
 * Serves the built web application: only files that were there at start, compressed beforehand, hashed names for ever, the
 * rest asked for anew each time. Any other address outside /api opens the application.
 */
export function webFiles(directory: string): RequestHandler {
  const root = resolve(directory);
  const files = new Set(listed(root));
  return (request, response, next) => {
    if (request.method !== 'GET' && request.method !== 'HEAD') return next();
    const path = pathOf(request.path);
    if (path === null || path.startsWith('api/') || path === 'api') return next();
    const file = files.has(path) && types[extname(path)] ? path : extname(path) === '' ? 'index.html' : null;
    if (file === null || !files.has(file)) return next();
    send(response, root, file, request.headers['accept-encoding'] ?? '', files);
  };
}

function send(
  response: Response,
  root: string,
  file: string,
  accepted: string,
  files: ReadonlySet<string>,
): void {
  const immutable = file.startsWith('assets/');
  response.setHeader('Cache-Control', immutable ? 'public, max-age=31536000, immutable' : 'no-cache');
  response.setHeader('Vary', 'Accept-Encoding');
  response.setHeader('Content-Type', types[extname(file)] ?? 'application/octet-stream');
  const [encoding, suffix] = encodings.find(
    ([name, end]) => accepted.includes(name) && files.has(file + end),
  ) ?? ['', ''];
  if (encoding) response.setHeader('Content-Encoding', encoding);
  const path = join(root, file + suffix);
  response.setHeader('ETag', tagOf(path));
  response.sendFile(path, { cacheControl: false, dotfiles: 'deny' });
}

/** The framework's own tags are switched off, since the API's answers are nobody's to keep. */
function tagOf(path: string): string {
  const { size, mtimeMs } = statSync(path, { throwIfNoEntry: false }) ?? { size: 0, mtimeMs: 0 };
  return `W/"${size.toString(16)}-${Math.round(mtimeMs).toString(16)}"`;
}

function pathOf(path: string): string | null {
  try {
    const decoded = decodeURIComponent(path).replace(/^\/+/, '');
    return decoded.includes('..') || decoded.includes('\0') ? null : decoded;
  } catch {
    return null;
  }
}

function listed(root: string): string[] {
  if (!existsSync(root)) return [];
  return readdirSync(root, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) => relative(root, join(entry.parentPath, entry.name)).split(sep).join('/'));
}
