import { secret } from '../a/a.repo.ts'
export const b = secret
