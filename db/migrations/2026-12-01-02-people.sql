-- People who sign in, the links that let them in, and their sessions.

create table app_user (
  id bigint generated always as identity primary key,
  email text not null check (length(email) between 3 and 254 and email !~ '[[:space:][:cntrl:]]'),
  name text not null check (length(name) between 1 and 120),
  role text not null check (role in ('owner', 'assembler', 'accountant', 'customer')),
  status text not null check (status in ('invited', 'unconfirmed', 'active', 'disabled')),
  password_hash text,
  customer_id bigint,
  email_confirmed_at timestamptz,
  created_at timestamptz not null,
  version integer not null default 1 check (version > 0),
  constraint app_user_active_can_sign_in check (status <> 'active' or (password_hash is not null and email_confirmed_at is not null)),
  constraint app_user_staff_is_no_customer check (role = 'customer' or customer_id is null)
);
comment on table app_user is 'A person who signs in, or has been asked to. Never deleted, since the record of what was done points here.';
comment on column app_user.status is 'invited: staff asked in by the owner; unconfirmed: signed up, link not yet opened; active; disabled: can no longer sign in.';
comment on column app_user.password_hash is 'argon2id in its own text form, which carries its parameters.';
create unique index app_user_email_key on app_user (lower(email));
create index app_user_customer on app_user (customer_id);

alter table audit_entry
  add constraint audit_entry_actor_fkey foreign key (actor_id) references app_user (id);

create table user_token (
  id bigint generated always as identity primary key,
  user_id bigint not null references app_user (id),
  purpose text not null check (purpose in ('sign_up', 'invitation', 'password_reset', 'email_change')),
  token_hash bytea not null check (length(token_hash) = 32),
  new_email text,
  created_at timestamptz not null,
  expires_at timestamptz not null,
  used_at timestamptz,
  voided_at timestamptz,
  constraint user_token_token_hash_key unique (token_hash),
  constraint user_token_new_email_with_change check ((purpose = 'email_change') = (new_email is not null)),
  constraint user_token_used_or_voided check (used_at is null or voided_at is null)
);
comment on table user_token is 'A link sent by mail that can be used once for one purpose; only its SHA-256 is kept. A newer one for the same purpose voids it.';
create index user_token_open on user_token (user_id, purpose) where used_at is null and voided_at is null;

create table user_known_address (
  user_id bigint not null references app_user (id),
  address_digest bytea not null check (length(address_digest) = 32),
  last_signed_in_at timestamptz not null,
  primary key (user_id, address_digest)
);
comment on table user_known_address is 'A network address somebody signed in from before: guesses made from elsewhere do not lock them out there.';

create table user_session (
  sid text primary key,
  sess jsonb not null,
  expire timestamptz not null,
  user_id bigint generated always as ((sess #>> '{passport,user}')::bigint) stored
);
comment on table user_session is 'A browser''s session, written by connect-pg-simple; without a user until somebody signs in.';
create index user_session_expire on user_session (expire);
create index user_session_user on user_session (user_id);
