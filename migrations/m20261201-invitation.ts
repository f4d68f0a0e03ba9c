import { Migration } from '@mikro-orm/migrations';

const statements = [
  `create table invitation (
    id uuid not null,
    group_id uuid not null,
    email varchar(254) not null,
    role text check (role in ('pi', 'researcher', 'student')) not null,
    secret_sha256 varchar(64) not null,
    invited_by_id uuid not null,
    created_at timestamptz not null default now(),
    expires_at timestamptz not null,
    accepted_at timestamptz null,
    revoked_at timestamptz null,
    constraint invitation_pkey primary key (id),
    constraint invitation_secret_sha256_unique unique (secret_sha256),
    constraint invitation_email_lower_case check (email = lower(email)),
    constraint invitation_group_id_foreign foreign key (group_id) references research_group (id) on update cascade on delete cascade,
    constraint invitation_invited_by_id_foreign foreign key (invited_by_id) references person (id) on update cascade
  )`,
  `create unique index invitation_open_once on invitation (group_id, email) where accepted_at is null and revoked_at is null`,
];

export class InvitationTable extends Migration {
  override up(): void {
    for (const statement of statements) this.addSql(statement);
  }
}
