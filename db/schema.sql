-- Generated from db/migrations by npm run db:generate; do not edit.

CREATE EXTENSION pg_trgm;

CREATE FUNCTION public.bill_contains_itself_guard() RETURNS trigger
    LANGUAGE plpgsql
    AS $$
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

CREATE FUNCTION public.bill_content_frozen() RETURNS trigger
    LANGUAGE plpgsql
    AS $$
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

CREATE FUNCTION public.bill_revision_guard() RETURNS trigger
    LANGUAGE plpgsql
    AS $$
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

CREATE FUNCTION public.document_stock_agrees() RETURNS trigger
    LANGUAGE plpgsql
    AS $$
declare
  touched bigint;
  moved bigint;
  posted bigint;
  last_id bigint;
  last_made_by xid;
begin
  if tg_table_name = 'stock_move' then
    touched := new.document_id;
    -- A document of many moves is added up once, for its last move: when this transaction made that one too, its own
    -- check is still to come. Else opening stock of thousands of lots would be added up thousands of times.
    select id, xmin into last_id, last_made_by
      from stock_move where document_id = touched order by document_id desc, id desc limit 1;
    if last_id <> new.id and last_made_by = pg_current_xact_id()::xid then
      return null;
    end if;
  else
    select document_id into touched from journal_entry where id = new.entry_id;
  end if;
  select coalesce(sum(value_minor), 0) into moved from stock_move where document_id = touched;
  select coalesce(sum(l.debit_minor - l.credit_minor), 0) into posted
    from journal_entry e
    join journal_line l on l.entry_id = e.id
    join account a on a.code = l.account_code and a.is_stock
    where e.document_id = touched;
  if moved <> posted then
    raise exception 'document % moved % on the shelf but posted %', touched, moved, posted
      using errcode = '23514', constraint = 'stock_agrees_with_journal';
  end if;
  return null;
end $$;

CREATE FUNCTION public.invoice_parts_add_up() RETURNS trigger
    LANGUAGE plpgsql SECURITY DEFINER
    SET search_path TO 'public'
    AS $$
declare
  whole invoice;
  net bigint;
  taxable bigint;
  vat bigint;
  credited bigint;
  credited_invoice invoice;
begin
  select * into whole from invoice where id = new.id;
  select coalesce((select sum(net_minor) from invoice_line where invoice_id = whole.id), 0)
       + coalesce((select sum(case kind when 'charge' then amount_minor else -amount_minor end)
                   from invoice_charge where invoice_id = whole.id), 0) into net;
  select coalesce(sum(taxable_minor), 0), coalesce(sum(vat_minor), 0) into taxable, vat
    from invoice_vat where invoice_id = whole.id;
  if net <> whole.net_minor or taxable <> whole.net_minor or vat <> whole.vat_minor then
    raise exception 'invoice % does not add up', whole.number
      using errcode = '23514', constraint = 'invoice_parts_add_up';
  end if;
  if whole.credits_invoice_id is not null then
    select * into credited_invoice from invoice where id = whole.credits_invoice_id for update;
    select sum(gross_minor) into credited from invoice where credits_invoice_id = whole.credits_invoice_id;
    if credited_invoice.kind <> 'invoice' or credited > credited_invoice.gross_minor then
      raise exception 'credit notes exceed invoice %', credited_invoice.number
        using errcode = '23514', constraint = 'invoice_not_overcredited';
    end if;
  end if;
  return null;
end $$;

CREATE FUNCTION public.invoice_without_gap() RETURNS trigger
    LANGUAGE plpgsql
    AS $$
declare
  previous timestamptz;
begin
  if new.sequence = 1 then
    return new;
  end if;
  select issued_at into previous from invoice
    where series = new.series and year = new.year and sequence = new.sequence - 1;
  if previous is null then
    raise exception 'number % would leave a gap', new.number using errcode = '23514', constraint = 'invoice_without_gap';
  end if;
  if previous > new.issued_at then
    raise exception 'number % would be issued before its predecessor', new.number
      using errcode = '23514', constraint = 'invoice_in_order';
  end if;
  return new;
end $$;

CREATE FUNCTION public.journal_entry_balances() RETURNS trigger
    LANGUAGE plpgsql
    AS $$
declare
  touched bigint := new.entry_id;
  difference bigint;
  lines integer;
begin
  select coalesce(sum(debit_minor - credit_minor), 0), count(*) into difference, lines
    from journal_line where entry_id = touched;
  if difference <> 0 or lines < 2 then
    raise exception 'journal entry % does not balance', touched
      using errcode = '23514', constraint = 'journal_entry_balances';
  end if;
  return null;
end $$;

CREATE FUNCTION public.journal_entry_has_lines() RETURNS trigger
    LANGUAGE plpgsql
    AS $$
begin
  if not exists (select 1 from journal_line where entry_id = new.id) then
    raise exception 'journal entry % has no lines', new.id
      using errcode = '23514', constraint = 'journal_entry_balances';
  end if;
  return null;
end $$;

CREATE FUNCTION public.journal_entry_period_open() RETURNS trigger
    LANGUAGE plpgsql SECURITY DEFINER
    SET search_path TO 'public'
    AS $$
declare
  closed timestamptz;
begin
  insert into period (month) values (date_trunc('month', new.day)::date) on conflict do nothing;
  -- The share lock makes a close wait for entries under way, and entries wait for a close.
  select closed_at into closed from period where month = date_trunc('month', new.day)::date for share;
  if closed is not null then
    raise exception 'the period of % is closed', new.day using errcode = '23514', constraint = 'period_closed';
  end if;
  return new;
end $$;

CREATE FUNCTION public.packed_unit_is_sound() RETURNS trigger
    LANGUAGE plpgsql
    AS $$
begin
  if new.unit_id is not null and not unit_is_sound(new.unit_id) then
    raise exception 'a unit without a valid pass cannot be packed'
      using errcode = '23514', constraint = 'packed_unit_is_sound';
  end if;
  return new;
end $$;

CREATE FUNCTION public.part_stays_as_moved() RETURNS trigger
    LANGUAGE plpgsql
    AS $$
begin
  if exists (select 1 from stock_move where part_id = new.id) then
    raise exception 'part % has moved: its measure and how closely it is followed stay', new.code
      using errcode = '23514', constraint = 'part_stays_as_moved';
  end if;
  return new;
end $$;

CREATE FUNCTION public.refund_within_payment() RETURNS trigger
    LANGUAGE plpgsql SECURITY DEFINER
    SET search_path TO 'public'
    AS $$
declare
  received bigint;
  given_back bigint;
begin
  select amount_minor into received from payment where document_id = new.payment_document_id for update;
  select sum(amount_minor) into given_back from refund
    where payment_document_id = new.payment_document_id and status <> 'failed';
  if given_back > received then
    raise exception 'refunds exceed the payment' using errcode = '23514', constraint = 'refund_within_payment';
  end if;
  return null;
end $$;

CREATE FUNCTION public.shipment_units_are_sound() RETURNS trigger
    LANGUAGE plpgsql
    AS $$
begin
  if new.status in ('packed', 'shipped') and exists (
    select 1 from packed_item p
    where p.shipment_id = new.id and p.taken_out_at is null and p.unit_id is not null and not unit_is_sound(p.unit_id)
  ) then
    raise exception 'a unit without a valid pass cannot be shipped'
      using errcode = '23514', constraint = 'packed_unit_is_sound';
  end if;
  return new;
end $$;

CREATE FUNCTION public.stock_move_applied() RETURNS trigger
    LANGUAGE plpgsql SECURITY DEFINER
    SET search_path TO 'public'
    AS $$
begin
  insert into stock_balance (lot_id, bin_id, owner_customer_id, part_id, quantity)
    select distinct lot_id, bin_id, owner_customer_id, part_id, 0 from added
    order by lot_id, bin_id, owner_customer_id
    on conflict do nothing;
  update stock_balance b set quantity = b.quantity + d.quantity
    from (
      select lot_id, bin_id, owner_customer_id, sum(quantity) as quantity
      from added group by lot_id, bin_id, owner_customer_id order by lot_id, bin_id
    ) d
    where b.lot_id = d.lot_id and b.bin_id = d.bin_id and b.owner_customer_id is not distinct from d.owner_customer_id;
  insert into cost_pool (part_id, lot_id, quantity, value_minor)
    select distinct a.part_id, case when p.traced = 'single' then a.lot_id end, 0, 0
    from added a join part p on p.id = a.part_id
    where a.owner_customer_id is null
    order by 1, 2
    on conflict do nothing;
  update cost_pool c set quantity = c.quantity + d.quantity, value_minor = c.value_minor + d.value_minor
    from (
      select a.part_id, case when p.traced = 'single' then a.lot_id end as lot_id,
             sum(a.quantity) as quantity, sum(a.value_minor) as value_minor
      from added a join part p on p.id = a.part_id
      where a.owner_customer_id is null
      group by 1, 2 order by 1, 2
    ) d
    where c.part_id = d.part_id and c.lot_id is not distinct from d.lot_id;
  return null;
end $$;

CREATE FUNCTION public.unit_completed_when_sound() RETURNS trigger
    LANGUAGE plpgsql
    AS $$
begin
  if new.completed_at is not null and old.completed_at is null and not unit_is_sound(new.id) then
    raise exception 'unit % has no valid pass', new.serial using errcode = '23514', constraint = 'unit_is_sound';
  end if;
  return new;
end $$;

CREATE FUNCTION public.unit_is_sound(bigint) RETURNS boolean
    LANGUAGE sql STABLE
    AS $_$
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
$_$;

COMMENT ON FUNCTION public.unit_is_sound(bigint) IS 'Whether a unit may be finished, packed or shipped.';

CREATE FUNCTION public.unit_keeps_its_serial() RETURNS trigger
    LANGUAGE plpgsql
    AS $$
begin
  if tg_op = 'DELETE' then
    raise exception 'a serial number is never taken back' using errcode = '23514', constraint = 'unit_serial_kept';
  end if;
  if new.serial <> old.serial or new.part_id <> old.part_id or new.batch_id <> old.batch_id then
    raise exception 'a unit keeps its serial number' using errcode = '23514', constraint = 'unit_serial_kept';
  end if;
  return new;
end $$;

CREATE TABLE public.account (
    code text NOT NULL,
    name text NOT NULL,
    kind text NOT NULL,
    is_stock boolean DEFAULT false NOT NULL,
    CONSTRAINT account_code_check CHECK ((code ~ '^[0-9]{4}$'::text)),
    CONSTRAINT account_kind_check CHECK ((kind = ANY (ARRAY['asset'::text, 'liability'::text, 'equity'::text, 'income'::text, 'expense'::text])))
);

COMMENT ON TABLE public.account IS 'An account of the journal. The stock accounts together carry the value of the shelf.';

CREATE TABLE public.app_user (
    id bigint NOT NULL,
    email text NOT NULL,
    name text NOT NULL,
    role text NOT NULL,
    status text NOT NULL,
    password_hash text,
    customer_id bigint,
    email_confirmed_at timestamp with time zone,
    created_at timestamp with time zone NOT NULL,
    version integer DEFAULT 1 NOT NULL,
    CONSTRAINT app_user_active_can_sign_in CHECK (((status <> 'active'::text) OR ((password_hash IS NOT NULL) AND (email_confirmed_at IS NOT NULL)))),
    CONSTRAINT app_user_email_check CHECK ((((length(email) >= 3) AND (length(email) <= 254)) AND (email !~ '[[:space:][:cntrl:]]'::text))),
    CONSTRAINT app_user_name_check CHECK (((length(name) >= 1) AND (length(name) <= 120))),
    CONSTRAINT app_user_role_check CHECK ((role = ANY (ARRAY['owner'::text, 'assembler'::text, 'accountant'::text, 'customer'::text]))),
    CONSTRAINT app_user_staff_is_no_customer CHECK (((role = 'customer'::text) OR (customer_id IS NULL))),
    CONSTRAINT app_user_status_check CHECK ((status = ANY (ARRAY['invited'::text, 'unconfirmed'::text, 'active'::text, 'disabled'::text]))),
    CONSTRAINT app_user_version_check CHECK ((version > 0))
);

COMMENT ON TABLE public.app_user IS 'A person who signs in, or has been asked to. Never deleted, since the record of what was done points here.';

COMMENT ON COLUMN public.app_user.status IS 'invited: staff asked in by the owner; unconfirmed: signed up, link not yet opened; active; disabled: can no longer sign in.';

COMMENT ON COLUMN public.app_user.password_hash IS 'argon2id in its own text form, which carries its parameters.';

ALTER TABLE public.app_user ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.app_user_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.as_built (
    id bigint NOT NULL,
    unit_id bigint NOT NULL,
    batch_line_id bigint NOT NULL,
    part_id bigint NOT NULL,
    lot_id bigint NOT NULL,
    quantity numeric(18,6) NOT NULL,
    exact boolean NOT NULL,
    fitted_at timestamp with time zone NOT NULL,
    fitted_by bigint,
    removed_at timestamp with time zone,
    removed_by bigint,
    CONSTRAINT as_built_quantity_check CHECK ((quantity > (0)::numeric))
);

COMMENT ON TABLE public.as_built IS 'What is in a unit: a lot scanned to it (exact), or one of the lots picked for its batch.';

COMMENT ON COLUMN public.as_built.quantity IS 'Quantity of the part per unit; where several lots of a batch come into question, each may hold any share of it.';

ALTER TABLE public.as_built ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.as_built_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.attempt_count (
    bucket text NOT NULL,
    window_ends_at timestamp with time zone NOT NULL,
    attempts integer NOT NULL,
    CONSTRAINT attempt_count_attempts_check CHECK ((attempts > 0))
);

COMMENT ON TABLE public.attempt_count IS 'How often something was tried for one account or from one address in the running window.';

COMMENT ON COLUMN public.attempt_count.bucket IS 'What is counted and a digest of for whom: no address or name in clear.';

CREATE TABLE public.audit_entry (
    id bigint NOT NULL,
    recorded_at timestamp with time zone NOT NULL,
    actor_id bigint,
    actor_name text,
    actor_role text,
    action text NOT NULL,
    subject_kind text NOT NULL,
    subject_id bigint,
    subject_code text,
    before jsonb,
    after jsonb,
    request_id text,
    CONSTRAINT audit_entry_action_check CHECK ((action ~ '^[a-z][a-z_]*(\.[a-z_]+)*$'::text)),
    CONSTRAINT audit_entry_actor_whole CHECK ((((actor_id IS NULL) = (actor_name IS NULL)) AND ((actor_id IS NULL) = (actor_role IS NULL)))),
    CONSTRAINT audit_entry_subject_kind_check CHECK ((subject_kind ~ '^[a-z][a-z_]*$'::text))
);

COMMENT ON TABLE public.audit_entry IS 'One thing that somebody (or, without an actor, the product itself) did, with the values before and after. Append-only.';

ALTER TABLE public.audit_entry ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.audit_entry_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.batch (
    id bigint NOT NULL,
    number text NOT NULL,
    part_id bigint NOT NULL,
    revision_id bigint NOT NULL,
    quantity integer NOT NULL,
    status text DEFAULT 'planned'::text NOT NULL,
    start_on date,
    due_on date NOT NULL,
    made_quantity integer DEFAULT 0 NOT NULL,
    note text,
    created_at timestamp with time zone NOT NULL,
    created_by bigint,
    build_started_at timestamp with time zone,
    finished_at timestamp with time zone,
    version integer DEFAULT 1 NOT NULL,
    CONSTRAINT batch_days_in_order CHECK ((start_on <= due_on)),
    CONSTRAINT batch_made_within CHECK (((made_quantity >= 0) AND (made_quantity <= quantity))),
    CONSTRAINT batch_quantity_check CHECK (((quantity >= 1) AND (quantity <= 1000))),
    CONSTRAINT batch_status_check CHECK ((status = ANY (ARRAY['planned'::text, 'picking'::text, 'in_build'::text, 'done'::text, 'withdrawn'::text])))
);

COMMENT ON TABLE public.batch IS 'A number of pieces of one made part, built together to one bill revision.';

COMMENT ON COLUMN public.batch.made_quantity IS 'Of a part that is not followed one by one: pieces that came onto the shelf so far. Units say it themselves.';

CREATE TABLE public.batch_cost (
    id bigint NOT NULL,
    batch_id bigint NOT NULL,
    document_id bigint NOT NULL,
    component text NOT NULL,
    value_minor bigint NOT NULL,
    occurred_at timestamp with time zone NOT NULL,
    CONSTRAINT batch_cost_component_check CHECK ((component = ANY (ARRAY['materials_in'::text, 'materials_out'::text, 'labour'::text, 'loss'::text])))
);

COMMENT ON TABLE public.batch_cost IS 'What went into a batch and came out of it: its share of work in progress. Append only.';

ALTER TABLE public.batch_cost ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.batch_cost_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

ALTER TABLE public.batch ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.batch_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.batch_issue (
    id bigint NOT NULL,
    batch_line_id bigint NOT NULL,
    document_id bigint NOT NULL,
    part_id bigint NOT NULL,
    lot_id bigint NOT NULL,
    bin_id bigint NOT NULL,
    quantity numeric(18,6) NOT NULL,
    value_minor bigint NOT NULL,
    issued_at timestamp with time zone NOT NULL,
    issued_by bigint,
    CONSTRAINT batch_issue_quantity_check CHECK ((quantity <> (0)::numeric))
);

COMMENT ON TABLE public.batch_issue IS 'A quantity of a lot picked for a batch line, or below zero, given back. Append only.';

