-- Documents, the journal and the stock ledger. Nothing here is ever edited: what was wrong is reversed by more of it.

create table document (
  id bigint generated always as identity primary key,
  kind text not null check (kind in (
    'opening', 'receipt', 'transfer', 'adjustment', 'lot_status', 'issue', 'issue_return', 'completion', 'scrap',
    'packing', 'shipment', 'invoice', 'credit_note', 'payment', 'refund', 'cancellation', 'manual_entry', 'reversal'
  )),
  number text not null,
  occurred_at timestamptz not null,
  recorded_by bigint references app_user (id),
  note text,
  reverses_document_id bigint references document (id),
  constraint document_number_unique unique (number),
  constraint document_reversed_once unique (reverses_document_id),
  constraint document_reversal_names_one check ((kind = 'reversal') = (reverses_document_id is not null))
);
create index document_by_kind on document (kind, occurred_at desc);
comment on table document is 'Something that happened, with its number, instant and person; moves and entries hang from it. No person: the system, on a payment event.';

create table account (
  code text primary key check (code ~ '^[0-9]{4}$'),
  name text not null,
  kind text not null check (kind in ('asset', 'liability', 'equity', 'income', 'expense')),
  is_stock boolean not null default false
);
comment on table account is 'An account of the journal. The stock accounts together carry the value of the shelf.';

create table posting_rule (
  event text not null,
  component text not null,
  debit_account_code text not null references account (code),
  credit_account_code text not null references account (code),
  sentence text not null,
  primary key (event, component)
);
comment on table posting_rule is 'Which account an amount of an event is debited and which credited: the one table by which events become entries.';

create table period (
  month date primary key check (month = date_trunc('month', month)::date),
  closed_at timestamptz,
  closed_by bigint references app_user (id)
);
comment on table period is 'A month of the books. A closed one accepts no entry.';

create table journal_entry (
  id bigint generated always as identity primary key,
  document_id bigint not null references document (id),
  event text not null,
  source_key text not null,
  day date not null,
  posted_at timestamptz not null,
  recorded_by bigint references app_user (id),
  narrative text not null,
  constraint journal_entry_source_unique unique (source_key)
);
create index journal_entry_by_day on journal_entry (day, id);
create index journal_entry_by_document on journal_entry (document_id);
comment on table journal_entry is 'A balanced double entry for one event. The source key lets each event post once.';

create table journal_line (
  id bigint generated always as identity primary key,
  entry_id bigint not null references journal_entry (id),
  account_code text not null references account (code),
  debit_minor bigint not null default 0 check (debit_minor >= 0),
  credit_minor bigint not null default 0 check (credit_minor >= 0),
  constraint journal_line_one_side check ((debit_minor = 0) <> (credit_minor = 0))
);
create index journal_line_by_entry on journal_line (entry_id);
create index journal_line_by_account on journal_line (account_code);
comment on table journal_line is 'One side of an entry on one account, in minor units of the shop''s currency.';

create function journal_entry_period_open() returns trigger
language plpgsql security definer set search_path = public as $$
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
create trigger journal_entry_in_open_period before insert on journal_entry
  for each row execute function journal_entry_period_open();

create function journal_entry_balances() returns trigger language plpgsql as $$
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
create constraint trigger journal_line_balances after insert on journal_line
  deferrable initially deferred for each row execute function journal_entry_balances();

create function journal_entry_has_lines() returns trigger language plpgsql as $$
begin
  if not exists (select 1 from journal_line where entry_id = new.id) then
    raise exception 'journal entry % has no lines', new.id
      using errcode = '23514', constraint = 'journal_entry_balances';
  end if;
  return null;
end $$;
create constraint trigger journal_entry_not_empty after insert on journal_entry
  deferrable initially deferred for each row execute function journal_entry_has_lines();

