import { Body, Param, Query, type PipeTransform } from '@nestjs/common';
import type { z } from 'zod';
import { ProblemException } from './problem.exception';

/** Checks a value against its schema; what does not fit is named field by field. */
export class ZodPipe<T extends z.ZodType> implements PipeTransform<unknown, z.infer<T>> {
  constructor(private readonly schema: T) {}

  transform(value: unknown): z.infer<T> {
    const read = this.schema.safeParse(value);
    if (read.success) return read.data;
    const fields = read.error.issues.slice(0, 40).map((issue) => ({
      path: issue.path.map(String).join('.'),
      fault: faultOf(issue),
    }));
    throw new ProblemException('validation-failed', { fields });
  }
}

function faultOf(issue: z.core.$ZodIssue): string {
  if (issue.code === 'too_big') return 'too-long';
  if (issue.code === 'too_small') return 'too-short';
  if (issue.code === 'invalid_type' && issue.input === undefined) return 'required';
  return 'invalid';
}

/** `@ZodBody(schema)`: the request's body, checked. */
export const ZodBody = (schema: z.ZodType): ParameterDecorator => Body(new ZodPipe(schema));

/** `@ZodQuery(schema)`: the query of the address, checked. */
export const ZodQuery = (schema: z.ZodType): ParameterDecorator => Query(new ZodPipe(schema));

/** `@ZodParam('id', schema)`: a part of the path, checked; a malformed one is a resource that does not exist. */
export const ZodParam = (name: string, schema: z.ZodType): ParameterDecorator =>
  Param(name, new MissingPipe(schema));

class MissingPipe<T extends z.ZodType> implements PipeTransform<unknown, z.infer<T>> {
  constructor(private readonly schema: T) {}

  transform(value: unknown): z.infer<T> {
    const read = this.schema.safeParse(value);
    if (!read.success) throw new ProblemException('not-found');
    return read.data;
  }
}
