import type { CheckDto, ColumnCheckDto } from '../../shared/contracts/checks.ts'

/* Worked by hand for a W10X49 of A992 at Lc 4.20 m; a thing to show, not a thing to trust. */

const flexural: CheckDto = {
  clause: 'E3',
  title: 'Flexural buckling about the weak axis',
  demand: 1_250_000,
  capacity: 2_114_000,
  unit: 'N',
  utilisation: 0.591,
  steps: [
    {
      symbol: 'Lc/ry',
      expression: 'Lc / ry',
      template: '{0} / {1}',
      terms: [
        { value: 4200, unit: 'mm' },
        { value: 64.5, unit: 'mm' },
      ],
      substitution: '4200 mm / 64.5 mm',
      value: 65.12,
      unit: '1',
    },
    {
      symbol: 'Fe',
      expression: 'π²·E / (Lc/r)²',
      template: 'π² · {0} / {1}²',
      terms: [
        { value: 199_948, unit: 'MPa' },
        { value: 65.12, unit: '1' },
      ],
      substitution: 'π² · 199 948 MPa / 65.12²',
      value: 465.4,
      unit: 'MPa',
    },
    {
      symbol: 'Fn',
      expression: '0.658^(Fy/Fe) · Fy, as Fy/Fe ≤ 2.25',
      template: '0.658^({0} / {1}) · {0}',
      terms: [
        { value: 344.74, unit: 'MPa' },
        { value: 465.4, unit: 'MPa' },
      ],
      substitution: '0.658^(344.7 MPa / 465.4 MPa) · 344.7 MPa',
      value: 252.8,
      unit: 'MPa',
    },
    {
      symbol: 'φPn',
      expression: 'φ · Fn · Ag',
      template: '0.90 · {0} · {1}',
      terms: [
        { value: 252.8, unit: 'MPa' },
        { value: 9290, unit: 'mm²' },
      ],
      substitution: '0.90 · 252.8 MPa · 9 290 mm²',
      value: 2_114_000,
      unit: 'N',
    },
  ],
  notes: ['Ω, χ, λ, √, ′ and ″ stand here so that a reader can be sure of every sign.'],
}

const slenderness: CheckDto = {
  clause: 'B4.1a',
  title: 'Width to thickness of the flange',
  demand: 8.93,
  capacity: 13.49,
  unit: '1',
  utilisation: 0.662,
  steps: [
    {
      symbol: 'λr',
      expression: '0.56 · √(E / Fy)',
      template: '0.56 · √({0} / {1})',
      terms: [
        { value: 199_948, unit: 'MPa' },
        { value: 344.74, unit: 'MPa' },
      ],
      substitution: '0.56 · √(199 948 MPa / 344.7 MPa)',
      value: 13.49,
      unit: '1',
    },
  ],
  notes: [],
}

export const bearing: CheckDto = {
  clause: 'J8',
  title: 'Bearing on concrete',
  demand: 1_250_000,
  capacity: 2_352_000,
  unit: 'N',
  utilisation: 0.531,
  steps: [
    {
      symbol: 'φPp',
      expression: 'φ · 0.85 · fc · A1',
      template: '0.65 · 0.85 · {0} · {1}',
      terms: [
        { value: 28, unit: 'MPa' },
        { value: 152_000, unit: 'mm²' },
      ],
      substitution: '0.65 · 0.85 · 28 MPa · 152 000 mm²',
      value: 2_352_000,
      unit: 'N',
    },
  ],
  notes: ['Breakout, pull-out and shear of the concrete are not covered.'],
}

export const HEIGHT = 6400
export const BRACE = 2200
const sine = (waves: number): [number, number][] =>
  Array.from({ length: 33 }, (_, index) => [(HEIGHT * index) / 32, Math.sin((Math.PI * waves * index) / 32)])

export const columnCheck: ColumnCheckDto = {
  verdict: 'holds',
  utilisation: 0.591,
  governing: { check: 'flexural buckling', axis: 'weak', clause: 'E3', combination: '1.2D + 1.6L' },
  lengths: {
    strong: {
      segment: 5120,
      eigenvalue: 4608,
      used: 5120,
      governedBy: 'segment',
      segments: [{ from: 0, to: HEIGHT, k: 0.8, kl: 5120 }],
      criticalLoad: 8_500_000,
      shape: sine(1),
    },
    weak: {
      segment: 4200,
      eigenvalue: 3460,
      used: 4200,
      governedBy: 'segment',
      segments: [
        { from: 0, to: BRACE, k: 1, kl: 2200 },
        { from: BRACE, to: HEIGHT, k: 1, kl: 4200 },
      ],
      criticalLoad: 6_370_000,
      shape: sine(2),
    },
    torsion: { used: HEIGHT },
  },
  braces: [{ height: BRACE, axis: 'weak', length: BRACE, strength: 12_500, stiffness: 6061 }],
  values: { required: 1_250_000 },
  checks: [flexural, slenderness],
  assumptions: ['Braces hold translation only and are taken as rigid (AISC 360 Appendix 6).'],
  warnings: [],
  notCovered: ['Fire', 'Connections other than the base plate and cap plate'],
}
