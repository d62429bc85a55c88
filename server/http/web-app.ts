import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import express, { Router, type RequestHandler } from 'express';

const encodings = [
  ['br', '.br'],
  ['gzip', '.gz'],
] as const;

/** Files whose names change with their content. */
const isHashed = (file: string) => /^\/(_expo|assets)\//.test(file);

const cacheControl = (file: string) =>
  isHashed(file) ? 'public, max-age=31536000, immutable' : 'public, max-age=3600';

/** Sends the file made by the build in the caller's encoding, where there is one. */
const precompressed =
  (root: string): RequestHandler =>
  (request, response, next) => {
    const file = decodeURI(request.path);
    const inside = path.join(root, file);
    const wanted = encodings.find(
      ([name, extension]) =>
        request.acceptsEncodings(name) !== false && existsSync(inside + extension),
    );
    if (wanted && inside.startsWith(root + path.sep) && !file.endsWith('/')) {
      const [name, extension] = wanted;
      response.type(path.extname(file));
      response.setHeader('Content-Encoding', name);
      request.url = request.url.replace(request.path, request.path + extension);
    }
    next();
  };

/** The page every app address opens. */
export const readIndex = (root: string): string =>
  readFileSync(path.join(root, 'index.html'), 'utf8');

/** Serves the built app: its files, and its page at every address a browser opens. */
export function webApp(root: string, index: string): Router {
  const router = Router();
  const files = express.static(path.resolve(root), { index: false, cacheControl: false });
  router.use((request, response, next) => {
    if (path.extname(request.path) !== '' && request.path !== '/index.html') {
      response.setHeader('Cache-Control', cacheControl(request.path));
      response.vary('Accept-Encoding');
    }
    next();
  });
  router.use(precompressed(path.resolve(root)), files);
  router.get('/{*path}', (request, response, next) => {
    response.removeHeader('Cache-Control');
    const isPage = path.extname(request.path) === '' || request.path === '/index.html';
    if (!isPage || request.accepts(['json', 'html']) !== 'html') {
      next();
      return;
    }
    response.setHeader('Cache-Control', 'no-cache');
    response.type('html').send(index);
  });
  return router;
}
