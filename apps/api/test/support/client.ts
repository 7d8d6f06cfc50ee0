import type { Server } from 'node:http';

import supertest from 'supertest';

/** A browser of its own: keeps cookies, and sends what our pages send with every request. */
export type Client = ReturnType<typeof createClient>;

export function createClient(server: Server) {
  return supertest.agent(server).set('X-Linkfell-Csrf', '1').set('Sec-Fetch-Site', 'same-origin');
}
