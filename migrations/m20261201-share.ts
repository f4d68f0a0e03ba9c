import { Migration } from '@mikro-orm/migrations';

const statements = [
  `create table share (
    id uuid not null,
    run_id uuid not null,
    created_by_id uuid not null,
    secret_sha256 varchar(64) not null,
    passphrase_hash text null,
    may_download boolean not null,
    views int not null default 0,
    created_at timestamptz not null default now(),
    expires_at timestamptz not null,
    revoked_at timestamptz null,
    constraint share_pkey primary key (id),
    constraint share_secret_sha256_unique unique (secret_sha256),
    constraint share_run_id_foreign foreign key (run_id) references run (id) on update cascade on delete cascade,
    constraint share_created_by_id_foreign foreign key (created_by_id) references person (id) on update cascade
  )`,
  `create index share_run_id_index on share (run_id)`,
];

export class ShareTable extends Migration {
  override up(): void {
    for (const statement of statements) this.addSql(statement);
  }
}
