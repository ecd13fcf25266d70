import { FACTORS, type Method } from '../standards/aisc360/resistance.ts'
import { makeStep } from '../units/render.ts'
import type { Check, Quantity, Step } from '../units/step.ts'
import type { BaseInput, BaseParts } from './base-design.ts'
import { availableBearing, confinement, nominalBearing } from './bearing.ts'
import { cantilevers, thicknessRequired, type Cantilevers } from './cantilever.ts'

const mm = (value: number): Quantity => ({ value, unit: 'mm' })
const plain = (value: number): Quantity => ({ value, unit: '1' })
const newtons = (value: number): Quantity => ({ value, unit: 'N' })
const mpa = (value: number): Quantity => ({ value, unit: 'MPa' })

interface Found {
  checks: Check[]
  values: Record<string, number>
}

/** Bearing on the concrete and thickness of the plate under compression. */
export function compressionChecks(input: BaseInput, parts: BaseParts, method: Method): Found {
  const { section, required, concrete } = input
  const { plate } = parts
  const A1 = plate.length * plate.width
  const confined = confinement(plate, concrete.pier)
  const bearing = availableBearing(concrete.strength, A1, confined, method)
  const ratio = required.compression / bearing
  const found = cantilevers(section, plate, ratio)
  const needed = thicknessRequired(found.l, required.compression, plate.yield, plate, method)
  return {
    values: {
      bearingAvailable: bearing,
      bearingRatio: ratio,
      ...found,
      thicknessRequired: needed,
    },
    checks: [
      {
        clause: 'J8',
        title: 'Bearing on concrete',
        demand: required.compression,
        capacity: bearing,
        unit: 'N',
        utilisation: ratio,
        steps: bearingSteps(concrete.strength, plate, confined, method),
        notes: concrete.pier ? [] : ['The footing is taken as wide enough that √(A2/A1) reaches 2.'],
      },
      {
        clause: 'Design Guide 1',
        title: 'Thickness of the base plate under bearing',
        demand: needed,
        capacity: plate.thickness,
        unit: 'mm',
        utilisation: needed / plate.thickness,
        steps: [
          ...cantileverSteps(input, parts, found, ratio),
          thicknessStep(input, parts, found.l, needed, method),
        ],
        notes:
          section.shape === 'I'
            ? []
            : ['l is not taken less than n′: our guard for plates close to the shaft.'],
      },
    ],
  }
}

function bearingSteps(
  fc: number,
  plate: { length: number; width: number },
  confined: number,
  method: Method,
): Step[] {
  const A1 = plate.length * plate.width
  const nominal = nominalBearing(fc, A1, confined)
  const { phi, omega } = FACTORS.concreteBearing
  const lrfd = method === 'LRFD'
  return [
    makeStep({
      symbol: 'A1',
      expression: 'N · B',
      template: '{0} · {1}',
      terms: [mm(plate.length), mm(plate.width)],
      value: A1,
      unit: 'mm²',
    }),
    makeStep({
      symbol: 'Pp',
      expression: '0.85 · f′c · A1 · min(2, √(A2/A1))',
      template: '0.85 · {0} · {1} · {2}',
      terms: [mpa(fc), { value: A1, unit: 'mm²' }, plain(confined)],
      value: nominal,
      unit: 'N',
    }),
    makeStep({
      symbol: lrfd ? 'φPp' : 'Pp/Ω',
      expression: lrfd ? 'φ · Pp' : 'Pp / Ω',
      template: lrfd ? `${phi.toFixed(2)} · {0}` : `{0} / ${omega.toFixed(2)}`,
      terms: [newtons(nominal)],
      value: lrfd ? phi * nominal : nominal / omega,
      unit: 'N',
    }),
  ]
}

function cantileverSteps(
  { section }: BaseInput,
  { plate }: BaseParts,
  found: Cantilevers,
  ratio: number,
): Step[] {
  const { depth: d, width: b, shape } = section
  const along = shape === 'round' ? 0.8 : 0.95
  const across = shape === 'box' ? 0.95 : 0.8
  const half = (
    symbol: string,
    expression: string,
    factor: number,
    size: number,
    part: number,
    value: number,
  ) =>
    makeStep({
      symbol,
      expression,
      template: `({0} − ${factor.toFixed(2)} · {1}) / 2`,
      terms: [mm(size), mm(part)],
      value,
      unit: 'mm',
    })
  const steps = [
    half('m', `(N − ${along.toFixed(2)}·d) / 2`, along, plate.length, d, found.m),
    half('n', `(B − ${across.toFixed(2)}·b) / 2`, across, plate.width, b, found.n),
    makeStep({
      symbol: 'n′',
      expression: '√(d·b) / 4',
      template: '√({0} · {1}) / 4',
      terms: [mm(d), mm(b)],
      value: found.nPrime,
      unit: 'mm',
    }),
  ]
  if (shape !== 'I') return steps
  const X = Math.min(1, ((4 * d * b) / (d + b) ** 2) * ratio)
  return [
    ...steps,
    makeStep({
      symbol: 'X',
      expression: '4·d·b / (d + b)² · P/Pavail, at most 1',
      template: '4 · {0} · {1} / ({0} + {1})² · {2}',
      terms: [mm(d), mm(b), plain(ratio)],
      value: X,
      unit: '1',
    }),
    makeStep({
      symbol: 'λ',
      expression: '2√X / (1 + √(1 − X)), at most 1',
      template: '2 · √{0} / (1 + √(1 − {0}))',
      terms: [plain(X)],
      value: found.lambda,
      unit: '1',
    }),
  ]
}

function thicknessStep(
  { required }: BaseInput,
  { plate }: BaseParts,
  l: number,
  needed: number,
  method: Method,
): Step {
  const { phi, omega } = FACTORS.plateBending
  const lrfd = method === 'LRFD'
  return makeStep({
    symbol: 't',
    expression: lrfd ? 'l · √(2·P / (φ·Fy·B·N)), l the largest' : 'l · √(2·Ω·P / (Fy·B·N)), l the largest',
    template: lrfd
      ? `{0} · √(2 · {1} / (${phi.toFixed(2)} · {2} · {3} · {4}))`
      : `{0} · √(2 · ${omega.toFixed(2)} · {1} / ({2} · {3} · {4}))`,
    terms: [mm(l), newtons(required.compression), mpa(plate.yield), mm(plate.width), mm(plate.length)],
    value: needed,
    unit: 'mm',
  })
}
