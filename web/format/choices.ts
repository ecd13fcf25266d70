import { FAMILY_NAMES } from '../../shared/sections/family-names.ts'
import type { Finish } from '../../shared/pricing/line-spec.ts'
import type { Family } from '../../shared/sections/section.ts'

export interface Choice<Value> {
  value: Value
  text: string
}

export const FINISH_WORDS: Record<Finish, string> = {
  none: 'No finish',
  prime: 'Blasted and primed',
  paint: 'Painted',
  galvanise: 'Hot-dip galvanised',
}
export const FINISHES = (Object.keys(FINISH_WORDS) as Finish[]).map((value) => ({
  value,
  text: FINISH_WORDS[value],
}))

export const STANDARDS = ['AISC 360-22', 'AISC 360-16', 'EN 1993-1-1'] as const
export const COMBINATIONS = {
  american: ['ASCE 7-22', 'ASCE 7-16'],
  european: ['EN 1990 6.10', 'EN 1990 6.10ab'],
} as const
export const GRADES = {
  american: ['A992', 'A572-50', 'A36', 'A500-C', 'A1085', 'A53-B'],
  european: ['S235', 'S275', 'S355', 'S420', 'S460'],
} as const
export const LIVE_CATEGORIES = [
  { value: 'A', text: 'A, dwellings' },
  { value: 'B', text: 'B, offices' },
  { value: 'C', text: 'C, people gather' },
  { value: 'D', text: 'D, shops' },
  { value: 'E', text: 'E, storage' },
  { value: 'H', text: 'H, roofs' },
] as const

export const FAMILY_CHOICES = (Object.keys(FAMILY_NAMES) as Family[]).map((value) => ({
  value,
  text: FAMILY_NAMES[value],
}))
const AMERICAN: Family[] = ['W', 'HSS_SQUARE', 'HSS_RECT', 'HSS_ROUND', 'PIPE']

/** Families to choose from: a standard's own ones. */
export function familiesFor(european: boolean): Choice<Family>[] {
  return (Object.keys(FAMILY_NAMES) as Family[])
    .filter((family) => AMERICAN.includes(family) !== european)
    .map((value) => ({ value, text: FAMILY_NAMES[value] }))
}

export const END_CONDITIONS = ['pinned', 'fixed', 'guided', 'free'] as const
export const HOLDS = [
  { value: 'weak', text: 'weak axis' },
  { value: 'strong', text: 'strong axis' },
  { value: 'both', text: 'both axes' },
] as const