ALTER TABLE public.batch_issue ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.batch_issue_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.batch_line (
    id bigint NOT NULL,
    batch_id bigint NOT NULL,
    bill_line_id bigint NOT NULL,
    path text NOT NULL,
    part_id bigint NOT NULL,
    quantity_per numeric(18,6) NOT NULL,
    required numeric(18,6) NOT NULL,
    issued numeric(18,6) DEFAULT 0 NOT NULL,
    demand_id bigint,
    CONSTRAINT batch_line_issued_check CHECK ((issued >= (0)::numeric)),
    CONSTRAINT batch_line_quantity_per_check CHECK ((quantity_per > (0)::numeric)),
    CONSTRAINT batch_line_required_check CHECK ((required > (0)::numeric))
);

COMMENT ON TABLE public.batch_line IS 'One part a batch needs. Sub-assemblies that are not taken from the shelf are built within the batch; the path then names the bill lines down to this one.';

COMMENT ON COLUMN public.batch_line.quantity_per IS 'Quantity that stays in one unit; required adds the normal scrap for the whole batch.';

ALTER TABLE public.batch_line ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.batch_line_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.batch_step (
    id bigint NOT NULL,
    batch_id bigint NOT NULL,
    "position" integer NOT NULL,
    build_step_id bigint NOT NULL,
    path text DEFAULT ''::text NOT NULL,
    per_unit numeric(18,6) DEFAULT 1 NOT NULL,
    CONSTRAINT batch_step_per_unit_check CHECK ((per_unit > (0)::numeric)),
    CONSTRAINT batch_step_position_check CHECK (("position" > 0))
);

COMMENT ON TABLE public.batch_step IS 'The steps of a batch in order: those of sub-assemblies built within it first, then its own.';

COMMENT ON COLUMN public.batch_step.path IS 'Of which sub-assembly built within the batch; empty for the steps of the batch''s own revision.';

COMMENT ON COLUMN public.batch_step.per_unit IS 'How many of the sub-assembly one unit holds: the minutes of the step count that often.';

ALTER TABLE public.batch_step ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.batch_step_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.batch_sub_assembly (
    batch_id bigint NOT NULL,
    path text NOT NULL,
    part_id bigint NOT NULL,
    revision_id bigint NOT NULL,
    required numeric(18,6) NOT NULL,
    from_shelf boolean NOT NULL,
    CONSTRAINT batch_sub_assembly_required_check CHECK ((required > (0)::numeric))
);

COMMENT ON TABLE public.batch_sub_assembly IS 'A made component of a batch, and whether it is taken from the shelf or built within the batch.';

CREATE TABLE public.bill_line (
    id bigint NOT NULL,
    revision_id bigint NOT NULL,
    "position" integer NOT NULL,
    part_id bigint NOT NULL,
    quantity_per numeric(18,6) NOT NULL,
    scrap_percent numeric(7,4) DEFAULT 0 NOT NULL,
    marks text,
    note text,
    CONSTRAINT bill_line_position_check CHECK (("position" > 0)),
    CONSTRAINT bill_line_quantity_per_check CHECK ((quantity_per > (0)::numeric)),
    CONSTRAINT bill_line_scrap_percent_check CHECK (((scrap_percent >= (0)::numeric) AND (scrap_percent < (100)::numeric)))
);

COMMENT ON TABLE public.bill_line IS 'One component of a bill revision: which part, how many per unit made, and how much is lost on the way.';

COMMENT ON COLUMN public.bill_line.scrap_percent IS 'Share of what is issued that is normally lost: issue = quantity / (1 - share).';

CREATE TABLE public.bill_line_alternate (
    id bigint NOT NULL,
    line_id bigint NOT NULL,
    priority integer NOT NULL,
    part_id bigint NOT NULL,
    CONSTRAINT bill_line_alternate_priority_check CHECK ((priority > 0))
);

COMMENT ON TABLE public.bill_line_alternate IS 'A part approved to stand in for a bill line''s own, in order of preference.';

ALTER TABLE public.bill_line_alternate ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.bill_line_alternate_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

ALTER TABLE public.bill_line ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.bill_line_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.bill_revision (
    id bigint NOT NULL,
    part_id bigint NOT NULL,
    number integer NOT NULL,
    status text DEFAULT 'draft'::text NOT NULL,
    note text,
    created_at timestamp with time zone NOT NULL,
    created_by bigint,
    released_at timestamp with time zone,
    released_by bigint,
    superseded_at timestamp with time zone,
    version integer DEFAULT 1 NOT NULL,
    CONSTRAINT bill_revision_number_check CHECK ((number > 0)),
    CONSTRAINT bill_revision_released_instant CHECK (((status = 'draft'::text) = (released_at IS NULL))),
    CONSTRAINT bill_revision_status_check CHECK ((status = ANY (ARRAY['draft'::text, 'released'::text, 'superseded'::text]))),
    CONSTRAINT bill_revision_superseded_instant CHECK (((status = 'superseded'::text) = (superseded_at IS NOT NULL)))
);

COMMENT ON TABLE public.bill_revision IS 'One numbered state of a part''s bill: what it is made of, how, and how it is tested.';

ALTER TABLE public.bill_revision ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.bill_revision_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.bin (
    id bigint NOT NULL,
    code text NOT NULL,
    name text DEFAULT ''::text NOT NULL,
    quarantine boolean DEFAULT false NOT NULL,
    retired_at timestamp with time zone,
    version integer DEFAULT 1 NOT NULL,
    CONSTRAINT bin_code_check CHECK (((code = upper(code)) AND (code ~ '^[A-Z0-9][A-Z0-9.-]{0,23}$'::text))),
    CONSTRAINT bin_name_check CHECK ((length(name) <= 120))
);

COMMENT ON TABLE public.bin IS 'A place on the shelf. What lies in a quarantine bin can be neither picked nor sold.';

ALTER TABLE public.bin ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.bin_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.build_step (
    id bigint NOT NULL,
    revision_id bigint NOT NULL,
    "position" integer NOT NULL,
    title text NOT NULL,
    instruction text DEFAULT ''::text NOT NULL,
    minutes numeric(9,2) DEFAULT 0 NOT NULL,
    caution text,
    CONSTRAINT build_step_minutes_check CHECK ((minutes >= (0)::numeric)),
    CONSTRAINT build_step_position_check CHECK (("position" > 0)),
    CONSTRAINT build_step_title_check CHECK (((length(title) >= 1) AND (length(title) <= 120)))
);

COMMENT ON TABLE public.build_step IS 'One thing to do when building to a revision, with the minutes it is expected to take.';

ALTER TABLE public.build_step ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.build_step_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.characteristic (
    id bigint NOT NULL,
    revision_id bigint NOT NULL,
    "position" integer NOT NULL,
    name text NOT NULL,
    kind text NOT NULL,
    unit text,
    lower_limit numeric,
    target numeric,
    upper_limit numeric,
    digits smallint,
    condition text,
    caution text,
    CONSTRAINT characteristic_digits_check CHECK (((digits >= 0) AND (digits <= 9))),
    CONSTRAINT characteristic_kind_check CHECK ((kind = ANY (ARRAY['numeric'::text, 'yes_no'::text]))),
    CONSTRAINT characteristic_limits_in_order CHECK ((lower_limit < upper_limit)),
    CONSTRAINT characteristic_name_check CHECK (((length(name) >= 1) AND (length(name) <= 120))),
    CONSTRAINT characteristic_numeric_has_limit CHECK (((kind <> 'numeric'::text) OR ((unit IS NOT NULL) AND (digits IS NOT NULL) AND ((lower_limit IS NOT NULL) OR (upper_limit IS NOT NULL))))),
    CONSTRAINT characteristic_position_check CHECK (("position" > 0)),
    CONSTRAINT characteristic_target_within CHECK (((target >= lower_limit) AND (target <= upper_limit))),
    CONSTRAINT characteristic_yes_no_has_none CHECK (((kind <> 'yes_no'::text) OR ((unit IS NULL) AND (lower_limit IS NULL) AND (target IS NULL) AND (upper_limit IS NULL))))
);

COMMENT ON TABLE public.characteristic IS 'One thing the test plan of a revision asks to measure or look at, with its limits.';

ALTER TABLE public.characteristic ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.characteristic_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.contents_line (
    id bigint NOT NULL,
    kit_part_id bigint NOT NULL,
    "position" integer NOT NULL,
    part_id bigint NOT NULL,
    quantity numeric(18,6) NOT NULL,
    bag text DEFAULT '1'::text NOT NULL,
    CONSTRAINT contents_line_bag_check CHECK (((length(bag) >= 1) AND (length(bag) <= 24))),
    CONSTRAINT contents_line_not_itself CHECK ((part_id <> kit_part_id)),
    CONSTRAINT contents_line_position_check CHECK (("position" > 0)),
    CONSTRAINT contents_line_quantity_check CHECK ((quantity > (0)::numeric))
);

COMMENT ON TABLE public.contents_line IS 'One line of a kit''s contents list: what goes into which bag.';

ALTER TABLE public.contents_line ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.contents_line_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.contents_list (
    kit_part_id bigint NOT NULL,
    version integer DEFAULT 1 NOT NULL,
    saved_at timestamp with time zone NOT NULL,
    saved_by bigint
);

COMMENT ON TABLE public.contents_list IS 'That a part is packed as a kit, and how often its contents list was saved.';

CREATE TABLE public.cost_pool (
    part_id bigint NOT NULL,
    lot_id bigint,
    quantity numeric(18,6) NOT NULL,
    value_minor bigint NOT NULL,
    CONSTRAINT cost_pool_empty_is_worth_nothing CHECK (((quantity > (0)::numeric) OR (value_minor = 0))),
    CONSTRAINT cost_pool_quantity_not_negative CHECK ((quantity >= (0)::numeric)),
    CONSTRAINT cost_pool_value_not_negative CHECK ((value_minor >= 0))
);

COMMENT ON TABLE public.cost_pool IS 'Quantity and value over which a part''s cost is averaged: one per part, or one per unit where units carry their own cost.';

CREATE TABLE public.country (
    code text NOT NULL,
    name text NOT NULL,
    in_union boolean NOT NULL,
    CONSTRAINT country_code_check CHECK ((code ~ '^[A-Z]{2}$'::text))
);

COMMENT ON TABLE public.country IS 'A country by its ISO 3166-1 code, and whether its goods are inside the European Union''s VAT area.';

CREATE TABLE public.customer (
    id bigint NOT NULL,
    kind text DEFAULT 'person'::text NOT NULL,
    name text NOT NULL,
    email text NOT NULL,
    vat_number text,
    created_at timestamp with time zone NOT NULL,
    version integer DEFAULT 1 NOT NULL,
    CONSTRAINT customer_kind_check CHECK ((kind = ANY (ARRAY['person'::text, 'company'::text]))),
    CONSTRAINT customer_name_check CHECK (((length(name) >= 1) AND (length(name) <= 120)))
);

COMMENT ON TABLE public.customer IS 'A buyer, a person or a company, with any number of sign-ins.';

ALTER TABLE public.customer ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.customer_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.delivery_rate (
    id bigint NOT NULL,
    country_code text NOT NULL,
    net_minor bigint NOT NULL,
    transit_days smallint NOT NULL,
    carries_lithium boolean DEFAULT true NOT NULL,
    valid_from date NOT NULL,
    CONSTRAINT delivery_rate_net_minor_check CHECK ((net_minor >= 0)),
    CONSTRAINT delivery_rate_transit_days_check CHECK (((transit_days >= 0) AND (transit_days <= 90)))
);

COMMENT ON TABLE public.delivery_rate IS 'What delivery to a country costs net, from a day on. No row: ask us.';

ALTER TABLE public.delivery_rate ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.delivery_rate_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.demand (
    id bigint NOT NULL,
    kind text NOT NULL,
    part_id bigint NOT NULL,
    quantity numeric(18,6) NOT NULL,
    taken numeric(18,6) DEFAULT 0 NOT NULL,
    needed_on date,
    reference text NOT NULL,
    created_at timestamp with time zone NOT NULL,
    closed_at timestamp with time zone,
    CONSTRAINT demand_kind_check CHECK ((kind = ANY (ARRAY['order_line'::text, 'batch_line'::text]))),
    CONSTRAINT demand_quantity_check CHECK ((quantity > (0)::numeric)),
    CONSTRAINT demand_taken_check CHECK ((taken >= (0)::numeric))
);

COMMENT ON TABLE public.demand IS 'A need for a quantity of a part: an order line or a batch line. Taken: what it has had so far.';

ALTER TABLE public.demand ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.demand_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.document (
    id bigint NOT NULL,
    kind text NOT NULL,
    number text NOT NULL,
    occurred_at timestamp with time zone NOT NULL,
    recorded_by bigint,
    note text,
    reverses_document_id bigint,
    CONSTRAINT document_kind_check CHECK ((kind = ANY (ARRAY['opening'::text, 'receipt'::text, 'transfer'::text, 'adjustment'::text, 'lot_status'::text, 'issue'::text, 'issue_return'::text, 'completion'::text, 'scrap'::text, 'packing'::text, 'shipment'::text, 'invoice'::text, 'credit_note'::text, 'payment'::text, 'refund'::text, 'cancellation'::text, 'manual_entry'::text, 'reversal'::text]))),
    CONSTRAINT document_reversal_names_one CHECK (((kind = 'reversal'::text) = (reverses_document_id IS NOT NULL)))
);

COMMENT ON TABLE public.document IS 'Something that happened, with its number, instant and person; moves and entries hang from it. No person: the system, on a payment event.';

ALTER TABLE public.document ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.document_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.file_chunk (
    file_id bigint NOT NULL,
    "position" integer NOT NULL,
    bytes bytea NOT NULL,
    CONSTRAINT file_chunk_bytes_check CHECK (((length(bytes) >= 1) AND (length(bytes) <= 262144))),
    CONSTRAINT file_chunk_position_check CHECK (("position" >= 0))
);
ALTER TABLE ONLY public.file_chunk ALTER COLUMN bytes SET STORAGE EXTERNAL;

COMMENT ON TABLE public.file_chunk IS 'A piece of a file''s content, in order from position 0, so that it can be streamed. Append-only.';

CREATE TABLE public.file_object (
    id bigint NOT NULL,
    sha256 bytea NOT NULL,
    byte_size integer NOT NULL,
    media_type text NOT NULL,
    stored_at timestamp with time zone NOT NULL,
    CONSTRAINT file_object_byte_size_check CHECK ((byte_size > 0)),
    CONSTRAINT file_object_sha256_check CHECK ((length(sha256) = 32))
);

COMMENT ON TABLE public.file_object IS 'The content of one or more files, addressed by its digest; names belong to the documents that refer to it. Append-only.';

COMMENT ON COLUMN public.file_object.media_type IS 'Found from the content when it was stored, never taken from the sender.';

ALTER TABLE public.file_object ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.file_object_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.idempotency_key (
    scope text NOT NULL,
    key text NOT NULL,
    request_hash bytea NOT NULL,
    claimed_at timestamp with time zone NOT NULL,
    status smallint,
    answer json,
    answered_at timestamp with time zone,
    CONSTRAINT idempotency_key_answer_whole CHECK (((status IS NULL) = (answered_at IS NULL))),
    CONSTRAINT idempotency_key_key_check CHECK (((length(key) >= 8) AND (length(key) <= 200))),
    CONSTRAINT idempotency_key_request_hash_check CHECK ((length(request_hash) = 32)),
    CONSTRAINT idempotency_key_status_check CHECK (((status >= 200) AND (status <= 599)))
);

COMMENT ON TABLE public.idempotency_key IS 'A creating request that took effect, with the answer it got, so that sending it again creates nothing and gets the same answer.';

COMMENT ON COLUMN public.idempotency_key.scope IS 'Who sent it: a person, or a visitor''s session.';

COMMENT ON COLUMN public.idempotency_key.answer IS 'As text, so that the repeated answer has the same bytes.';

CREATE TABLE public.import_run (
    id bigint NOT NULL,
    kind text NOT NULL,
    file_name text NOT NULL,
    content_sha256 bytea NOT NULL,
    row_count integer NOT NULL,
    applied_at timestamp with time zone NOT NULL,
    applied_by bigint NOT NULL,
    document_id bigint,
    CONSTRAINT import_run_content_sha256_check CHECK ((length(content_sha256) = 32)),
    CONSTRAINT import_run_kind_check CHECK ((kind = ANY (ARRAY['parts'::text, 'bill'::text, 'build_steps'::text, 'test_plan'::text, 'opening_stock'::text]))),
    CONSTRAINT import_run_row_count_check CHECK ((row_count >= 0))
);

COMMENT ON TABLE public.import_run IS 'A CSV file that was taken in whole.';

