-- Bills of material with numbered revisions, their steps, their test plan, and the contents lists of kits.

create table bill_revision (
  id bigint generated always as identity primary key,
  part_id bigint not null references part (id),
  number integer not null check (number > 0),
  status text not null default 'draft' check (status in ('draft', 'released', 'superseded')),
  note text,
  created_at timestamptz not null,
  created_by bigint,
  released_at timestamptz,
  released_by bigint,
  superseded_at timestamptz,
  version integer not null default 1,
  constraint bill_revision_number_unique unique (part_id, number),
  constraint bill_revision_part unique (id, part_id),
  constraint bill_revision_released_instant check ((status = 'draft') = (released_at is null)),
  constraint bill_revision_superseded_instant check ((status = 'superseded') = (superseded_at is not null))
);
create unique index bill_revision_one_draft on bill_revision (part_id) where status = 'draft';
create unique index bill_revision_one_released on bill_revision (part_id) where status = 'released';
comment on table bill_revision is 'One numbered state of a part''s bill: what it is made of, how, and how it is tested.';

create table bill_line (
  id bigint generated always as identity primary key,
  revision_id bigint not null references bill_revision (id) on delete cascade,
  position integer not null check (position > 0),
  part_id bigint not null references part (id),
  quantity_per numeric(18, 6) not null check (quantity_per > 0),
  scrap_percent numeric(7, 4) not null default 0 check (scrap_percent >= 0 and scrap_percent < 100),
  marks text,
  note text,
  constraint bill_line_position_unique unique (revision_id, position) deferrable initially deferred
);
create index bill_line_by_part on bill_line (part_id);
comment on table bill_line is 'One component of a bill revision: which part, how many per unit made, and how much is lost on the way.';
comment on column bill_line.scrap_percent is 'Share of what is issued that is normally lost: issue = quantity / (1 - share).';

create table bill_line_alternate (
  id bigint generated always as identity primary key,
  line_id bigint not null references bill_line (id) on delete cascade,
  priority integer not null check (priority > 0),
  part_id bigint not null references part (id),
  constraint bill_line_alternate_unique unique (line_id, part_id),
  constraint bill_line_alternate_priority unique (line_id, priority) deferrable initially deferred
);
create index bill_line_alternate_by_part on bill_line_alternate (part_id);
comment on table bill_line_alternate is 'A part approved to stand in for a bill line''s own, in order of preference.';

create table build_step (
  id bigint generated always as identity primary key,
  revision_id bigint not null references bill_revision (id) on delete cascade,
  position integer not null check (position > 0),
  title text not null check (length(title) between 1 and 120),
  instruction text not null default '',
  minutes numeric(9, 2) not null default 0 check (minutes >= 0),
  caution text,
  constraint build_step_position_unique unique (revision_id, position) deferrable initially deferred
);
comment on table build_step is 'One thing to do when building to a revision, with the minutes it is expected to take.';

create table characteristic (
  id bigint generated always as identity primary key,
  revision_id bigint not null references bill_revision (id) on delete cascade,
  position integer not null check (position > 0),
  name text not null check (length(name) between 1 and 120),
  kind text not null check (kind in ('numeric', 'yes_no')),
  unit text,
  lower_limit numeric,
  target numeric,
  upper_limit numeric,
  digits smallint check (digits between 0 and 9),
  condition text,
  caution text,
  constraint characteristic_position_unique unique (revision_id, position) deferrable initially deferred,
  constraint characteristic_numeric_has_limit check (
    kind <> 'numeric' or (unit is not null and digits is not null and (lower_limit is not null or upper_limit is not null))
  ),
  constraint characteristic_yes_no_has_none check (
    kind <> 'yes_no' or (unit is null and lower_limit is null and target is null and upper_limit is null)
  ),
  constraint characteristic_limits_in_order check (lower_limit < upper_limit),
  constraint characteristic_target_within check (target >= lower_limit and target <= upper_limit)
);
comment on table characteristic is 'One thing the test plan of a revision asks to measure or look at, with its limits.';

create table contents_line (
  id bigint generated always as identity primary key,
  kit_part_id bigint not null references part (id),
  position integer not null check (position > 0),
  part_id bigint not null references part (id),
  quantity numeric(18, 6) not null check (quantity > 0),
  bag text not null default '1' check (length(bag) between 1 and 24),
  constraint contents_line_position_unique unique (kit_part_id, position) deferrable initially deferred,
  constraint contents_line_part_unique unique (kit_part_id, part_id, bag),
  constraint contents_line_not_itself check (part_id <> kit_part_id)
);
create index contents_line_by_part on contents_line (part_id);
comment on table contents_line is 'One line of a kit''s contents list: what goes into which bag.';

