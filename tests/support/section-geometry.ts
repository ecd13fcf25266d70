import type { BoxSection, ISection, RoundSection } from '../../shared/sections/section.ts'

/*
 * Properties of a shape from its drawn dimensions alone, to hold the published tables against: sums of rectangles and of
 * the spandrel between a square corner and a quarter circle, which has the area (1 − π/4)r².
 */
export interface Properties {
  area: number
  Ix: number
  Iy: number
  Zx: number
  Zy: number
}

const SPANDREL_AREA = 1 - Math.PI / 4
/** Distance of the spandrel's centroid from the square corner, over r. */
const SPANDREL_CENTROID = (10 - 3 * Math.PI) / (12 - 3 * Math.PI)
/** Second moment of the spandrel about an axis through its own centroid, over r⁴: square less quarter circle about the circle's centre. */
const SPANDREL_OWN = 1 / 3 - Math.PI / 16 - SPANDREL_AREA * (1 - SPANDREL_CENTROID) ** 2

interface Patch {
  area: number
  x: number
  y: number
  ownX: number
  ownY: number
}

function rectangle(width: number, depth: number, x: number, y: number): Patch {
  return { area: width * depth, x, y, ownX: (width * depth ** 3) / 12, ownY: (depth * width ** 3) / 12 }
}

function spandrel(radius: number, cornerX: number, cornerY: number, sign: 1 | -1): Patch {
  const own = sign * SPANDREL_OWN * radius ** 4
  return { area: sign * SPANDREL_AREA * radius ** 2, x: cornerX, y: cornerY, ownX: own, ownY: own }
}

/** Patches of one quarter, none of which crosses an axis. */
function fromQuarter(patches: readonly Patch[]): Properties {
  const sum = (of: (patch: Patch) => number): number =>
    4 * patches.reduce((total, patch) => total + of(patch), 0)
  return {
    area: sum((patch) => patch.area),
    Ix: sum((patch) => patch.ownX + patch.area * patch.y ** 2),
    Iy: sum((patch) => patch.ownY + patch.area * patch.x ** 2),
    Zx: sum((patch) => patch.area * patch.y),
    Zy: sum((patch) => patch.area * patch.x),
  }
}

export function geometryOfI({ depth, width, tw, tf, fillet: r }: ISection): Properties {
  const web = depth / 2 - tf
  return fromQuarter([
    rectangle(width / 2, tf, width / 4, depth / 2 - tf / 2),
    rectangle(tw / 2, web, tw / 4, web / 2),
    spandrel(r, tw / 2 + SPANDREL_CENTROID * r, web - SPANDREL_CENTROID * r, 1),
  ])
}

function solidRounded(depth: number, width: number, r: number): Properties {
  return fromQuarter([
    rectangle(width / 2, depth / 2, width / 4, depth / 4),
    spandrel(r, width / 2 - SPANDREL_CENTROID * r, depth / 2 - SPANDREL_CENTROID * r, -1),
  ])
}

export function geometryOfBox(box: BoxSection, outside: number, inside: number): Properties {
  const t = box.designWall
  const outer = solidRounded(box.depth, box.width, outside)
  const inner = solidRounded(box.depth - 2 * t, box.width - 2 * t, inside)
  return {
    area: outer.area - inner.area,
    Ix: outer.Ix - inner.Ix,
    Iy: outer.Iy - inner.Iy,
    Zx: outer.Zx - inner.Zx,
    Zy: outer.Zy - inner.Zy,
  }
}

export function geometryOfRing({ depth: D, designWall: t }: RoundSection): Properties {
  const d = D - 2 * t
  const I = (Math.PI * (D ** 4 - d ** 4)) / 64
  const Z = (D ** 3 - d ** 3) / 6
  return { area: (Math.PI * (D ** 2 - d ** 2)) / 4, Ix: I, Iy: I, Zx: Z, Zy: Z }
}

/** St Venant constant of a rolled I with the humps at its junctions, as EN 10365 tables compute it (El Darwish and Johnston, 1965). */
export function torsionOfI({ depth, width, tw, tf, fillet: r }: ISection): number {
  const hump = ((r + tw / 2) ** 2 + (r + tf) ** 2 - r ** 2) / (2 * r + tf)
  return (
    (2 / 3) * (width - 0.63 * tf) * tf ** 3 +
    (1 / 3) * (depth - 2 * tf) * tw ** 3 +
    2 * (tw / tf) * (0.145 + (0.1 * r) / tf) * hump ** 4
  )
}

/** Warping constant of two equal flanges: Iy·ho²/4, of the flanges alone. */
export function warpingOfI({ depth, width, tf }: ISection): number {
  return (tf * width ** 3 * (depth - tf) ** 2) / 24
}

/** Median and largest of |published / computed − 1|, with the shape that has the largest. */
export function spread(rows: readonly { name: string; published: number; computed: number }[]): {
  median: number
  largest: number
  worst: string
} {
  const off = rows
    .map(({ name, published, computed }) => ({ name, by: Math.abs(published / computed - 1) }))
    .sort((a, b) => a.by - b.by)
  const last = off.at(-1)
  return {
    median: off[Math.floor(off.length / 2)]?.by ?? NaN,
    largest: last?.by ?? NaN,
    worst: last?.name ?? '',
  }
}

/** S and r follow from the rest. */
export function withDerived(shape: { depth: number; width: number }, found: Properties) {
  return {
    ...found,
    Sx: (2 * found.Ix) / shape.depth,
    Sy: (2 * found.Iy) / shape.width,
    rx: Math.sqrt(found.Ix / found.area),
    ry: Math.sqrt(found.Iy / found.area),
  }
}
