import { sql, type Kysely } from 'kysely'

export async function up(db: Kysely<unknown>): Promise<void> {
  for (const statement of STATEMENTS) await sql.raw(statement).execute(db)
}

const STATEMENTS = [
  `CREATE TABLE outbox (
    id TEXT PRIMARY KEY,
    kind TEXT NOT NULL,
    to_address TEXT NOT NULL,
    subject TEXT NOT NULL,
    html TEXT NOT NULL,
    text TEXT NOT NULL,
    attachment TEXT,
    quote_id TEXT REFERENCES quotes (id),
    order_id TEXT REFERENCES orders (id),
    status TEXT NOT NULL CHECK (status IN ('waiting', 'sent', 'parked')),
    attempts INTEGER NOT NULL,
    next_at TEXT NOT NULL,
    last_error TEXT,
    created_at TEXT NOT NULL,
    sent_at TEXT
  ) STRICT`,
  `CREATE INDEX outbox_by_turn ON outbox (status, next_at)`,
  `CREATE INDEX outbox_by_quote ON outbox (quote_id, created_at)`,
  `CREATE TABLE payments (
    id TEXT PRIMARY KEY,
    order_id TEXT NOT NULL REFERENCES orders (id),
    purpose TEXT NOT NULL CHECK (purpose IN ('deposit')),
    status TEXT NOT NULL,
    amount INTEGER NOT NULL CHECK (amount > 0),
    currency TEXT NOT NULL,
    session_id TEXT UNIQUE,
    session_url TEXT,
    session_expires_at TEXT,
    failure TEXT,
    created_at TEXT NOT NULL,
    settled_at TEXT
  ) STRICT`,
  `CREATE INDEX payments_by_order ON payments (order_id, created_at)`,
  `CREATE TABLE stripe_events (
    id TEXT PRIMARY KEY,
    type TEXT NOT NULL,
    object_id TEXT NOT NULL,
    received_at TEXT NOT NULL,
    handled_at TEXT,
    attempts INTEGER NOT NULL,
    next_at TEXT NOT NULL,
    outcome TEXT
  ) STRICT`,
  `CREATE INDEX stripe_events_waiting ON stripe_events (handled_at, next_at)`,
  `CREATE TABLE ledger (
    id TEXT PRIMARY KEY,
    transaction_id TEXT NOT NULL,
    at TEXT NOT NULL,
    account TEXT NOT NULL,
    amount INTEGER NOT NULL,
    currency TEXT NOT NULL,
    memo TEXT NOT NULL,
    order_id TEXT REFERENCES orders (id),
    payment_id TEXT REFERENCES payments (id)
  ) STRICT`,
  `CREATE INDEX ledger_by_day ON ledger (at, id)`,
  `CREATE INDEX ledger_by_account ON ledger (account, at, id)`,
  `CREATE TRIGGER ledger_is_never_changed BEFORE UPDATE ON ledger
    BEGIN SELECT RAISE(ABORT, 'the ledger is never changed: post the opposite'); END`,
  `CREATE TRIGGER ledger_is_never_deleted BEFORE DELETE ON ledger
    BEGIN SELECT RAISE(ABORT, 'the ledger is never deleted from'); END`,
]
