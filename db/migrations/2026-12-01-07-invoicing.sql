-- Invoices and credit notes: numbered without gaps, frozen when issued.

create table invoice (
  id bigint generated always as identity primary key,
  document_id bigint not null references document (id),
  kind text not null check (kind in ('invoice', 'credit_note')),
  series text not null check (series ~ '^[A-Z]{1,6}$'),
  year integer not null check (year between 2000 and 9999),
  sequence integer not null check (sequence > 0),
  number text not null,
  credits_invoice_id bigint references invoice (id),
  issued_at timestamptz not null,
  issued_on date not null,
  tax_point date not null,
  due_on date,
  currency text not null check (currency ~ '^[A-Z]{3}$'),
  seller jsonb not null,
  buyer jsonb not null,
  customer_id bigint,
  reference text not null,
  vat_treatment text not null check (vat_treatment in ('home', 'destination', 'export', 'intra_community')),
  vat_note text,
  net_minor bigint not null check (net_minor >= 0),
  vat_minor bigint not null check (vat_minor >= 0),
  gross_minor bigint not null,
  prepaid_minor bigint not null default 0 check (prepaid_minor >= 0),
  reason text,
  constraint invoice_number_unique unique (number),
  constraint invoice_sequence_unique unique (series, year, sequence),
  constraint invoice_document_unique unique (document_id),
  constraint invoice_adds_up check (net_minor + vat_minor = gross_minor),
  constraint invoice_prepaid_within check (prepaid_minor <= gross_minor),
  constraint invoice_credit_names_invoice check ((kind = 'credit_note') = (credits_invoice_id is not null)),
  constraint invoice_credit_says_why check ((kind = 'credit_note') = (reason is not null))
);
create index invoice_by_day on invoice (issued_on desc, id desc);
create index invoice_by_customer on invoice (customer_id) where customer_id is not null;
create index invoice_credits on invoice (credits_invoice_id) where credits_invoice_id is not null;
create index invoice_search on invoice using gin ((number || ' ' || reference || ' ' || (buyer ->> 'name')) gin_trgm_ops);
comment on table invoice is 'An invoice or credit note as it was issued; buyer and seller as they were on that day. Never changed.';

create table invoice_line (
  id bigint generated always as identity primary key,
  invoice_id bigint not null references invoice (id),
  position integer not null check (position > 0),
  part_id bigint references part (id),
  code text not null,
  description text not null,
  quantity numeric(18, 6) not null check (quantity > 0),
  measure text not null,
  unit_net numeric(18, 6) not null check (unit_net >= 0),
  net_minor bigint not null check (net_minor >= 0),
  vat_category text not null check (vat_category in ('S', 'Z', 'E', 'AE', 'K', 'G', 'O')),
  vat_rate numeric(7, 4) not null check (vat_rate >= 0 and vat_rate < 100),
  constraint invoice_line_position_unique unique (invoice_id, position)
);
comment on table invoice_line is 'One line of an invoice or credit note. Unit price in major units with up to six decimals.';

create table invoice_charge (
  id bigint generated always as identity primary key,
  invoice_id bigint not null references invoice (id),
  position integer not null check (position > 0),
  kind text not null check (kind in ('charge', 'allowance')),
  reason text not null,
  amount_minor bigint not null check (amount_minor > 0),
  vat_category text not null check (vat_category in ('S', 'Z', 'E', 'AE', 'K', 'G', 'O')),
  vat_rate numeric(7, 4) not null check (vat_rate >= 0 and vat_rate < 100),
  constraint invoice_charge_position_unique unique (invoice_id, position)
);
comment on table invoice_charge is 'A charge (delivery) or allowance on the whole invoice.';

create table invoice_vat (
  invoice_id bigint not null references invoice (id),
  vat_category text not null,
  vat_rate numeric(7, 4) not null,
  taxable_minor bigint not null check (taxable_minor >= 0),
  vat_minor bigint not null check (vat_minor >= 0),
  reason text,
  primary key (invoice_id, vat_category, vat_rate)
);
comment on table invoice_vat is 'VAT of an invoice, once per category and rate.';

create table invoice_file (
  invoice_id bigint not null references invoice (id),
  kind text not null check (kind in ('pdf', 'ubl')),
  file_id bigint not null references file_object (id),
  primary key (invoice_id, kind)
);
comment on table invoice_file is 'The invoice as a file, made once after it was issued.';

-- A series has no gaps: number n is only taken when n - 1 is there, and never goes back in time.
create function invoice_without_gap() returns trigger language plpgsql as $$
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
create trigger invoice_numbered before insert on invoice for each row execute function invoice_without_gap();

-- At commit the parts of an invoice add up, and credit notes never give back more than was invoiced.
create function invoice_parts_add_up() returns trigger
language plpgsql security definer set search_path = public as $$
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
create constraint trigger invoice_adds_up_at_commit after insert on invoice
  deferrable initially deferred for each row execute function invoice_parts_add_up();
