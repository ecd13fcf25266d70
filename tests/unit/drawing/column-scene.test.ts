import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { ColumnDrawing } from '../../../shared/drawing/column-drawing.ts'
import { columnScene } from '../../../shared/drawing/column-scene.ts'
import type { Mark, Meaning, Point, PolylineMark, Scene } from '../../../shared/drawing/scene.ts'

const drawing: ColumnDrawing = {
  height: 6000,
  ends: { strong: { bottom: 'fixed', top: 'pinned' }, weak: { bottom: 'pinned', top: 'pinned' } },
  braces: [
    { height: 2000, holds: 'weak', stopsTwist: false },
    { height: 4500, holds: 'both', stopsTwist: true },
  ],
  depth: 250,
  width: 200,
  system: 'SI',
}

function polylines(scene: Scene, meaning: Meaning): PolylineMark[] {
  return scene.marks.filter(
    (mark): mark is PolylineMark => mark.kind === 'polyline' && mark.meaning === meaning,
  )
}

function texts(scene: Scene): string[] {
  return scene.marks.flatMap((mark) => (mark.kind === 'text' ? [mark.text] : []))
}

function extent(points: Point[]): { across: number; down: number } {
  const xs = points.map(([x]) => x)
  const ys = points.map(([, y]) => y)
  return { across: Math.max(...xs) - Math.min(...xs), down: Math.max(...ys) - Math.min(...ys) }
}

function pointsOf(mark: Mark): Point[] {
  if (mark.kind === 'polyline') return mark.points
  if (mark.kind === 'rings') return mark.rings.flat()
  return mark.kind === 'circle' ? [mark.centre] : [mark.at]
}

describe('the elevation of a column', () => {
  it('has both shafts in the proportions of the steel: depth about the strong axis, width about the weak', () => {
    const [strong, weak] = polylines(columnScene(drawing), 'shaft').map((mark) => extent(mark.points))
    expect((strong?.down ?? 0) / (strong?.across ?? 1)).toBeCloseTo(6000 / 250, 6)
    expect((weak?.down ?? 0) / (weak?.across ?? 1)).toBeCloseTo(6000 / 200, 6)
  })

  it('puts each brace at its height, in the views of the axes that it holds', () => {
    const scene = columnScene(drawing)
    const { foot, head } = scene.layout
    const pins = scene.marks.flatMap((mark) =>
      mark.kind === 'circle' && mark.meaning === 'brace' ? [mark.centre] : [],
    )
    const heights = pins.map(([x, y]) => ({ x, part: (foot - y) / (foot - head) }))
    const inView = (x: number) => heights.filter((pin) => pin.x === x).map((pin) => pin.part)
    expect(inView(scene.layout.views.strong.x)).toEqual([expect.closeTo(0.75, 9)])
    expect(inView(scene.layout.views.weak.x)).toEqual([expect.closeTo(1 / 3, 9), expect.closeTo(0.75, 9)])
  })

  it('breaks a shaft too slender to be seen to scale, and keeps heights in proportion', () => {
    const tall = {
      ...drawing,
      height: 24_000,
      braces: [{ height: 6000, holds: 'weak' as const, stopsTwist: false }],
    }
    const scene = columnScene(tall)
    expect(polylines(columnScene(drawing), 'break')).toHaveLength(0)
    expect(polylines(scene, 'break')).toHaveLength(4)
    const pin = scene.marks.find((mark) => mark.kind === 'circle' && mark.meaning === 'brace')
    const { foot, head } = scene.layout
    expect((foot - (pin ? (pointsOf(pin)[0]?.[1] ?? 0) : 0)) / (foot - head)).toBeCloseTo(0.25, 9)
  })

  it('shows the K·L of each segment and the overall height, in the units asked for', () => {
    const lengths = {
      segment: 4500,
      eigenvalue: 4100,
      used: 4500,
      governedBy: 'segment' as const,
      segments: [
        { from: 0, to: 4500, k: 0.8, kl: 3600 },
        { from: 4500, to: 6000, k: null, kl: null },
      ],
      criticalLoad: 1e6,
      shape: [
        [0, 0],
        [2000, -1],
        [6000, 0.5],
      ] as [number, number][],
    }
    const both = { ...drawing, lengths: { strong: lengths, weak: lengths } }
    expect(texts(columnScene(both))).toEqual(
      expect.arrayContaining(['6.00 m', '3.60 m', 'K 0.80', 'free part']),
    )
    // 3600 mm = 11.811 ft; 6000 mm = 19 ft 8.22 in, to the sixteenth 19′-8 1/4″ (1 in = 25.4 mm by definition).
    const inFeet = texts(columnScene({ ...both, system: 'US' }))
    expect(inFeet).toEqual(expect.arrayContaining(['19′-8 1/4″', '11.81 ft']))
    const [form] = polylines(columnScene(both), 'buckled')
    const { views, foot, head } = columnScene(both).layout
    const bow = form?.points.reduce((most, point) =>
      Math.abs(point[0] - views.strong.x) > Math.abs(most[0] - views.strong.x) ? point : most,
    )
    expect((foot - (bow?.[1] ?? 0)) / (foot - head)).toBeCloseTo(1 / 3, 9)
  })

  it('says where inputs belong in percent, so that they stay put when the drawing is scaled', () => {
    const { anchors, layout, height, width } = columnScene(drawing)
    expect(anchors.bottom.strong.y).toBeCloseTo((layout.foot / height) * 100, 9)
    expect(anchors.top.weak.x).toBeCloseTo((layout.views.weak.x / width) * 100, 9)
    expect(anchors.braces.map((places) => Object.keys(places))).toEqual([['weak'], ['strong', 'weak']])
  })

  it('keeps every mark on the sheet, whatever the column', () => {
    const end = fc.constantFrom('pinned', 'fixed', 'guided', 'free')
    const ends = fc.record({ bottom: end, top: end })
    const any = fc.record({
      height: fc.double({ min: 500, max: 30_000, noNaN: true }),
      ends: fc.record({ strong: ends, weak: ends }),
      depth: fc.double({ min: 60, max: 1100, noNaN: true }),
      width: fc.double({ min: 60, max: 450, noNaN: true }),
      parts: fc.array(fc.double({ min: 0.05, max: 0.95, noNaN: true }), { maxLength: 6 }),
      sheet: fc.record({
        width: fc.integer({ min: 280, max: 560 }),
        height: fc.integer({ min: 420, max: 800 }),
      }),
    })
    fc.assert(
      fc.property(any, ({ parts, ...column }) => {
        const braces = parts.map((part) => ({
          height: part * column.height,
          holds: 'both' as const,
          stopsTwist: true,
        }))
        const scene = columnScene({ ...column, braces, compression: 1e6, uplift: 1e5, system: 'US' })
        for (const [x, y] of scene.marks.flatMap(pointsOf)) {
          expect(x).toBeGreaterThanOrEqual(0)
          expect(x).toBeLessThanOrEqual(scene.width)
          expect(y).toBeGreaterThanOrEqual(0)
          expect(y).toBeLessThanOrEqual(scene.height)
        }
      }),
    )
  })
})
