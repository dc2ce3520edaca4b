-- What every part of the product stands on: the record of who did what, mail waiting to leave, files, answers kept for
-- repeated requests, gapless numbers, and counts of attempts. Instants are written by the server's clock: no column
-- takes now() by default.

create table audit_entry (
  id bigint generated always as identity primary key,
  recorded_at timestamptz not null,
  actor_id bigint,
  actor_name text,
  actor_role text,
  action text not null check (action ~ '^[a-z][a-z_]*(\.[a-z_]+)*$'),
  subject_kind text not null check (subject_kind ~ '^[a-z][a-z_]*$'),
  subject_id bigint,
  subject_code text,
  before jsonb,
  after jsonb,
  request_id text,
  constraint audit_entry_actor_whole check ((actor_id is null) = (actor_name is null) and (actor_id is null) = (actor_role is null))
);
comment on table audit_entry is 'One thing that somebody (or, without an actor, the product itself) did, with the values before and after. Append-only.';
create index audit_entry_recorded_at on audit_entry (recorded_at desc, id desc);
create index audit_entry_subject on audit_entry (subject_kind, subject_id);
create index audit_entry_actor on audit_entry (actor_id);

create table file_object (
  id bigint generated always as identity primary key,
  sha256 bytea not null check (length(sha256) = 32),
  byte_size integer not null check (byte_size > 0),
  media_type text not null,
  stored_at timestamptz not null,
  constraint file_object_sha256_key unique (sha256)
);
comment on table file_object is 'The content of one or more files, addressed by its digest; names belong to the documents that refer to it. Append-only.';
comment on column file_object.media_type is 'Found from the content when it was stored, never taken from the sender.';

create table file_chunk (
  file_id bigint not null references file_object (id),
  position integer not null check (position >= 0),
  bytes bytea not null check (length(bytes) between 1 and 262144),
  primary key (file_id, position)
);
comment on table file_chunk is 'A piece of a file''s content, in order from position 0, so that it can be streamed. Append-only.';
-- Photos, captures and PDFs are compressed already; trying again costs time and gains nothing.
alter table file_chunk alter column bytes set storage external;

create table outbox_mail (
  id bigint generated always as identity primary key,
  dedupe_key text not null,
  recipient text not null check (recipient !~ '[\r\n,;]'),
  subject text not null check (subject !~ '[\r\n]'),
  body_text text not null,
  body_html text not null,
  confidential boolean not null default false,
  message_id text not null,
  created_at timestamptz not null,
  attempts integer not null default 0 check (attempts >= 0),
  next_attempt_at timestamptz not null,
  claimed_at timestamptz,
  sent_at timestamptz,
  given_up_at timestamptz,
  last_error text,
  constraint outbox_mail_dedupe_key_key unique (dedupe_key),
  constraint outbox_mail_message_id_key unique (message_id),
  constraint outbox_mail_one_end check (sent_at is null or given_up_at is null)
);
comment on table outbox_mail is 'A mail that is to leave once; written in the transaction of the event that it tells of.';
comment on column outbox_mail.dedupe_key is 'Names the event, so that one event sends one mail.';
comment on column outbox_mail.confidential is 'Its text holds a link that lets somebody in, and is emptied once it has left.';
comment on column outbox_mail.claimed_at is 'Set while a sender has it in hand. One left behind by a broken sender may have left: it waits for a person.';
create index outbox_mail_waiting on outbox_mail (next_attempt_at) where sent_at is null and given_up_at is null;

create table outbox_mail_attachment (
  mail_id bigint not null references outbox_mail (id),
  position integer not null check (position >= 0),
  file_id bigint not null references file_object (id),
  file_name text not null check (file_name !~ '[\r\n/\\]'),
  primary key (mail_id, position)
);
comment on table outbox_mail_attachment is 'A stored file that goes with a mail, under the name that the reader sees.';

create table idempotency_key (
  scope text not null,
  key text not null check (length(key) between 8 and 200),
  request_hash bytea not null check (length(request_hash) = 32),
  claimed_at timestamptz not null,
  status smallint check (status between 200 and 599),
  answer json,
  answered_at timestamptz,
  primary key (scope, key),
  constraint idempotency_key_answer_whole check ((status is null) = (answered_at is null))
);
comment on table idempotency_key is 'A creating request that took effect, with the answer it got, so that sending it again creates nothing and gets the same answer.';
comment on column idempotency_key.answer is 'As text, so that the repeated answer has the same bytes.';
comment on column idempotency_key.scope is 'Who sent it: a person, or a visitor''s session.';
create index idempotency_key_claimed_at on idempotency_key (claimed_at);

create table number_series (
  series text not null check (series ~ '^[a-z][a-z_]*$'),
  period text not null,
  last_number integer not null check (last_number > 0),
  primary key (series, period)
);
comment on table number_series is 'The last number given in a series and period. The row stays locked until the document that takes the number is committed, so no number is lost or given twice.';
comment on column number_series.period is 'The year, or an empty text for a series that never starts again.';

create table attempt_count (
  bucket text primary key,
  window_ends_at timestamptz not null,
  attempts integer not null check (attempts > 0)
);
comment on table attempt_count is 'How often something was tried for one account or from one address in the running window.';
comment on column attempt_count.bucket is 'What is counted and a digest of for whom: no address or name in clear.';
create index attempt_count_window_ends_at on attempt_count (window_ends_at);
