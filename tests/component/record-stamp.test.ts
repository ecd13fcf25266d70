import { mount } from '@vue/test-utils'
import { describe, expect, it } from 'vitest'
import RecordStamp from '../../web/components/RecordStamp.vue'
import UtilisationMark from '../../web/components/UtilisationMark.vue'

describe('a stamp', () => {
  it.each([
    ['accepted', 'good'],
    ['awaiting deposit', 'wait'],
    ['declined', 'bad'],
    ['expired', 'past'],
    ['in review', 'plain'],
  ])('says %s in words', (state, tone) => {
    const stamp = mount(RecordStamp, { props: { state } })
    expect(stamp.text()).toBe(state)
    expect(stamp.classes()).toContain(tone)
  })
})

describe('a utilisation', () => {
  it.each([
    [0.71, 1, '71\u00a0% holds'],
    [0.95, 1, '95\u00a0% holds, near its limit'],
    [1, 1, '100\u00a0% holds, near its limit'],
    [1.002, 1, '100.2\u00a0% fails'],
    [0.85, 0.8, '85\u00a0% fails'],
  ])('%d of %d reads %s', (value, limit, text) => {
    expect(mount(UtilisationMark, { props: { value, limit } }).text()).toBe(text)
  })
})
