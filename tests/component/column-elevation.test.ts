import { mount } from '@vue/test-utils'
import { describe, expect, it } from 'vitest'
import BasePlatePlan from '../../web/components/BasePlatePlan.vue'
import ColumnElevation from '../../web/components/ColumnElevation.vue'
import SectionOutline from '../../web/components/SectionOutline.vue'
import type { ColumnDrawing } from '../../shared/drawing/column-drawing.ts'

const ends = { bottom: 'pinned', top: 'pinned' } as const
const drawing: ColumnDrawing = {
  height: 6000,
  ends: { strong: ends, weak: ends },
  braces: [
    { height: 2000, holds: 'weak', stopsTwist: false },
    { height: 4000, holds: 'both', stopsTwist: false },
  ],
  system: 'SI',
}

function named(wrapper: ReturnType<typeof mount>, attribute: string): string {
  const id = wrapper.get('svg').attributes(attribute)
  return wrapper.get(`[id="${id}"]`).text()
}

describe('the drawing of a column', () => {
  it('is one picture with a name and with words that say the same', () => {
    const wrapper = mount(ColumnElevation, { props: { drawing, title: 'A1' } })
    expect(wrapper.get('svg').attributes('role')).toBe('img')
    expect(named(wrapper, 'aria-labelledby')).toBe('Column A1')
    expect(named(wrapper, 'aria-describedby')).toContain('Brace 1 at 2.00 m holds the weak axis only')
    expect(wrapper.findAll('[role="slider"]')).toHaveLength(0)
  })

  it('offers each brace once as a slider between its neighbours', () => {
    const wrapper = mount(ColumnElevation, { props: { drawing, interactive: true } })
    const [first, second] = wrapper.findAll('[role="slider"]')
    expect(wrapper.findAll('[role="slider"]')).toHaveLength(2)
    expect(first?.attributes()).toMatchObject({
      'aria-label': 'Brace 1 height',
      'aria-valuemin': '50',
      'aria-valuemax': '3950',
      'aria-valuenow': '2000',
      'aria-valuetext': '2.00 m',
    })
    expect(second?.attributes('aria-valuemin')).toBe('2050')
    expect(second?.attributes('aria-valuemax')).toBe('5950')
  })

  it.each([
    ['ArrowUp', 2050],
    ['ArrowDown', 1950],
    ['PageUp', 2500],
    ['Home', 50],
    ['End', 3950],
  ])('moves a brace by %s', async (key, height) => {
    const wrapper = mount(ColumnElevation, { props: { drawing, interactive: true } })
    await wrapper.get('[aria-label="Brace 1 height"]').trigger('keydown', { key })
    expect(wrapper.emitted('move-brace')).toEqual([[{ index: 0, height }]])
  })

  it('moves by an inch in US units and leaves other keys alone', async () => {
    const wrapper = mount(ColumnElevation, {
      props: { drawing: { ...drawing, system: 'US' }, interactive: true },
    })
    const slider = wrapper.get('[aria-label="Brace 2 height"]')
    await slider.trigger('keydown', { key: 'a' })
    await slider.trigger('keydown', { key: 'ArrowDown' })
    expect(wrapper.emitted('move-brace')).toEqual([[{ index: 1, height: 3974.6 }]])
  })

  it('tells a form where its inputs belong', () => {
    const wrapper = mount(ColumnElevation, {
      props: { drawing },
      slots: {
        overlay: ({ anchors }: { anchors: { height: { x: number } } }) => String(anchors.height.x > 0),
      },
    })
    expect(wrapper.get('.drawing').text()).toContain('true')
  })
})

describe('the plans', () => {
  const outline: [number, number][][] = [
    [
      [-100, -100],
      [100, -100],
      [100, 100],
      [-100, 100],
    ],
  ]

  it('name the section and give its size', () => {
    const wrapper = mount(SectionOutline, {
      props: { designation: 'SHS 200', outline, depth: 200, width: 200, system: 'SI' },
    })
    expect(named(wrapper, 'aria-labelledby')).toBe('Section SHS 200')
    expect(named(wrapper, 'aria-describedby')).toContain('200 mm deep and 200 mm wide')
  })

  it('say where the holes of a base plate are', () => {
    const wrapper = mount(BasePlatePlan, {
      props: {
        plate: { length: 400, width: 400, thickness: 25 },
        holes: { diameter: 27 },
        positions: [[150, 150]],
        outline,
        system: 'SI',
      },
    })
    expect(named(wrapper, 'aria-describedby')).toContain('150 mm along and 150 mm across')
  })
})
