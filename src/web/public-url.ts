import { env } from '@/src/env';

/** An address that works from outside, such as in an e-mail. */
export const publicUrl = (path: string): string => new URL(path, env().PUBLIC_URL).href;