create table contents_list (
  kit_part_id bigint primary key references part (id),
  version integer not null default 1,
  saved_at timestamptz not null,
  saved_by bigint
);
comment on table contents_list is 'That a part is packed as a kit, and how often its contents list was saved.';

-- A released revision is what units were built to: its lines, steps and plan are beyond change.
create function bill_content_frozen() returns trigger language plpgsql as $$
declare
  touched bigint;
  state text;
begin
  if tg_table_name = 'bill_line_alternate' then
    if tg_op = 'UPDATE' and old.line_id <> new.line_id then
      raise exception 'an alternate stays with its line' using errcode = '23514', constraint = 'bill_revision_frozen';
    end if;
    select revision_id into touched from bill_line
      where id = case when tg_op = 'DELETE' then old.line_id else new.line_id end;
  else
    touched := case when tg_op = 'DELETE' then old.revision_id else new.revision_id end;
    if tg_op = 'UPDATE' and old.revision_id <> new.revision_id then
      raise exception 'a line stays with its revision' using errcode = '23514', constraint = 'bill_revision_frozen';
    end if;
  end if;
  select status into state from bill_revision where id = touched for share;
  if state is distinct from 'draft' and state is not null then
    raise exception 'a released bill revision cannot change'
      using errcode = '23514', constraint = 'bill_revision_frozen';
  end if;
  return case when tg_op = 'DELETE' then old else new end;
end $$;

create trigger bill_line_frozen before insert or update or delete on bill_line
  for each row execute function bill_content_frozen();
create trigger bill_line_alternate_frozen before insert or update or delete on bill_line_alternate
  for each row execute function bill_content_frozen();
create trigger build_step_frozen before insert or update or delete on build_step
  for each row execute function bill_content_frozen();
create trigger characteristic_frozen before insert or update or delete on characteristic
  for each row execute function bill_content_frozen();

-- Statuses only go forward; a revision keeps its part and number, and a released one everything but its status.
create function bill_revision_guard() returns trigger language plpgsql as $$
begin
  if tg_op = 'DELETE' then
    if old.status <> 'draft' then
      raise exception 'a released bill revision cannot be removed'
        using errcode = '23514', constraint = 'bill_revision_frozen';
    end if;
    return old;
  end if;
  if new.part_id <> old.part_id or new.number <> old.number
     or (old.status = 'released' and new.status = 'draft')
     or (old.status = 'superseded' and new.status <> 'superseded')
     or (old.status <> 'draft' and (new.note, new.created_at, new.created_by, new.released_at, new.released_by)
       is distinct from (old.note, old.created_at, old.created_by, old.released_at, old.released_by)) then
    raise exception 'a bill revision only goes from draft to released to superseded'
      using errcode = '23514', constraint = 'bill_revision_frozen';
  end if;
  return new;
end $$;
create trigger bill_revision_guarded before update or delete on bill_revision
  for each row execute function bill_revision_guard();

-- No bill contains itself, at any depth, over drafts and released revisions, lines and alternates alike.
-- Bills are edited rarely; one lock at a time keeps two edits from closing a loop between them.
create function bill_contains_itself_guard() returns trigger language plpgsql as $$
declare
  parent bigint;
begin
  perform pg_advisory_xact_lock(hashtext('bill graph'));
  if tg_table_name = 'bill_line_alternate' then
    select r.part_id into parent from bill_line l join bill_revision r on r.id = l.revision_id where l.id = new.line_id;
  else
    select part_id into parent from bill_revision where id = new.revision_id;
  end if;
  if exists (
    with recursive below (part_id) as (
      select new.part_id
      union
      select child.part_id
      from below
      join bill_revision r on r.part_id = below.part_id and r.status <> 'superseded'
      cross join lateral (
        select l.part_id from bill_line l where l.revision_id = r.id
        union all
        select a.part_id from bill_line l join bill_line_alternate a on a.line_id = l.id where l.revision_id = r.id
      ) child
    )
    select 1 from below where below.part_id = parent
  ) then
    raise exception 'a bill may not contain itself' using errcode = '23514', constraint = 'bill_contains_itself';
  end if;
  return new;
end $$;
create trigger bill_line_acyclic after insert or update on bill_line
  for each row execute function bill_contains_itself_guard();
create trigger bill_line_alternate_acyclic after insert or update on bill_line_alternate
  for each row execute function bill_contains_itself_guard();
