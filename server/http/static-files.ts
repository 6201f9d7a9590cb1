import { statSync } from 'node:fs';
import path from 'node:path';

import express, {
  type ErrorRequestHandler,
  type Request,
  type RequestHandler,
  type Response,
  type Router,
} from 'express';

const YEAR_MS = 365 * 24 * 3600 * 1000;
const ENCODINGS = { br: '.br', gzip: '.gz' } as const;

/**
 * Serves the built web app. Files with a hash in their name are kept by browsers for a year and a missing one is a
 * 404, never a page; other files are asked for again each time; every other address gets the one page of the app.
 *
 * @param webRoot - absolute path of the folder that the build wrote
 */
export function staticFiles(webRoot: string): Router {
  const router = express.Router();
  router.use(compressedTwin(webRoot));
  for (const folder of ['/_expo', '/assets']) {
    router.use(
      folder,
      express.static(path.join(webRoot, folder), {
        immutable: true,
        maxAge: YEAR_MS,
        fallthrough: false,
        index: false,
        redirect: false,
      }),
    );
  }
  router.use(express.static(webRoot, { index: false, redirect: false, setHeaders: askAgain }));
  router.get('/{*rest}', appPage(webRoot));
  router.use(noSuchFile, missingFile);
  return router;
}

const noSuchFile: RequestHandler = (_req, res) => {
  res.status(404).type('text').send('There is no such file.\n');
};

/** A missing file with a hash in its name comes as an error, which Express would log with its stack each time. */
const missingFile: ErrorRequestHandler = (error: { status?: number }, req, res, next) => {
  if (error.status === 404 && !res.headersSent) noSuchFile(req, res, next);
  else next(error);
};

function askAgain(res: Response): void {
  res.setHeader('Cache-Control', 'no-cache');
}

/** The build leaves `name.br` and `name.gz` beside large text files; this sends the one the browser can read. */
function compressedTwin(webRoot: string): RequestHandler {
  return (req, res, next) => {
    if (req.method !== 'GET' && req.method !== 'HEAD') return next();
    // Browsers name gzip first without preferring it, so each is asked for by itself, the smaller one before.
    const encoding = (['br', 'gzip'] as const).find((name) => req.acceptsEncodings(name));
    if (!encoding) return next();

    const twin = req.path + ENCODINGS[encoding];
    if (req.path.endsWith('/') || !isFile(webRoot, twin)) return next();

    res.type(path.extname(req.path));
    res.vary('Accept-Encoding');
    res.set('Content-Encoding', encoding);
    req.url = twin;
    next();
  };
}

function isFile(webRoot: string, urlPath: string): boolean {
  // The names made by the build hold only these; anything else, such as an escape or a step upwards, has no twin.
  if (!/^[\w/.@~()-]+$/.test(urlPath) || urlPath.includes('..')) return false;
  return statSync(path.join(webRoot, urlPath), { throwIfNoEntry: false })?.isFile() ?? false;
}

function appPage(webRoot: string): RequestHandler {
  return (req, res, next) => {
    // A name with a dot is a file that is not there: answering with a page would hide that.
    if (/\.[^/]*$/.test(req.path)) return next();
    // What a customer's link shows must not stay in a shared phone's cache.
    res.set('Cache-Control', isCustomerPage(req) ? 'no-store' : 'no-cache');
    res.sendFile('index.html', { root: webRoot, cacheControl: false }, (error) => {
      if (error && !res.headersSent)
        res.status(503).type('text').send('The web app is not built yet: run npm start.\n');
    });
  };
}

function isCustomerPage(req: Request): boolean {
  return req.path.startsWith('/view/');
}
