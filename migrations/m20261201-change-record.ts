import { Migration } from '@mikro-orm/migrations';

const statements = [
  `create table change_record (
    id uuid not null,
    group_id uuid null,
    person_id uuid null,
    person_name varchar(200) not null,
    action varchar(60) not null,
    target_kind varchar(40) not null,
    target_id varchar(64) not null,
    target_name varchar(300) not null default '',
    before jsonb null,
    after jsonb null,
    created_at timestamptz not null default now(),
    constraint change_record_pkey primary key (id)
  )`,
  `create index change_record_of_group on change_record (group_id, created_at, id)`,
  `create index change_record_by_time on change_record (created_at, id)`,
  `create function refuse_rewriting_history() returns trigger language plpgsql as $$
  begin
    raise exception 'the record of changes is append-only';
  end $$`,
  `create trigger change_record_is_append_only before update or delete or truncate on change_record
    for each statement execute function refuse_rewriting_history()`,
];

export class ChangeRecordTable extends Migration {
  override up(): void {
    for (const statement of statements) this.addSql(statement);
  }
}