ALTER TABLE public.import_run ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.import_run_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.invoice (
    id bigint NOT NULL,
    document_id bigint NOT NULL,
    kind text NOT NULL,
    series text NOT NULL,
    year integer NOT NULL,
    sequence integer NOT NULL,
    number text NOT NULL,
    credits_invoice_id bigint,
    issued_at timestamp with time zone NOT NULL,
    issued_on date NOT NULL,
    tax_point date NOT NULL,
    due_on date,
    currency text NOT NULL,
    seller jsonb NOT NULL,
    buyer jsonb NOT NULL,
    customer_id bigint,
    reference text NOT NULL,
    vat_treatment text NOT NULL,
    vat_note text,
    net_minor bigint NOT NULL,
    vat_minor bigint NOT NULL,
    gross_minor bigint NOT NULL,
    prepaid_minor bigint DEFAULT 0 NOT NULL,
    reason text,
    CONSTRAINT invoice_adds_up CHECK (((net_minor + vat_minor) = gross_minor)),
    CONSTRAINT invoice_credit_names_invoice CHECK (((kind = 'credit_note'::text) = (credits_invoice_id IS NOT NULL))),
    CONSTRAINT invoice_credit_says_why CHECK (((kind = 'credit_note'::text) = (reason IS NOT NULL))),
    CONSTRAINT invoice_currency_check CHECK ((currency ~ '^[A-Z]{3}$'::text)),
    CONSTRAINT invoice_kind_check CHECK ((kind = ANY (ARRAY['invoice'::text, 'credit_note'::text]))),
    CONSTRAINT invoice_net_minor_check CHECK ((net_minor >= 0)),
    CONSTRAINT invoice_prepaid_minor_check CHECK ((prepaid_minor >= 0)),
    CONSTRAINT invoice_prepaid_within CHECK ((prepaid_minor <= gross_minor)),
    CONSTRAINT invoice_sequence_check CHECK ((sequence > 0)),
    CONSTRAINT invoice_series_check CHECK ((series ~ '^[A-Z]{1,6}$'::text)),
    CONSTRAINT invoice_vat_minor_check CHECK ((vat_minor >= 0)),
    CONSTRAINT invoice_vat_treatment_check CHECK ((vat_treatment = ANY (ARRAY['home'::text, 'destination'::text, 'export'::text, 'intra_community'::text]))),
    CONSTRAINT invoice_year_check CHECK (((year >= 2000) AND (year <= 9999)))
);

COMMENT ON TABLE public.invoice IS 'An invoice or credit note as it was issued; buyer and seller as they were on that day. Never changed.';

CREATE TABLE public.invoice_charge (
    id bigint NOT NULL,
    invoice_id bigint NOT NULL,
    "position" integer NOT NULL,
    kind text NOT NULL,
    reason text NOT NULL,
    amount_minor bigint NOT NULL,
    vat_category text NOT NULL,
    vat_rate numeric(7,4) NOT NULL,
    CONSTRAINT invoice_charge_amount_minor_check CHECK ((amount_minor > 0)),
    CONSTRAINT invoice_charge_kind_check CHECK ((kind = ANY (ARRAY['charge'::text, 'allowance'::text]))),
    CONSTRAINT invoice_charge_position_check CHECK (("position" > 0)),
    CONSTRAINT invoice_charge_vat_category_check CHECK ((vat_category = ANY (ARRAY['S'::text, 'Z'::text, 'E'::text, 'AE'::text, 'K'::text, 'G'::text, 'O'::text]))),
    CONSTRAINT invoice_charge_vat_rate_check CHECK (((vat_rate >= (0)::numeric) AND (vat_rate < (100)::numeric)))
);

COMMENT ON TABLE public.invoice_charge IS 'A charge (delivery) or allowance on the whole invoice.';

ALTER TABLE public.invoice_charge ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.invoice_charge_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.invoice_file (
    invoice_id bigint NOT NULL,
    kind text NOT NULL,
    file_id bigint NOT NULL,
    CONSTRAINT invoice_file_kind_check CHECK ((kind = ANY (ARRAY['pdf'::text, 'ubl'::text])))
);

COMMENT ON TABLE public.invoice_file IS 'The invoice as a file, made once after it was issued.';

ALTER TABLE public.invoice ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.invoice_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.invoice_line (
    id bigint NOT NULL,
    invoice_id bigint NOT NULL,
    "position" integer NOT NULL,
    part_id bigint,
    code text NOT NULL,
    description text NOT NULL,
    quantity numeric(18,6) NOT NULL,
    measure text NOT NULL,
    unit_net numeric(18,6) NOT NULL,
    net_minor bigint NOT NULL,
    vat_category text NOT NULL,
    vat_rate numeric(7,4) NOT NULL,
    CONSTRAINT invoice_line_net_minor_check CHECK ((net_minor >= 0)),
    CONSTRAINT invoice_line_position_check CHECK (("position" > 0)),
    CONSTRAINT invoice_line_quantity_check CHECK ((quantity > (0)::numeric)),
    CONSTRAINT invoice_line_unit_net_check CHECK ((unit_net >= (0)::numeric)),
    CONSTRAINT invoice_line_vat_category_check CHECK ((vat_category = ANY (ARRAY['S'::text, 'Z'::text, 'E'::text, 'AE'::text, 'K'::text, 'G'::text, 'O'::text]))),
    CONSTRAINT invoice_line_vat_rate_check CHECK (((vat_rate >= (0)::numeric) AND (vat_rate < (100)::numeric)))
);

COMMENT ON TABLE public.invoice_line IS 'One line of an invoice or credit note. Unit price in major units with up to six decimals.';

ALTER TABLE public.invoice_line ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.invoice_line_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.invoice_vat (
    invoice_id bigint NOT NULL,
    vat_category text NOT NULL,
    vat_rate numeric(7,4) NOT NULL,
    taxable_minor bigint NOT NULL,
    vat_minor bigint NOT NULL,
    reason text,
    CONSTRAINT invoice_vat_taxable_minor_check CHECK ((taxable_minor >= 0)),
    CONSTRAINT invoice_vat_vat_minor_check CHECK ((vat_minor >= 0))
);

COMMENT ON TABLE public.invoice_vat IS 'VAT of an invoice, once per category and rate.';

CREATE TABLE public.journal_entry (
    id bigint NOT NULL,
    document_id bigint NOT NULL,
    event text NOT NULL,
    source_key text NOT NULL,
    day date NOT NULL,
    posted_at timestamp with time zone NOT NULL,
    recorded_by bigint,
    narrative text NOT NULL
);

COMMENT ON TABLE public.journal_entry IS 'A balanced double entry for one event. The source key lets each event post once.';

ALTER TABLE public.journal_entry ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.journal_entry_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.journal_line (
    id bigint NOT NULL,
    entry_id bigint NOT NULL,
    account_code text NOT NULL,
    debit_minor bigint DEFAULT 0 NOT NULL,
    credit_minor bigint DEFAULT 0 NOT NULL,
    CONSTRAINT journal_line_credit_minor_check CHECK ((credit_minor >= 0)),
    CONSTRAINT journal_line_debit_minor_check CHECK ((debit_minor >= 0)),
    CONSTRAINT journal_line_one_side CHECK (((debit_minor = 0) <> (credit_minor = 0)))
);

COMMENT ON TABLE public.journal_line IS 'One side of an entry on one account, in minor units of the shop''s currency.';

ALTER TABLE public.journal_line ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.journal_line_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.listing (
    id bigint NOT NULL,
    slug text NOT NULL,
    part_id bigint NOT NULL,
    form text NOT NULL,
    family text NOT NULL,
    title text NOT NULL,
    summary text NOT NULL,
    description text DEFAULT ''::text NOT NULL,
    skills text,
    cautions text[] DEFAULT '{}'::text[] NOT NULL,
    drawing text,
    net_minor bigint NOT NULL,
    place integer DEFAULT 100 NOT NULL,
    published_at timestamp with time zone,
    version integer DEFAULT 1 NOT NULL,
    CONSTRAINT listing_family_check CHECK (((length(family) >= 1) AND (length(family) <= 60))),
    CONSTRAINT listing_form_check CHECK ((form = ANY (ARRAY['tool'::text, 'kit'::text, 'spare'::text]))),
    CONSTRAINT listing_kit_names_skills CHECK (((form <> 'kit'::text) OR (skills IS NOT NULL))),
    CONSTRAINT listing_net_minor_check CHECK ((net_minor > 0)),
    CONSTRAINT listing_slug_check CHECK ((slug ~ '^[a-z0-9][a-z0-9-]{0,59}$'::text)),
    CONSTRAINT listing_title_check CHECK (((length(title) >= 1) AND (length(title) <= 120)))
);

COMMENT ON TABLE public.listing IS 'A part as it is offered on the storefront, at a price net of VAT.';

ALTER TABLE public.listing ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.listing_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.lot (
    id bigint NOT NULL,
    code text NOT NULL,
    part_id bigint NOT NULL,
    kind text NOT NULL,
    status text NOT NULL,
    supplier_id bigint,
    supplier_lot_code text,
    received_on date,
    expires_on date,
    unit_cost numeric(18,6),
    parent_lot_id bigint,
    document_id bigint,
    note text,
    created_at timestamp with time zone NOT NULL,
    version integer DEFAULT 1 NOT NULL,
    CONSTRAINT lot_kind_check CHECK ((kind = ANY (ARRAY['standing'::text, 'delivery'::text, 'made'::text, 'unit'::text]))),
    CONSTRAINT lot_status_check CHECK ((status = ANY (ARRAY['held'::text, 'released'::text, 'rejected'::text]))),
    CONSTRAINT lot_unit_cost_check CHECK ((unit_cost >= (0)::numeric))
);

COMMENT ON TABLE public.lot IS 'A quantity of one part with one origin. Parts traced by count use one standing lot; a finished unit is a lot of one.';

COMMENT ON COLUMN public.lot.unit_cost IS 'What one stock unit cost when it came; the value of what lies here follows the cost pool.';

ALTER TABLE public.lot ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.lot_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.lot_status_change (
    document_id bigint NOT NULL,
    lot_id bigint NOT NULL,
    from_status text NOT NULL,
    to_status text NOT NULL,
    reason text NOT NULL,
    CONSTRAINT lot_status_change_changes CHECK ((from_status <> to_status)),
    CONSTRAINT lot_status_change_reason_check CHECK (((length(reason) >= 1) AND (length(reason) <= 500))),
    CONSTRAINT lot_status_change_to_status_check CHECK ((to_status = ANY (ARRAY['held'::text, 'released'::text, 'rejected'::text])))
);

COMMENT ON TABLE public.lot_status_change IS 'A lot was held, released or rejected, and why.';

CREATE TABLE public.nonconformity (
    id bigint NOT NULL,
    number text NOT NULL,
    unit_id bigint NOT NULL,
    run_id bigint,
    batch_step_id bigint,
    lot_id bigint,
    what text NOT NULL,
    cause text,
    action text,
    outcome text,
    found_at timestamp with time zone NOT NULL,
    found_by bigint,
    closed_at timestamp with time zone,
    closed_by bigint,
    version integer DEFAULT 1 NOT NULL,
    CONSTRAINT nonconformity_closed_with_outcome CHECK (((closed_at IS NULL) = (outcome IS NULL))),
    CONSTRAINT nonconformity_outcome_check CHECK ((outcome = ANY (ARRAY['reworked'::text, 'scrapped'::text, 'no_fault'::text]))),
    CONSTRAINT nonconformity_what_check CHECK (((length(what) >= 1) AND (length(what) <= 500)))
);

COMMENT ON TABLE public.nonconformity IS 'A fault: what was wrong with a unit, where it was found, why, and what was done.';

ALTER TABLE public.nonconformity ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.nonconformity_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.number_series (
    series text NOT NULL,
    period text NOT NULL,
    last_number integer NOT NULL,
    CONSTRAINT number_series_last_number_check CHECK ((last_number > 0)),
    CONSTRAINT number_series_series_check CHECK ((series ~ '^[a-z][a-z_]*$'::text))
);

COMMENT ON TABLE public.number_series IS 'The last number given in a series and period. The row stays locked until the document that takes the number is committed, so no number is lost or given twice.';

COMMENT ON COLUMN public.number_series.period IS 'The year, or an empty text for a series that never starts again.';

CREATE TABLE public.order_cancellation (
    document_id bigint NOT NULL,
    order_id bigint NOT NULL,
    reason text NOT NULL,
    CONSTRAINT order_cancellation_reason_check CHECK (((length(reason) >= 1) AND (length(reason) <= 500)))
);

COMMENT ON TABLE public.order_cancellation IS 'An order was cancelled before it left, or was never paid.';

CREATE TABLE public.order_invoice (
    invoice_id bigint NOT NULL,
    order_id bigint NOT NULL
);

COMMENT ON TABLE public.order_invoice IS 'The invoices and credit notes of an order.';

CREATE TABLE public.order_line (
    id bigint NOT NULL,
    order_id bigint NOT NULL,
    "position" integer NOT NULL,
    listing_id bigint NOT NULL,
    part_id bigint NOT NULL,
    form text NOT NULL,
    title text NOT NULL,
    quantity integer NOT NULL,
    unit_net_minor bigint NOT NULL,
    net_minor bigint NOT NULL,
    vat_category text NOT NULL,
    vat_rate numeric(7,4) NOT NULL,
    CONSTRAINT order_line_adds_up CHECK ((net_minor = (unit_net_minor * quantity))),
    CONSTRAINT order_line_form_check CHECK ((form = ANY (ARRAY['tool'::text, 'kit'::text, 'spare'::text]))),
    CONSTRAINT order_line_position_check CHECK (("position" > 0)),
    CONSTRAINT order_line_quantity_check CHECK (((quantity >= 1) AND (quantity <= 100))),
    CONSTRAINT order_line_unit_net_minor_check CHECK ((unit_net_minor >= 0)),
    CONSTRAINT order_line_vat_category_check CHECK ((vat_category = ANY (ARRAY['S'::text, 'Z'::text, 'E'::text, 'AE'::text, 'K'::text, 'G'::text, 'O'::text]))),
    CONSTRAINT order_line_vat_rate_check CHECK (((vat_rate >= (0)::numeric) AND (vat_rate < (100)::numeric)))
);

COMMENT ON TABLE public.order_line IS 'One listing of an order, at the price it was sold for.';

ALTER TABLE public.order_line ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.order_line_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.order_line_need (
    id bigint NOT NULL,
    order_line_id bigint NOT NULL,
    part_id bigint NOT NULL,
    quantity numeric(18,6) NOT NULL,
    bag text,
    demand_id bigint NOT NULL,
    CONSTRAINT order_line_need_quantity_check CHECK ((quantity > (0)::numeric))
);

COMMENT ON TABLE public.order_line_need IS 'What must leave the shelf for an order line: the tool itself, or each line of a kit''s contents list as it was then.';

ALTER TABLE public.order_line_need ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.order_line_need_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.outbox_mail (
    id bigint NOT NULL,
    dedupe_key text NOT NULL,
    recipient text NOT NULL,
    subject text NOT NULL,
    body_text text NOT NULL,
    body_html text NOT NULL,
    confidential boolean DEFAULT false NOT NULL,
    message_id text NOT NULL,
    created_at timestamp with time zone NOT NULL,
    attempts integer DEFAULT 0 NOT NULL,
    next_attempt_at timestamp with time zone NOT NULL,
    claimed_at timestamp with time zone,
    sent_at timestamp with time zone,
    given_up_at timestamp with time zone,
    last_error text,
    CONSTRAINT outbox_mail_attempts_check CHECK ((attempts >= 0)),
    CONSTRAINT outbox_mail_one_end CHECK (((sent_at IS NULL) OR (given_up_at IS NULL))),
    CONSTRAINT outbox_mail_recipient_check CHECK ((recipient !~ '[\r\n,;]'::text)),
    CONSTRAINT outbox_mail_subject_check CHECK ((subject !~ '[\r\n]'::text))
);

COMMENT ON TABLE public.outbox_mail IS 'A mail that is to leave once; written in the transaction of the event that it tells of.';

COMMENT ON COLUMN public.outbox_mail.dedupe_key IS 'Names the event, so that one event sends one mail.';

COMMENT ON COLUMN public.outbox_mail.confidential IS 'Its text holds a link that lets somebody in, and is emptied once it has left.';

COMMENT ON COLUMN public.outbox_mail.claimed_at IS 'Set while a sender has it in hand. One left behind by a broken sender may have left: it waits for a person.';

CREATE TABLE public.outbox_mail_attachment (
    mail_id bigint NOT NULL,
    "position" integer NOT NULL,
    file_id bigint NOT NULL,
    file_name text NOT NULL,
    CONSTRAINT outbox_mail_attachment_file_name_check CHECK ((file_name !~ '[\r\n/\\]'::text)),
    CONSTRAINT outbox_mail_attachment_position_check CHECK (("position" >= 0))
);

COMMENT ON TABLE public.outbox_mail_attachment IS 'A stored file that goes with a mail, under the name that the reader sees.';

ALTER TABLE public.outbox_mail ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.outbox_mail_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.packed_item (
    id bigint NOT NULL,
    shipment_id bigint NOT NULL,
    order_line_need_id bigint NOT NULL,
    part_id bigint NOT NULL,
    lot_id bigint NOT NULL,
    bin_id bigint NOT NULL,
    unit_id bigint,
    quantity numeric(18,6) NOT NULL,
    packed_at timestamp with time zone NOT NULL,
    packed_by bigint,
    taken_out_at timestamp with time zone,
    returned_at timestamp with time zone,
    CONSTRAINT packed_item_quantity_check CHECK ((quantity > (0)::numeric)),
    CONSTRAINT packed_item_unit_is_one CHECK (((unit_id IS NULL) OR (quantity = (1)::numeric)))
);

COMMENT ON TABLE public.packed_item IS 'What was scanned into a parcel: a unit, or a quantity of a lot. A unit is in one parcel at a time.';

