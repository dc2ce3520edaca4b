-- Parts: bought parts, made parts, kits and finished tools alike, and the bins they lie in.

create table part (
  id bigint generated always as identity primary key,
  code text not null check (code = upper(code) and code ~ '^[A-Z0-9][A-Z0-9./-]{0,31}$'),
  name text not null check (length(name) between 1 and 120),
  description text,
  measure text not null check (measure in ('piece', 'pair', 'set', 'm', 'mm', 'kg', 'g', 'l', 'ml')),
  traced text not null check (traced in ('count', 'delivery', 'single')),
  serial_letters text,
  reorder_point numeric(18, 6) check (reorder_point >= 0),
  unit_weight_g numeric(18, 6) check (unit_weight_g >= 0),
  shelf_life_days integer check (shelf_life_days > 0),
  origin_country_code text references country (code),
  commodity_code text,
  photo_file_id bigint,
  retired_on date,
  created_at timestamptz not null,
  created_by bigint,
  version integer not null default 1,
  constraint part_code_unique unique (code),
  constraint part_single_has_letters check ((traced = 'single') = (serial_letters is not null)),
  constraint part_single_is_a_piece check (traced <> 'single' or measure = 'piece'),
  constraint part_serial_letters_form check (serial_letters ~ '^[A-Z]{2,3}$')
);
create unique index part_serial_letters_unique on part (serial_letters) where serial_letters is not null;
create index part_search on part using gin ((code || ' ' || name) gin_trgm_ops);
comment on table part is 'Anything that can lie on the shelf: bought part, made part, kit or finished tool.';
comment on column part.traced is 'How closely it is followed: by count, by delivery (lots), or one by one (serial numbers).';
comment on column part.serial_letters is 'Two or three letters that begin the serial numbers of units made one by one.';

-- Quantities already moved would mean something else under another measure, and a part followed differently has lots of
-- another kind. The first move holds a lock on the part, so that one of the two waits and then sees the other.
create function part_stays_as_moved() returns trigger language plpgsql as $$
begin
  if exists (select 1 from stock_move where part_id = new.id) then
    raise exception 'part % has moved: its measure and how closely it is followed stay', new.code
      using errcode = '23514', constraint = 'part_stays_as_moved';
  end if;
  return new;
end $$;
create trigger part_stays_as_moved before update of measure, traced on part for each row
  when (old.measure <> new.measure or old.traced <> new.traced) execute function part_stays_as_moved();

create table part_parameter (
  id bigint generated always as identity primary key,
  part_id bigint not null references part (id) on delete cascade,
  name text not null check (length(name) between 1 and 60),
  value_number numeric,
  value_text text,
  unit text,
  said text not null generated always as (
    name || ' ' || coalesce(value_text, trim_scale(value_number)::text) || coalesce(unit, '')
  ) stored,
  constraint part_parameter_name_unique unique (part_id, name),
  constraint part_parameter_one_value check ((value_number is null) <> (value_text is null))
);
create index part_parameter_by_name on part_parameter (name, value_number);
create index part_parameter_search on part_parameter using gin (said gin_trgm_ops);
comment on table part_parameter is 'One property of a part, a number with its unit or a word.';

create table part_supplier (
  part_id bigint not null references part (id) on delete cascade,
  supplier_id bigint not null references supplier (id),
  supplier_part_code text,
  lead_time_days integer check (lead_time_days between 0 and 730),
  preferred boolean not null default false,
  primary key (part_id, supplier_id)
);
create unique index part_supplier_one_preferred on part_supplier (part_id) where preferred;
create index part_supplier_by_supplier on part_supplier (supplier_id);
comment on table part_supplier is 'A supplier from whom a part can be bought.';

create table part_battery (
  part_id bigint primary key references part (id) on delete cascade,
  kind text not null check (kind in ('cell', 'battery')),
  chemistry text not null check (chemistry in ('lithium_ion', 'lithium_metal')),
  watt_hours numeric(12, 3) check (watt_hours > 0),
  lithium_grams numeric(12, 3) check (lithium_grams > 0),
  cell_count smallint check (cell_count > 0),
  transport_test_reference text,
  transport_test_passed_on date
);
comment on table part_battery is 'What the transport papers must know of a part that is a lithium cell or battery.';
comment on column part_battery.transport_test_reference is 'The test summary of this very design; without one a pack is never shipped.';

create table bin (
  id bigint generated always as identity primary key,
  code text not null check (code = upper(code) and code ~ '^[A-Z0-9][A-Z0-9.-]{0,23}$'),
  name text not null default '' check (length(name) <= 120),
  quarantine boolean not null default false,
  retired_at timestamptz,
  version integer not null default 1,
  constraint bin_code_unique unique (code)
);
comment on table bin is 'A place on the shelf. What lies in a quarantine bin can be neither picked nor sold.';
