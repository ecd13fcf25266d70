/** Families of rolled and hollow shapes, by the names of their standards. */
export const FAMILIES = [
  'W',
  'HSS_SQUARE',
  'HSS_RECT',
  'HSS_ROUND',
  'PIPE',
  'HEA',
  'HEB',
  'HEM',
  'IPE',
  'UC',
  'UB',
  'SHS',
  'RHS',
  'CHS',
] as const
export type Family = (typeof FAMILIES)[number]

/** Properties common to every shape. mm-based; strong axis is x–x in US tables, y–y in European ones. */
interface SectionBase {
  designation: string
  /** The metric designation of a US shape (W250X73); equal to `designation` for European shapes. */
  designationSI: string
  family: Family
  /** Mass per metre for weighing and pricing, kg/m. US shapes: from the published lb/ft. */
  mass: number
  /** Gross area, mm². */
  area: number
  /** Overall depth (perpendicular to the strong axis) and width, mm. For round shapes both are the diameter. */
  depth: number
  width: number
  Ix: number
  Sx: number
  rx: number
  Zx: number
  Iy: number
  Sy: number
  ry: number
  Zy: number
  /** St Venant torsion constant, mm⁴. */
  J: number
  /** Outline perimeter for painting, mm. */
  perimeter: number
}

export interface ISection extends SectionBase {
  shape: 'I'
  /** Welded from plates; left out for rolled shapes. */
  builtUp?: boolean
  tw: number
  tf: number
  /** Root fillet radius, mm. */
  fillet: number
  /** Warping constant, mm⁶. */
  Cw: number
  /** Distance between flange centroids, mm. */
  ho: number
  /** bf/2tf and h/tw as published (US) or computed from the dimensions. */
  flangeRatio: number
  webRatio: number
  /** Effective radius of gyration for lateral-torsional buckling, mm. */
  rts: number
}

export interface BoxSection extends SectionBase {
  shape: 'box'
  /** Nominal wall and design wall (0.93 nominal for A500), mm. */
  wall: number
  designWall: number
  /** Flat width over design wall of the width and depth sides. */
  widthRatio: number
  depthRatio: number
  /** Outside corner radius, mm. */
  corner: number
  process: 'A500' | 'hot finished' | 'cold formed'
}

export interface RoundSection extends SectionBase {
  shape: 'round'
  wall: number
  designWall: number
  /** D / design wall. */
  diameterRatio: number
  process: 'A500' | 'A53' | 'hot finished' | 'cold formed'
}

/** A shape of the catalogue. AISC: computed from the US columns alone. */
export type Section = ISection | BoxSection | RoundSection
