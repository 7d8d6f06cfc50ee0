import { existsSync, readFileSync } from 'node:fs';
import { join, normalize, resolve, sep } from 'node:path';

import type { NextFunction, Request, RequestHandler, Response } from 'express';
import express from 'express';

import { pagePolicy } from './content-security-policy.js';

interface Page {
  html: string;
  policy: string;
}

/** Addresses that are never a page. */
const serverSide = /^\/(api|health|metrics|assets)(\/|$)/;

/** The built pages of one folder: the prerendered file of an address where there is one, else the empty page. */
class Pages {
  private readonly known = new Map<string, Page>();

  /** Without content of its own: the front page is written out in index.html, and is not what other addresses show. */
  private readonly empty: string;

  constructor(private readonly root: string) {
    const bare = join(root, 'app.html');
    this.empty = existsSync(bare) ? bare : join(root, 'index.html');
  }

  at(path: string): Page {
    const file = this.prerendered(path) ?? this.empty;
    let page = this.known.get(file);
    if (!page) {
      const html = readFileSync(file, 'utf8');
      page = { html, policy: pagePolicy(html) };
      this.known.set(file, page);
    }
    return page;
  }

  private prerendered(path: string): string | null {
    let plain: string;
    try {
      plain = decodeURIComponent(path);
    } catch {
      return null;
    }
    const file = normalize(join(this.root, plain, 'index.html'));
    return file.startsWith(this.root + sep) && existsSync(file) ? file : null;
  }
}

/**
 * Serves the built web app: files as they are (hashed ones for ever), and its page for every other address,
 * where the router in the browser takes over.
 */
export function webApp(folder: string): RequestHandler[] {
  const root = resolve(folder);
  const pages = new Pages(root);
  const files = express.static(root, {
    index: false,
    redirect: false,
    dotfiles: 'ignore',
    setHeaders: (response, path) => {
      const hashed = path.startsWith(join(root, 'assets') + sep);
      response.setHeader('Cache-Control', hashed ? 'public, max-age=31536000, immutable' : 'no-cache');
    },
  });
  const page = (request: Request, response: Response, next: NextFunction): void => {
    const readOnly = request.method === 'GET' || request.method === 'HEAD';
    if (!readOnly || serverSide.test(request.path)) return next();
    const { html, policy } = pages.at(request.path);
    response.set({ 'Content-Security-Policy': policy, 'Cache-Control': 'no-cache' });
    response.type('html').send(html);
  };
  return [
    (request, response, next) => {
      // The page itself goes out below with its own policy, not as a bare file.
      if (serverSide.test(request.path) && !request.path.startsWith('/assets/')) return next();
      if (request.path.endsWith('.html')) return page(request, response, next);
      files(request, response, next);
    },
    page,
  ];
}
