-- The storefront, orders, payments, packing and dispatch.

create table vat_rate (
  id bigint generated always as identity primary key,
  country_code text not null references country (code),
  rate numeric(7, 4) not null check (rate >= 0 and rate < 100),
  valid_from date not null,
  valid_until date,
  source text not null,
  constraint vat_rate_days_in_order check (valid_until >= valid_from),
  constraint vat_rate_starts_once unique (country_code, valid_from)
);
comment on table vat_rate is 'Standard VAT rate of a country over a span of days, with where it was read.';

create table vat_exception (
  country_code text not null references country (code),
  postcode_prefix text not null check (postcode_prefix = upper(postcode_prefix)),
  sentence text not null,
  primary key (country_code, postcode_prefix)
);
comment on table vat_exception is 'Postcodes for which a country''s usual rule does not hold: the buyer is asked to write to the shop.';

create table delivery_rate (
  id bigint generated always as identity primary key,
  country_code text not null references country (code),
  net_minor bigint not null check (net_minor >= 0),
  transit_days smallint not null check (transit_days between 0 and 90),
  carries_lithium boolean not null default true,
  valid_from date not null,
  constraint delivery_rate_starts_once unique (country_code, valid_from)
);
comment on table delivery_rate is 'What delivery to a country costs net, from a day on. No row: ask us.';

create table listing (
  id bigint generated always as identity primary key,
  slug text not null check (slug ~ '^[a-z0-9][a-z0-9-]{0,59}$'),
  part_id bigint not null references part (id),
  form text not null check (form in ('tool', 'kit', 'spare')),
  family text not null check (length(family) between 1 and 60),
  title text not null check (length(title) between 1 and 120),
  summary text not null,
  description text not null default '',
  skills text,
  cautions text[] not null default '{}',
  drawing text,
  net_minor bigint not null check (net_minor > 0),
  place integer not null default 100,
  published_at timestamptz,
  version integer not null default 1,
  constraint listing_slug_unique unique (slug),
  constraint listing_part_unique unique (part_id),
  constraint listing_kit_names_skills check (form <> 'kit' or skills is not null)
);
comment on table listing is 'A part as it is offered on the storefront, at a price net of VAT.';

create table customer (
  id bigint generated always as identity primary key,
  kind text not null default 'person' check (kind in ('person', 'company')),
  name text not null check (length(name) between 1 and 120),
  email text not null,
  vat_number text,
  created_at timestamptz not null,
  version integer not null default 1
);
create index customer_by_email on customer (lower(email));
comment on table customer is 'A buyer, a person or a company, with any number of sign-ins.';

alter table app_user add constraint app_user_of_customer foreign key (customer_id) references customer (id);
alter table stock_move add constraint stock_move_of_customer foreign key (owner_customer_id) references customer (id);
alter table stock_balance add constraint stock_balance_of_customer foreign key (owner_customer_id) references customer (id);
alter table invoice add constraint invoice_of_customer foreign key (customer_id) references customer (id);

create table sales_order (
  id bigint generated always as identity primary key,
  number text not null,
  customer_id bigint not null references customer (id),
  guest_token_sha256 bytea,
  placed_at timestamptz not null,
  email text not null,
  recipient text not null,
  company text,
  address_line text not null,
  address_line_2 text,
  city text not null,
  postcode text not null,
  country_code text not null references country (code),
  currency text not null check (currency ~ '^[A-Z]{3}$'),
  vat_treatment text not null check (vat_treatment in ('home', 'destination', 'export', 'intra_community')),
  vat_note text,
  delivery_net_minor bigint not null check (delivery_net_minor >= 0),
  net_minor bigint not null check (net_minor >= 0),
  vat_minor bigint not null check (vat_minor >= 0),
  gross_minor bigint not null check (gross_minor > 0),
  promised_on date not null,
  version integer not null default 1,
  constraint sales_order_number_unique unique (number),
  constraint sales_order_adds_up check (net_minor + vat_minor = gross_minor)
);
create index sales_order_by_customer on sales_order (customer_id, placed_at desc);
create index sales_order_by_instant on sales_order (placed_at desc, id desc);
create index sales_order_search on sales_order using gin ((number || ' ' || recipient || ' ' || email) gin_trgm_ops);
comment on table sales_order is 'What a buyer ordered and was promised. It stores no status: that is read from the documents beside it.';

