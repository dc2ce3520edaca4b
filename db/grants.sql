-- What the server's role may do. Run after every migration; running it again changes nothing.
-- It reads and writes working tables; ledgers it may only add to; what triggers keep, it may only read.

grant usage on schema public to emberlot_server;
grant select, insert, update, delete on all tables in schema public to emberlot_server;
grant usage, select on all sequences in schema public to emberlot_server;

-- Append only.
revoke update, delete, truncate on
  document, journal_entry, journal_line, stock_move, receipt, lot_status_change, import_run,
  invoice, invoice_line, invoice_charge, invoice_vat,
  batch_issue, batch_cost, reading, rework,
  order_cancellation, order_invoice, payment, payment_event,
  audit_entry, file_object, file_chunk
from emberlot_server;

-- Kept by triggers.
revoke insert, update, delete, truncate on stock_balance, cost_pool from emberlot_server;

-- Written by migrations only.
revoke insert, update, delete, truncate on account, posting_rule from emberlot_server;

-- What identifies a thing that others point to stays.
revoke delete, truncate on
  lot, unit, batch, sales_order, order_line, order_line_need, shipment, packed_item, refund, payment_session, test_run,
  as_built, nonconformity, demand, reservation, bill_revision, part, customer, app_user, period, number_series
from emberlot_server;
grant delete on bill_revision, part to emberlot_server;

-- The job queue lives in a schema of its own, kept by its library; its tables admit nobody but their owner until a
-- policy says so.
grant usage on schema graphile_worker to emberlot_server;
grant select, insert, update, delete on all tables in schema graphile_worker to emberlot_server;
grant usage, select on all sequences in schema graphile_worker to emberlot_server;
grant execute on all functions in schema graphile_worker to emberlot_server;
revoke insert, update, delete on graphile_worker.migrations from emberlot_server;
do $$
declare
  queue_table text;
begin
  for queue_table in
    select tablename from pg_tables where schemaname = 'graphile_worker' and rowsecurity
  loop
    execute format('drop policy if exists emberlot_server_works on graphile_worker.%I', queue_table);
    execute format(
      'create policy emberlot_server_works on graphile_worker.%I to emberlot_server using (true) with check (true)',
      queue_table
    );
  end loop;
end
$$;
