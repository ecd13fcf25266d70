import PDFDocument from 'pdfkit'
import { describe, expect, it } from 'vitest'
import { registerFaces } from '../../../server/pdf/faces.ts'
import { legible, STYLES, useStyle, type StyleName } from '../../../server/pdf/type-style.ts'

/* A face without a letter leaves it blank on paper while text can still be extracted, so the face itself is asked. */

interface Chosen {
  _font: { name: string; font: { hasGlyphForCodePoint: (point: number) => boolean } }
}

function chosen(style: StyleName, text: string): Chosen['_font'] {
  const doc = new PDFDocument()
  registerFaces(doc)
  useStyle(doc, style, text)
  return (doc as unknown as Chosen)._font
}

const TEXTS = [
  'Ωφλχπ√²³⁴⁶≤≥′″Ø',
  'φPn = 0.90 · Fn · Ag',
  'λ̄ Φ χ γM0 ψ0 ε kσ ρ',
  '½ × – − ∞ · → ≈ €',
  '1·10⁻⁶⁷',
  'Åsgård & Łuków',
  'Đặng',
  'Сталь',
]

describe('every style', () => {
  it.each(Object.keys(STYLES) as StyleName[])(
    '%s has a glyph for each letter that a quote may hold',
    (style) => {
      for (const text of TEXTS) {
        const { font, name } = chosen(style, text)
        const blank = [...legible(text)].filter(
          (letter) => !font.hasGlyphForCodePoint(letter.codePointAt(0) ?? 0),
        )
        expect(blank, `${text} in ${name}`).toEqual([])
      }
    },
  )

  it('is read in Archivo where Archivo can', () => {
    expect(chosen('body', 'Ω π Δ µ ≤').name).toMatch(/^Archivo/)
    expect(chosen('strong', 'Column A1').name).toMatch(/^Archivo/)
  })
})
