-- Batches, units, what went into them, and how they measured.

create table batch (
  id bigint generated always as identity primary key,
  number text not null,
  part_id bigint not null,
  revision_id bigint not null,
  quantity integer not null check (quantity between 1 and 1000),
  status text not null default 'planned' check (status in ('planned', 'picking', 'in_build', 'done', 'withdrawn')),
  start_on date,
  due_on date not null,
  made_quantity integer not null default 0,
  note text,
  created_at timestamptz not null,
  created_by bigint references app_user (id),
  build_started_at timestamptz,
  finished_at timestamptz,
  version integer not null default 1,
  constraint batch_number_unique unique (number),
  constraint batch_revision_of_part foreign key (revision_id, part_id) references bill_revision (id, part_id),
  constraint batch_days_in_order check (start_on <= due_on),
  constraint batch_made_within check (made_quantity between 0 and quantity)
);
create index batch_open on batch (due_on) where status in ('planned', 'picking', 'in_build');
create index batch_by_part on batch (part_id, created_at desc);
comment on table batch is 'A number of pieces of one made part, built together to one bill revision.';
comment on column batch.made_quantity is 'Of a part that is not followed one by one: pieces that came onto the shelf so far. Units say it themselves.';

alter table reservation add constraint reservation_of_batch foreign key (batch_id) references batch (id);

create table batch_line (
  id bigint generated always as identity primary key,
  batch_id bigint not null references batch (id),
  bill_line_id bigint not null references bill_line (id),
  path text not null,
  part_id bigint not null references part (id),
  quantity_per numeric(18, 6) not null check (quantity_per > 0),
  required numeric(18, 6) not null check (required > 0),
  issued numeric(18, 6) not null default 0 check (issued >= 0),
  demand_id bigint references demand (id),
  constraint batch_line_path_unique unique (batch_id, path)
);
create index batch_line_by_part on batch_line (part_id);
comment on table batch_line is 'One part a batch needs. Sub-assemblies that are not taken from the shelf are built within the batch; the path then names the bill lines down to this one.';
comment on column batch_line.quantity_per is 'Quantity that stays in one unit; required adds the normal scrap for the whole batch.';

create table batch_sub_assembly (
  batch_id bigint not null references batch (id),
  path text not null,
  part_id bigint not null references part (id),
  revision_id bigint not null references bill_revision (id),
  required numeric(18, 6) not null check (required > 0),
  from_shelf boolean not null,
  primary key (batch_id, path)
);
comment on table batch_sub_assembly is 'A made component of a batch, and whether it is taken from the shelf or built within the batch.';

create table batch_step (
  id bigint generated always as identity primary key,
  batch_id bigint not null references batch (id),
  position integer not null check (position > 0),
  build_step_id bigint not null references build_step (id),
  path text not null default '',
  per_unit numeric(18, 6) not null default 1 check (per_unit > 0),
  constraint batch_step_position_unique unique (batch_id, position)
);
comment on table batch_step is 'The steps of a batch in order: those of sub-assemblies built within it first, then its own.';
comment on column batch_step.path is 'Of which sub-assembly built within the batch; empty for the steps of the batch''s own revision.';
comment on column batch_step.per_unit is 'How many of the sub-assembly one unit holds: the minutes of the step count that often.';

create table batch_issue (
  id bigint generated always as identity primary key,
  batch_line_id bigint not null references batch_line (id),
  document_id bigint not null references document (id),
  part_id bigint not null,
  lot_id bigint not null,
  bin_id bigint not null references bin (id),
  quantity numeric(18, 6) not null check (quantity <> 0),
  value_minor bigint not null,
  issued_at timestamptz not null,
  issued_by bigint references app_user (id),
  constraint batch_issue_lot_of_part foreign key (lot_id, part_id) references lot (id, part_id)
);
create index batch_issue_by_line on batch_issue (batch_line_id);
create index batch_issue_by_lot on batch_issue (lot_id);
comment on table batch_issue is 'A quantity of a lot picked for a batch line, or below zero, given back. Append only.';

