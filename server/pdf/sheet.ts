import { legible, useStyle, type StyleName } from './type-style.ts'

type Element = ReturnType<PDFKit.PDFDocument['struct']>
export type Align = 'left' | 'right' | 'center'

interface Placing {
  x?: number
  y?: number
  width?: number
  align?: Align
}

/** A tagged document that is written from the top of a page down and goes on to the next when it is full. */
export class Sheet {
  readonly doc: PDFKit.PDFDocument
  readonly left: number
  readonly right: number
  readonly width: number
  private readonly parents: Element[] = []

  constructor(doc: PDFKit.PDFDocument) {
    this.doc = doc
    this.left = doc.page.margins.left
    this.right = doc.page.width - doc.page.margins.right
    this.width = this.right - this.left
    const root = doc.struct('Document')
    doc.addStructure(root)
    this.parents.push(root)
  }

  /** Ends the structure; nothing can be added after. */
  close(): void {
    this.parents.forEach((element) => element.end())
  }

  get y(): number {
    return this.doc.y
  }

  moveTo(y: number): void {
    this.doc.x = this.left
    this.doc.y = y
  }

  down(by: number): void {
    this.moveTo(this.doc.y + by)
  }

  get bottom(): number {
    return this.doc.page.height - this.doc.page.margins.bottom
  }

  /** Starts a page unless this much room is left; says whether it did. */
  room(height: number): boolean {
    if (this.doc.y + height <= this.bottom) return false
    this.newPage()
    return true
  }

  newPage(): void {
    this.doc.addPage()
    this.moveTo(this.doc.page.margins.top)
  }

  /** A structure element whose content is drawn by `draw`. */
  tag(type: string, draw: () => void, options: { alt?: string; scope?: 'Column' | 'Row' } = {}): void {
    const element = this.doc.struct(type, { ...options }, draw)
    this.parents.at(-1)?.add(element)
    element.end()
  }

  /** A structure element made of those that `body` makes. */
  group(type: string, body: () => void): void {
    const element = this.doc.struct(type)
    this.parents.at(-1)?.add(element)
    this.parents.push(element)
    body()
    this.parents.pop()
    element.end()
  }

  /** What is not content: rules, frames, repeated heads. */
  artifact(draw: () => void): void {
    this.doc.markContent('Artifact', { type: 'Layout' })
    draw()
    this.doc.endMarkedContent()
  }

  /** Text in a style, without a structure element of its own. */
  put(
    style: StyleName,
    text: string,
    { x = this.left, y = this.doc.y, width, align = 'left' }: Placing = {},
  ): void {
    const shown = legible(text)
    useStyle(this.doc, style, shown)
    // Figures that stand under each other have one width; Plex's always do.
    const features: PDFKit.Mixins.OpenTypeFeatures[] = align === 'right' ? ['tnum'] : []
    this.doc.text(shown, x, y, {
      width: width ?? this.right - x,
      align,
      lineGap: 1.5,
      ...(features[0] && { features }),
    })
    this.doc.x = this.left
  }

  heightOf(style: StyleName, text: string, width: number): number {
    const shown = legible(text)
    useStyle(this.doc, style, shown)
    return this.doc.heightOfString(shown, { width, lineGap: 1.5 })
  }

  paragraph(text: string, style: StyleName = 'body', type = 'P'): void {
    this.tag(type, () => this.put(style, text))
  }

  /** A heading that is not left alone at the foot of a page. */
  heading(text: string, level: 1 | 2 | 3 = 2, keep = 60): void {
    const style = ({ 1: 'title', 2: 'heading', 3: 'subheading' } as const)[level]
    this.room(keep)
    this.tag(`H${level}`, () => this.put(style, text))
    this.down(level === 3 ? 3 : 5)
  }

  rule(colour: string, width = 0.5, y = this.doc.y): void {
    this.artifact(() => {
      this.doc.moveTo(this.left, y).lineTo(this.right, y).lineWidth(width).strokeColor(colour).stroke()
    })
  }

  list(items: readonly string[], style: StyleName = 'body'): void {
    this.group('L', () => {
      for (const item of items) {
        this.room(this.heightOf(style, item, this.width - 12))
        const { y } = this.doc
        this.group('LI', () => {
          this.tag('Lbl', () => this.put(style, '–', { y, width: 10 }))
          this.tag('LBody', () => this.put(style, item, { x: this.left + 12, y }))
        })
        this.down(2.5)
      }
    })
  }
}
