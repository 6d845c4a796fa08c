import express, { type Request, type RequestHandler, type Response } from 'express';
import { extname } from 'node:path';
import { allowInlineStyles } from './security';
import { readWebFiles, type WebPage } from './web-files';

export interface WebApp {
  /** Answers every GET and HEAD: a page, a file or the not-found page. Mount it last. */
  router: express.Router;
  /** What the content security policy has to let through besides our own files. */
  inlineScriptHashes: string[];
}

// Metro puts a hash of the content into these names, so a copy never grows stale.
const hashedName = /-[0-9a-f]{32}\.\w+$|\.[0-9a-f]{32}(@\dx)?\.\w+$/;
const forever = 'public, max-age=31536000, immutable';
const suffixes = { br: '.br', gzip: '.gz' } as const;

/**
 * Serves the exported web app in `distDir` with the compressed forms that stand beside its files.
 * @throws when the folder holds no export
 */
export function serveWebApp(distDir: string): WebApp {
  const files = readWebFiles(distDir);

  const send = (request: Request, response: Response, path: string, cacheControl: string) => {
    response.setHeader('Cache-Control', cacheControl);
    response.type(extname(path));
    const offered = files.encodings.get(path) ?? [];
    const encoding = offered.find((candidate) => request.acceptsEncodings(candidate) === candidate);
    if (offered.length > 0) response.vary('Accept-Encoding');
    if (encoding !== undefined) response.setHeader('Content-Encoding', encoding);
    // Only names from the list made at start come here, so nothing outside the folder can be asked for.
    response.sendFile(path.slice(1) + (encoding === undefined ? '' : suffixes[encoding]), {
      root: distDir, cacheControl: false, acceptRanges: false, dotfiles: 'deny',
    });
  };

  const sendPage = (request: Request, response: Response, page: WebPage) => {
    allowInlineStyles(response, page.inlineStyleHashes);
    send(request, response, `/${page.file}`, 'no-cache');
  };

  const answer: RequestHandler = (request, response, next) => {
    if (request.method !== 'GET' && request.method !== 'HEAD') return next();
    const path = decodePath(request.path);
    if (path !== null && files.assets.has(path)) {
      return send(request, response, path, hashedName.test(path) ? forever : 'no-cache');
    }
    const page = path === null ? undefined : files.pages.find((candidate) => candidate.pattern.test(path));
    if (page !== undefined) return sendPage(request, response, page);
    const bare = path?.replace(/(?<=.)\/+$/, '');
    if (bare !== undefined && bare !== path && !bare.startsWith('//') && files.pages.some((candidate) => candidate.pattern.test(bare))) {
      const query = request.originalUrl.indexOf('?');
      return response.redirect(308, encodeURI(bare) + (query < 0 ? '' : request.originalUrl.slice(query)));
    }
    response.status(404);
    return sendPage(request, response, files.notFound);
  };

  const router = express.Router();
  router.use(answer);
  return { router, inlineScriptHashes: files.inlineScriptHashes };
}

function decodePath(path: string): string | null {
  try {
    return decodeURIComponent(path);
  } catch {
    return null;
  }
}