create table lot (
  id bigint generated always as identity primary key,
  code text not null,
  part_id bigint not null references part (id),
  kind text not null check (kind in ('standing', 'delivery', 'made', 'unit')),
  status text not null check (status in ('held', 'released', 'rejected')),
  supplier_id bigint references supplier (id),
  supplier_lot_code text,
  received_on date,
  expires_on date,
  unit_cost numeric(18, 6) check (unit_cost >= 0),
  parent_lot_id bigint references lot (id),
  document_id bigint references document (id),
  note text,
  created_at timestamptz not null,
  version integer not null default 1,
  constraint lot_code_unique unique (code),
  constraint lot_of_part unique (id, part_id)
);
create unique index lot_one_standing on lot (part_id) where kind = 'standing';
create index lot_by_part on lot (part_id, received_on);
create index lot_by_supplier on lot (supplier_id) where supplier_id is not null;
create index lot_search on lot using gin ((code || ' ' || coalesce(supplier_lot_code, '')) gin_trgm_ops);
comment on table lot is 'A quantity of one part with one origin. Parts traced by count use one standing lot; a finished unit is a lot of one.';
comment on column lot.unit_cost is 'What one stock unit cost when it came; the value of what lies here follows the cost pool.';

create table stock_move (
  id bigint generated always as identity primary key,
  document_id bigint not null references document (id),
  part_id bigint not null references part (id),
  lot_id bigint not null,
  bin_id bigint not null references bin (id),
  owner_customer_id bigint,
  quantity numeric(18, 6) not null,
  unit_cost numeric(18, 6) not null check (unit_cost >= 0),
  value_minor bigint not null,
  reason text not null check (reason in (
    'opening', 'receipt', 'transfer', 'found', 'lost', 'damaged', 'counted', 'issue', 'issue_return', 'completion',
    'scrap', 'dispatch', 'return', 'late_cost', 'write_down', 'reversal'
  )),
  occurred_at timestamptz not null,
  recorded_by bigint references app_user (id),
  reverses_move_id bigint references stock_move (id),
  constraint stock_move_lot_of_part foreign key (lot_id, part_id) references lot (id, part_id),
  constraint stock_move_says_something check (quantity <> 0 or value_minor <> 0),
  constraint stock_move_signs_agree check (quantity = 0 or value_minor = 0 or sign(quantity) = sign(value_minor)),
  constraint stock_move_buyers_goods_have_no_value check (owner_customer_id is null or value_minor = 0),
  constraint stock_move_reversed_once unique (reverses_move_id)
);
create index stock_move_by_lot on stock_move (lot_id, id);
create index stock_move_by_part on stock_move (part_id, id);
create index stock_move_by_document on stock_move (document_id, id);
create index stock_move_by_instant on stock_move (occurred_at, id);
comment on table stock_move is 'The stock ledger: one signed change of one lot in one bin, with its value in minor units. Append only.';

create table stock_balance (
  lot_id bigint not null,
  bin_id bigint not null references bin (id),
  owner_customer_id bigint,
  part_id bigint not null,
  quantity numeric(18, 6) not null,
  constraint stock_balance_place unique nulls not distinct (lot_id, bin_id, owner_customer_id),
  constraint stock_balance_lot_of_part foreign key (lot_id, part_id) references lot (id, part_id),
  constraint stock_balance_not_negative check (quantity >= 0)
);
create index stock_balance_by_part on stock_balance (part_id) where quantity > 0;
create index stock_balance_by_bin on stock_balance (bin_id) where quantity > 0;
comment on table stock_balance is 'What lies of a lot in a bin: the sum of its moves, kept by the database in the same statement as the move.';

create table cost_pool (
  part_id bigint not null references part (id),
  lot_id bigint,
  quantity numeric(18, 6) not null,
  value_minor bigint not null,
  constraint cost_pool_key unique nulls not distinct (part_id, lot_id),
  constraint cost_pool_quantity_not_negative check (quantity >= 0),
  constraint cost_pool_value_not_negative check (value_minor >= 0),
  constraint cost_pool_empty_is_worth_nothing check (quantity > 0 or value_minor = 0)
);
comment on table cost_pool is 'Quantity and value over which a part''s cost is averaged: one per part, or one per unit where units carry their own cost.';

