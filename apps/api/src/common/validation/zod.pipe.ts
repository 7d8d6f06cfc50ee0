import { Injectable, type ArgumentMetadata, type PipeTransform } from '@nestjs/common';
import type { z } from 'zod';

import { CommonException, type FieldProblem } from '../problems/problem.exception.js';

const escapePointer = (part: PropertyKey): string => String(part).replace(/~/g, '~0').replace(/\//g, '~1');

/** The faults zod found, as RFC 6901 pointers below `base`. */
export function toFieldProblems(issues: readonly z.core.$ZodIssue[], base = ''): FieldProblem[] {
  return issues.flatMap((issue) => {
    // An unknown key is reported at the key itself, so that the page knows which one.
    const paths =
      issue.code === 'unrecognized_keys' ? issue.keys.map((key) => [...issue.path, key]) : [issue.path];
    return paths.map((path) => ({
      pointer: [base, ...path.map(escapePointer)].join('/'),
      detail: issue.code === 'unrecognized_keys' ? 'This is not asked for' : issue.message,
    }));
  });
}

/** Checks one part of the request against a contract; also where the OpenAPI document reads the contract from. */
@Injectable()
export class ZodPipe<Schema extends z.ZodType> implements PipeTransform<unknown, z.output<Schema>> {
  constructor(readonly schema: Schema) {}

  transform(value: unknown, metadata: ArgumentMetadata): z.output<Schema> {
    const parsed = this.schema.safeParse(value ?? (metadata.type === 'body' ? {} : value));
    if (parsed.success) return parsed.data;
    // A path that cannot exist is the same as one that does not.
    if (metadata.type === 'param') throw new CommonException('not-found');
    throw new CommonException('invalid', {
      errors: toFieldProblems(parsed.error.issues, metadata.type === 'query' ? 'query' : ''),
    });
  }
}

/** `@Body(zod(signInBody)) body: SignInBody`, `@Query(zod(matchesQuery))`, `@Param('id', zod(uuid))`. */
export function zod<Schema extends z.ZodType>(schema: Schema): ZodPipe<Schema> {
  return new ZodPipe(schema);
}
