import { existsSync, readFileSync } from 'node:fs';
import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { extname, join, normalize, resolve } from 'node:path';

const dist = resolve(import.meta.dirname, '../../dist');
const types: Record<string, string> = {
  '.js': 'text/javascript',
  '.css': 'text/css',
  '.svg': 'image/svg+xml',
  '.woff2': 'font/woff2',
};

/** Without the hashes of inline styles: pages must run their scripts, and only theirs, under this. */
const policy = `default-src 'none'; script-src 'self'; style-src 'self' 'unsafe-inline'; font-src 'self'; img-src 'self' data:; connect-src 'self'; base-uri 'none'; object-src 'none'`;

/** Serves the built pages alone, with no API behind them: what is written must stand by itself. */
export async function serveWrittenPages(): Promise<{ url: string; server: Server }> {
  const server = createServer((request, response) => {
    const { pathname } = new URL(request.url ?? '/', 'http://localhost');
    const file = join(dist, normalize(pathname));
    if (extname(pathname) && existsSync(file)) {
      response.setHeader('Content-Type', types[extname(pathname)] ?? 'text/plain');
      response.end(readFileSync(file));
      return;
    }
    const page = join(file, 'index.html');
    response.setHeader('Content-Type', 'text/html; charset=utf-8');
    response.setHeader('Content-Security-Policy', policy);
    // Any other address gets the front page's file, as a careless server would do it.
    response.end(readFileSync(existsSync(page) ? page : join(dist, 'index.html')));
  });
  await new Promise<void>((listening) => server.listen(0, '127.0.0.1', listening));
  return { url: `http://127.0.0.1:${(server.address() as AddressInfo).port}`, server };
}