-- Balances and cost pools follow the moves in the same statement. Rows are made first and then changed, because an
-- insert that meets a conflict would have its own negative quantity checked; both in key order, against deadlocks.
create function stock_move_applied() returns trigger
language plpgsql security definer set search_path = public as $$
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
create trigger stock_move_applies after insert on stock_move
  referencing new table as added for each statement execute function stock_move_applied();

-- At commit, what a document moved on the shelf equals what it posted to the stock accounts, to the minor unit.
create function document_stock_agrees() returns trigger language plpgsql as $$
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
create constraint trigger stock_move_agrees after insert on stock_move
  deferrable initially deferred for each row execute function document_stock_agrees();
create constraint trigger journal_line_stock_agrees after insert on journal_line
  deferrable initially deferred for each row execute function document_stock_agrees();

create table receipt (
  document_id bigint primary key references document (id),
  supplier_id bigint not null references supplier (id),
  delivery_note text,
  received_on date not null
);
create index receipt_by_supplier on receipt (supplier_id, received_on desc);
comment on table receipt is 'A delivery from a supplier; its lots and moves carry the same document.';

create table lot_status_change (
  document_id bigint primary key references document (id),
  lot_id bigint not null references lot (id),
  from_status text not null,
  to_status text not null check (to_status in ('held', 'released', 'rejected')),
  reason text not null check (length(reason) between 1 and 500),
  constraint lot_status_change_changes check (from_status <> to_status)
);
create index lot_status_change_by_lot on lot_status_change (lot_id);
comment on table lot_status_change is 'A lot was held, released or rejected, and why.';

create table demand (
  id bigint generated always as identity primary key,
  kind text not null check (kind in ('order_line', 'batch_line')),
  part_id bigint not null references part (id),
  quantity numeric(18, 6) not null check (quantity > 0),
  taken numeric(18, 6) not null default 0 check (taken >= 0),
  needed_on date,
  reference text not null,
  created_at timestamptz not null,
  closed_at timestamptz
);
create index demand_open_by_part on demand (part_id) where closed_at is null;
comment on table demand is 'A need for a quantity of a part: an order line or a batch line. Taken: what it has had so far.';

create table reservation (
  id bigint generated always as identity primary key,
  demand_id bigint not null references demand (id),
  part_id bigint not null references part (id),
  quantity numeric(18, 6) not null check (quantity > 0),
  supply text not null check (supply in ('shelf', 'batch')),
  batch_id bigint,
  lot_id bigint references lot (id),
  of_unit boolean not null default false,
  expires_at timestamptz,
  created_at timestamptz not null,
  ended_at timestamptz,
  end_reason text check (end_reason in ('taken', 'expired', 'cancelled', 'moved')),
  constraint reservation_batch_named check ((supply = 'batch') = (batch_id is not null)),
  constraint reservation_unit_has_lot check (not of_unit or (lot_id is not null and quantity = 1)),
  constraint reservation_end_says_why check ((ended_at is null) = (end_reason is null))
);
create index reservation_live_by_part on reservation (part_id) where ended_at is null;
create index reservation_live_by_demand on reservation (demand_id) where ended_at is null;
create index reservation_live_by_batch on reservation (batch_id) where ended_at is null and batch_id is not null;
create index reservation_expiring on reservation (expires_at) where ended_at is null and expires_at is not null;
create unique index reservation_one_per_unit on reservation (lot_id) where of_unit and ended_at is null;
comment on table reservation is 'A claim of a demand on a quantity of one supply: the shelf or a batch under way; bound to a lot or unit only at picking or packing.';

create table import_run (
  id bigint generated always as identity primary key,
  kind text not null check (kind in ('parts', 'bill', 'build_steps', 'test_plan', 'opening_stock')),
  file_name text not null,
  content_sha256 bytea not null check (length(content_sha256) = 32),
  row_count integer not null check (row_count >= 0),
  applied_at timestamptz not null,
  applied_by bigint not null references app_user (id),
  document_id bigint references document (id)
);
create index import_run_by_content on import_run (content_sha256);
comment on table import_run is 'A CSV file that was taken in whole.';

