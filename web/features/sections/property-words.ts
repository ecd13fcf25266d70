import type { Unit } from '../../../shared/units/step.ts'

/** Properties of a shape by their symbols, in the order in which a table gives them. */
export const PROPERTY_WORDS: Record<string, { symbol: string; text: string; unit: Unit }> = {
  mass: { symbol: 'm', text: 'Mass per length', unit: 'kg/m' },
  area: { symbol: 'A', text: 'Area', unit: 'mm²' },
  depth: { symbol: 'd', text: 'Depth', unit: 'mm' },
  width: { symbol: 'b', text: 'Width', unit: 'mm' },
  tw: { symbol: 'tw', text: 'Web thickness', unit: 'mm' },
  tf: { symbol: 'tf', text: 'Flange thickness', unit: 'mm' },
  fillet: { symbol: 'r', text: 'Root fillet', unit: 'mm' },
  wall: { symbol: 't', text: 'Wall, nominal', unit: 'mm' },
  designWall: { symbol: 't des', text: 'Wall for design', unit: 'mm' },
  corner: { symbol: 'R', text: 'Outside corner', unit: 'mm' },
  Ix: { symbol: 'Ix', text: 'Second moment, strong axis', unit: 'mm⁴' },
  Sx: { symbol: 'Sx', text: 'Elastic modulus, strong axis', unit: 'mm³' },
  Zx: { symbol: 'Zx', text: 'Plastic modulus, strong axis', unit: 'mm³' },
  rx: { symbol: 'rx', text: 'Radius of gyration, strong axis', unit: 'mm' },
  Iy: { symbol: 'Iy', text: 'Second moment, weak axis', unit: 'mm⁴' },
  Sy: { symbol: 'Sy', text: 'Elastic modulus, weak axis', unit: 'mm³' },
  Zy: { symbol: 'Zy', text: 'Plastic modulus, weak axis', unit: 'mm³' },
  ry: { symbol: 'ry', text: 'Radius of gyration, weak axis', unit: 'mm' },
  J: { symbol: 'J', text: 'Torsion constant', unit: 'mm⁴' },
  Cw: { symbol: 'Cw', text: 'Warping constant', unit: 'mm⁶' },
  ho: { symbol: 'ho', text: 'Between flange centroids', unit: 'mm' },
  rts: { symbol: 'rts', text: 'Effective radius of gyration', unit: 'mm' },
  flangeRatio: { symbol: 'b/2tf', text: 'Slenderness of the flange', unit: '1' },
  webRatio: { symbol: 'h/tw', text: 'Slenderness of the web', unit: '1' },
  widthRatio: { symbol: 'b/t', text: 'Slenderness of the width sides', unit: '1' },
  depthRatio: { symbol: 'h/t', text: 'Slenderness of the depth sides', unit: '1' },
  diameterRatio: { symbol: 'D/t', text: 'Slenderness of the wall', unit: '1' },
  perimeter: { symbol: 'U', text: 'Outline, for paint', unit: 'mm' },
}

export interface PropertyRow {
  key: string
  symbol: string
  text: string
  unit: Unit
  value: number
}

/** What is known of a shape, in the order above; anything else after it by its own name. */
export function propertyRows(properties: Record<string, number>): PropertyRow[] {
  const known = Object.entries(PROPERTY_WORDS).flatMap(([key, words]) => {
    const value = properties[key]
    return value === undefined ? [] : [{ key, ...words, value }]
  })
  const others = Object.entries(properties)
    .filter(([key]) => !(key in PROPERTY_WORDS))
    .map(([key, value]) => ({ key, symbol: key, text: '', unit: '1' as const, value }))
  return [...known, ...others]
}
