import type { Section } from '../../sections/section.ts'
import { refuse } from '../../units/refusal.ts'
import { classOf, epsilonOf, partClass, partsOf, type Part } from './classification.ts'

/** Buckling factors kσ of uniform compression, EN 1993-1-5 Tables 4.1 and 4.2. */
const K_SIGMA = { internal: 4, outstand: 0.43 } as const

/** λ̄p = (c/t)/(28.4·ε·√kσ). EN 1993-1-5 4.4(2). */
export function plateSlenderness({ c, t, kind }: Part, fy: number): number {
  return c / t / (28.4 * epsilonOf(fy) * Math.sqrt(K_SIGMA[kind]))
}

/**
 * Share of a part that counts: internal ρ = (λ̄p − 0.22)/λ̄p² above 0.673; outstand ρ = (λ̄p − 0.188)/λ̄p² above 0.748.
 * EN 1993-1-5 Eq. 4.2, 4.3.
 */
export function reductionOf(part: Part, fy: number): number {
  const slender = plateSlenderness(part, fy)
  const [turn, less] = part.kind === 'internal' ? [0.673, 0.22] : [0.748, 0.188]
  return slender <= turn ? 1 : Math.min(1, (slender - less) / slender ** 2)
}

/** Aeff = A − Σ n·(1 − ρ)·c·t over the parts of class 4, mm². Refuses round sections of class 4. EN 1993-1-1 6.2.9.3. */
export function effectiveAreaEn(section: Section, fy: number): number {
  if (classOf(section, fy) < 4) return section.area
  if (section.shape === 'round') {
    return refuse('section', `${section.designation} is of class 4 (EN 1993-1-6); choose a thicker wall`)
  }
  return partsOf(section)
    .filter((part) => partClass(part, fy) === 4)
    .reduce((rest, part) => rest - part.count * (1 - reductionOf(part, fy)) * part.c * part.t, section.area)
}
