import type { LineRequirement, LineRequirementInput } from '../../../shared/contracts/requirement.ts'
import { newLine, type LineDraft } from './line-draft.ts'

const isEuropean = (line: Pick<LineDraft, 'standard'>) => line.standard === 'EN 1993-1-1'

/** Leaves out what is empty: the contract takes no `undefined`. */
function given<T extends object>(values: T): { [K in keyof T]?: Exclude<T[K], undefined> } {
  return Object.fromEntries(Object.entries(values).filter(([, value]) => value !== undefined)) as {
    [K in keyof T]?: Exclude<T[K], undefined>
  }
}

/** A line as the API takes it. */
export function toRequirement(line: LineDraft): LineRequirementInput {
  const { loads } = line
  const pier =
    line.pierLength && line.pierWidth ? { pier: { length: line.pierLength, width: line.pierWidth } } : {}
  const offset =
    line.offsetStrong || line.offsetWeak
      ? { offset: { strong: line.offsetStrong ?? 0, weak: line.offsetWeak ?? 0 } }
      : {}
  return {
    ...line.kept,
    mark: line.mark,
    quantity: line.quantity ?? 0,
    standard: line.standard,
    ...(isEuropean(line)
      ? { liveCategory: line.liveCategory }
      : { method: line.method, liveFactor: line.liveFactor }),
    ...(line.combinations ? { combinations: line.combinations } : {}),
    ...given({ height: line.height }),
    ends: line.ends,
    braces: line.braces,
    endFixity: line.endFixity,
    ...(line.kept.required ? {} : { loads: loadsOf(loads) }),
    ...offset,
    selfWeight: line.selfWeight,
    ...(line.grade ? { grade: line.grade } : {}),
    limits: {
      ...line.kept.limits,
      ...(line.families.length > 0 ? { families: line.families } : {}),
      ...given({ maxDepth: line.maxDepth, maxWidth: line.maxWidth }),
      maxUtilisation: (line.maxUtilisation ?? 100) / 100,
    },
    finish: line.finish,
    base: {
      plate: line.basePlate,
      rods: line.basePlate && line.rods,
      concrete: { strength: line.concreteStrength ?? 28, ...pier },
    },
    cap: { plate: line.capPlate },
  }
}

function loadsOf(loads: LineDraft['loads']): NonNullable<LineRequirementInput['loads']> {
  const { dead, live, roofLive, snow, rain } = loads
  return {
    ...given({ dead, live, roofLive, snow, rain }),
    wind: given({ pushes: loads.windPushes, lifts: loads.windLifts }),
    earthquake: given({
      pushes: loads.earthquakePushes,
      lifts: loads.earthquakeLifts,
      vertical: loads.earthquakeVertical,
    }),
  }
}

const some = (value: number | undefined) => (value === 0 ? undefined : value)

/** A kept line back into fields. */
export function fromRequirement(kept: LineRequirement): LineDraft {
  const { loads, limits, base } = kept
  const fresh = newLine(kept.mark)
  const pier = base.concrete.pier
  return {
    ...fresh,
    quantity: kept.quantity,
    height: kept.height,
    ends: kept.ends ?? fresh.ends,
    braces: kept.braces,
    loads: {
      dead: some(loads?.dead),
      live: some(loads?.live),
      roofLive: some(loads?.roofLive),
      snow: some(loads?.snow),
      rain: some(loads?.rain),
      windPushes: some(loads?.wind.pushes),
      windLifts: some(loads?.wind.lifts),
      earthquakePushes: some(loads?.earthquake.pushes),
      earthquakeLifts: some(loads?.earthquake.lifts),
      earthquakeVertical: some(loads?.earthquake.vertical),
    },
    offsetStrong: some(kept.offset?.strong),
    offsetWeak: some(kept.offset?.weak),
    standard: kept.standard,
    method: kept.method ?? 'LRFD',
    combinations: kept.combinations ?? null,
    liveFactor: kept.liveFactor === 1 ? 1 : 0.5,
    liveCategory: kept.liveCategory,
    endFixity: kept.endFixity,
    selfWeight: kept.selfWeight,
    grade: typeof kept.grade === 'string' ? kept.grade : '',
    families: limits.families ?? [],
    maxDepth: limits.maxDepth,
    maxWidth: limits.maxWidth,
    maxUtilisation: limits.maxUtilisation === 1 ? undefined : limits.maxUtilisation * 100,
    finish: kept.finish,
    basePlate: base.plate,
    rods: base.rods,
    capPlate: kept.cap.plate,
    concreteStrength: base.concrete.strength,
    pierLength: pier?.length,
    pierWidth: pier?.width,
    kept: {
      ...(kept.lengths ? { lengths: kept.lengths } : {}),
      ...(kept.required ? { required: kept.required } : {}),
      ...(typeof kept.grade === 'object' ? { grade: kept.grade } : {}),
      ...(limits.maxSlenderness ? { limits: { maxSlenderness: limits.maxSlenderness } } : {}),
    },
  }
}
