import { selectFace, type Face } from './faces.ts'

export const INK = {
  ink: '#1B2024',
  soft: '#454B50',
  faint: '#6B7074',
  hair: '#A5A6A3',
  ground: '#E9E7E1',
  cut: '#D2D0CA',
  oxide: '#98402B',
  sheet: '#FFFFFF',
  fails: '#A1123C',
} as const

export interface TypeStyle {
  face: Face
  size: number
  colour: string
}

export const STYLES = {
  title: { face: 'readStrong', size: 21, colour: INK.ink },
  heading: { face: 'readStrong', size: 13, colour: INK.ink },
  subheading: { face: 'readStrong', size: 9.5, colour: INK.ink },
  body: { face: 'read', size: 9, colour: INK.ink },
  strong: { face: 'readStrong', size: 9, colour: INK.ink },
  small: { face: 'read', size: 8, colour: INK.soft },
  label: { face: 'read', size: 7.5, colour: INK.faint },
  reckon: { face: 'reckon', size: 8, colour: INK.ink },
  reckonStrong: { face: 'reckonStrong', size: 8, colour: INK.ink },
  reckonFails: { face: 'reckonStrong', size: 8, colour: INK.fails },
  reckonSoft: { face: 'reckon', size: 8, colour: INK.soft },
} as const satisfies Record<string, TypeStyle>
export type StyleName = keyof typeof STYLES

/** Letters that Archivo does not have: Greek but for Ω μ π Δ, combining marks, Cyrillic. */
const NOT_IN_ARCHIVO = /(?![ΩμπΔ])\p{Script=Greek}|\p{Script=Cyrillic}|\p{M}/u

const RAISED = '⁰¹²³⁴⁵⁶⁷⁸⁹'

/** Neither face has a raised minus: 10⁻⁶ is written 10^−6 on paper. */
export function legible(text: string): string {
  return text.replace(/⁻([⁰¹²³⁴⁵⁶⁷⁸⁹]+)/g, (_, raised: string) => {
    return `^−${[...raised].map((digit) => RAISED.indexOf(digit)).join('')}`
  })
}

/** Selects the style's face, or Plex where Archivo would leave a letter blank. */
export function useStyle(doc: PDFKit.PDFDocument, name: StyleName, text = ''): void {
  const { face, size, colour } = STYLES[name]
  const plex = face.endsWith('Strong') ? 'reckonStrong' : 'reckon'
  selectFace(doc, NOT_IN_ARCHIVO.test(text) ? plex : face)
  doc.fontSize(size).fillColor(colour)
}

export function useFace(doc: PDFKit.PDFDocument, size: number, colour: string, strong = false): void {
  selectFace(doc, strong ? 'readStrong' : 'read')
  doc.fontSize(size).fillColor(colour)
}