insert into account (code, name, kind, is_stock) values
  ('1200', 'Trade receivables', 'asset', false),
  ('1250', 'Card processor clearing', 'asset', false),
  ('1260', 'Bank', 'asset', false),
  ('1310', 'Parts and materials', 'asset', true),
  ('1320', 'Work in progress', 'asset', false),
  ('1330', 'Finished units', 'asset', true),
  ('2100', 'Goods received, not invoiced', 'liability', false),
  ('2200', 'VAT on sales', 'liability', false),
  ('2300', 'Customer prepayments', 'liability', false),
  ('3100', 'Opening balances', 'equity', false),
  ('4000', 'Sales of tools, kits and spares', 'income', false),
  ('4050', 'Delivery charged', 'income', false),
  ('5000', 'Cost of sales', 'expense', false),
  ('5100', 'Bench labour absorbed', 'expense', false),
  ('5200', 'Stock differences', 'expense', false),
  ('5300', 'Scrap and abnormal loss', 'expense', false),
  ('5400', 'Warranty work', 'expense', false),
  ('6100', 'Payment processing fees', 'expense', false);

-- One row per event and component. An amount below zero swaps the two sides.
insert into posting_rule (event, component, debit_account_code, credit_account_code, sentence) values
  ('opening_stock', 'materials', '1310', '3100', 'Parts on the shelf when the books begin'),
  ('opening_stock', 'units', '1330', '3100', 'Finished units on the shelf when the books begin'),
  ('goods_received', 'materials', '1310', '2100', 'A delivery is on the shelf before its invoice is here'),
  ('stock_adjusted', 'materials', '1310', '5200', 'Parts found (debit) or missing (credit)'),
  ('stock_adjusted', 'units', '1330', '5200', 'Units found (debit) or missing (credit)'),
  ('stock_scrapped', 'materials', '5300', '1310', 'Parts thrown away'),
  ('stock_scrapped', 'units', '5300', '1330', 'Units thrown away'),
  ('issued_to_batch', 'materials', '1320', '1310', 'Parts picked for a batch become work in progress'),
  ('issued_to_batch', 'units', '1320', '1330', 'Serial-numbered parts picked for a batch'),
  ('returned_from_batch', 'materials', '1310', '1320', 'Parts left over go back to the shelf'),
  ('returned_from_batch', 'units', '1330', '1320', 'Serial-numbered parts left over go back'),
  ('unit_completed', 'materials', '1330', '1320', 'A finished unit takes its materials'),
  ('unit_completed', 'labour', '1330', '5100', 'A finished unit takes its minutes at the bench'),
  ('made_part_completed', 'materials', '1310', '1320', 'A made part takes its materials'),
  ('made_part_completed', 'labour', '1310', '5100', 'A made part takes its minutes at the bench'),
  ('batch_loss', 'materials', '5300', '1320', 'What a batch lost beyond its good units'),
  ('invoice_issued', 'net', '1200', '2300', 'Invoiced at payment: the net amount is owed as goods'),
  ('invoice_issued', 'vat', '1200', '2200', 'VAT falls due with the advance payment'),
  ('credit_note_issued', 'net', '2300', '1200', 'A credit note gives the prepayment back'),
  ('credit_note_issued', 'vat', '2200', '1200', 'A credit note takes its VAT back'),
  ('payment_received', 'gross', '1250', '1200', 'The card processor holds the buyer''s payment'),
  ('payment_fee', 'fee', '6100', '1250', 'The card processor keeps its fee'),
  ('refund_sent', 'gross', '1200', '1250', 'Money back through the card processor'),
  ('dispatched', 'goods', '2300', '4000', 'Dispatch turns the prepayment into revenue'),
  ('dispatched', 'delivery', '2300', '4050', 'Delivery charged is earned at dispatch'),
  ('dispatched', 'cost_materials', '5000', '1310', 'Cost of kits and spares that left'),
  ('dispatched', 'cost_units', '5000', '1330', 'Cost of units that left');
