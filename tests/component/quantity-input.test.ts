import { mount } from '@vue/test-utils'
import { defineComponent, nextTick, ref } from 'vue'
import { describe, expect, it } from 'vitest'
import QuantityInput from '../../web/components/QuantityInput.vue'
import { provideUnits } from '../../web/composables/useUnits.ts'
import type { QuantityKind } from '../../web/format/typed-quantity.ts'
import type { UnitSystem } from '../../shared/units/step.ts'

function mountInput(kind: QuantityKind, start?: number, system: UnitSystem = 'SI') {
  const units = ref<UnitSystem>(system)
  const value = ref<number | undefined>(start)
  const problem = ref<string | null>(null)
  const Host = defineComponent({
    components: { QuantityInput },
    setup() {
      provideUnits(units)
      return { value, problem, kind }
    },
    template:
      '<QuantityInput v-model="value" :kind="kind" label="It" @problem="(text) => (problem = text)" />',
  })
  const input = mount(Host, { global: { components: { QuantityInput } } }).get('input')
  return { units, value, problem, input }
}

// Exact by definition: 1 ft = 304.8 mm, 1 in = 25.4 mm; 1 kip = 4448.2216152605 N (1 lbf = 4.4482216152605 N).
describe('a quantity as typed', () => {
  it.each<[QuantityKind, UnitSystem, string, number]>([
    ['height', 'SI', '6400', 6400],
    ['height', 'SI', '6.4 m', 6400],
    ['height', 'SI', '21 ft', 6400.8],
    ['height', 'US', '20', 6096],
    ['height', 'US', '12\'-6 1/2"', 3822.7],
    ['height', 'US', '6400 mm', 6400],
    ['detail', 'US', '12 1/2', 317.5],
    ['force', 'SI', '420', 420_000],
    ['force', 'US', '100', 444_822.16152605],
    ['force', 'US', '420 kN', 420_000],
    ['stress', 'US', '4', 27.579_029],
    ['stress', 'US', '4000 psi', 27.579_029],
    ['distance', 'US', '10', 16.093_44],
    ['number', 'SI', '4', 4],
  ])('%s in %s: %s', async (kind, system, text, expected) => {
    const { input, value, problem } = mountInput(kind, undefined, system)
    await input.setValue(text)
    expect(value.value).toBeCloseTo(expected, 4)
    expect(problem.value).toBeNull()
  })

  it('says what would be right and keeps what it had', async () => {
    const { input, value, problem } = mountInput('height', 6000)
    await input.setValue('tall')
    expect(problem.value).toContain('4.2 m')
    expect(value.value).toBe(6000)
    await input.trigger('blur')
    expect(input.element.value).toBe('tall')
    await input.setValue('')
    expect(value.value).toBeUndefined()
    expect(problem.value).toBeNull()
  })

  it('does not take a number with two readings', async () => {
    const { input, value, problem } = mountInput('height')
    await input.setValue('4,200')
    expect(value.value).toBeUndefined()
    expect(problem.value).toContain('two readings')
  })

  it('shows other units without touching what is stored', async () => {
    const { input, units, value } = mountInput('height', 6400)
    expect(input.element.value).toBe('6400')
    units.value = 'US'
    await nextTick()
    expect(input.element.value).toBe('20′-11 15/16″')
    await input.trigger('blur')
    expect(value.value).toBe(6400)
  })
})
