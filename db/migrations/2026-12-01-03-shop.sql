-- The shop itself: who sells, where, in what currency, on which days.

create extension if not exists pg_trgm;

create table country (
  code text primary key check (code ~ '^[A-Z]{2}$'),
  name text not null,
  in_union boolean not null
);
comment on table country is 'A country by its ISO 3166-1 code, and whether its goods are inside the European Union''s VAT area.';

create table shop (
  id boolean primary key default true check (id),
  name text not null,
  legal_name text not null,
  address_line text not null,
  city text not null,
  postcode text not null,
  country_code text not null references country (code),
  email text not null,
  phone text,
  vat_number text,
  registration_number text,
  bank_name text,
  iban text,
  currency text not null check (currency ~ '^[A-Z]{3}$'),
  zone text not null,
  working_weekdays smallint[] not null default '{1,2,3,4,5}',
  handling_days smallint not null default 1 check (handling_days between 0 and 60),
  checkout_hold_minutes smallint not null default 45 check (checkout_hold_minutes between 31 and 1440),
  labour_rate_minor bigint not null default 0 check (labour_rate_minor >= 0),
  warranty_months smallint not null default 24 check (warranty_months between 0 and 240),
  one_stop_shop_from date,
  version integer not null default 1
);
comment on table shop is 'The one shop of this installation: its name, address, tax numbers, calendar and rates.';
comment on column shop.working_weekdays is 'ISO weekdays on which the shop works, Monday 1 to Sunday 7.';
comment on column shop.checkout_hold_minutes is 'How long goods stay claimed for a buyer on the payment page; longer than the page itself lives.';
comment on column shop.labour_rate_minor is 'Cost of one hour at the bench, in minor units.';
comment on column shop.one_stop_shop_from is 'First day on which destination VAT is charged to consumers in other union countries; empty: not elected.';

create table shop_closed_day (
  day date primary key,
  name text not null
);
comment on table shop_closed_day is 'A day on which the shop does not work although its weekday would.';

create table supplier (
  id bigint generated always as identity primary key,
  code text not null check (code = upper(code) and code ~ '^[A-Z0-9][A-Z0-9-]{0,23}$'),
  name text not null check (length(name) between 1 and 120),
  email text,
  phone text,
  country_code text references country (code),
  currency text not null check (currency ~ '^[A-Z]{3}$'),
  lead_time_days integer check (lead_time_days between 0 and 730),
  note text,
  created_at timestamptz not null,
  version integer not null default 1,
  constraint supplier_code_unique unique (code)
);
comment on table supplier is 'Somebody the shop buys from.';
