import type { Result } from '@rimeward/units';

/** A result made from another where there is one; the first failure otherwise. */
export const follow = <A, B>(first: Result<A>, next: (value: A) => Result<B>): Result<B> =>
  first.ok ? next(first.value) : first;

/** A result made from two. */
export const both = <A, B, C>(
  first: Result<A>,
  second: Result<B>,
  next: (a: A, b: B) => Result<C>,
): Result<C> => {
  if (!first.ok) return first;
  return second.ok ? next(first.value, second.value) : second;
};
