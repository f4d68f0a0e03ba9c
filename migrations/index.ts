import type { MigrationObject } from '@mikro-orm/core';
import { ChangeRecordTable } from './m20261201-change-record';
import { MailTables } from './m20261201-mail';
import { ShareTable } from './m20261201-share';
import { House } from './m20261201-house';
import { InvitationTable } from './m20261201-invitation';

/** In order; a migration that was released is never changed. */
export const migrations: MigrationObject[] = [
  { name: 'm20261201-house', class: House },
  { name: 'm20261201a-change-record', class: ChangeRecordTable },
  { name: 'm20261201b-invitation', class: InvitationTable },
  { name: 'm20261201c-mail', class: MailTables },
  { name: 'm20261201d-share', class: ShareTable },
];