ALTER TABLE public.packed_item ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.packed_item_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.part (
    id bigint NOT NULL,
    code text NOT NULL,
    name text NOT NULL,
    description text,
    measure text NOT NULL,
    traced text NOT NULL,
    serial_letters text,
    reorder_point numeric(18,6),
    unit_weight_g numeric(18,6),
    shelf_life_days integer,
    origin_country_code text,
    commodity_code text,
    photo_file_id bigint,
    retired_on date,
    created_at timestamp with time zone NOT NULL,
    created_by bigint,
    version integer DEFAULT 1 NOT NULL,
    CONSTRAINT part_code_check CHECK (((code = upper(code)) AND (code ~ '^[A-Z0-9][A-Z0-9./-]{0,31}$'::text))),
    CONSTRAINT part_measure_check CHECK ((measure = ANY (ARRAY['piece'::text, 'pair'::text, 'set'::text, 'm'::text, 'mm'::text, 'kg'::text, 'g'::text, 'l'::text, 'ml'::text]))),
    CONSTRAINT part_name_check CHECK (((length(name) >= 1) AND (length(name) <= 120))),
    CONSTRAINT part_reorder_point_check CHECK ((reorder_point >= (0)::numeric)),
    CONSTRAINT part_serial_letters_form CHECK ((serial_letters ~ '^[A-Z]{2,3}$'::text)),
    CONSTRAINT part_shelf_life_days_check CHECK ((shelf_life_days > 0)),
    CONSTRAINT part_single_has_letters CHECK (((traced = 'single'::text) = (serial_letters IS NOT NULL))),
    CONSTRAINT part_single_is_a_piece CHECK (((traced <> 'single'::text) OR (measure = 'piece'::text))),
    CONSTRAINT part_traced_check CHECK ((traced = ANY (ARRAY['count'::text, 'delivery'::text, 'single'::text]))),
    CONSTRAINT part_unit_weight_g_check CHECK ((unit_weight_g >= (0)::numeric))
);

COMMENT ON TABLE public.part IS 'Anything that can lie on the shelf: bought part, made part, kit or finished tool.';

COMMENT ON COLUMN public.part.traced IS 'How closely it is followed: by count, by delivery (lots), or one by one (serial numbers).';

COMMENT ON COLUMN public.part.serial_letters IS 'Two or three letters that begin the serial numbers of units made one by one.';

CREATE TABLE public.part_battery (
    part_id bigint NOT NULL,
    kind text NOT NULL,
    chemistry text NOT NULL,
    watt_hours numeric(12,3),
    lithium_grams numeric(12,3),
    cell_count smallint,
    transport_test_reference text,
    transport_test_passed_on date,
    CONSTRAINT part_battery_cell_count_check CHECK ((cell_count > 0)),
    CONSTRAINT part_battery_chemistry_check CHECK ((chemistry = ANY (ARRAY['lithium_ion'::text, 'lithium_metal'::text]))),
    CONSTRAINT part_battery_kind_check CHECK ((kind = ANY (ARRAY['cell'::text, 'battery'::text]))),
    CONSTRAINT part_battery_lithium_grams_check CHECK ((lithium_grams > (0)::numeric)),
    CONSTRAINT part_battery_watt_hours_check CHECK ((watt_hours > (0)::numeric))
);

COMMENT ON TABLE public.part_battery IS 'What the transport papers must know of a part that is a lithium cell or battery.';

COMMENT ON COLUMN public.part_battery.transport_test_reference IS 'The test summary of this very design; without one a pack is never shipped.';

ALTER TABLE public.part ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.part_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.part_parameter (
    id bigint NOT NULL,
    part_id bigint NOT NULL,
    name text NOT NULL,
    value_number numeric,
    value_text text,
    unit text,
    said text GENERATED ALWAYS AS ((((name || ' '::text) || COALESCE(value_text, (trim_scale(value_number))::text)) || COALESCE(unit, ''::text))) STORED NOT NULL,
    CONSTRAINT part_parameter_name_check CHECK (((length(name) >= 1) AND (length(name) <= 60))),
    CONSTRAINT part_parameter_one_value CHECK (((value_number IS NULL) <> (value_text IS NULL)))
);

COMMENT ON TABLE public.part_parameter IS 'One property of a part, a number with its unit or a word.';

ALTER TABLE public.part_parameter ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.part_parameter_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.part_supplier (
    part_id bigint NOT NULL,
    supplier_id bigint NOT NULL,
    supplier_part_code text,
    lead_time_days integer,
    preferred boolean DEFAULT false NOT NULL,
    CONSTRAINT part_supplier_lead_time_days_check CHECK (((lead_time_days >= 0) AND (lead_time_days <= 730)))
);

COMMENT ON TABLE public.part_supplier IS 'A supplier from whom a part can be bought.';

CREATE TABLE public.payment (
    document_id bigint NOT NULL,
    order_id bigint NOT NULL,
    payment_session_id bigint NOT NULL,
    amount_minor bigint NOT NULL,
    currency text NOT NULL,
    provider_payment_id text NOT NULL,
    received_at timestamp with time zone NOT NULL,
    CONSTRAINT payment_amount_minor_check CHECK ((amount_minor > 0))
);

COMMENT ON TABLE public.payment IS 'Money received for an order. Append only.';

CREATE TABLE public.payment_event (
    provider_event_id text NOT NULL,
    type text NOT NULL,
    object_id text NOT NULL,
    payload jsonb NOT NULL,
    received_at timestamp with time zone NOT NULL,
    outcome text NOT NULL
);

COMMENT ON TABLE public.payment_event IS 'An event the payment service sent, kept once; what it did is in the outcome. Append only.';

CREATE TABLE public.payment_review (
    id bigint NOT NULL,
    order_id bigint,
    provider_event_id text,
    what text NOT NULL,
    created_at timestamp with time zone NOT NULL,
    settled_at timestamp with time zone,
    settled_by bigint,
    resolution text,
    CONSTRAINT payment_review_settled_says_how CHECK (((settled_at IS NULL) = (resolution IS NULL)))
);

COMMENT ON TABLE public.payment_review IS 'A payment that does not fit its order: nothing leaves until a person has looked.';

ALTER TABLE public.payment_review ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.payment_review_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.payment_session (
    id bigint NOT NULL,
    order_id bigint NOT NULL,
    operation_key uuid NOT NULL,
    provider_session_id text,
    amount_minor bigint NOT NULL,
    currency text NOT NULL,
    page_url text,
    status text DEFAULT 'opening'::text NOT NULL,
    expires_at timestamp with time zone NOT NULL,
    created_at timestamp with time zone NOT NULL,
    CONSTRAINT payment_session_amount_minor_check CHECK ((amount_minor > 0)),
    CONSTRAINT payment_session_status_check CHECK ((status = ANY (ARRAY['opening'::text, 'open'::text, 'paid'::text, 'waiting'::text, 'expired'::text, 'failed'::text])))
);

COMMENT ON TABLE public.payment_session IS 'One try to have an order paid on the hosted payment page.';

ALTER TABLE public.payment_session ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.payment_session_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.period (
    month date NOT NULL,
    closed_at timestamp with time zone,
    closed_by bigint,
    CONSTRAINT period_month_check CHECK ((month = (date_trunc('month'::text, (month)::timestamp with time zone))::date))
);

COMMENT ON TABLE public.period IS 'A month of the books. A closed one accepts no entry.';

CREATE TABLE public.posting_rule (
    event text NOT NULL,
    component text NOT NULL,
    debit_account_code text NOT NULL,
    credit_account_code text NOT NULL,
    sentence text NOT NULL
);

COMMENT ON TABLE public.posting_rule IS 'Which account an amount of an event is debited and which credited: the one table by which events become entries.';

CREATE TABLE public.reading (
    id bigint NOT NULL,
    run_id bigint NOT NULL,
    characteristic_id bigint NOT NULL,
    value numeric,
    typed text,
    answer boolean,
    unit text,
    lower_limit numeric,
    upper_limit numeric,
    verdict text NOT NULL,
    measured_at timestamp with time zone NOT NULL,
    received_at timestamp with time zone NOT NULL,
    recorded_by bigint NOT NULL,
    client_key uuid NOT NULL,
    CONSTRAINT reading_number_or_answer CHECK (((value IS NULL) <> (answer IS NULL))),
    CONSTRAINT reading_verdict_check CHECK ((verdict = ANY (ARRAY['within'::text, 'outside'::text])))
);

COMMENT ON TABLE public.reading IS 'One measured value or answer with the limits it was judged by. A later reading of the same characteristic in a run takes its place; none is removed.';

ALTER TABLE public.reading ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.reading_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.receipt (
    document_id bigint NOT NULL,
    supplier_id bigint NOT NULL,
    delivery_note text,
    received_on date NOT NULL
);

COMMENT ON TABLE public.receipt IS 'A delivery from a supplier; its lots and moves carry the same document.';

CREATE TABLE public.refund (
    id bigint NOT NULL,
    document_id bigint NOT NULL,
    order_id bigint NOT NULL,
    payment_document_id bigint NOT NULL,
    credit_note_id bigint NOT NULL,
    amount_minor bigint NOT NULL,
    operation_key uuid NOT NULL,
    provider_refund_id text,
    status text DEFAULT 'requested'::text NOT NULL,
    requested_at timestamp with time zone NOT NULL,
    requested_by bigint,
    settled_at timestamp with time zone,
    CONSTRAINT refund_amount_minor_check CHECK ((amount_minor > 0)),
    CONSTRAINT refund_status_check CHECK ((status = ANY (ARRAY['requested'::text, 'sent'::text, 'failed'::text])))
);

COMMENT ON TABLE public.refund IS 'Money going back to a buyer, each with its credit note.';

ALTER TABLE public.refund ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.refund_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.reservation (
    id bigint NOT NULL,
    demand_id bigint NOT NULL,
    part_id bigint NOT NULL,
    quantity numeric(18,6) NOT NULL,
    supply text NOT NULL,
    batch_id bigint,
    lot_id bigint,
    of_unit boolean DEFAULT false NOT NULL,
    expires_at timestamp with time zone,
    created_at timestamp with time zone NOT NULL,
    ended_at timestamp with time zone,
    end_reason text,
    CONSTRAINT reservation_batch_named CHECK (((supply = 'batch'::text) = (batch_id IS NOT NULL))),
    CONSTRAINT reservation_end_reason_check CHECK ((end_reason = ANY (ARRAY['taken'::text, 'expired'::text, 'cancelled'::text, 'moved'::text]))),
    CONSTRAINT reservation_end_says_why CHECK (((ended_at IS NULL) = (end_reason IS NULL))),
    CONSTRAINT reservation_quantity_check CHECK ((quantity > (0)::numeric)),
    CONSTRAINT reservation_supply_check CHECK ((supply = ANY (ARRAY['shelf'::text, 'batch'::text]))),
    CONSTRAINT reservation_unit_has_lot CHECK (((NOT of_unit) OR ((lot_id IS NOT NULL) AND (quantity = (1)::numeric))))
);

COMMENT ON TABLE public.reservation IS 'A claim of a demand on a quantity of one supply: the shelf or a batch under way; bound to a lot or unit only at picking or packing.';

ALTER TABLE public.reservation ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.reservation_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.rework (
    id bigint NOT NULL,
    unit_id bigint NOT NULL,
    nonconformity_id bigint,
    what text NOT NULL,
    minutes numeric(9,2) DEFAULT 0 NOT NULL,
    done_at timestamp with time zone NOT NULL,
    done_by bigint,
    CONSTRAINT rework_minutes_check CHECK ((minutes >= (0)::numeric)),
    CONSTRAINT rework_what_check CHECK (((length(what) >= 1) AND (length(what) <= 500)))
);

COMMENT ON TABLE public.rework IS 'Work done again on a unit; it voids the pass the unit had.';

ALTER TABLE public.rework ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.rework_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.sales_order (
    id bigint NOT NULL,
    number text NOT NULL,
    customer_id bigint NOT NULL,
    guest_token_sha256 bytea,
    placed_at timestamp with time zone NOT NULL,
    email text NOT NULL,
    recipient text NOT NULL,
    company text,
    address_line text NOT NULL,
    address_line_2 text,
    city text NOT NULL,
    postcode text NOT NULL,
    country_code text NOT NULL,
    currency text NOT NULL,
    vat_treatment text NOT NULL,
    vat_note text,
    delivery_net_minor bigint NOT NULL,
    net_minor bigint NOT NULL,
    vat_minor bigint NOT NULL,
    gross_minor bigint NOT NULL,
    promised_on date NOT NULL,
    version integer DEFAULT 1 NOT NULL,
    CONSTRAINT sales_order_adds_up CHECK (((net_minor + vat_minor) = gross_minor)),
    CONSTRAINT sales_order_currency_check CHECK ((currency ~ '^[A-Z]{3}$'::text)),
    CONSTRAINT sales_order_delivery_net_minor_check CHECK ((delivery_net_minor >= 0)),
    CONSTRAINT sales_order_gross_minor_check CHECK ((gross_minor > 0)),
    CONSTRAINT sales_order_net_minor_check CHECK ((net_minor >= 0)),
    CONSTRAINT sales_order_vat_minor_check CHECK ((vat_minor >= 0)),
    CONSTRAINT sales_order_vat_treatment_check CHECK ((vat_treatment = ANY (ARRAY['home'::text, 'destination'::text, 'export'::text, 'intra_community'::text])))
);

COMMENT ON TABLE public.sales_order IS 'What a buyer ordered and was promised. It stores no status: that is read from the documents beside it.';

ALTER TABLE public.sales_order ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.sales_order_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.schema_migration (
    name text NOT NULL,
    sha256 text NOT NULL,
    applied_at timestamp with time zone DEFAULT clock_timestamp() NOT NULL,
    CONSTRAINT schema_migration_sha256_check CHECK ((sha256 ~ '^[0-9a-f]{64}$'::text))
);

COMMENT ON TABLE public.schema_migration IS 'One row per migration file applied to this database.';

CREATE TABLE public.shipment (
    id bigint NOT NULL,
    number text NOT NULL,
    order_id bigint NOT NULL,
    status text DEFAULT 'packing'::text NOT NULL,
    opened_at timestamp with time zone NOT NULL,
    opened_by bigint,
    packed_at timestamp with time zone,
    shipped_at timestamp with time zone,
    shipped_by bigint,
    carrier text,
    tracking_code text,
    weight_g integer,
    lithium jsonb,
    document_id bigint,
    version integer DEFAULT 1 NOT NULL,
    CONSTRAINT shipment_shipped_complete CHECK (((status = 'shipped'::text) = ((shipped_at IS NOT NULL) AND (document_id IS NOT NULL)))),
    CONSTRAINT shipment_status_check CHECK ((status = ANY (ARRAY['packing'::text, 'packed'::text, 'shipped'::text, 'dissolved'::text]))),
    CONSTRAINT shipment_weight_g_check CHECK ((weight_g > 0))
);

COMMENT ON TABLE public.shipment IS 'A parcel of an order, from the first thing scanned into it until it leaves.';

ALTER TABLE public.shipment ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.shipment_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.shop (
    id boolean DEFAULT true NOT NULL,
    name text NOT NULL,
    legal_name text NOT NULL,
    address_line text NOT NULL,
    city text NOT NULL,
    postcode text NOT NULL,
    country_code text NOT NULL,
    email text NOT NULL,
    phone text,
    vat_number text,
    registration_number text,
    bank_name text,
    iban text,
    currency text NOT NULL,
    zone text NOT NULL,
    working_weekdays smallint[] DEFAULT '{1,2,3,4,5}'::smallint[] NOT NULL,
    handling_days smallint DEFAULT 1 NOT NULL,
    checkout_hold_minutes smallint DEFAULT 45 NOT NULL,
    labour_rate_minor bigint DEFAULT 0 NOT NULL,
    warranty_months smallint DEFAULT 24 NOT NULL,
    one_stop_shop_from date,
    version integer DEFAULT 1 NOT NULL,
    CONSTRAINT shop_checkout_hold_minutes_check CHECK (((checkout_hold_minutes >= 31) AND (checkout_hold_minutes <= 1440))),
    CONSTRAINT shop_currency_check CHECK ((currency ~ '^[A-Z]{3}$'::text)),
    CONSTRAINT shop_handling_days_check CHECK (((handling_days >= 0) AND (handling_days <= 60))),
    CONSTRAINT shop_id_check CHECK (id),
    CONSTRAINT shop_labour_rate_minor_check CHECK ((labour_rate_minor >= 0)),
    CONSTRAINT shop_warranty_months_check CHECK (((warranty_months >= 0) AND (warranty_months <= 240)))
);

COMMENT ON TABLE public.shop IS 'The one shop of this installation: its name, address, tax numbers, calendar and rates.';

COMMENT ON COLUMN public.shop.working_weekdays IS 'ISO weekdays on which the shop works, Monday 1 to Sunday 7.';

COMMENT ON COLUMN public.shop.checkout_hold_minutes IS 'How long goods stay claimed for a buyer on the payment page; longer than the page itself lives.';

COMMENT ON COLUMN public.shop.labour_rate_minor IS 'Cost of one hour at the bench, in minor units.';

COMMENT ON COLUMN public.shop.one_stop_shop_from IS 'First day on which destination VAT is charged to consumers in other union countries; empty: not elected.';

CREATE TABLE public.shop_closed_day (
    day date NOT NULL,
    name text NOT NULL
);

COMMENT ON TABLE public.shop_closed_day IS 'A day on which the shop does not work although its weekday would.';

CREATE TABLE public.stock_balance (
    lot_id bigint NOT NULL,
    bin_id bigint NOT NULL,
    owner_customer_id bigint,
    part_id bigint NOT NULL,
    quantity numeric(18,6) NOT NULL,
    CONSTRAINT stock_balance_not_negative CHECK ((quantity >= (0)::numeric))
);

COMMENT ON TABLE public.stock_balance IS 'What lies of a lot in a bin: the sum of its moves, kept by the database in the same statement as the move.';

