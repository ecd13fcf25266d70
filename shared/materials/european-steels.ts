import type { Section } from '../sections/section.ts'
import { MPA_PER_KSI } from '../units/convert.ts'
import { refuse } from '../units/refusal.ts'
import { statedSteel } from './shape-steels.ts'
import type { Steel } from './steel.ts'

/** Young's and shear modulus of EN 1993-1-1 3.2.6, MPa. */
export const E_EN = 210_000
export const G_EN = 81_000

interface EuropeanGrade {
  name: string
  title: string
  /** Yield strength by thickness up to `to` mm, MPa: EN 10025-2, EN 10210-1, EN 10219-1. */
  yields: readonly { to: number; fy: number }[]
  /** Tensile strength, MPa: EN 1993-1-1 Table 3.1, the lower of its two columns. */
  fu: number
}

const STEPS = [16, 40, 63, 80, 100, 150]
function grade(name: string, fy: readonly number[], fu: number): EuropeanGrade {
  const yields = STEPS.map((to, index) => ({ to, fy: fy[index] ?? 0 }))
  return { name, title: `EN ${name}`, yields, fu }
}

export const EUROPEAN_GRADES: readonly EuropeanGrade[] = [
  grade('S355', [355, 345, 335, 325, 315, 295], 470),
  grade('S275', [275, 265, 255, 245, 235, 225], 410),
  grade('S235', [235, 225, 215, 215, 215, 195], 360),
]

/** Thickness that decides the yield strength: of the thickest element, mm. */
export function thickestOf(section: Section): number {
  return section.shape === 'I' ? Math.max(section.tf, section.tw) : section.wall
}

/** Yield strength of a grade at a thickness, mm; undefined for grades and thicknesses that are not listed. MPa. */
export function europeanYield(name: string, thickness: number): number | undefined {
  const found = EUROPEAN_GRADES.find((one) => one.name === name.trim().toUpperCase())
  return found?.yields.find(({ to }) => thickness <= to)?.fy
}

/**
 * The steel of a European shape: a grade's name, strengths in MPa, or S355 where nothing is said. Its yield is that of
 * the thickest element. Refuses grades and thicknesses that are not listed.
 */
export function europeanSteelOf(
  asked: string | { yield: number; ultimate: number } | undefined,
  section: Section,
): Steel {
  if (typeof asked === 'object') {
    if (asked.ultimate < asked.yield) refuse('grade.ultimate', 'tensile strength is not less than yield')
    return statedSteel(asked.yield, asked.ultimate)
  }
  const wanted = (asked ?? 'S355').trim().toUpperCase()
  const found = EUROPEAN_GRADES.find(({ name }) => name === wanted)
  if (!found)
    return refuse('grade', `European shapes are of ${EUROPEAN_GRADES.map(({ name }) => name).join(', ')}`)
  const fy = europeanYield(wanted, thickestOf(section))
  if (fy === undefined)
    return refuse('section', `${section.designation} is thicker than ${found.title} is listed for`)
  const { name, title, fu } = found
  return {
    name,
    title,
    Fy: fy,
    Fu: fu,
    FyKsi: fy / MPA_PER_KSI,
    FuKsi: fu / MPA_PER_KSI,
    families: [section.family],
  }
}
