import { client } from '../api/client.ts'
import { secret } from '../../server/modules/a/a.repo.ts'
export const shown = client + secret
