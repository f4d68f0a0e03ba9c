import { p } from '@mikro-orm/core';
import { randomUUID } from 'node:crypto';

/** Random, so that knowing one id says nothing of another. */
export const id = () =>
  p
    .uuid()
    .primary()
    .onCreate(() => randomUUID());

export const createdAt = () =>
  p
    .datetime()
    .onCreate(() => new Date())
    .defaultRaw('now()');

export const moment = () => p.datetime();

/** A number in PostgreSQL's float8: numeric would come back as a string. */
export const real = () => p.float().columnType('double precision');
