/** The database role the server connects with: it reads and writes, but cannot rewrite a ledger. */
export const serverRole = 'emberlot_server';

/** The database role that owns the schema and runs the migrations. */
export const ownerRole = 'emberlot_owner';
