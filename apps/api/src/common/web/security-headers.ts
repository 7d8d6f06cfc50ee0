import type { NextFunction, Request, RequestHandler, Response } from 'express';
import helmet from 'helmet';

import type { Config } from '../../config/config.js';
import { nothingPolicy } from './content-security-policy.js';

/** Headers of every answer. Pages of the web app replace the policy by their own. */
export function securityHeaders(config: Config): RequestHandler[] {
  return [
    helmet({
      contentSecurityPolicy: false,
      // Only where the public address is https: on plain loopback it would lock the browser out.
      strictTransportSecurity: config.https ? { maxAge: 31_536_000, includeSubDomains: true } : false,
      referrerPolicy: { policy: 'same-origin' },
      crossOriginOpenerPolicy: { policy: 'same-origin' },
      crossOriginResourcePolicy: { policy: 'same-origin' },
      xFrameOptions: { action: 'deny' },
    }),
    (request: Request, response: Response, next: NextFunction) => {
      response.setHeader('Content-Security-Policy', nothingPolicy);
      if (request.path.startsWith('/api/')) response.setHeader('Cache-Control', 'no-store');
      next();
    },
  ];
}
