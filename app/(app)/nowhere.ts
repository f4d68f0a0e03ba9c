import { notFound } from 'next/navigation';
import { z } from 'zod';
import { Refusal } from '@/src/errors';
import { orNotFound } from '@/src/web/page';

/** An address that was mistyped or cut short leads nowhere; that is no fault of ours. */
export function idOrNowhere(id: string): string {
  return z.uuid().safeParse(id).success ? id : notFound();
}

/** The same for what only the database can tell, such as a place in a list that is none. */
export async function orNowhere<T>(promise: Promise<T>): Promise<T> {
  try {
    return await orNotFound(promise);
  } catch (error) {
    if (error instanceof Refusal && error.kind === 'invalid') notFound();
    throw error;
  }
}

/** A parameter that is given twice counts once. */
export const onlyOne = (given: string | string[] | undefined): string | undefined =>
  Array.isArray(given) ? given[0] : given;