create table order_line (
  id bigint generated always as identity primary key,
  order_id bigint not null references sales_order (id),
  position integer not null check (position > 0),
  listing_id bigint not null references listing (id),
  part_id bigint not null references part (id),
  form text not null check (form in ('tool', 'kit', 'spare')),
  title text not null,
  quantity integer not null check (quantity between 1 and 100),
  unit_net_minor bigint not null check (unit_net_minor >= 0),
  net_minor bigint not null,
  vat_category text not null check (vat_category in ('S', 'Z', 'E', 'AE', 'K', 'G', 'O')),
  vat_rate numeric(7, 4) not null check (vat_rate >= 0 and vat_rate < 100),
  constraint order_line_position_unique unique (order_id, position),
  constraint order_line_adds_up check (net_minor = unit_net_minor * quantity)
);
create index order_line_by_part on order_line (part_id);
comment on table order_line is 'One listing of an order, at the price it was sold for.';

create table order_line_need (
  id bigint generated always as identity primary key,
  order_line_id bigint not null references order_line (id),
  part_id bigint not null references part (id),
  quantity numeric(18, 6) not null check (quantity > 0),
  bag text,
  demand_id bigint not null references demand (id),
  constraint order_line_need_demand_unique unique (demand_id)
);
create index order_line_need_by_line on order_line_need (order_line_id);
comment on table order_line_need is 'What must leave the shelf for an order line: the tool itself, or each line of a kit''s contents list as it was then.';

create table order_cancellation (
  document_id bigint primary key references document (id),
  order_id bigint not null references sales_order (id),
  reason text not null check (length(reason) between 1 and 500),
  constraint order_cancelled_once unique (order_id)
);
comment on table order_cancellation is 'An order was cancelled before it left, or was never paid.';

create table payment_session (
  id bigint generated always as identity primary key,
  order_id bigint not null references sales_order (id),
  operation_key uuid not null,
  provider_session_id text,
  amount_minor bigint not null check (amount_minor > 0),
  currency text not null,
  page_url text,
  status text not null default 'opening' check (status in ('opening', 'open', 'paid', 'waiting', 'expired', 'failed')),
  expires_at timestamptz not null,
  created_at timestamptz not null,
  constraint payment_session_operation_unique unique (operation_key),
  constraint payment_session_provider_unique unique (provider_session_id)
);
create index payment_session_by_order on payment_session (order_id);
create index payment_session_unsettled on payment_session (expires_at) where status in ('opening', 'open', 'waiting');
comment on table payment_session is 'One try to have an order paid on the hosted payment page.';

create table payment_event (
  provider_event_id text primary key,
  type text not null,
  object_id text not null,
  payload jsonb not null,
  received_at timestamptz not null,
  outcome text not null
);
create index payment_event_by_object on payment_event (object_id);
comment on table payment_event is 'An event the payment service sent, kept once; what it did is in the outcome. Append only.';

create table payment (
  document_id bigint primary key references document (id),
  order_id bigint not null references sales_order (id),
  payment_session_id bigint not null references payment_session (id),
  amount_minor bigint not null check (amount_minor > 0),
  currency text not null,
  provider_payment_id text not null,
  received_at timestamptz not null,
  constraint payment_provider_unique unique (provider_payment_id),
  constraint payment_session_paid_once unique (payment_session_id)
);
create index payment_by_order on payment (order_id);
comment on table payment is 'Money received for an order. Append only.';

create table payment_review (
  id bigint generated always as identity primary key,
  order_id bigint references sales_order (id),
  provider_event_id text references payment_event (provider_event_id) deferrable initially deferred,
  what text not null,
  created_at timestamptz not null,
  settled_at timestamptz,
  settled_by bigint references app_user (id),
  resolution text,
  constraint payment_review_settled_says_how check ((settled_at is null) = (resolution is null))
);
create index payment_review_open on payment_review (created_at) where settled_at is null;
comment on table payment_review is 'A payment that does not fit its order: nothing leaves until a person has looked.';

