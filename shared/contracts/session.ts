import { z } from 'zod'
import { email, id, role, text } from './common.ts'

export const signInBody = z.strictObject({ email, password: z.string().min(1).max(500) })
export const person = z.object({
  id,
  name: z.string(),
  email: z.string(),
  role,
  company: z.object({ id, name: z.string() }).nullable(),
})
export type PersonDto = z.infer<typeof person>
export const sessionAnswer = z.object({
  person: person.nullable(),
  demo: z.boolean(),
  /** Where the shop delivers to and knows the tax of; empty for nobody. */
  taxRegions: z.array(z.string()),
})
export const personRow = person.extend({ active: z.boolean(), lastSignInAt: z.string().nullable() })
export const signedName = text(120)
