import type { MigrationObject } from '@mikro-orm/core';

export const migrations: MigrationObject[] = [];
