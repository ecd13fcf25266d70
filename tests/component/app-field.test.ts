import { mount } from '@vue/test-utils'
import { nextTick } from 'vue'
import { describe, expect, it } from 'vitest'
import AppField from '../../web/components/AppField.vue'

function field(props: { error?: string | null; hint?: string } = {}) {
  return mount(AppField, {
    props: { label: 'Tax region', path: 'shipTo.region', ...props },
    slots: { default: '<input class="inner">' },
    attachTo: document.body,
  })
}

describe('a field', () => {
  it('names its inner input', async () => {
    const wrapper = field()
    await nextTick()
    const input = wrapper.get('input')
    expect(wrapper.get('label').attributes('for')).toBe(input.attributes('id'))
    expect(input.attributes('aria-invalid')).toBeUndefined()
    expect(input.attributes('aria-describedby')).toBeUndefined()
  })

  it('ties hint and error to the input, and lets go of them', async () => {
    const wrapper = field({ hint: 'The state of that address', error: 'the region that taxes the delivery' })
    await nextTick()
    const input = wrapper.get('input')
    const described = input.attributes('aria-describedby')?.split(' ') ?? []
    expect(described.map((id) => wrapper.get(`[id="${id}"]`).text())).toEqual([
      'The state of that address',
      'the region that taxes the delivery',
    ])
    expect(input.attributes('aria-invalid')).toBe('true')

    await wrapper.setProps({ error: null })
    await nextTick()
    expect(input.attributes('aria-invalid')).toBeUndefined()
    expect(input.attributes('aria-describedby')?.split(' ')).toHaveLength(1)
  })

  it('carries the path by which the server names it', () => {
    expect(field().get('[data-path="shipTo.region"]').classes()).toContain('field')
  })
})