CREATE TABLE public.stock_move (
    id bigint NOT NULL,
    document_id bigint NOT NULL,
    part_id bigint NOT NULL,
    lot_id bigint NOT NULL,
    bin_id bigint NOT NULL,
    owner_customer_id bigint,
    quantity numeric(18,6) NOT NULL,
    unit_cost numeric(18,6) NOT NULL,
    value_minor bigint NOT NULL,
    reason text NOT NULL,
    occurred_at timestamp with time zone NOT NULL,
    recorded_by bigint,
    reverses_move_id bigint,
    CONSTRAINT stock_move_buyers_goods_have_no_value CHECK (((owner_customer_id IS NULL) OR (value_minor = 0))),
    CONSTRAINT stock_move_reason_check CHECK ((reason = ANY (ARRAY['opening'::text, 'receipt'::text, 'transfer'::text, 'found'::text, 'lost'::text, 'damaged'::text, 'counted'::text, 'issue'::text, 'issue_return'::text, 'completion'::text, 'scrap'::text, 'dispatch'::text, 'return'::text, 'late_cost'::text, 'write_down'::text, 'reversal'::text]))),
    CONSTRAINT stock_move_says_something CHECK (((quantity <> (0)::numeric) OR (value_minor <> 0))),
    CONSTRAINT stock_move_signs_agree CHECK (((quantity = (0)::numeric) OR (value_minor = 0) OR ((sign(quantity))::double precision = sign((value_minor)::double precision)))),
    CONSTRAINT stock_move_unit_cost_check CHECK ((unit_cost >= (0)::numeric))
);

COMMENT ON TABLE public.stock_move IS 'The stock ledger: one signed change of one lot in one bin, with its value in minor units. Append only.';

ALTER TABLE public.stock_move ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.stock_move_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.supplier (
    id bigint NOT NULL,
    code text NOT NULL,
    name text NOT NULL,
    email text,
    phone text,
    country_code text,
    currency text NOT NULL,
    lead_time_days integer,
    note text,
    created_at timestamp with time zone NOT NULL,
    version integer DEFAULT 1 NOT NULL,
    CONSTRAINT supplier_code_check CHECK (((code = upper(code)) AND (code ~ '^[A-Z0-9][A-Z0-9-]{0,23}$'::text))),
    CONSTRAINT supplier_currency_check CHECK ((currency ~ '^[A-Z]{3}$'::text)),
    CONSTRAINT supplier_lead_time_days_check CHECK (((lead_time_days >= 0) AND (lead_time_days <= 730))),
    CONSTRAINT supplier_name_check CHECK (((length(name) >= 1) AND (length(name) <= 120)))
);

COMMENT ON TABLE public.supplier IS 'Somebody the shop buys from.';

ALTER TABLE public.supplier ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.supplier_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.test_run (
    id bigint NOT NULL,
    unit_id bigint NOT NULL,
    revision_id bigint NOT NULL,
    sequence integer NOT NULL,
    started_at timestamp with time zone NOT NULL,
    started_by bigint,
    measured_at timestamp with time zone,
    verdict text,
    voided_at timestamp with time zone,
    void_reason text,
    CONSTRAINT test_run_judged_when_measured CHECK (((measured_at IS NULL) = (verdict IS NULL))),
    CONSTRAINT test_run_sequence_check CHECK ((sequence > 0)),
    CONSTRAINT test_run_verdict_check CHECK ((verdict = ANY (ARRAY['pass'::text, 'fail'::text]))),
    CONSTRAINT test_run_void_says_why CHECK (((voided_at IS NULL) = (void_reason IS NULL)))
);

COMMENT ON TABLE public.test_run IS 'One going through of a test plan on a unit. Measured at: the instant of its last reading; runs are ordered by it.';

ALTER TABLE public.test_run ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.test_run_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.unit (
    id bigint NOT NULL,
    serial text NOT NULL,
    part_id bigint NOT NULL,
    revision_id bigint NOT NULL,
    batch_id bigint NOT NULL,
    place integer NOT NULL,
    page_token text NOT NULL,
    serial_issued_at timestamp with time zone NOT NULL,
    completed_at timestamp with time zone,
    lot_id bigint,
    scrapped_at timestamp with time zone,
    scrap_reason text,
    version integer DEFAULT 1 NOT NULL,
    CONSTRAINT unit_completed_has_lot CHECK (((completed_at IS NULL) = (lot_id IS NULL))),
    CONSTRAINT unit_page_token_check CHECK ((length(page_token) >= 22)),
    CONSTRAINT unit_place_check CHECK ((place > 0)),
    CONSTRAINT unit_scrap_says_why CHECK (((scrapped_at IS NULL) = (scrap_reason IS NULL)))
);

COMMENT ON TABLE public.unit IS 'One serial-numbered piece, from the issue of its number on. Numbers are never reused.';

ALTER TABLE public.unit ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.unit_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.unit_step (
    unit_id bigint NOT NULL,
    batch_step_id bigint NOT NULL,
    done_at timestamp with time zone NOT NULL,
    done_by bigint NOT NULL
);

COMMENT ON TABLE public.unit_step IS 'A build step done on a unit, by whom and when.';

CREATE TABLE public.user_known_address (
    user_id bigint NOT NULL,
    address_digest bytea NOT NULL,
    last_signed_in_at timestamp with time zone NOT NULL,
    CONSTRAINT user_known_address_address_digest_check CHECK ((length(address_digest) = 32))
);

COMMENT ON TABLE public.user_known_address IS 'A network address somebody signed in from before: guesses made from elsewhere do not lock them out there.';

