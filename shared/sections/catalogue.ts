import type { Family, Section } from './section.ts'

/** Families whose shapes are checked by AISC 360, and by EN 1993-1-1. */
export const US_FAMILIES: readonly Family[] = ['W', 'HSS_SQUARE', 'HSS_RECT', 'HSS_ROUND', 'PIPE']
export const EU_FAMILIES: readonly Family[] = ['HEA', 'HEB', 'HEM', 'IPE', 'UC', 'UB', 'SHS', 'RHS', 'CHS']

export interface Catalogue {
  readonly sections: readonly Section[]
  /** Families that have at least one shape here, in the order of the tables. */
  readonly families: readonly Family[]
  /** By either designation, in any case, with or without spaces; `undefined` when unknown. */
  find(designation: string): Section | undefined
  /** Shapes whose designation contains `text`, in table order. */
  search(text: string, families?: readonly Family[]): Section[]
  ofFamilies(families: readonly Family[]): Section[]
}

/** One spelling for all: capitals, no spaces, `×` and `*` as X, a decimal comma as a point. */
export function normaliseDesignation(designation: string): string {
  return designation.toUpperCase().replaceAll(/\s+/g, '').replaceAll(/[×*]/g, 'X').replaceAll(',', '.')
}

export function createCatalogue(sections: readonly Section[]): Catalogue {
  const byName = new Map<string, Section>()
  // SI names first: where one spelling names two shapes, the shape's own name counts.
  for (const section of sections) byName.set(normaliseDesignation(section.designationSI), section)
  for (const section of sections) byName.set(normaliseDesignation(section.designation), section)

  function ofFamilies(families: readonly Family[]): Section[] {
    const wanted = new Set(families)
    return sections.filter((section) => wanted.has(section.family))
  }

  return {
    sections,
    families: [...new Set(sections.map((section) => section.family))],
    find: (designation) => byName.get(normaliseDesignation(designation)),
    ofFamilies,
    search(text, families) {
      const wanted = normaliseDesignation(text)
      const pool = families ? ofFamilies(families) : sections
      return pool.filter(
        (section) =>
          normaliseDesignation(section.designation).includes(wanted) ||
          normaliseDesignation(section.designationSI).includes(wanted),
      )
    },
  }
}
