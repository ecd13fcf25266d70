export type Axis = 'strong' | 'weak'
export type EndCondition = 'pinned' | 'fixed' | 'guided' | 'free'
export type EndFixity = 'recommended' | 'theoretical'

export interface Ends {
  bottom: EndCondition
  top: EndCondition
}

export interface Brace {
  /** Height above the base, mm. */
  height: number
  /** The axis whose buckling it restrains. */
  holds: Axis | 'both'
  stopsTwist: boolean
  /** Distance of the brace from the centre of the section, mm (a girt on a flange). */
  offset?: number | undefined
}

/** A column as asked: mm. */
export interface Column {
  height: number
  ends: { strong: Ends; weak: Ends }
  braces: Brace[]
  endFixity: EndFixity
}

/** One unbraced segment by the segment method. `k` is null where the part has no K of its own (free above a brace). */
export interface Segment {
  from: number
  to: number
  k: number | null
  kl: number | null
}

/** Effective length about one axis by both methods, mm; `criticalLoad` is elastic, N, referred to the base force. */
export interface EffectiveLength {
  segment: number
  eigenvalue: number
  used: number
  governedBy: 'segment' | 'eigenvalue'
  segments: Segment[]
  criticalLoad: number
  /** Buckled form: [height mm, deflection scaled to a largest value of 1]. */
  shape: [number, number][]
}
