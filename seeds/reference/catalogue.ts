import { createCatalogue } from '../../shared/sections/catalogue.ts'
import { euHollow, euI } from '../../shared/sections/eu-shapes.ts'
import { usBox, usI, usPipe, usRound } from '../../shared/sections/us-shapes.ts'
import { EU_H } from './sections/eu-h.ts'
import { EU_HOLLOW } from './sections/eu-hollow.ts'
import { UK_UC_UB } from './sections/uk-uc-ub.ts'
import { US_HSS_RECT } from './sections/us-hss-rect.ts'
import { US_HSS_ROUND } from './sections/us-hss-round.ts'
import { US_HSS_SQUARE } from './sections/us-hss-square.ts'
import { US_PIPE } from './sections/us-pipe.ts'
import { US_W } from './sections/us-w.ts'

/** Every published shape that the desk knows. */
export const catalogue = createCatalogue([
  ...US_W.map(usI),
  ...US_HSS_SQUARE.map(usBox('HSS_SQUARE')),
  ...US_HSS_RECT.map(usBox('HSS_RECT')),
  ...US_HSS_ROUND.map(usRound),
  ...US_PIPE.map(usPipe),
  ...EU_H.map(euI),
  ...UK_UC_UB.map(euI),
  ...EU_HOLLOW.map(euHollow),
])
