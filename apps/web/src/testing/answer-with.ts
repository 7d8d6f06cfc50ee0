import { vi } from 'vitest';

/**
 * Answers the API's GET requests by path, without its query; everything else is a 404.
 * @returns the requests that came, with their queries
 */
export function answerWith(answers: Record<string, unknown>): string[] {
  const asked: string[] = [];
  vi.stubGlobal('fetch', (input: string) => {
    asked.push(input);
    const path = input.replace(/^\/api/, '').replace(/\?.*$/, '');
    return Promise.resolve(
      path in answers
        ? Response.json(answers[path])
        : Response.json({ type: 'about:blank', title: 'Nothing here', status: 404 }, { status: 404 }),
    );
  });
  return asked;
}
