import type { MigrationObject } from '@mikro-orm/core';
import { House } from './m20261201-house';

/** In order; a migration that was released is never changed. */
export const migrations: MigrationObject[] = [{ name: 'm20261201-house', class: House }];
