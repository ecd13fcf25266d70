import type { Finish } from '../pricing/line-spec.ts'
import type { Family } from '../sections/section.ts'
import type { ColumnRequest } from '../standards/column-request.ts'

export interface Limits {
  families?: readonly Family[] | undefined
  /** mm. */
  maxDepth?: number | undefined
  maxWidth?: number | undefined
  maxUtilisation: number
  maxSlenderness?: number | undefined
}

/** A mark with its quantity and all that fixes its price, without a shape. N, mm, MPa. */
export interface LineAsked extends ColumnRequest {
  mark: string
  quantity: number
  limits: Limits
  finish: Finish
  base: {
    plate: boolean
    rods: boolean
    concrete: { strength: number; pier?: { length: number; width: number } | undefined }
  }
  cap: { plate: boolean }
}