CREATE TABLE public.user_session (
    sid text NOT NULL,
    sess jsonb NOT NULL,
    expire timestamp with time zone NOT NULL,
    user_id bigint GENERATED ALWAYS AS (((sess #>> '{passport,user}'::text[]))::bigint) STORED
);

COMMENT ON TABLE public.user_session IS 'A browser''s session, written by connect-pg-simple; without a user until somebody signs in.';

CREATE TABLE public.user_token (
    id bigint NOT NULL,
    user_id bigint NOT NULL,
    purpose text NOT NULL,
    token_hash bytea NOT NULL,
    new_email text,
    created_at timestamp with time zone NOT NULL,
    expires_at timestamp with time zone NOT NULL,
    used_at timestamp with time zone,
    voided_at timestamp with time zone,
    CONSTRAINT user_token_new_email_with_change CHECK (((purpose = 'email_change'::text) = (new_email IS NOT NULL))),
    CONSTRAINT user_token_purpose_check CHECK ((purpose = ANY (ARRAY['sign_up'::text, 'invitation'::text, 'password_reset'::text, 'email_change'::text]))),
    CONSTRAINT user_token_token_hash_check CHECK ((length(token_hash) = 32)),
    CONSTRAINT user_token_used_or_voided CHECK (((used_at IS NULL) OR (voided_at IS NULL)))
);

COMMENT ON TABLE public.user_token IS 'A link sent by mail that can be used once for one purpose; only its SHA-256 is kept. A newer one for the same purpose voids it.';

ALTER TABLE public.user_token ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.user_token_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

CREATE TABLE public.vat_exception (
    country_code text NOT NULL,
    postcode_prefix text NOT NULL,
    sentence text NOT NULL,
    CONSTRAINT vat_exception_postcode_prefix_check CHECK ((postcode_prefix = upper(postcode_prefix)))
);

COMMENT ON TABLE public.vat_exception IS 'Postcodes for which a country''s usual rule does not hold: the buyer is asked to write to the shop.';

CREATE TABLE public.vat_rate (
    id bigint NOT NULL,
    country_code text NOT NULL,
    rate numeric(7,4) NOT NULL,
    valid_from date NOT NULL,
    valid_until date,
    source text NOT NULL,
    CONSTRAINT vat_rate_days_in_order CHECK ((valid_until >= valid_from)),
    CONSTRAINT vat_rate_rate_check CHECK (((rate >= (0)::numeric) AND (rate < (100)::numeric)))
);

COMMENT ON TABLE public.vat_rate IS 'Standard VAT rate of a country over a span of days, with where it was read.';

ALTER TABLE public.vat_rate ALTER COLUMN id ADD GENERATED ALWAYS AS IDENTITY (
    SEQUENCE NAME public.vat_rate_id_seq
    START WITH 1
    INCREMENT BY 1
    NO MINVALUE
    NO MAXVALUE
    CACHE 1
);

ALTER TABLE ONLY public.account
    ADD CONSTRAINT account_pkey PRIMARY KEY (code);

ALTER TABLE ONLY public.app_user
    ADD CONSTRAINT app_user_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.as_built
    ADD CONSTRAINT as_built_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.attempt_count
    ADD CONSTRAINT attempt_count_pkey PRIMARY KEY (bucket);

ALTER TABLE ONLY public.audit_entry
    ADD CONSTRAINT audit_entry_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.batch_cost
    ADD CONSTRAINT batch_cost_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.batch_issue
    ADD CONSTRAINT batch_issue_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.batch_line
    ADD CONSTRAINT batch_line_path_unique UNIQUE (batch_id, path);

ALTER TABLE ONLY public.batch_line
    ADD CONSTRAINT batch_line_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.batch
    ADD CONSTRAINT batch_number_unique UNIQUE (number);

ALTER TABLE ONLY public.batch
    ADD CONSTRAINT batch_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.batch_step
    ADD CONSTRAINT batch_step_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.batch_step
    ADD CONSTRAINT batch_step_position_unique UNIQUE (batch_id, "position");

ALTER TABLE ONLY public.batch_sub_assembly
    ADD CONSTRAINT batch_sub_assembly_pkey PRIMARY KEY (batch_id, path);

ALTER TABLE ONLY public.bill_line_alternate
    ADD CONSTRAINT bill_line_alternate_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.bill_line_alternate
    ADD CONSTRAINT bill_line_alternate_priority UNIQUE (line_id, priority) DEFERRABLE INITIALLY DEFERRED;

ALTER TABLE ONLY public.bill_line_alternate
    ADD CONSTRAINT bill_line_alternate_unique UNIQUE (line_id, part_id);

ALTER TABLE ONLY public.bill_line
    ADD CONSTRAINT bill_line_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.bill_line
    ADD CONSTRAINT bill_line_position_unique UNIQUE (revision_id, "position") DEFERRABLE INITIALLY DEFERRED;

ALTER TABLE ONLY public.bill_revision
    ADD CONSTRAINT bill_revision_number_unique UNIQUE (part_id, number);

ALTER TABLE ONLY public.bill_revision
    ADD CONSTRAINT bill_revision_part UNIQUE (id, part_id);

ALTER TABLE ONLY public.bill_revision
    ADD CONSTRAINT bill_revision_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.bin
    ADD CONSTRAINT bin_code_unique UNIQUE (code);

ALTER TABLE ONLY public.bin
    ADD CONSTRAINT bin_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.build_step
    ADD CONSTRAINT build_step_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.build_step
    ADD CONSTRAINT build_step_position_unique UNIQUE (revision_id, "position") DEFERRABLE INITIALLY DEFERRED;

ALTER TABLE ONLY public.characteristic
    ADD CONSTRAINT characteristic_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.characteristic
    ADD CONSTRAINT characteristic_position_unique UNIQUE (revision_id, "position") DEFERRABLE INITIALLY DEFERRED;

ALTER TABLE ONLY public.contents_line
    ADD CONSTRAINT contents_line_part_unique UNIQUE (kit_part_id, part_id, bag);

ALTER TABLE ONLY public.contents_line
    ADD CONSTRAINT contents_line_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.contents_line
    ADD CONSTRAINT contents_line_position_unique UNIQUE (kit_part_id, "position") DEFERRABLE INITIALLY DEFERRED;

ALTER TABLE ONLY public.contents_list
    ADD CONSTRAINT contents_list_pkey PRIMARY KEY (kit_part_id);

ALTER TABLE ONLY public.cost_pool
    ADD CONSTRAINT cost_pool_key UNIQUE NULLS NOT DISTINCT (part_id, lot_id);

ALTER TABLE ONLY public.country
    ADD CONSTRAINT country_pkey PRIMARY KEY (code);

ALTER TABLE ONLY public.customer
    ADD CONSTRAINT customer_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.delivery_rate
    ADD CONSTRAINT delivery_rate_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.delivery_rate
    ADD CONSTRAINT delivery_rate_starts_once UNIQUE (country_code, valid_from);

ALTER TABLE ONLY public.demand
    ADD CONSTRAINT demand_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.document
    ADD CONSTRAINT document_number_unique UNIQUE (number);

ALTER TABLE ONLY public.document
    ADD CONSTRAINT document_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.document
    ADD CONSTRAINT document_reversed_once UNIQUE (reverses_document_id);

ALTER TABLE ONLY public.file_chunk
    ADD CONSTRAINT file_chunk_pkey PRIMARY KEY (file_id, "position");

ALTER TABLE ONLY public.file_object
    ADD CONSTRAINT file_object_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.file_object
    ADD CONSTRAINT file_object_sha256_key UNIQUE (sha256);

ALTER TABLE ONLY public.idempotency_key
    ADD CONSTRAINT idempotency_key_pkey PRIMARY KEY (scope, key);

ALTER TABLE ONLY public.import_run
    ADD CONSTRAINT import_run_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.invoice_charge
    ADD CONSTRAINT invoice_charge_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.invoice_charge
    ADD CONSTRAINT invoice_charge_position_unique UNIQUE (invoice_id, "position");

ALTER TABLE ONLY public.invoice
    ADD CONSTRAINT invoice_document_unique UNIQUE (document_id);

ALTER TABLE ONLY public.invoice_file
    ADD CONSTRAINT invoice_file_pkey PRIMARY KEY (invoice_id, kind);

ALTER TABLE ONLY public.invoice_line
    ADD CONSTRAINT invoice_line_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.invoice_line
    ADD CONSTRAINT invoice_line_position_unique UNIQUE (invoice_id, "position");

ALTER TABLE ONLY public.invoice
    ADD CONSTRAINT invoice_number_unique UNIQUE (number);

ALTER TABLE ONLY public.invoice
    ADD CONSTRAINT invoice_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.invoice
    ADD CONSTRAINT invoice_sequence_unique UNIQUE (series, year, sequence);

ALTER TABLE ONLY public.invoice_vat
    ADD CONSTRAINT invoice_vat_pkey PRIMARY KEY (invoice_id, vat_category, vat_rate);

ALTER TABLE ONLY public.journal_entry
    ADD CONSTRAINT journal_entry_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.journal_entry
    ADD CONSTRAINT journal_entry_source_unique UNIQUE (source_key);

ALTER TABLE ONLY public.journal_line
    ADD CONSTRAINT journal_line_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.listing
    ADD CONSTRAINT listing_part_unique UNIQUE (part_id);

ALTER TABLE ONLY public.listing
    ADD CONSTRAINT listing_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.listing
    ADD CONSTRAINT listing_slug_unique UNIQUE (slug);

ALTER TABLE ONLY public.lot
    ADD CONSTRAINT lot_code_unique UNIQUE (code);

ALTER TABLE ONLY public.lot
    ADD CONSTRAINT lot_of_part UNIQUE (id, part_id);

ALTER TABLE ONLY public.lot
    ADD CONSTRAINT lot_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.lot_status_change
    ADD CONSTRAINT lot_status_change_pkey PRIMARY KEY (document_id);

ALTER TABLE ONLY public.nonconformity
    ADD CONSTRAINT nonconformity_number_unique UNIQUE (number);

ALTER TABLE ONLY public.nonconformity
    ADD CONSTRAINT nonconformity_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.number_series
    ADD CONSTRAINT number_series_pkey PRIMARY KEY (series, period);

ALTER TABLE ONLY public.order_cancellation
    ADD CONSTRAINT order_cancellation_pkey PRIMARY KEY (document_id);

ALTER TABLE ONLY public.order_cancellation
    ADD CONSTRAINT order_cancelled_once UNIQUE (order_id);

ALTER TABLE ONLY public.order_invoice
    ADD CONSTRAINT order_invoice_pkey PRIMARY KEY (invoice_id);

ALTER TABLE ONLY public.order_line_need
    ADD CONSTRAINT order_line_need_demand_unique UNIQUE (demand_id);

ALTER TABLE ONLY public.order_line_need
    ADD CONSTRAINT order_line_need_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.order_line
    ADD CONSTRAINT order_line_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.order_line
    ADD CONSTRAINT order_line_position_unique UNIQUE (order_id, "position");

ALTER TABLE ONLY public.outbox_mail_attachment
    ADD CONSTRAINT outbox_mail_attachment_pkey PRIMARY KEY (mail_id, "position");

ALTER TABLE ONLY public.outbox_mail
    ADD CONSTRAINT outbox_mail_dedupe_key_key UNIQUE (dedupe_key);

ALTER TABLE ONLY public.outbox_mail
    ADD CONSTRAINT outbox_mail_message_id_key UNIQUE (message_id);

ALTER TABLE ONLY public.outbox_mail
    ADD CONSTRAINT outbox_mail_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.packed_item
    ADD CONSTRAINT packed_item_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.part_battery
    ADD CONSTRAINT part_battery_pkey PRIMARY KEY (part_id);

ALTER TABLE ONLY public.part
    ADD CONSTRAINT part_code_unique UNIQUE (code);

ALTER TABLE ONLY public.part_parameter
    ADD CONSTRAINT part_parameter_name_unique UNIQUE (part_id, name);

ALTER TABLE ONLY public.part_parameter
    ADD CONSTRAINT part_parameter_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.part
    ADD CONSTRAINT part_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.part_supplier
    ADD CONSTRAINT part_supplier_pkey PRIMARY KEY (part_id, supplier_id);

ALTER TABLE ONLY public.payment_event
    ADD CONSTRAINT payment_event_pkey PRIMARY KEY (provider_event_id);

ALTER TABLE ONLY public.payment
    ADD CONSTRAINT payment_pkey PRIMARY KEY (document_id);

ALTER TABLE ONLY public.payment
    ADD CONSTRAINT payment_provider_unique UNIQUE (provider_payment_id);

ALTER TABLE ONLY public.payment_review
    ADD CONSTRAINT payment_review_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.payment_session
    ADD CONSTRAINT payment_session_operation_unique UNIQUE (operation_key);

ALTER TABLE ONLY public.payment
    ADD CONSTRAINT payment_session_paid_once UNIQUE (payment_session_id);

ALTER TABLE ONLY public.payment_session
    ADD CONSTRAINT payment_session_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.payment_session
    ADD CONSTRAINT payment_session_provider_unique UNIQUE (provider_session_id);

ALTER TABLE ONLY public.period
    ADD CONSTRAINT period_pkey PRIMARY KEY (month);

ALTER TABLE ONLY public.posting_rule
    ADD CONSTRAINT posting_rule_pkey PRIMARY KEY (event, component);

ALTER TABLE ONLY public.reading
    ADD CONSTRAINT reading_applied_once UNIQUE (client_key);

ALTER TABLE ONLY public.reading
    ADD CONSTRAINT reading_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.receipt
    ADD CONSTRAINT receipt_pkey PRIMARY KEY (document_id);

ALTER TABLE ONLY public.refund
    ADD CONSTRAINT refund_credit_note_unique UNIQUE (credit_note_id);

ALTER TABLE ONLY public.refund
    ADD CONSTRAINT refund_operation_unique UNIQUE (operation_key);

ALTER TABLE ONLY public.refund
    ADD CONSTRAINT refund_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.refund
    ADD CONSTRAINT refund_provider_unique UNIQUE (provider_refund_id);

ALTER TABLE ONLY public.reservation
    ADD CONSTRAINT reservation_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.rework
    ADD CONSTRAINT rework_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.sales_order
    ADD CONSTRAINT sales_order_number_unique UNIQUE (number);

ALTER TABLE ONLY public.sales_order
    ADD CONSTRAINT sales_order_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.schema_migration
    ADD CONSTRAINT schema_migration_pkey PRIMARY KEY (name);

ALTER TABLE ONLY public.shipment
    ADD CONSTRAINT shipment_number_unique UNIQUE (number);

ALTER TABLE ONLY public.shipment
    ADD CONSTRAINT shipment_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.shop_closed_day
    ADD CONSTRAINT shop_closed_day_pkey PRIMARY KEY (day);

ALTER TABLE ONLY public.shop
    ADD CONSTRAINT shop_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.stock_balance
    ADD CONSTRAINT stock_balance_place UNIQUE NULLS NOT DISTINCT (lot_id, bin_id, owner_customer_id);

ALTER TABLE ONLY public.stock_move
    ADD CONSTRAINT stock_move_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.stock_move
    ADD CONSTRAINT stock_move_reversed_once UNIQUE (reverses_move_id);

ALTER TABLE ONLY public.supplier
    ADD CONSTRAINT supplier_code_unique UNIQUE (code);

ALTER TABLE ONLY public.supplier
    ADD CONSTRAINT supplier_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.test_run
    ADD CONSTRAINT test_run_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.test_run
    ADD CONSTRAINT test_run_sequence_unique UNIQUE (unit_id, sequence);

ALTER TABLE ONLY public.unit
    ADD CONSTRAINT unit_lot_unique UNIQUE (lot_id);

ALTER TABLE ONLY public.unit
    ADD CONSTRAINT unit_page_token_unique UNIQUE (page_token);

ALTER TABLE ONLY public.unit
    ADD CONSTRAINT unit_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.unit
    ADD CONSTRAINT unit_place_unique UNIQUE (batch_id, place);

ALTER TABLE ONLY public.unit
    ADD CONSTRAINT unit_serial_unique UNIQUE (serial);

ALTER TABLE ONLY public.unit_step
    ADD CONSTRAINT unit_step_pkey PRIMARY KEY (unit_id, batch_step_id);

ALTER TABLE ONLY public.user_known_address
    ADD CONSTRAINT user_known_address_pkey PRIMARY KEY (user_id, address_digest);

ALTER TABLE ONLY public.user_session
    ADD CONSTRAINT user_session_pkey PRIMARY KEY (sid);

ALTER TABLE ONLY public.user_token
    ADD CONSTRAINT user_token_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.user_token
    ADD CONSTRAINT user_token_token_hash_key UNIQUE (token_hash);

ALTER TABLE ONLY public.vat_exception
    ADD CONSTRAINT vat_exception_pkey PRIMARY KEY (country_code, postcode_prefix);

ALTER TABLE ONLY public.vat_rate
    ADD CONSTRAINT vat_rate_pkey PRIMARY KEY (id);

ALTER TABLE ONLY public.vat_rate
    ADD CONSTRAINT vat_rate_starts_once UNIQUE (country_code, valid_from);

CREATE INDEX app_user_customer ON public.app_user USING btree (customer_id);

CREATE UNIQUE INDEX app_user_email_key ON public.app_user USING btree (lower(email));

CREATE INDEX as_built_by_lot ON public.as_built USING btree (lot_id);

CREATE INDEX as_built_by_unit ON public.as_built USING btree (unit_id);

CREATE INDEX attempt_count_window_ends_at ON public.attempt_count USING btree (window_ends_at);

CREATE INDEX audit_entry_actor ON public.audit_entry USING btree (actor_id);

CREATE INDEX audit_entry_recorded_at ON public.audit_entry USING btree (recorded_at DESC, id DESC);

CREATE INDEX audit_entry_subject ON public.audit_entry USING btree (subject_kind, subject_id);

CREATE INDEX batch_by_part ON public.batch USING btree (part_id, created_at DESC);

CREATE INDEX batch_cost_by_batch ON public.batch_cost USING btree (batch_id);

CREATE INDEX batch_issue_by_line ON public.batch_issue USING btree (batch_line_id);

CREATE INDEX batch_issue_by_lot ON public.batch_issue USING btree (lot_id);

CREATE INDEX batch_line_by_part ON public.batch_line USING btree (part_id);

CREATE INDEX batch_open ON public.batch USING btree (due_on) WHERE (status = ANY (ARRAY['planned'::text, 'picking'::text, 'in_build'::text]));

CREATE INDEX bill_line_alternate_by_part ON public.bill_line_alternate USING btree (part_id);

CREATE INDEX bill_line_by_part ON public.bill_line USING btree (part_id);

CREATE UNIQUE INDEX bill_revision_one_draft ON public.bill_revision USING btree (part_id) WHERE (status = 'draft'::text);

CREATE UNIQUE INDEX bill_revision_one_released ON public.bill_revision USING btree (part_id) WHERE (status = 'released'::text);

CREATE INDEX contents_line_by_part ON public.contents_line USING btree (part_id);

CREATE INDEX customer_by_email ON public.customer USING btree (lower(email));

CREATE INDEX demand_open_by_part ON public.demand USING btree (part_id) WHERE (closed_at IS NULL);

CREATE INDEX document_by_kind ON public.document USING btree (kind, occurred_at DESC);

CREATE INDEX idempotency_key_claimed_at ON public.idempotency_key USING btree (claimed_at);

CREATE INDEX import_run_by_content ON public.import_run USING btree (content_sha256);

CREATE INDEX invoice_by_customer ON public.invoice USING btree (customer_id) WHERE (customer_id IS NOT NULL);

CREATE INDEX invoice_by_day ON public.invoice USING btree (issued_on DESC, id DESC);

CREATE INDEX invoice_credits ON public.invoice USING btree (credits_invoice_id) WHERE (credits_invoice_id IS NOT NULL);

CREATE INDEX invoice_search ON public.invoice USING gin ((((((number || ' '::text) || reference) || ' '::text) || (buyer ->> 'name'::text))) public.gin_trgm_ops);

CREATE INDEX journal_entry_by_day ON public.journal_entry USING btree (day, id);

CREATE INDEX journal_entry_by_document ON public.journal_entry USING btree (document_id);

CREATE INDEX journal_line_by_account ON public.journal_line USING btree (account_code);

CREATE INDEX journal_line_by_entry ON public.journal_line USING btree (entry_id);

CREATE INDEX lot_by_part ON public.lot USING btree (part_id, received_on);

CREATE INDEX lot_by_supplier ON public.lot USING btree (supplier_id) WHERE (supplier_id IS NOT NULL);

CREATE UNIQUE INDEX lot_one_standing ON public.lot USING btree (part_id) WHERE (kind = 'standing'::text);

CREATE INDEX lot_search ON public.lot USING gin ((((code || ' '::text) || COALESCE(supplier_lot_code, ''::text))) public.gin_trgm_ops);

CREATE INDEX lot_status_change_by_lot ON public.lot_status_change USING btree (lot_id);

CREATE INDEX nonconformity_by_unit ON public.nonconformity USING btree (unit_id);

CREATE INDEX nonconformity_open ON public.nonconformity USING btree (found_at) WHERE (closed_at IS NULL);

CREATE INDEX order_invoice_by_order ON public.order_invoice USING btree (order_id);

CREATE INDEX order_line_by_part ON public.order_line USING btree (part_id);

CREATE INDEX order_line_need_by_line ON public.order_line_need USING btree (order_line_id);

CREATE INDEX outbox_mail_waiting ON public.outbox_mail USING btree (next_attempt_at) WHERE ((sent_at IS NULL) AND (given_up_at IS NULL));

CREATE INDEX packed_item_by_lot ON public.packed_item USING btree (lot_id);

CREATE INDEX packed_item_by_shipment ON public.packed_item USING btree (shipment_id);

CREATE UNIQUE INDEX packed_item_unit_once ON public.packed_item USING btree (unit_id) WHERE ((unit_id IS NOT NULL) AND (taken_out_at IS NULL) AND (returned_at IS NULL));

CREATE INDEX part_parameter_by_name ON public.part_parameter USING btree (name, value_number);

CREATE INDEX part_parameter_search ON public.part_parameter USING gin (said public.gin_trgm_ops);

CREATE INDEX part_search ON public.part USING gin ((((code || ' '::text) || name)) public.gin_trgm_ops);

CREATE UNIQUE INDEX part_serial_letters_unique ON public.part USING btree (serial_letters) WHERE (serial_letters IS NOT NULL);

CREATE INDEX part_supplier_by_supplier ON public.part_supplier USING btree (supplier_id);

CREATE UNIQUE INDEX part_supplier_one_preferred ON public.part_supplier USING btree (part_id) WHERE preferred;

CREATE INDEX payment_by_order ON public.payment USING btree (order_id);

CREATE INDEX payment_event_by_object ON public.payment_event USING btree (object_id);

CREATE INDEX payment_review_open ON public.payment_review USING btree (created_at) WHERE (settled_at IS NULL);

CREATE INDEX payment_session_by_order ON public.payment_session USING btree (order_id);

CREATE INDEX payment_session_unsettled ON public.payment_session USING btree (expires_at) WHERE (status = ANY (ARRAY['opening'::text, 'open'::text, 'waiting'::text]));

CREATE INDEX reading_by_characteristic ON public.reading USING btree (characteristic_id, measured_at);

CREATE INDEX reading_by_run ON public.reading USING btree (run_id, characteristic_id, measured_at DESC);

CREATE INDEX receipt_by_supplier ON public.receipt USING btree (supplier_id, received_on DESC);

CREATE INDEX refund_by_order ON public.refund USING btree (order_id);

CREATE INDEX refund_by_payment ON public.refund USING btree (payment_document_id);

CREATE INDEX reservation_expiring ON public.reservation USING btree (expires_at) WHERE ((ended_at IS NULL) AND (expires_at IS NOT NULL));

CREATE INDEX reservation_live_by_batch ON public.reservation USING btree (batch_id) WHERE ((ended_at IS NULL) AND (batch_id IS NOT NULL));

CREATE INDEX reservation_live_by_demand ON public.reservation USING btree (demand_id) WHERE (ended_at IS NULL);

CREATE INDEX reservation_live_by_part ON public.reservation USING btree (part_id) WHERE (ended_at IS NULL);

CREATE UNIQUE INDEX reservation_one_per_unit ON public.reservation USING btree (lot_id) WHERE (of_unit AND (ended_at IS NULL));

CREATE INDEX rework_by_unit ON public.rework USING btree (unit_id);

CREATE INDEX sales_order_by_customer ON public.sales_order USING btree (customer_id, placed_at DESC);

CREATE INDEX sales_order_by_instant ON public.sales_order USING btree (placed_at DESC, id DESC);

CREATE INDEX sales_order_search ON public.sales_order USING gin ((((((number || ' '::text) || recipient) || ' '::text) || email)) public.gin_trgm_ops);

CREATE INDEX shipment_by_instant ON public.shipment USING btree (shipped_at DESC) WHERE (shipped_at IS NOT NULL);

CREATE INDEX shipment_by_order ON public.shipment USING btree (order_id);

CREATE UNIQUE INDEX shipment_one_open_per_order ON public.shipment USING btree (order_id) WHERE (status = ANY (ARRAY['packing'::text, 'packed'::text]));

CREATE INDEX stock_balance_by_bin ON public.stock_balance USING btree (bin_id) WHERE (quantity > (0)::numeric);

CREATE INDEX stock_balance_by_part ON public.stock_balance USING btree (part_id) WHERE (quantity > (0)::numeric);

CREATE INDEX stock_move_by_document ON public.stock_move USING btree (document_id, id);

CREATE INDEX stock_move_by_instant ON public.stock_move USING btree (occurred_at, id);

CREATE INDEX stock_move_by_lot ON public.stock_move USING btree (lot_id, id);

CREATE INDEX stock_move_by_part ON public.stock_move USING btree (part_id, id);

CREATE UNIQUE INDEX test_run_one_open ON public.test_run USING btree (unit_id) WHERE ((verdict IS NULL) AND (voided_at IS NULL));

CREATE INDEX unit_by_part ON public.unit USING btree (part_id, serial_issued_at DESC);

CREATE INDEX unit_search ON public.unit USING gin (serial public.gin_trgm_ops);

CREATE INDEX user_session_expire ON public.user_session USING btree (expire);

CREATE INDEX user_session_user ON public.user_session USING btree (user_id);

CREATE INDEX user_token_open ON public.user_token USING btree (user_id, purpose) WHERE ((used_at IS NULL) AND (voided_at IS NULL));

CREATE TRIGGER bill_line_acyclic AFTER INSERT OR UPDATE ON public.bill_line FOR EACH ROW EXECUTE FUNCTION public.bill_contains_itself_guard();

CREATE TRIGGER bill_line_alternate_acyclic AFTER INSERT OR UPDATE ON public.bill_line_alternate FOR EACH ROW EXECUTE FUNCTION public.bill_contains_itself_guard();

CREATE TRIGGER bill_line_alternate_frozen BEFORE INSERT OR DELETE OR UPDATE ON public.bill_line_alternate FOR EACH ROW EXECUTE FUNCTION public.bill_content_frozen();

CREATE TRIGGER bill_line_frozen BEFORE INSERT OR DELETE OR UPDATE ON public.bill_line FOR EACH ROW EXECUTE FUNCTION public.bill_content_frozen();

CREATE TRIGGER bill_revision_guarded BEFORE DELETE OR UPDATE ON public.bill_revision FOR EACH ROW EXECUTE FUNCTION public.bill_revision_guard();

CREATE TRIGGER build_step_frozen BEFORE INSERT OR DELETE OR UPDATE ON public.build_step FOR EACH ROW EXECUTE FUNCTION public.bill_content_frozen();

CREATE TRIGGER characteristic_frozen BEFORE INSERT OR DELETE OR UPDATE ON public.characteristic FOR EACH ROW EXECUTE FUNCTION public.bill_content_frozen();

CREATE CONSTRAINT TRIGGER invoice_adds_up_at_commit AFTER INSERT ON public.invoice DEFERRABLE INITIALLY DEFERRED FOR EACH ROW EXECUTE FUNCTION public.invoice_parts_add_up();

CREATE TRIGGER invoice_numbered BEFORE INSERT ON public.invoice FOR EACH ROW EXECUTE FUNCTION public.invoice_without_gap();

CREATE TRIGGER journal_entry_in_open_period BEFORE INSERT ON public.journal_entry FOR EACH ROW EXECUTE FUNCTION public.journal_entry_period_open();

CREATE CONSTRAINT TRIGGER journal_entry_not_empty AFTER INSERT ON public.journal_entry DEFERRABLE INITIALLY DEFERRED FOR EACH ROW EXECUTE FUNCTION public.journal_entry_has_lines();

CREATE CONSTRAINT TRIGGER journal_line_balances AFTER INSERT ON public.journal_line DEFERRABLE INITIALLY DEFERRED FOR EACH ROW EXECUTE FUNCTION public.journal_entry_balances();

CREATE CONSTRAINT TRIGGER journal_line_stock_agrees AFTER INSERT ON public.journal_line DEFERRABLE INITIALLY DEFERRED FOR EACH ROW EXECUTE FUNCTION public.document_stock_agrees();

CREATE TRIGGER packed_item_sound BEFORE INSERT ON public.packed_item FOR EACH ROW EXECUTE FUNCTION public.packed_unit_is_sound();

CREATE TRIGGER part_stays_as_moved BEFORE UPDATE OF measure, traced ON public.part FOR EACH ROW WHEN (((old.measure <> new.measure) OR (old.traced <> new.traced))) EXECUTE FUNCTION public.part_stays_as_moved();

CREATE TRIGGER refund_checked AFTER INSERT OR UPDATE ON public.refund FOR EACH ROW EXECUTE FUNCTION public.refund_within_payment();

CREATE TRIGGER shipment_sound BEFORE UPDATE ON public.shipment FOR EACH ROW EXECUTE FUNCTION public.shipment_units_are_sound();

CREATE CONSTRAINT TRIGGER stock_move_agrees AFTER INSERT ON public.stock_move DEFERRABLE INITIALLY DEFERRED FOR EACH ROW EXECUTE FUNCTION public.document_stock_agrees();

CREATE TRIGGER stock_move_applies AFTER INSERT ON public.stock_move REFERENCING NEW TABLE AS added FOR EACH STATEMENT EXECUTE FUNCTION public.stock_move_applied();

CREATE TRIGGER unit_completion_checked BEFORE UPDATE ON public.unit FOR EACH ROW EXECUTE FUNCTION public.unit_completed_when_sound();

CREATE TRIGGER unit_serial_kept BEFORE DELETE OR UPDATE ON public.unit FOR EACH ROW EXECUTE FUNCTION public.unit_keeps_its_serial();

ALTER TABLE ONLY public.app_user
    ADD CONSTRAINT app_user_of_customer FOREIGN KEY (customer_id) REFERENCES public.customer(id);

ALTER TABLE ONLY public.as_built
    ADD CONSTRAINT as_built_batch_line_id_fkey FOREIGN KEY (batch_line_id) REFERENCES public.batch_line(id);

ALTER TABLE ONLY public.as_built
    ADD CONSTRAINT as_built_fitted_by_fkey FOREIGN KEY (fitted_by) REFERENCES public.app_user(id);

ALTER TABLE ONLY public.as_built
    ADD CONSTRAINT as_built_lot_of_part FOREIGN KEY (lot_id, part_id) REFERENCES public.lot(id, part_id);

ALTER TABLE ONLY public.as_built
    ADD CONSTRAINT as_built_removed_by_fkey FOREIGN KEY (removed_by) REFERENCES public.app_user(id);

ALTER TABLE ONLY public.as_built
    ADD CONSTRAINT as_built_unit_id_fkey FOREIGN KEY (unit_id) REFERENCES public.unit(id);

ALTER TABLE ONLY public.audit_entry
    ADD CONSTRAINT audit_entry_actor_fkey FOREIGN KEY (actor_id) REFERENCES public.app_user(id);

ALTER TABLE ONLY public.batch_cost
    ADD CONSTRAINT batch_cost_batch_id_fkey FOREIGN KEY (batch_id) REFERENCES public.batch(id);

ALTER TABLE ONLY public.batch_cost
    ADD CONSTRAINT batch_cost_document_id_fkey FOREIGN KEY (document_id) REFERENCES public.document(id);

ALTER TABLE ONLY public.batch
    ADD CONSTRAINT batch_created_by_fkey FOREIGN KEY (created_by) REFERENCES public.app_user(id);

ALTER TABLE ONLY public.batch_issue
    ADD CONSTRAINT batch_issue_batch_line_id_fkey FOREIGN KEY (batch_line_id) REFERENCES public.batch_line(id);

ALTER TABLE ONLY public.batch_issue
    ADD CONSTRAINT batch_issue_bin_id_fkey FOREIGN KEY (bin_id) REFERENCES public.bin(id);

ALTER TABLE ONLY public.batch_issue
    ADD CONSTRAINT batch_issue_document_id_fkey FOREIGN KEY (document_id) REFERENCES public.document(id);

ALTER TABLE ONLY public.batch_issue
    ADD CONSTRAINT batch_issue_issued_by_fkey FOREIGN KEY (issued_by) REFERENCES public.app_user(id);

ALTER TABLE ONLY public.batch_issue
    ADD CONSTRAINT batch_issue_lot_of_part FOREIGN KEY (lot_id, part_id) REFERENCES public.lot(id, part_id);

ALTER TABLE ONLY public.batch_line
    ADD CONSTRAINT batch_line_batch_id_fkey FOREIGN KEY (batch_id) REFERENCES public.batch(id);

ALTER TABLE ONLY public.batch_line
    ADD CONSTRAINT batch_line_bill_line_id_fkey FOREIGN KEY (bill_line_id) REFERENCES public.bill_line(id);

ALTER TABLE ONLY public.batch_line
    ADD CONSTRAINT batch_line_demand_id_fkey FOREIGN KEY (demand_id) REFERENCES public.demand(id);

ALTER TABLE ONLY public.batch_line
    ADD CONSTRAINT batch_line_part_id_fkey FOREIGN KEY (part_id) REFERENCES public.part(id);

ALTER TABLE ONLY public.batch
    ADD CONSTRAINT batch_revision_of_part FOREIGN KEY (revision_id, part_id) REFERENCES public.bill_revision(id, part_id);

ALTER TABLE ONLY public.batch_step
    ADD CONSTRAINT batch_step_batch_id_fkey FOREIGN KEY (batch_id) REFERENCES public.batch(id);

ALTER TABLE ONLY public.batch_step
    ADD CONSTRAINT batch_step_build_step_id_fkey FOREIGN KEY (build_step_id) REFERENCES public.build_step(id);

ALTER TABLE ONLY public.batch_sub_assembly
    ADD CONSTRAINT batch_sub_assembly_batch_id_fkey FOREIGN KEY (batch_id) REFERENCES public.batch(id);

ALTER TABLE ONLY public.batch_sub_assembly
    ADD CONSTRAINT batch_sub_assembly_part_id_fkey FOREIGN KEY (part_id) REFERENCES public.part(id);

ALTER TABLE ONLY public.batch_sub_assembly
    ADD CONSTRAINT batch_sub_assembly_revision_id_fkey FOREIGN KEY (revision_id) REFERENCES public.bill_revision(id);

ALTER TABLE ONLY public.bill_line_alternate
    ADD CONSTRAINT bill_line_alternate_line_id_fkey FOREIGN KEY (line_id) REFERENCES public.bill_line(id) ON DELETE CASCADE;

ALTER TABLE ONLY public.bill_line_alternate
    ADD CONSTRAINT bill_line_alternate_part_id_fkey FOREIGN KEY (part_id) REFERENCES public.part(id);

ALTER TABLE ONLY public.bill_line
    ADD CONSTRAINT bill_line_part_id_fkey FOREIGN KEY (part_id) REFERENCES public.part(id);

ALTER TABLE ONLY public.bill_line
    ADD CONSTRAINT bill_line_revision_id_fkey FOREIGN KEY (revision_id) REFERENCES public.bill_revision(id) ON DELETE CASCADE;

ALTER TABLE ONLY public.bill_revision
    ADD CONSTRAINT bill_revision_part_id_fkey FOREIGN KEY (part_id) REFERENCES public.part(id);

ALTER TABLE ONLY public.build_step
    ADD CONSTRAINT build_step_revision_id_fkey FOREIGN KEY (revision_id) REFERENCES public.bill_revision(id) ON DELETE CASCADE;

ALTER TABLE ONLY public.characteristic
    ADD CONSTRAINT characteristic_revision_id_fkey FOREIGN KEY (revision_id) REFERENCES public.bill_revision(id) ON DELETE CASCADE;

ALTER TABLE ONLY public.contents_line
    ADD CONSTRAINT contents_line_kit_part_id_fkey FOREIGN KEY (kit_part_id) REFERENCES public.part(id);

ALTER TABLE ONLY public.contents_line
    ADD CONSTRAINT contents_line_part_id_fkey FOREIGN KEY (part_id) REFERENCES public.part(id);

ALTER TABLE ONLY public.contents_list
    ADD CONSTRAINT contents_list_kit_part_id_fkey FOREIGN KEY (kit_part_id) REFERENCES public.part(id);

ALTER TABLE ONLY public.cost_pool
    ADD CONSTRAINT cost_pool_part_id_fkey FOREIGN KEY (part_id) REFERENCES public.part(id);

ALTER TABLE ONLY public.delivery_rate
    ADD CONSTRAINT delivery_rate_country_code_fkey FOREIGN KEY (country_code) REFERENCES public.country(code);

ALTER TABLE ONLY public.demand
    ADD CONSTRAINT demand_part_id_fkey FOREIGN KEY (part_id) REFERENCES public.part(id);

ALTER TABLE ONLY public.document
    ADD CONSTRAINT document_recorded_by_fkey FOREIGN KEY (recorded_by) REFERENCES public.app_user(id);

ALTER TABLE ONLY public.document
    ADD CONSTRAINT document_reverses_document_id_fkey FOREIGN KEY (reverses_document_id) REFERENCES public.document(id);

ALTER TABLE ONLY public.file_chunk
    ADD CONSTRAINT file_chunk_file_id_fkey FOREIGN KEY (file_id) REFERENCES public.file_object(id);

ALTER TABLE ONLY public.import_run
    ADD CONSTRAINT import_run_applied_by_fkey FOREIGN KEY (applied_by) REFERENCES public.app_user(id);

ALTER TABLE ONLY public.import_run
    ADD CONSTRAINT import_run_document_id_fkey FOREIGN KEY (document_id) REFERENCES public.document(id);

ALTER TABLE ONLY public.invoice_charge
    ADD CONSTRAINT invoice_charge_invoice_id_fkey FOREIGN KEY (invoice_id) REFERENCES public.invoice(id);

ALTER TABLE ONLY public.invoice
    ADD CONSTRAINT invoice_credits_invoice_id_fkey FOREIGN KEY (credits_invoice_id) REFERENCES public.invoice(id);

ALTER TABLE ONLY public.invoice
    ADD CONSTRAINT invoice_document_id_fkey FOREIGN KEY (document_id) REFERENCES public.document(id);

ALTER TABLE ONLY public.invoice_file
    ADD CONSTRAINT invoice_file_file_id_fkey FOREIGN KEY (file_id) REFERENCES public.file_object(id);

ALTER TABLE ONLY public.invoice_file
    ADD CONSTRAINT invoice_file_invoice_id_fkey FOREIGN KEY (invoice_id) REFERENCES public.invoice(id);

ALTER TABLE ONLY public.invoice_line
    ADD CONSTRAINT invoice_line_invoice_id_fkey FOREIGN KEY (invoice_id) REFERENCES public.invoice(id);

ALTER TABLE ONLY public.invoice_line
    ADD CONSTRAINT invoice_line_part_id_fkey FOREIGN KEY (part_id) REFERENCES public.part(id);

ALTER TABLE ONLY public.invoice
    ADD CONSTRAINT invoice_of_customer FOREIGN KEY (customer_id) REFERENCES public.customer(id);

ALTER TABLE ONLY public.invoice_vat
    ADD CONSTRAINT invoice_vat_invoice_id_fkey FOREIGN KEY (invoice_id) REFERENCES public.invoice(id);

ALTER TABLE ONLY public.journal_entry
    ADD CONSTRAINT journal_entry_document_id_fkey FOREIGN KEY (document_id) REFERENCES public.document(id);

ALTER TABLE ONLY public.journal_entry
    ADD CONSTRAINT journal_entry_recorded_by_fkey FOREIGN KEY (recorded_by) REFERENCES public.app_user(id);

ALTER TABLE ONLY public.journal_line
    ADD CONSTRAINT journal_line_account_code_fkey FOREIGN KEY (account_code) REFERENCES public.account(code);

ALTER TABLE ONLY public.journal_line
    ADD CONSTRAINT journal_line_entry_id_fkey FOREIGN KEY (entry_id) REFERENCES public.journal_entry(id);

ALTER TABLE ONLY public.listing
    ADD CONSTRAINT listing_part_id_fkey FOREIGN KEY (part_id) REFERENCES public.part(id);

ALTER TABLE ONLY public.lot
    ADD CONSTRAINT lot_document_id_fkey FOREIGN KEY (document_id) REFERENCES public.document(id);

ALTER TABLE ONLY public.lot
    ADD CONSTRAINT lot_parent_lot_id_fkey FOREIGN KEY (parent_lot_id) REFERENCES public.lot(id);

ALTER TABLE ONLY public.lot
    ADD CONSTRAINT lot_part_id_fkey FOREIGN KEY (part_id) REFERENCES public.part(id);

ALTER TABLE ONLY public.lot_status_change
    ADD CONSTRAINT lot_status_change_document_id_fkey FOREIGN KEY (document_id) REFERENCES public.document(id);

ALTER TABLE ONLY public.lot_status_change
    ADD CONSTRAINT lot_status_change_lot_id_fkey FOREIGN KEY (lot_id) REFERENCES public.lot(id);

ALTER TABLE ONLY public.lot
    ADD CONSTRAINT lot_supplier_id_fkey FOREIGN KEY (supplier_id) REFERENCES public.supplier(id);

ALTER TABLE ONLY public.nonconformity
    ADD CONSTRAINT nonconformity_batch_step_id_fkey FOREIGN KEY (batch_step_id) REFERENCES public.batch_step(id);

ALTER TABLE ONLY public.nonconformity
    ADD CONSTRAINT nonconformity_closed_by_fkey FOREIGN KEY (closed_by) REFERENCES public.app_user(id);

ALTER TABLE ONLY public.nonconformity
    ADD CONSTRAINT nonconformity_found_by_fkey FOREIGN KEY (found_by) REFERENCES public.app_user(id);

ALTER TABLE ONLY public.nonconformity
    ADD CONSTRAINT nonconformity_lot_id_fkey FOREIGN KEY (lot_id) REFERENCES public.lot(id);

ALTER TABLE ONLY public.nonconformity
    ADD CONSTRAINT nonconformity_run_id_fkey FOREIGN KEY (run_id) REFERENCES public.test_run(id);

ALTER TABLE ONLY public.nonconformity
    ADD CONSTRAINT nonconformity_unit_id_fkey FOREIGN KEY (unit_id) REFERENCES public.unit(id);

ALTER TABLE ONLY public.order_cancellation
    ADD CONSTRAINT order_cancellation_document_id_fkey FOREIGN KEY (document_id) REFERENCES public.document(id);

ALTER TABLE ONLY public.order_cancellation
    ADD CONSTRAINT order_cancellation_order_id_fkey FOREIGN KEY (order_id) REFERENCES public.sales_order(id);

ALTER TABLE ONLY public.order_invoice
    ADD CONSTRAINT order_invoice_invoice_id_fkey FOREIGN KEY (invoice_id) REFERENCES public.invoice(id);

ALTER TABLE ONLY public.order_invoice
    ADD CONSTRAINT order_invoice_order_id_fkey FOREIGN KEY (order_id) REFERENCES public.sales_order(id);

ALTER TABLE ONLY public.order_line
    ADD CONSTRAINT order_line_listing_id_fkey FOREIGN KEY (listing_id) REFERENCES public.listing(id);

ALTER TABLE ONLY public.order_line_need
    ADD CONSTRAINT order_line_need_demand_id_fkey FOREIGN KEY (demand_id) REFERENCES public.demand(id);

ALTER TABLE ONLY public.order_line_need
    ADD CONSTRAINT order_line_need_order_line_id_fkey FOREIGN KEY (order_line_id) REFERENCES public.order_line(id);

ALTER TABLE ONLY public.order_line_need
    ADD CONSTRAINT order_line_need_part_id_fkey FOREIGN KEY (part_id) REFERENCES public.part(id);

ALTER TABLE ONLY public.order_line
    ADD CONSTRAINT order_line_order_id_fkey FOREIGN KEY (order_id) REFERENCES public.sales_order(id);

ALTER TABLE ONLY public.order_line
    ADD CONSTRAINT order_line_part_id_fkey FOREIGN KEY (part_id) REFERENCES public.part(id);

ALTER TABLE ONLY public.outbox_mail_attachment
    ADD CONSTRAINT outbox_mail_attachment_file_id_fkey FOREIGN KEY (file_id) REFERENCES public.file_object(id);

ALTER TABLE ONLY public.outbox_mail_attachment
    ADD CONSTRAINT outbox_mail_attachment_mail_id_fkey FOREIGN KEY (mail_id) REFERENCES public.outbox_mail(id);

ALTER TABLE ONLY public.packed_item
    ADD CONSTRAINT packed_item_bin_id_fkey FOREIGN KEY (bin_id) REFERENCES public.bin(id);

ALTER TABLE ONLY public.packed_item
    ADD CONSTRAINT packed_item_lot_of_part FOREIGN KEY (lot_id, part_id) REFERENCES public.lot(id, part_id);

ALTER TABLE ONLY public.packed_item
    ADD CONSTRAINT packed_item_order_line_need_id_fkey FOREIGN KEY (order_line_need_id) REFERENCES public.order_line_need(id);

ALTER TABLE ONLY public.packed_item
    ADD CONSTRAINT packed_item_packed_by_fkey FOREIGN KEY (packed_by) REFERENCES public.app_user(id);

ALTER TABLE ONLY public.packed_item
    ADD CONSTRAINT packed_item_shipment_id_fkey FOREIGN KEY (shipment_id) REFERENCES public.shipment(id);

ALTER TABLE ONLY public.packed_item
    ADD CONSTRAINT packed_item_unit_id_fkey FOREIGN KEY (unit_id) REFERENCES public.unit(id);

ALTER TABLE ONLY public.part_battery
    ADD CONSTRAINT part_battery_part_id_fkey FOREIGN KEY (part_id) REFERENCES public.part(id) ON DELETE CASCADE;

ALTER TABLE ONLY public.part
    ADD CONSTRAINT part_origin_country_code_fkey FOREIGN KEY (origin_country_code) REFERENCES public.country(code);

ALTER TABLE ONLY public.part_parameter
    ADD CONSTRAINT part_parameter_part_id_fkey FOREIGN KEY (part_id) REFERENCES public.part(id) ON DELETE CASCADE;

ALTER TABLE ONLY public.part_supplier
    ADD CONSTRAINT part_supplier_part_id_fkey FOREIGN KEY (part_id) REFERENCES public.part(id) ON DELETE CASCADE;

ALTER TABLE ONLY public.part_supplier
    ADD CONSTRAINT part_supplier_supplier_id_fkey FOREIGN KEY (supplier_id) REFERENCES public.supplier(id);

ALTER TABLE ONLY public.payment
    ADD CONSTRAINT payment_document_id_fkey FOREIGN KEY (document_id) REFERENCES public.document(id);

ALTER TABLE ONLY public.payment
    ADD CONSTRAINT payment_order_id_fkey FOREIGN KEY (order_id) REFERENCES public.sales_order(id);

ALTER TABLE ONLY public.payment
    ADD CONSTRAINT payment_payment_session_id_fkey FOREIGN KEY (payment_session_id) REFERENCES public.payment_session(id);

ALTER TABLE ONLY public.payment_review
    ADD CONSTRAINT payment_review_order_id_fkey FOREIGN KEY (order_id) REFERENCES public.sales_order(id);

ALTER TABLE ONLY public.payment_review
    ADD CONSTRAINT payment_review_provider_event_id_fkey FOREIGN KEY (provider_event_id) REFERENCES public.payment_event(provider_event_id) DEFERRABLE INITIALLY DEFERRED;

ALTER TABLE ONLY public.payment_review
    ADD CONSTRAINT payment_review_settled_by_fkey FOREIGN KEY (settled_by) REFERENCES public.app_user(id);

ALTER TABLE ONLY public.payment_session
    ADD CONSTRAINT payment_session_order_id_fkey FOREIGN KEY (order_id) REFERENCES public.sales_order(id);

ALTER TABLE ONLY public.period
    ADD CONSTRAINT period_closed_by_fkey FOREIGN KEY (closed_by) REFERENCES public.app_user(id);

ALTER TABLE ONLY public.posting_rule
    ADD CONSTRAINT posting_rule_credit_account_code_fkey FOREIGN KEY (credit_account_code) REFERENCES public.account(code);

ALTER TABLE ONLY public.posting_rule
    ADD CONSTRAINT posting_rule_debit_account_code_fkey FOREIGN KEY (debit_account_code) REFERENCES public.account(code);

ALTER TABLE ONLY public.reading
    ADD CONSTRAINT reading_characteristic_id_fkey FOREIGN KEY (characteristic_id) REFERENCES public.characteristic(id);

ALTER TABLE ONLY public.reading
    ADD CONSTRAINT reading_recorded_by_fkey FOREIGN KEY (recorded_by) REFERENCES public.app_user(id);

ALTER TABLE ONLY public.reading
    ADD CONSTRAINT reading_run_id_fkey FOREIGN KEY (run_id) REFERENCES public.test_run(id);

ALTER TABLE ONLY public.receipt
    ADD CONSTRAINT receipt_document_id_fkey FOREIGN KEY (document_id) REFERENCES public.document(id);

ALTER TABLE ONLY public.receipt
    ADD CONSTRAINT receipt_supplier_id_fkey FOREIGN KEY (supplier_id) REFERENCES public.supplier(id);

ALTER TABLE ONLY public.refund
    ADD CONSTRAINT refund_credit_note_id_fkey FOREIGN KEY (credit_note_id) REFERENCES public.invoice(id);

ALTER TABLE ONLY public.refund
    ADD CONSTRAINT refund_document_id_fkey FOREIGN KEY (document_id) REFERENCES public.document(id);

ALTER TABLE ONLY public.refund
    ADD CONSTRAINT refund_order_id_fkey FOREIGN KEY (order_id) REFERENCES public.sales_order(id);

ALTER TABLE ONLY public.refund
    ADD CONSTRAINT refund_payment_document_id_fkey FOREIGN KEY (payment_document_id) REFERENCES public.payment(document_id);

ALTER TABLE ONLY public.refund
    ADD CONSTRAINT refund_requested_by_fkey FOREIGN KEY (requested_by) REFERENCES public.app_user(id);

ALTER TABLE ONLY public.reservation
    ADD CONSTRAINT reservation_demand_id_fkey FOREIGN KEY (demand_id) REFERENCES public.demand(id);

ALTER TABLE ONLY public.reservation
    ADD CONSTRAINT reservation_lot_id_fkey FOREIGN KEY (lot_id) REFERENCES public.lot(id);

ALTER TABLE ONLY public.reservation
    ADD CONSTRAINT reservation_of_batch FOREIGN KEY (batch_id) REFERENCES public.batch(id);

ALTER TABLE ONLY public.reservation
    ADD CONSTRAINT reservation_part_id_fkey FOREIGN KEY (part_id) REFERENCES public.part(id);

ALTER TABLE ONLY public.rework
    ADD CONSTRAINT rework_done_by_fkey FOREIGN KEY (done_by) REFERENCES public.app_user(id);

ALTER TABLE ONLY public.rework
    ADD CONSTRAINT rework_nonconformity_id_fkey FOREIGN KEY (nonconformity_id) REFERENCES public.nonconformity(id);

ALTER TABLE ONLY public.rework
    ADD CONSTRAINT rework_unit_id_fkey FOREIGN KEY (unit_id) REFERENCES public.unit(id);

ALTER TABLE ONLY public.sales_order
    ADD CONSTRAINT sales_order_country_code_fkey FOREIGN KEY (country_code) REFERENCES public.country(code);

ALTER TABLE ONLY public.sales_order
    ADD CONSTRAINT sales_order_customer_id_fkey FOREIGN KEY (customer_id) REFERENCES public.customer(id);

ALTER TABLE ONLY public.shipment
    ADD CONSTRAINT shipment_document_id_fkey FOREIGN KEY (document_id) REFERENCES public.document(id);

ALTER TABLE ONLY public.shipment
    ADD CONSTRAINT shipment_opened_by_fkey FOREIGN KEY (opened_by) REFERENCES public.app_user(id);

ALTER TABLE ONLY public.shipment
    ADD CONSTRAINT shipment_order_id_fkey FOREIGN KEY (order_id) REFERENCES public.sales_order(id);

ALTER TABLE ONLY public.shipment
    ADD CONSTRAINT shipment_shipped_by_fkey FOREIGN KEY (shipped_by) REFERENCES public.app_user(id);

ALTER TABLE ONLY public.shop
    ADD CONSTRAINT shop_country_code_fkey FOREIGN KEY (country_code) REFERENCES public.country(code);

ALTER TABLE ONLY public.stock_balance
    ADD CONSTRAINT stock_balance_bin_id_fkey FOREIGN KEY (bin_id) REFERENCES public.bin(id);

ALTER TABLE ONLY public.stock_balance
    ADD CONSTRAINT stock_balance_lot_of_part FOREIGN KEY (lot_id, part_id) REFERENCES public.lot(id, part_id);

ALTER TABLE ONLY public.stock_balance
    ADD CONSTRAINT stock_balance_of_customer FOREIGN KEY (owner_customer_id) REFERENCES public.customer(id);

ALTER TABLE ONLY public.stock_move
    ADD CONSTRAINT stock_move_bin_id_fkey FOREIGN KEY (bin_id) REFERENCES public.bin(id);

ALTER TABLE ONLY public.stock_move
    ADD CONSTRAINT stock_move_document_id_fkey FOREIGN KEY (document_id) REFERENCES public.document(id);

ALTER TABLE ONLY public.stock_move
    ADD CONSTRAINT stock_move_lot_of_part FOREIGN KEY (lot_id, part_id) REFERENCES public.lot(id, part_id);

ALTER TABLE ONLY public.stock_move
    ADD CONSTRAINT stock_move_of_customer FOREIGN KEY (owner_customer_id) REFERENCES public.customer(id);

ALTER TABLE ONLY public.stock_move
    ADD CONSTRAINT stock_move_part_id_fkey FOREIGN KEY (part_id) REFERENCES public.part(id);

ALTER TABLE ONLY public.stock_move
    ADD CONSTRAINT stock_move_recorded_by_fkey FOREIGN KEY (recorded_by) REFERENCES public.app_user(id);

ALTER TABLE ONLY public.stock_move
    ADD CONSTRAINT stock_move_reverses_move_id_fkey FOREIGN KEY (reverses_move_id) REFERENCES public.stock_move(id);

ALTER TABLE ONLY public.supplier
    ADD CONSTRAINT supplier_country_code_fkey FOREIGN KEY (country_code) REFERENCES public.country(code);

ALTER TABLE ONLY public.test_run
    ADD CONSTRAINT test_run_revision_id_fkey FOREIGN KEY (revision_id) REFERENCES public.bill_revision(id);

ALTER TABLE ONLY public.test_run
    ADD CONSTRAINT test_run_started_by_fkey FOREIGN KEY (started_by) REFERENCES public.app_user(id);

ALTER TABLE ONLY public.test_run
    ADD CONSTRAINT test_run_unit_id_fkey FOREIGN KEY (unit_id) REFERENCES public.unit(id);

ALTER TABLE ONLY public.unit
    ADD CONSTRAINT unit_batch_id_fkey FOREIGN KEY (batch_id) REFERENCES public.batch(id);

ALTER TABLE ONLY public.unit
    ADD CONSTRAINT unit_lot_id_fkey FOREIGN KEY (lot_id) REFERENCES public.lot(id);

ALTER TABLE ONLY public.unit
    ADD CONSTRAINT unit_revision_of_part FOREIGN KEY (revision_id, part_id) REFERENCES public.bill_revision(id, part_id);

ALTER TABLE ONLY public.unit_step
    ADD CONSTRAINT unit_step_batch_step_id_fkey FOREIGN KEY (batch_step_id) REFERENCES public.batch_step(id);

ALTER TABLE ONLY public.unit_step
    ADD CONSTRAINT unit_step_done_by_fkey FOREIGN KEY (done_by) REFERENCES public.app_user(id);

ALTER TABLE ONLY public.unit_step
    ADD CONSTRAINT unit_step_unit_id_fkey FOREIGN KEY (unit_id) REFERENCES public.unit(id);

ALTER TABLE ONLY public.user_known_address
    ADD CONSTRAINT user_known_address_user_id_fkey FOREIGN KEY (user_id) REFERENCES public.app_user(id);

ALTER TABLE ONLY public.user_token
    ADD CONSTRAINT user_token_user_id_fkey FOREIGN KEY (user_id) REFERENCES public.app_user(id);

ALTER TABLE ONLY public.vat_exception
    ADD CONSTRAINT vat_exception_country_code_fkey FOREIGN KEY (country_code) REFERENCES public.country(code);

ALTER TABLE ONLY public.vat_rate
    ADD CONSTRAINT vat_rate_country_code_fkey FOREIGN KEY (country_code) REFERENCES public.country(code);

GRANT USAGE ON SCHEMA public TO emberlot_server;

GRANT SELECT ON TABLE public.account TO emberlot_server;

GRANT SELECT,INSERT,UPDATE ON TABLE public.app_user TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.app_user_id_seq TO emberlot_server;

GRANT SELECT,INSERT,UPDATE ON TABLE public.as_built TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.as_built_id_seq TO emberlot_server;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.attempt_count TO emberlot_server;

GRANT SELECT,INSERT ON TABLE public.audit_entry TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.audit_entry_id_seq TO emberlot_server;

GRANT SELECT,INSERT,UPDATE ON TABLE public.batch TO emberlot_server;

GRANT SELECT,INSERT ON TABLE public.batch_cost TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.batch_cost_id_seq TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.batch_id_seq TO emberlot_server;

GRANT SELECT,INSERT ON TABLE public.batch_issue TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.batch_issue_id_seq TO emberlot_server;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.batch_line TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.batch_line_id_seq TO emberlot_server;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.batch_step TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.batch_step_id_seq TO emberlot_server;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.batch_sub_assembly TO emberlot_server;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.bill_line TO emberlot_server;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.bill_line_alternate TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.bill_line_alternate_id_seq TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.bill_line_id_seq TO emberlot_server;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.bill_revision TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.bill_revision_id_seq TO emberlot_server;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.bin TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.bin_id_seq TO emberlot_server;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.build_step TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.build_step_id_seq TO emberlot_server;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.characteristic TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.characteristic_id_seq TO emberlot_server;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.contents_line TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.contents_line_id_seq TO emberlot_server;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.contents_list TO emberlot_server;

GRANT SELECT ON TABLE public.cost_pool TO emberlot_server;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.country TO emberlot_server;

GRANT SELECT,INSERT,UPDATE ON TABLE public.customer TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.customer_id_seq TO emberlot_server;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.delivery_rate TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.delivery_rate_id_seq TO emberlot_server;

GRANT SELECT,INSERT,UPDATE ON TABLE public.demand TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.demand_id_seq TO emberlot_server;

GRANT SELECT,INSERT ON TABLE public.document TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.document_id_seq TO emberlot_server;

GRANT SELECT,INSERT ON TABLE public.file_chunk TO emberlot_server;

GRANT SELECT,INSERT ON TABLE public.file_object TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.file_object_id_seq TO emberlot_server;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.idempotency_key TO emberlot_server;

GRANT SELECT,INSERT ON TABLE public.import_run TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.import_run_id_seq TO emberlot_server;

GRANT SELECT,INSERT ON TABLE public.invoice TO emberlot_server;

GRANT SELECT,INSERT ON TABLE public.invoice_charge TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.invoice_charge_id_seq TO emberlot_server;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.invoice_file TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.invoice_id_seq TO emberlot_server;

GRANT SELECT,INSERT ON TABLE public.invoice_line TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.invoice_line_id_seq TO emberlot_server;

GRANT SELECT,INSERT ON TABLE public.invoice_vat TO emberlot_server;

GRANT SELECT,INSERT ON TABLE public.journal_entry TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.journal_entry_id_seq TO emberlot_server;

GRANT SELECT,INSERT ON TABLE public.journal_line TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.journal_line_id_seq TO emberlot_server;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.listing TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.listing_id_seq TO emberlot_server;

GRANT SELECT,INSERT,UPDATE ON TABLE public.lot TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.lot_id_seq TO emberlot_server;

GRANT SELECT,INSERT ON TABLE public.lot_status_change TO emberlot_server;

GRANT SELECT,INSERT,UPDATE ON TABLE public.nonconformity TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.nonconformity_id_seq TO emberlot_server;

GRANT SELECT,INSERT,UPDATE ON TABLE public.number_series TO emberlot_server;

GRANT SELECT,INSERT ON TABLE public.order_cancellation TO emberlot_server;

GRANT SELECT,INSERT ON TABLE public.order_invoice TO emberlot_server;

GRANT SELECT,INSERT,UPDATE ON TABLE public.order_line TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.order_line_id_seq TO emberlot_server;

GRANT SELECT,INSERT,UPDATE ON TABLE public.order_line_need TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.order_line_need_id_seq TO emberlot_server;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.outbox_mail TO emberlot_server;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.outbox_mail_attachment TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.outbox_mail_id_seq TO emberlot_server;

GRANT SELECT,INSERT,UPDATE ON TABLE public.packed_item TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.packed_item_id_seq TO emberlot_server;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.part TO emberlot_server;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.part_battery TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.part_id_seq TO emberlot_server;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.part_parameter TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.part_parameter_id_seq TO emberlot_server;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.part_supplier TO emberlot_server;

GRANT SELECT,INSERT ON TABLE public.payment TO emberlot_server;

GRANT SELECT,INSERT ON TABLE public.payment_event TO emberlot_server;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.payment_review TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.payment_review_id_seq TO emberlot_server;

GRANT SELECT,INSERT,UPDATE ON TABLE public.payment_session TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.payment_session_id_seq TO emberlot_server;

GRANT SELECT,INSERT,UPDATE ON TABLE public.period TO emberlot_server;

GRANT SELECT ON TABLE public.posting_rule TO emberlot_server;

GRANT SELECT,INSERT ON TABLE public.reading TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.reading_id_seq TO emberlot_server;

GRANT SELECT,INSERT ON TABLE public.receipt TO emberlot_server;

GRANT SELECT,INSERT,UPDATE ON TABLE public.refund TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.refund_id_seq TO emberlot_server;

GRANT SELECT,INSERT,UPDATE ON TABLE public.reservation TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.reservation_id_seq TO emberlot_server;

GRANT SELECT,INSERT ON TABLE public.rework TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.rework_id_seq TO emberlot_server;

GRANT SELECT,INSERT,UPDATE ON TABLE public.sales_order TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.sales_order_id_seq TO emberlot_server;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.schema_migration TO emberlot_server;

GRANT SELECT,INSERT,UPDATE ON TABLE public.shipment TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.shipment_id_seq TO emberlot_server;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.shop TO emberlot_server;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.shop_closed_day TO emberlot_server;

GRANT SELECT ON TABLE public.stock_balance TO emberlot_server;

GRANT SELECT,INSERT ON TABLE public.stock_move TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.stock_move_id_seq TO emberlot_server;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.supplier TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.supplier_id_seq TO emberlot_server;

GRANT SELECT,INSERT,UPDATE ON TABLE public.test_run TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.test_run_id_seq TO emberlot_server;

GRANT SELECT,INSERT,UPDATE ON TABLE public.unit TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.unit_id_seq TO emberlot_server;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.unit_step TO emberlot_server;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.user_known_address TO emberlot_server;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.user_session TO emberlot_server;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.user_token TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.user_token_id_seq TO emberlot_server;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.vat_exception TO emberlot_server;

GRANT SELECT,INSERT,DELETE,UPDATE ON TABLE public.vat_rate TO emberlot_server;

GRANT SELECT,USAGE ON SEQUENCE public.vat_rate_id_seq TO emberlot_server;
