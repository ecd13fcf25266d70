import type { BoxSection, ISection, Section } from './section.ts'

/** Closed rings of points [across the width, along the depth], mm from the centroid; the first is the outside. */
export type Rings = [number, number][][]
type Ring = [number, number][]

/** Chords to a quarter circle: at ten the polygon is within 0.4 % of the radius of the arc. */
const CHORDS = 10
const QUARTER = Math.PI / 2

function arc(x: number, y: number, radius: number, from: number, to: number): Ring {
  const chords = Math.max(1, Math.round((Math.abs(to - from) / QUARTER) * CHORDS))
  return Array.from({ length: chords + 1 }, (_, index): [number, number] => {
    const angle = from + ((to - from) * index) / chords
    return [x + radius * Math.cos(angle), y + radius * Math.sin(angle)]
  })
}

/** Flanges with square edges, root fillets as arcs. */
function ringOfI({ depth, width, tw, tf, fillet }: ISection): Ring {
  const root = depth / 2 - tf - fillet
  const centre = tw / 2 + fillet
  const right: Ring = [
    [width / 2, depth / 2],
    [width / 2, depth / 2 - tf],
    ...arc(centre, root, fillet, QUARTER, 2 * QUARTER),
    ...arc(centre, -root, fillet, 2 * QUARTER, 3 * QUARTER),
    [width / 2, -depth / 2 + tf],
    [width / 2, -depth / 2],
  ]
  const left = right.map(([x, y]): [number, number] => [-x, -y])
  return [...right, ...left]
}

function roundedRectangle(depth: number, width: number, radius: number): Ring {
  const x = width / 2 - radius
  const y = depth / 2 - radius
  return [
    ...arc(x, y, radius, 0, QUARTER),
    ...arc(-x, y, radius, QUARTER, 2 * QUARTER),
    ...arc(-x, -y, radius, 2 * QUARTER, 3 * QUARTER),
    ...arc(x, -y, radius, 3 * QUARTER, 4 * QUARTER),
  ]
}

function ringsOfBox({ depth, width, wall, corner }: BoxSection): Rings {
  return [
    roundedRectangle(depth, width, corner),
    roundedRectangle(depth - 2 * wall, width - 2 * wall, Math.max(0, corner - wall)),
  ]
}

function circle(diameter: number): Ring {
  return arc(0, 0, diameter / 2, 0, 4 * QUARTER).slice(0, -1)
}

/** What a saw cut shows, for drawing; hollow shapes with their nominal wall. */
export function outlineOf(section: Section): Rings {
  switch (section.shape) {
    case 'I':
      return [ringOfI(section)]
    case 'box':
      return ringsOfBox(section)
    case 'round':
      return [circle(section.depth), circle(section.depth - 2 * section.wall)]
  }
}
