import type { PersonDto } from '../../../shared/contracts/session.ts'
import type { PersonRow } from './people.repo.ts'

export function toPerson({ id, name, email, role, companyId, companyName }: PersonRow): PersonDto {
  return {
    id,
    name,
    email,
    role,
    company: companyId === null ? null : { id: companyId, name: companyName ?? '' },
  }
}
