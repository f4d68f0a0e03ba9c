import { Migration } from '@mikro-orm/migrations';

const statements = [
  `create table curve (
    key varchar(64) not null,
    engine_version varchar(20) not null,
    encoded bytea not null,
    relative_error_bound double precision not null,
    share_outside_valid_range double precision not null,
    created_at timestamptz not null default now(),
    constraint curve_pkey primary key (key)
  )`,
  `create table person (
    id uuid not null,
    email varchar(254) not null,
    name varchar(200) not null,
    password_hash text not null,
    platform_role text check (platform_role in ('member', 'admin')) not null default 'member',
    created_at timestamptz not null default now(),
    disabled_at timestamptz null,
    constraint person_pkey primary key (id),
    constraint person_email_lower_case check (email = lower(email))
  )`,
  `alter table person add constraint person_email_unique unique (email)`,
  `create table research_group (
    id uuid not null,
    name varchar(200) not null,
    created_at timestamptz not null default now(),
    constraint research_group_pkey primary key (id)
  )`,
  `create table personal_token (
    id uuid not null,
    person_id uuid not null,
    group_id uuid not null,
    name varchar(100) not null,
    secret_sha256 varchar(64) not null,
    last_four varchar(4) not null,
    scopes text[] not null,
    created_at timestamptz not null default now(),
    expires_at timestamptz not null,
    last_used_at timestamptz null,
    revoked_at timestamptz null,
    constraint personal_token_pkey primary key (id)
  )`,
  `create index personal_token_person_id_index on personal_token (person_id)`,
  `alter table personal_token add constraint personal_token_secret_sha256_unique unique (secret_sha256)`,
  `create table membership (
    id uuid not null,
    person_id uuid not null,
    group_id uuid not null,
    role text check (role in ('pi', 'researcher', 'student')) not null,
    created_at timestamptz not null default now(),
    constraint membership_pkey primary key (id)
  )`,
  `alter table membership add constraint membership_person_group unique (person_id, group_id)`,
  `create table material (
    id uuid not null,
    slug varchar(64) not null,
    aliases text[] not null,
    group_id uuid null,
    created_at timestamptz not null default now(),
    constraint material_pkey primary key (id),
    constraint material_slug_form check (slug ~ '^[a-z0-9][a-z0-9_-]*$')
  )`,
  `create unique index material_slug_of_owner on material (slug, group_id) nulls not distinct`,
  `create table material_version (
    id uuid not null,
    material_id uuid not null,
    version int not null,
    status text check (status in ('draft', 'published', 'retired')) not null,
    name varchar(200) not null,
    formula varchar(200) not null,
    density_kg_m3 double precision not null,
    density_source text not null,
    optics jsonb not null,
    valid_from_um double precision not null,
    valid_to_um double precision not null,
    citation text not null,
    note text not null default '',
    created_by_id uuid null,
    created_at timestamptz not null default now(),
    published_at timestamptz null,
    constraint material_version_pkey primary key (id),
    constraint material_version_density check (density_kg_m3 > 0 and density_kg_m3 <= 25000),
    constraint material_version_band check (valid_from_um > 0 and valid_to_um > valid_from_um)
  )`,
  `alter table material_version add constraint material_version_number unique (material_id, version)`,
  `create table catalogue (
    id uuid not null,
    group_id uuid not null,
    uploaded_by_id uuid not null,
    name varchar(200) not null,
    file_name varchar(255) not null,
    byte_size double precision not null,
    sha256 varchar(64) not null,
    mapping jsonb null,
    defaults jsonb not null,
    on_invalid_rows text check (on_invalid_rows in ('refuse', 'leaveOut')) not null,
    status text check (status in ('checking', 'ready', 'failed')) not null,
    failure text null,
    warnings jsonb not null,
    materials jsonb not null,
    rows_accepted int not null default 0,
    rows_rejected int not null default 0,
    rows_blank int not null default 0,
    rows_checked int not null default 0,
    claim uuid null,
    heartbeat_at timestamptz null,
    created_at timestamptz not null default now(),
    checked_at timestamptz null,
    constraint catalogue_pkey primary key (id),
    constraint catalogue_rows_not_negative check (rows_accepted >= 0 and rows_rejected >= 0 and rows_blank >= 0),
    constraint catalogue_sha256_form check (sha256 ~ '^[0-9a-f]{64}$'),
    constraint catalogue_failed_says_why check ((status = 'failed') = (failure is not null))
  )`,
  `create index catalogue_of_group on catalogue (group_id, created_at, id)`,
  `create table reject (
    catalogue_id uuid not null,
    ordinal int not null,
    line int not null,
    column_name text null,
    value text null,
    reason text not null,
    raw text not null,
    constraint reject_pkey primary key (catalogue_id, ordinal)
  )`,
  `create table grain (
    catalogue_id uuid not null,
    ordinal int not null,
    line int not null,
    label text null,
    radius_m double precision not null,
    radius_sigma_m double precision null,
    density_kg_m3 double precision not null,
    density_sigma_kg_m3 double precision null,
    material text not null,
    count double precision not null,
    constraint grain_pkey primary key (catalogue_id, ordinal),
    constraint grain_radius_positive check (radius_m > 0 and radius_m < 'infinity'),
    constraint grain_density_positive check (density_kg_m3 > 0 and density_kg_m3 < 'infinity'),
    constraint grain_sigmas_not_negative check (coalesce(radius_sigma_m, 0) >= 0 and coalesce(density_sigma_kg_m3, 0) >= 0),
    constraint grain_count_positive check (count > 0 and count < 'infinity')
  )`,
  `create table catalogue_chunk (
    catalogue_id uuid not null,
    ordinal int not null,
    bytes bytea not null,
    constraint catalogue_chunk_pkey primary key (catalogue_id, ordinal)
  )`,
  `create table run (
    id uuid not null,
    group_id uuid not null,
    requested_by_id uuid not null,
    catalogue_id uuid not null,
    name varchar(200) not null,
    status text check (status in ('queued', 'running', 'done', 'failed', 'cancelled')) not null,
    progress double precision not null default 0,
    stage varchar(100) not null default '',
    error text null,
    inputs jsonb not null,
    engine_version varchar(20) not null,
    summary jsonb null,
    histograms jsonb null,
    result_sha256 varchar(64) null,
    claim uuid null,
    attempts int not null default 0,
    heartbeat_at timestamptz null,
    created_at timestamptz not null default now(),
    started_at timestamptz null,
    finished_at timestamptz null,
    constraint run_pkey primary key (id),
    constraint run_progress_share check (progress between 0 and 1),
    constraint run_done_has_answer check ((status = 'done') = (summary is not null) and (status = 'done') = (result_sha256 is not null)),
    constraint run_failed_says_why check ((status = 'failed') = (error is not null))
  )`,
  `create index run_of_group on run (group_id, created_at, id)`,
  `create table run_grain (
    run_id uuid not null,
    ordinal int not null,
    qpr double precision not null,
    beta double precision not null,
    p_unbound double precision not null,
    is_unbound boolean not null,
    regime smallint not null,
    pr_time_yr double precision null,
    collision_time_yr double precision null,
    semi_major_axis_au double precision null,
    eccentricity double precision null,
    v_inf_km_s double precision null,
    temperature_k double precision null,
    lorentz_ratio double precision null,
    constraint run_grain_pkey primary key (run_id, ordinal),
    constraint run_grain_probability check (p_unbound between 0 and 1),
    constraint run_grain_regime check (regime between 0 and 2)
  )`,
  `create index run_grain_by_beta on run_grain (run_id, beta, ordinal)`,
  `create table session (
    id varchar(64) not null,
    person_id uuid not null,
    group_id uuid null,
    user_agent varchar(300) not null default '',
    created_at timestamptz not null default now(),
    expires_at timestamptz not null,
    ends_at timestamptz not null,
    constraint session_pkey primary key (id)
  )`,
  `create index session_person_id_index on session (person_id)`,
  `create table star (
    id uuid not null,
    slug varchar(64) not null,
    group_id uuid null,
    created_at timestamptz not null default now(),
    constraint star_pkey primary key (id),
    constraint star_slug_form check (slug ~ '^[a-z0-9][a-z0-9_-]*$')
  )`,
  `create unique index star_slug_of_owner on star (slug, group_id) nulls not distinct`,
  `create table star_version (
    id uuid not null,
    star_id uuid not null,
    version int not null,
    status text check (status in ('draft', 'published', 'retired')) not null,
    name varchar(200) not null,
    spectral_type varchar(40) null,
    mass_sun double precision not null,
    luminosity_sun double precision not null,
    teff_k double precision not null,
    radius_sun double precision null,
    spectrum jsonb null,
    citation text not null,
    note text not null default '',
    created_by_id uuid null,
    created_at timestamptz not null default now(),
    published_at timestamptz null,
    constraint star_version_pkey primary key (id),
    constraint star_version_mass check (mass_sun between 0.05 and 100),
    constraint star_version_luminosity check (luminosity_sun between 1e-5 and 1e6),
    constraint star_version_teff check (teff_k between 2000 and 60000)
  )`,
  `alter table star_version add constraint star_version_number unique (star_id, version)`,
  `alter table personal_token add constraint personal_token_person_id_foreign foreign key (person_id) references person (id) on update cascade on delete cascade`,
  `alter table personal_token add constraint personal_token_group_id_foreign foreign key (group_id) references research_group (id) on update cascade on delete cascade`,
  `alter table membership add constraint membership_person_id_foreign foreign key (person_id) references person (id) on update cascade on delete cascade`,
  `alter table membership add constraint membership_group_id_foreign foreign key (group_id) references research_group (id) on update cascade on delete cascade`,
  `alter table material add constraint material_group_id_foreign foreign key (group_id) references research_group (id) on update cascade on delete cascade`,
  `alter table material_version add constraint material_version_material_id_foreign foreign key (material_id) references material (id) on update cascade on delete cascade`,
  `alter table material_version add constraint material_version_created_by_id_foreign foreign key (created_by_id) references person (id) on update cascade on delete set null`,
  `alter table catalogue add constraint catalogue_group_id_foreign foreign key (group_id) references research_group (id) on update cascade`,
  `alter table catalogue add constraint catalogue_uploaded_by_id_foreign foreign key (uploaded_by_id) references person (id) on update cascade`,
  `alter table reject add constraint reject_catalogue_id_foreign foreign key (catalogue_id) references catalogue (id) on update cascade on delete cascade`,
  `alter table grain add constraint grain_catalogue_id_foreign foreign key (catalogue_id) references catalogue (id) on update cascade on delete cascade`,
  `alter table catalogue_chunk add constraint catalogue_chunk_catalogue_id_foreign foreign key (catalogue_id) references catalogue (id) on update cascade on delete cascade`,
  `alter table run add constraint run_group_id_foreign foreign key (group_id) references research_group (id) on update cascade`,
  `alter table run add constraint run_requested_by_id_foreign foreign key (requested_by_id) references person (id) on update cascade`,
  `alter table run add constraint run_catalogue_id_foreign foreign key (catalogue_id) references catalogue (id) on update cascade on delete restrict`,
  `alter table run_grain add constraint run_grain_run_id_foreign foreign key (run_id) references run (id) on update cascade on delete cascade`,
  `alter table session add constraint session_person_id_foreign foreign key (person_id) references person (id) on update cascade on delete cascade`,
  `alter table session add constraint session_group_id_foreign foreign key (group_id) references research_group (id) on update cascade on delete set null`,
  `alter table star add constraint star_group_id_foreign foreign key (group_id) references research_group (id) on update cascade on delete cascade`,
  `alter table star_version add constraint star_version_star_id_foreign foreign key (star_id) references star (id) on update cascade on delete cascade`,
  `alter table star_version add constraint star_version_created_by_id_foreign foreign key (created_by_id) references person (id) on update cascade on delete set null`,
  `create table rate_limit (
    key varchar(255) primary key,
    points integer not null default 0,
    expire bigint
  )`,
  `create function refuse_changed_version() returns trigger language plpgsql as $$
  begin
    if old.status = 'draft' then
      return new;
    end if;
    if to_jsonb(new) - 'status' = to_jsonb(old) - 'status' and (new.status = old.status or new.status = 'retired') then
      return new;
    end if;
    if to_jsonb(new) - 'created_by_id' = to_jsonb(old) - 'created_by_id' and new.created_by_id is null then
      return new;
    end if;
    raise exception 'a published version is immutable';
  end $$`,
  `create trigger star_version_is_immutable before update on star_version
    for each row execute function refuse_changed_version()`,
  `create trigger material_version_is_immutable before update on material_version
    for each row execute function refuse_changed_version()`,
];

export class House extends Migration {
  override up(): void {
    for (const statement of statements) this.addSql(statement);
  }
}
