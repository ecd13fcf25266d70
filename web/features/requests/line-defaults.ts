import { FINISH_WORDS } from '../../format/choices.ts'
import type { LineDraft } from './line-draft.ts'

function endsWords({ ends }: LineDraft): string {
  const all = [ends.strong.bottom, ends.strong.top, ends.weak.bottom, ends.weak.top]
  const [first] = all
  return all.every((end) => end === first) ? `${first} both ends, both axes` : 'ends as drawn'
}

function platesWords(line: LineDraft): string {
  if (!line.basePlate && !line.capPlate) return 'no plates'
  const base = line.basePlate ? `base plate${line.rods ? ' with anchor rods' : ''}` : ''
  return [base, line.capPlate ? 'cap plate' : ''].filter(Boolean).join(' and ')
}

/** Everything that was not asked, said in a line, so that nobody takes it for agreed by silence. */
export function takenAs(line: LineDraft): string {
  const european = line.standard === 'EN 1993-1-1'
  const combinations = line.combinations ?? (european ? 'EN 1990 6.10' : 'ASCE 7-22')
  return [
    european ? line.standard : `${line.standard} ${line.method}`,
    `${combinations} combinations`,
    endsWords(line),
    line.braces.length === 0 ? 'no braces' : `${line.braces.length} braced`,
    line.endFixity === 'recommended' ? 'recommended K' : 'theoretical K',
    line.grade || 'the usual steel of each shape (A992 for W)',
    line.families.length > 0 ? `${line.families.length} families allowed` : 'any family in stock',
    line.selfWeight ? 'own weight added' : 'own weight not added',
    FINISH_WORDS[line.finish].toLowerCase(),
    platesWords(line),
  ].join(' · ')
}
