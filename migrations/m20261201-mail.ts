import { Migration } from '@mikro-orm/migrations';

const statements = [
  `create table mail (
    id uuid not null,
    kind varchar(40) not null,
    to_address varchar(254) not null,
    subject varchar(300) not null,
    text text not null,
    html text not null,
    dedupe_key varchar(200) not null,
    status text check (status in ('queued', 'sending', 'sent', 'failed')) not null,
    attempts int not null default 0,
    heartbeat_at timestamptz null,
    created_at timestamptz not null default now(),
    sent_at timestamptz null,
    constraint mail_pkey primary key (id),
    constraint mail_dedupe_key_unique unique (dedupe_key)
  )`,
  `create index mail_by_time on mail (created_at, id)`,
  `create table account_link (
    id uuid not null,
    person_id uuid not null,
    purpose text check (purpose in ('verify', 'reset')) not null,
    email varchar(254) not null,
    secret_sha256 varchar(64) not null,
    created_at timestamptz not null default now(),
    expires_at timestamptz not null,
    used_at timestamptz null,
    constraint account_link_pkey primary key (id),
    constraint account_link_secret_sha256_unique unique (secret_sha256),
    constraint account_link_person_id_foreign foreign key (person_id) references person (id) on update cascade on delete cascade
  )`,
  `create index account_link_person_id_index on account_link (person_id)`,
  `alter table person add column email_verified_at timestamptz null`,
];

export class MailTables extends Migration {
  override up(): void {
    for (const statement of statements) this.addSql(statement);
  }
}
