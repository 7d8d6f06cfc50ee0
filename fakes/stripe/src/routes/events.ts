import { Router } from 'express';
import type { FakeContext } from '../context.js';
import { missing } from '../http/api-error.js';
import { endpoint } from '../http/endpoint.js';
import { createdWithin, LIST_PARAMS, page } from '../http/list.js';

export function eventRoutes(fake: FakeContext): Router {
  const router = Router();
  router.get(
    '/',
    endpoint(fake, ({ params }) => {
      const within = createdWithin(params.only(...LIST_PARAMS, 'type', 'types'));
      const type = params.text('type');
      const wanted = type ? [type] : params.texts('types');
      // A pattern such as charge.* is allowed, as in the public API.
      const matches = (name: string): boolean =>
        wanted.length === 0 ||
        wanted.some((one) => (one.endsWith('*') ? name.startsWith(one.slice(0, -1)) : one === name));
      return page(
        fake.store.events.newest((event) => within(event) && matches(event.type)),
        '/v1/events',
        params,
      );
    }),
  );
  router.get(
    '/:id',
    endpoint(fake, ({ path }) => {
      const event = fake.store.events.get(path('id'));
      if (!event) throw missing('event', path('id'));
      return event;
    }),
  );
  return router;
}
