import type { RoleName } from '../../../shared/contracts/common.ts'

export interface PeopleTable {
  id: string
  /** Of a contractor; null for the shop's own. */
  companyId: string | null
  name: string
  /** Lower case. */
  email: string
  role: RoleName
  passwordHash: string
  active: 0 | 1
  lastSignInAt: string | null
  createdAt: string
}
