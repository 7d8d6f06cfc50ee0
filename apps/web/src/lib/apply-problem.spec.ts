import { expect, it, vi } from 'vitest';
import { ApiProblem } from './api-problem';
import { applyProblem, fieldOfPointer } from './apply-problem';

const fields = ['email', 'contact.town'] as const;

function applied(error: unknown, describe?: (error: unknown) => string | undefined) {
  const setError = vi.fn();
  applyProblem<{ email: string; contact: { town: string } }>(error, setError, {
    fields,
    otherwise: 'email',
    describe,
  });
  return setError.mock.calls.map(([name, { message }]) => [name, message] as unknown[]);
}

it.each([
  ['/email', 'email'],
  ['/contact/town', 'contact.town'],
  ['/lines/0/quantity', 'lines.0.quantity'],
  ['/a~1b/c~0d', 'a/b.c~d'],
])('reads the pointer %s as the field %s', (pointer, field) => expect(fieldOfPointer(pointer)).toBe(field));

it('brings each fault to its field, and what belongs to none to the one named for it', () => {
  const problem = new ApiProblem({
    status: 400,
    errors: [
      { pointer: '/contact/town', detail: 'Enter a town' },
      { pointer: '/unknown', detail: 'Too late' },
    ],
  });
  expect(applied(problem)).toEqual([
    ['contact.town', 'Enter a town'],
    ['email', 'Too late'],
  ]);
});

it('says something when no field is named, and when it is no answer of the API', () => {
  expect(applied(new ApiProblem({ status: 409, detail: 'Somebody was quicker' }))).toEqual([
    ['email', 'Somebody was quicker'],
  ]);
  expect(applied(new TypeError('broken'))).toEqual([['email', 'That did not work; try again.']]);
});

it('lets the form say it better', () => {
  const problem = new ApiProblem({ status: 401, errors: [{ pointer: '/email', detail: 'no' }] });
  expect(applied(problem, () => 'No such account')).toEqual([['email', 'No such account']]);
});
