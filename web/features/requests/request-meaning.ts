import type { RequestDto } from '../../../shared/contracts/requests.ts'

type Status = RequestDto['status']

const MEANINGS: Record<Status, string> = {
  draft: 'A draft. Nobody at the shop sees it until you ask for a firm quote.',
  submitted: 'With the shop, waiting for an estimator. You are told by e-mail when the quote is out.',
  'in review': 'An estimator is working on it. You are told by e-mail when the quote is out.',
  quoted: 'Quoted. Read the quote, and accept or decline it before its price goes stale.',
  closed: 'Answered and closed.',
  withdrawn: 'You took it back.',
  declined: 'The shop will not quote this, and says why:',
}

/** What the state of a request means to whoever asked. */
export function requestMeaning({ status }: Pick<RequestDto, 'status'>): string {
  return MEANINGS[status]
}
