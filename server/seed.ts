import { randomUUID } from 'node:crypto'
import { DEMO_COMPANIES, DEMO_PASSWORD, DEMO_PEOPLE } from '../seeds/demo/people.ts'
import { DEFAULT_PRICE_BOOK } from '../seeds/reference/price-book.ts'
import { write, type Trx } from './db/open-database.ts'
import type { Deps } from './deps.ts'
import { addCompany } from './modules/companies/companies.service.ts'
import { addPerson, hasPeople } from './modules/people/people.service.ts'
import { seedPriceBook } from './modules/price-books/price-books.service.ts'

/** What a new store starts from: the default price book, and the demo's people or the first admin. */
export async function seed(deps: Deps): Promise<void> {
  const { db, clock } = deps
  const at = clock().toISOString()
  await write(db, (trx) => seedPriceBook(trx, DEFAULT_PRICE_BOOK, at))
  if (await hasPeople(db)) return
  if (deps.config.mode === 'demo') await seedDemo(deps, at)
  else await seedFirstAdmin(deps, at)
}

async function seedDemo({ db, passwords }: Deps, at: string): Promise<void> {
  const passwordHash = await passwords.hash(DEMO_PASSWORD)
  await write(db, async (trx) => {
    const companies = new Map<string, string>(DEMO_COMPANIES.map(({ key }) => [key, randomUUID()]))
    for (const { key, name, taxCertificate } of DEMO_COMPANIES) {
      const id = companies.get(key) ?? ''
      await addCompany(trx, { id, name, taxCertificate, creditTerms: 0, createdAt: at })
    }
    for (const { name, email, role, company } of DEMO_PEOPLE) {
      const companyId = company === null ? null : (companies.get(company) ?? null)
      await addNewPerson(trx, { name, email, role, companyId, passwordHash, createdAt: at })
    }
  })
}

async function seedFirstAdmin({ db, config, passwords, logger }: Deps, at: string): Promise<void> {
  const { firstAdmin } = config
  if (!firstAdmin) {
    logger.warn('nobody can sign in yet: start once with FIRST_ADMIN_EMAIL and FIRST_ADMIN_PASSWORD')
    return
  }
  const { email, password } = firstAdmin
  const passwordHash = await passwords.hash(password)
  await write(db, (trx) =>
    addNewPerson(trx, { name: email, email, role: 'admin', companyId: null, passwordHash, createdAt: at }),
  )
}

type NewPerson = Omit<Parameters<typeof addPerson>[1], 'id' | 'active' | 'lastSignInAt'>

function addNewPerson(trx: Trx, person: NewPerson): Promise<void> {
  return addPerson(trx, { id: randomUUID(), active: 1, lastSignInAt: null, ...person })
}