create table batch_cost (
  id bigint generated always as identity primary key,
  batch_id bigint not null references batch (id),
  document_id bigint not null references document (id),
  component text not null check (component in ('materials_in', 'materials_out', 'labour', 'loss')),
  value_minor bigint not null,
  occurred_at timestamptz not null
);
create index batch_cost_by_batch on batch_cost (batch_id);
comment on table batch_cost is 'What went into a batch and came out of it: its share of work in progress. Append only.';

create table unit (
  id bigint generated always as identity primary key,
  serial text not null,
  part_id bigint not null,
  revision_id bigint not null,
  batch_id bigint not null references batch (id),
  place integer not null check (place > 0),
  page_token text not null check (length(page_token) >= 22),
  serial_issued_at timestamptz not null,
  completed_at timestamptz,
  lot_id bigint references lot (id),
  scrapped_at timestamptz,
  scrap_reason text,
  version integer not null default 1,
  constraint unit_serial_unique unique (serial),
  constraint unit_place_unique unique (batch_id, place),
  constraint unit_page_token_unique unique (page_token),
  constraint unit_lot_unique unique (lot_id),
  constraint unit_revision_of_part foreign key (revision_id, part_id) references bill_revision (id, part_id),
  constraint unit_completed_has_lot check ((completed_at is null) = (lot_id is null)),
  constraint unit_scrap_says_why check ((scrapped_at is null) = (scrap_reason is null))
);
create index unit_by_part on unit (part_id, serial_issued_at desc);
create index unit_search on unit using gin (serial gin_trgm_ops);
comment on table unit is 'One serial-numbered piece, from the issue of its number on. Numbers are never reused.';

create function unit_keeps_its_serial() returns trigger language plpgsql as $$
begin
  if tg_op = 'DELETE' then
    raise exception 'a serial number is never taken back' using errcode = '23514', constraint = 'unit_serial_kept';
  end if;
  if new.serial <> old.serial or new.part_id <> old.part_id or new.batch_id <> old.batch_id then
    raise exception 'a unit keeps its serial number' using errcode = '23514', constraint = 'unit_serial_kept';
  end if;
  return new;
end $$;
create trigger unit_serial_kept before update or delete on unit for each row execute function unit_keeps_its_serial();

create table unit_step (
  unit_id bigint not null references unit (id),
  batch_step_id bigint not null references batch_step (id),
  done_at timestamptz not null,
  done_by bigint not null references app_user (id),
  primary key (unit_id, batch_step_id)
);
comment on table unit_step is 'A build step done on a unit, by whom and when.';

create table as_built (
  id bigint generated always as identity primary key,
  unit_id bigint not null references unit (id),
  batch_line_id bigint not null references batch_line (id),
  part_id bigint not null,
  lot_id bigint not null,
  quantity numeric(18, 6) not null check (quantity > 0),
  exact boolean not null,
  fitted_at timestamptz not null,
  fitted_by bigint references app_user (id),
  removed_at timestamptz,
  removed_by bigint references app_user (id),
  constraint as_built_lot_of_part foreign key (lot_id, part_id) references lot (id, part_id)
);
create index as_built_by_unit on as_built (unit_id);
create index as_built_by_lot on as_built (lot_id);
comment on table as_built is 'What is in a unit: a lot scanned to it (exact), or one of the lots picked for its batch.';
comment on column as_built.quantity is 'Quantity of the part per unit; where several lots of a batch come into question, each may hold any share of it.';

