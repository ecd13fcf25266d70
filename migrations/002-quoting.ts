import { sql, type Kysely } from 'kysely'

export async function up(db: Kysely<unknown>): Promise<void> {
  for (const statement of STATEMENTS) await sql.raw(statement).execute(db)
}

const STATEMENTS = [
  `CREATE TABLE price_books (
    version INTEGER PRIMARY KEY,
    first_day TEXT NOT NULL,
    book TEXT NOT NULL,
    created_at TEXT NOT NULL
  ) STRICT`,
  `CREATE TRIGGER price_books_are_never_changed BEFORE UPDATE ON price_books
    BEGIN SELECT RAISE(ABORT, 'a price book is never changed: a new one has the next version'); END`,
  `CREATE TABLE requests (
    id TEXT PRIMARY KEY,
    number TEXT NOT NULL UNIQUE,
    company_id TEXT NOT NULL REFERENCES companies (id),
    contact_id TEXT NOT NULL REFERENCES people (id),
    version INTEGER NOT NULL,
    status TEXT NOT NULL,
    title TEXT NOT NULL,
    ship_to TEXT NOT NULL,
    needed_by TEXT,
    notes TEXT NOT NULL,
    reason TEXT,
    lines TEXT NOT NULL,
    marks INTEGER NOT NULL,
    pieces INTEGER NOT NULL,
    indicative_total INTEGER,
    currency TEXT NOT NULL,
    created_at TEXT NOT NULL,
    submitted_at TEXT
  ) STRICT`,
  `CREATE INDEX requests_by_company ON requests (company_id, created_at, id)`,
  `CREATE INDEX requests_by_day ON requests (created_at, id)`,
  `CREATE INDEX requests_by_status ON requests (status, created_at, id)`,
  `CREATE TABLE quotes (
    id TEXT PRIMARY KEY,
    number TEXT NOT NULL UNIQUE,
    request_id TEXT NOT NULL UNIQUE REFERENCES requests (id),
    company_id TEXT NOT NULL REFERENCES companies (id),
    created_at TEXT NOT NULL
  ) STRICT`,
  `CREATE INDEX quotes_by_company ON quotes (company_id, created_at, id)`,
  `CREATE INDEX quotes_by_day ON quotes (created_at, id)`,
  `CREATE TABLE revisions (
    id TEXT PRIMARY KEY,
    quote_id TEXT NOT NULL REFERENCES quotes (id),
    position INTEGER NOT NULL,
    letter TEXT NOT NULL,
    status TEXT NOT NULL,
    version INTEGER NOT NULL,
    lines TEXT NOT NULL,
    price TEXT NOT NULL,
    discount TEXT NOT NULL,
    note TEXT NOT NULL,
    blockers TEXT NOT NULL,
    total INTEGER NOT NULL,
    currency TEXT NOT NULL,
    price_book_version INTEGER NOT NULL REFERENCES price_books (version),
    prepared_by TEXT NOT NULL REFERENCES people (id),
    approved_by TEXT,
    approved_at TEXT,
    sent_at TEXT,
    valid_until TEXT,
    document_key TEXT,
    document_sha256 TEXT,
    answered_by TEXT,
    answered_at TEXT,
    answer_reason TEXT,
    UNIQUE (quote_id, position),
    UNIQUE (quote_id, letter)
  ) STRICT`,
  // What was sent is what was agreed on: after that a revision can be answered, and nothing else of it moves.
  `CREATE TRIGGER sent_revisions_never_change BEFORE UPDATE ON revisions
    WHEN OLD.sent_at IS NOT NULL AND (
      NEW.lines IS NOT OLD.lines OR NEW.price IS NOT OLD.price OR NEW.discount IS NOT OLD.discount
      OR NEW.note IS NOT OLD.note OR NEW.total IS NOT OLD.total OR NEW.currency IS NOT OLD.currency
      OR NEW.letter IS NOT OLD.letter OR NEW.sent_at IS NOT OLD.sent_at
      OR NEW.valid_until IS NOT OLD.valid_until OR NEW.document_key IS NOT OLD.document_key
      OR NEW.document_sha256 IS NOT OLD.document_sha256
      OR NEW.price_book_version IS NOT OLD.price_book_version)
    BEGIN SELECT RAISE(ABORT, 'a sent revision never changes'); END`,
  `CREATE TRIGGER sent_revisions_are_never_deleted BEFORE DELETE ON revisions WHEN OLD.sent_at IS NOT NULL
    BEGIN SELECT RAISE(ABORT, 'a sent revision is never deleted'); END`,
  `CREATE TABLE orders (
    id TEXT PRIMARY KEY,
    number TEXT NOT NULL UNIQUE,
    quote_id TEXT NOT NULL UNIQUE REFERENCES quotes (id),
    letter TEXT NOT NULL,
    company_id TEXT NOT NULL REFERENCES companies (id),
    contact_id TEXT NOT NULL REFERENCES people (id),
    status TEXT NOT NULL,
    title TEXT NOT NULL,
    total INTEGER NOT NULL,
    deposit_due INTEGER NOT NULL,
    currency TEXT NOT NULL,
    accepted_by TEXT NOT NULL,
    accepted_at TEXT NOT NULL,
    released_at TEXT
  ) STRICT`,
  `CREATE INDEX orders_by_company ON orders (company_id, accepted_at, id)`,
  `CREATE INDEX orders_by_day ON orders (accepted_at, id)`,
  `CREATE TABLE order_progress (
    id TEXT PRIMARY KEY,
    order_id TEXT NOT NULL REFERENCES orders (id),
    status TEXT NOT NULL,
    at TEXT NOT NULL,
    who TEXT NOT NULL
  ) STRICT`,
  `CREATE INDEX order_progress_by_order ON order_progress (order_id, at)`,
]
