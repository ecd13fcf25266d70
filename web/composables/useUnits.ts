import { inject, provide, ref, type InjectionKey, type Ref } from 'vue'
import type { UnitSystem } from '../../shared/units/step.ts'

const UNITS: InjectionKey<Ref<UnitSystem>> = Symbol('units')

/** Once, at the top: everything below shows and reads quantities in these units. */
export function provideUnits(units: Ref<UnitSystem>): void {
  provide(UNITS, units)
}

export function useUnits(): Ref<UnitSystem> {
  return inject(UNITS, () => ref<UnitSystem>('SI'), true)
}