create table test_run (
  id bigint generated always as identity primary key,
  unit_id bigint not null references unit (id),
  revision_id bigint not null references bill_revision (id),
  sequence integer not null check (sequence > 0),
  started_at timestamptz not null,
  started_by bigint references app_user (id),
  measured_at timestamptz,
  verdict text check (verdict in ('pass', 'fail')),
  voided_at timestamptz,
  void_reason text,
  constraint test_run_sequence_unique unique (unit_id, sequence),
  constraint test_run_judged_when_measured check ((measured_at is null) = (verdict is null)),
  constraint test_run_void_says_why check ((voided_at is null) = (void_reason is null))
);
create unique index test_run_one_open on test_run (unit_id) where verdict is null and voided_at is null;
comment on table test_run is 'One going through of a test plan on a unit. Measured at: the instant of its last reading; runs are ordered by it.';

create table reading (
  id bigint generated always as identity primary key,
  run_id bigint not null references test_run (id),
  characteristic_id bigint not null references characteristic (id),
  value numeric,
  typed text,
  answer boolean,
  unit text,
  lower_limit numeric,
  upper_limit numeric,
  verdict text not null check (verdict in ('within', 'outside')),
  measured_at timestamptz not null,
  received_at timestamptz not null,
  recorded_by bigint not null references app_user (id),
  client_key uuid not null,
  constraint reading_applied_once unique (client_key),
  constraint reading_number_or_answer check ((value is null) <> (answer is null))
);
create index reading_by_run on reading (run_id, characteristic_id, measured_at desc);
create index reading_by_characteristic on reading (characteristic_id, measured_at);
comment on table reading is 'One measured value or answer with the limits it was judged by. A later reading of the same characteristic in a run takes its place; none is removed.';

create table nonconformity (
  id bigint generated always as identity primary key,
  number text not null,
  unit_id bigint not null references unit (id),
  run_id bigint references test_run (id),
  batch_step_id bigint references batch_step (id),
  lot_id bigint references lot (id),
  what text not null check (length(what) between 1 and 500),
  cause text,
  action text,
  outcome text check (outcome in ('reworked', 'scrapped', 'no_fault')),
  found_at timestamptz not null,
  found_by bigint references app_user (id),
  closed_at timestamptz,
  closed_by bigint references app_user (id),
  version integer not null default 1,
  constraint nonconformity_number_unique unique (number),
  constraint nonconformity_closed_with_outcome check ((closed_at is null) = (outcome is null))
);
create index nonconformity_by_unit on nonconformity (unit_id);
create index nonconformity_open on nonconformity (found_at) where closed_at is null;
comment on table nonconformity is 'A fault: what was wrong with a unit, where it was found, why, and what was done.';

create table rework (
  id bigint generated always as identity primary key,
  unit_id bigint not null references unit (id),
  nonconformity_id bigint references nonconformity (id),
  what text not null check (length(what) between 1 and 500),
  minutes numeric(9, 2) not null default 0 check (minutes >= 0),
  done_at timestamptz not null,
  done_by bigint references app_user (id)
);
create index rework_by_unit on rework (unit_id);
comment on table rework is 'Work done again on a unit; it voids the pass the unit had.';

-- A unit is sound when the last complete run, by the instant of measuring, passed and was not voided since,
-- against the plan of the unit's own revision, and nothing has been found wrong with it since.
create function unit_is_sound(bigint) returns boolean language sql stable as $$
  select coalesce((
    select r.verdict = 'pass' and r.voided_at is null and r.revision_id = u.revision_id
    from test_run r
    where r.unit_id = u.id and r.verdict is not null
    order by r.measured_at desc, r.sequence desc
    limit 1
  ), false)
  and u.scrapped_at is null
  and not exists (select 1 from nonconformity n where n.unit_id = u.id and n.closed_at is null)
  from unit u where u.id = $1
$$;
comment on function unit_is_sound is 'Whether a unit may be finished, packed or shipped.';

create function unit_completed_when_sound() returns trigger language plpgsql as $$
begin
  if new.completed_at is not null and old.completed_at is null and not unit_is_sound(new.id) then
    raise exception 'unit % has no valid pass', new.serial using errcode = '23514', constraint = 'unit_is_sound';
  end if;
  return new;
end $$;
create trigger unit_completion_checked before update on unit for each row execute function unit_completed_when_sound();
