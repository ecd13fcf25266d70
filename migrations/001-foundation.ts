import { sql, type Kysely } from 'kysely'

export async function up(db: Kysely<unknown>): Promise<void> {
  for (const statement of STATEMENTS) await sql.raw(statement).execute(db)
}

/* Instants are ISO 8601 UTC text; money is integer minor units with its currency. */
const STATEMENTS = [
  `CREATE TABLE counters (
    kind TEXT PRIMARY KEY,
    last TEXT NOT NULL
  ) STRICT`,
  `CREATE TABLE companies (
    id TEXT PRIMARY KEY,
    name TEXT NOT NULL UNIQUE,
    tax_certificate TEXT,
    credit_terms INTEGER NOT NULL DEFAULT 0 CHECK (credit_terms IN (0, 1)),
    created_at TEXT NOT NULL
  ) STRICT`,
  `CREATE TABLE people (
    id TEXT PRIMARY KEY,
    company_id TEXT REFERENCES companies (id),
    name TEXT NOT NULL,
    email TEXT NOT NULL UNIQUE,
    role TEXT NOT NULL CHECK (role IN ('contractor', 'estimator', 'accounts', 'admin')),
    password_hash TEXT NOT NULL,
    active INTEGER NOT NULL DEFAULT 1 CHECK (active IN (0, 1)),
    last_sign_in_at TEXT,
    created_at TEXT NOT NULL,
    CHECK ((role = 'contractor') = (company_id IS NOT NULL))
  ) STRICT`,
  `CREATE TABLE sessions (
    token_hash TEXT PRIMARY KEY,
    person_id TEXT NOT NULL REFERENCES people (id),
    created_at TEXT NOT NULL,
    seen_at TEXT NOT NULL
  ) STRICT`,
  `CREATE INDEX sessions_by_person ON sessions (person_id)`,
  `CREATE TABLE sign_in_attempts (
    key TEXT PRIMARY KEY,
    failures INTEGER NOT NULL,
    last_at TEXT NOT NULL
  ) STRICT`,
  `CREATE TABLE idempotency (
    owner TEXT NOT NULL,
    key TEXT NOT NULL,
    fingerprint TEXT NOT NULL,
    answer TEXT NOT NULL,
    created_at TEXT NOT NULL,
    PRIMARY KEY (owner, key)
  ) STRICT`,
  `CREATE TABLE audit (
    id INTEGER PRIMARY KEY,
    at TEXT NOT NULL,
    who TEXT NOT NULL,
    action TEXT NOT NULL,
    record TEXT NOT NULL,
    before TEXT NOT NULL,
    after TEXT NOT NULL,
    previous_hash TEXT NOT NULL,
    hash TEXT NOT NULL
  ) STRICT`,
  `CREATE TRIGGER audit_is_never_changed BEFORE UPDATE ON audit
    BEGIN SELECT RAISE(ABORT, 'the audit trail is never changed'); END`,
  `CREATE TRIGGER audit_is_never_deleted BEFORE DELETE ON audit
    BEGIN SELECT RAISE(ABORT, 'the audit trail is never deleted'); END`,
]