create table order_invoice (
  invoice_id bigint primary key references invoice (id),
  order_id bigint not null references sales_order (id)
);
create index order_invoice_by_order on order_invoice (order_id);
comment on table order_invoice is 'The invoices and credit notes of an order.';

create table refund (
  id bigint generated always as identity primary key,
  document_id bigint not null references document (id),
  order_id bigint not null references sales_order (id),
  payment_document_id bigint not null references payment (document_id),
  credit_note_id bigint not null references invoice (id),
  amount_minor bigint not null check (amount_minor > 0),
  operation_key uuid not null,
  provider_refund_id text,
  status text not null default 'requested' check (status in ('requested', 'sent', 'failed')),
  requested_at timestamptz not null,
  requested_by bigint references app_user (id),
  settled_at timestamptz,
  constraint refund_credit_note_unique unique (credit_note_id),
  constraint refund_operation_unique unique (operation_key),
  constraint refund_provider_unique unique (provider_refund_id)
);
create index refund_by_order on refund (order_id);
create index refund_by_payment on refund (payment_document_id);
comment on table refund is 'Money going back to a buyer, each with its credit note.';

create function refund_within_payment() returns trigger
language plpgsql security definer set search_path = public as $$
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
create trigger refund_checked after insert or update on refund for each row execute function refund_within_payment();

create table shipment (
  id bigint generated always as identity primary key,
  number text not null,
  order_id bigint not null references sales_order (id),
  status text not null default 'packing' check (status in ('packing', 'packed', 'shipped', 'dissolved')),
  opened_at timestamptz not null,
  opened_by bigint references app_user (id),
  packed_at timestamptz,
  shipped_at timestamptz,
  shipped_by bigint references app_user (id),
  carrier text,
  tracking_code text,
  weight_g integer check (weight_g > 0),
  lithium jsonb,
  document_id bigint references document (id),
  version integer not null default 1,
  constraint shipment_number_unique unique (number),
  constraint shipment_shipped_complete check ((status = 'shipped') = (shipped_at is not null and document_id is not null))
);
create unique index shipment_one_open_per_order on shipment (order_id) where status in ('packing', 'packed');
create index shipment_by_order on shipment (order_id);
create index shipment_by_instant on shipment (shipped_at desc) where shipped_at is not null;
comment on table shipment is 'A parcel of an order, from the first thing scanned into it until it leaves.';

create table packed_item (
  id bigint generated always as identity primary key,
  shipment_id bigint not null references shipment (id),
  order_line_need_id bigint not null references order_line_need (id),
  part_id bigint not null,
  lot_id bigint not null,
  bin_id bigint not null references bin (id),
  unit_id bigint references unit (id),
  quantity numeric(18, 6) not null check (quantity > 0),
  packed_at timestamptz not null,
  packed_by bigint references app_user (id),
  taken_out_at timestamptz,
  returned_at timestamptz,
  constraint packed_item_lot_of_part foreign key (lot_id, part_id) references lot (id, part_id),
  constraint packed_item_unit_is_one check (unit_id is null or quantity = 1)
);
create index packed_item_by_shipment on packed_item (shipment_id);
create index packed_item_by_lot on packed_item (lot_id);
create unique index packed_item_unit_once on packed_item (unit_id)
  where unit_id is not null and taken_out_at is null and returned_at is null;
comment on table packed_item is 'What was scanned into a parcel: a unit, or a quantity of a lot. A unit is in one parcel at a time.';

-- No unit without a valid pass gets into a parcel, or leaves in one.
create function packed_unit_is_sound() returns trigger language plpgsql as $$
begin
  if new.unit_id is not null and not unit_is_sound(new.unit_id) then
    raise exception 'a unit without a valid pass cannot be packed'
      using errcode = '23514', constraint = 'packed_unit_is_sound';
  end if;
  return new;
end $$;
create trigger packed_item_sound before insert on packed_item for each row execute function packed_unit_is_sound();

create function shipment_units_are_sound() returns trigger language plpgsql as $$
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
create trigger shipment_sound before update on shipment for each row execute function shipment_units_are_sound();
