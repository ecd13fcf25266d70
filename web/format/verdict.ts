import type { ColumnCheckDto } from '../../shared/contracts/checks.ts'
import type { UnitSystem } from '../../shared/units/step.ts'

/** What decides: "Governed by flexural buckling about the weak axis (E3), under 1.2D + 1.6L." */
export function governingText({ governing }: Pick<ColumnCheckDto, 'governing'>): string {
  const { check, clause, axis, combination } = governing
  const about = axis ? `, ${axis} axis` : ''
  const under = combination ? `, under ${combination}` : ''
  return `Governed by ${check} (${clause})${about}${under}.`
}

/** A shape by the name that the reader's tables give it. */
export function shapeName(
  { section, designationSI }: { section: string; designationSI: string },
  system: UnitSystem,
): string {
  return system === 'US' ? section : designationSI
}

/** The other name of the shape, where it has one. */
export function otherName(
  { section, designationSI }: { section: string; designationSI: string },
  system: UnitSystem,
): string | null {
  return section === designationSI ? null : system === 'US' ? designationSI : section
}
