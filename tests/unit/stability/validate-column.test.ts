import { describe, expect, it } from 'vitest'
import type { Brace, Column, Ends } from '../../../shared/stability/column.ts'
import { validateColumn } from '../../../shared/stability/validate-column.ts'

const PINNED: Ends = { bottom: 'pinned', top: 'pinned' }

function column(change: Partial<Column> = {}): Column {
  return {
    height: 4200,
    ends: { strong: PINNED, weak: PINNED },
    braces: [],
    endFixity: 'recommended',
    ...change,
  }
}
function brace(height: number, change: Partial<Brace> = {}): Brace {
  return { height, holds: 'both', stopsTwist: true, ...change }
}
const paths = (asked: Column): string[] => validateColumn(asked).map((issue) => issue.path)
const messages = (asked: Column): string =>
  validateColumn(asked)
    .map((issue) => issue.message)
    .join('; ')

describe('a column that can be taken', () => {
  it.each([
    column(),
    column({ height: 30_000 }),
    column({ braces: [brace(50), brace(4150)] }),
    column({ braces: [brace(2000, { holds: 'weak' }), brace(2000, { holds: 'strong', stopsTwist: false })] }),
    column({ ends: { strong: PINNED, weak: { bottom: 'fixed', top: 'free' } } }),
    column({ ends: { strong: PINNED, weak: { bottom: 'pinned', top: 'guided' } } }),
    column({ ends: { strong: PINNED, weak: { bottom: 'guided', top: 'guided' } }, braces: [brace(2000)] }),
    column({
      ends: { strong: PINNED, weak: { bottom: 'free', top: 'free' } },
      braces: [brace(1000), brace(2000)],
    }),
  ])('%#: raises nothing', (asked) => {
    expect(validateColumn(asked)).toEqual([])
  })
})

describe('a height', () => {
  it.each([0, -1, 30_001, NaN, Infinity])('of %d mm is refused', (height) => {
    expect(paths(column({ height }))).toEqual(['height'])
    expect(messages(column({ height }))).toContain('at most 30 000 mm')
  })
})

describe('a brace', () => {
  it.each([-100, 0, 49, 4151, 4200, 9000, NaN])('at %d mm is refused with the range', (height) => {
    const asked = column({ braces: [brace(2000), brace(height)] })
    expect(paths(asked)).toEqual(['braces.1.height'])
    expect(messages(asked)).toContain('between 50 and 4150 mm')
  })

  it('nearer than 50 mm to another of its axis is refused', () => {
    const asked = column({ braces: [brace(2000, { holds: 'weak' }), brace(2049)] })
    expect(paths(asked)).toEqual(['braces.1.height'])
    expect(messages(asked)).toContain('nearer to brace 1')
    expect(paths(column({ braces: [brace(2000), brace(2050)] }))).toEqual([])
  })

  it('has no room in a very short column', () => {
    expect(messages(column({ height: 90, braces: [brace(45)] }))).toContain('too short for a brace')
  })

  it('with an offset that is no number is refused', () => {
    expect(paths(column({ braces: [brace(2000, { offset: NaN })] }))).toEqual(['braces.0.offset'])
  })
})

describe('a mechanism', () => {
  it.each([
    ['pinned', 'free', 'ends.weak.top'],
    ['free', 'pinned', 'ends.weak.bottom'],
    ['guided', 'guided', 'ends.weak.top'],
    ['free', 'free', 'ends.weak.top'],
    ['guided', 'free', 'ends.weak.top'],
  ] as const)('%s–%s names %3$s', (bottom, top, path) => {
    const asked = column({ ends: { strong: PINNED, weak: { bottom, top } } })
    expect(paths(asked)).toContain(path)
    expect(messages(asked)).toContain('about its weak axis without bending')
  })

  it('is not cured by a brace of the other axis', () => {
    const asked = column({
      ends: { strong: PINNED, weak: { bottom: 'pinned', top: 'free' } },
      braces: [brace(2000, { holds: 'strong' })],
    })
    expect(paths(asked)).toEqual(['ends.weak.top'])
  })

  it('of twist is refused: free ends and braces that let it turn', () => {
    const free: Ends = { bottom: 'free', top: 'free' }
    const braces = [brace(1000, { stopsTwist: false }), brace(3000, { stopsTwist: false })]
    const asked = column({ ends: { strong: free, weak: free }, braces })
    expect(paths(asked)).toEqual(['braces'])
    expect(messages(asked)).toContain('stopsTwist')
  })
})
