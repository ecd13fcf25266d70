import { createRequire } from 'node:module'

const resolve = createRequire(import.meta.url).resolve
const archivo = (face: string) => resolve(`@expo-google-fonts/archivo/${face}.ttf`)
const plex = (face: string) => resolve(`@expo-google-fonts/ibm-plex-sans/${face}.ttf`)

const FILES = {
  read: archivo('400Regular/Archivo_400Regular'),
  readStrong: archivo('600SemiBold/Archivo_600SemiBold'),
  reckon: plex('400Regular/IBMPlexSans_400Regular'),
  reckonStrong: plex('600SemiBold/IBMPlexSans_600SemiBold'),
}
export type Face = keyof typeof FILES

/** What pdfkit makes of a font file. It takes one in place of a path, though its types do not say so. */
type OpenedFace = PDFKit.Mixins.PDFFontSource & { layout: unknown }
interface Holder {
  _font?: { font?: Partial<OpenedFace> }
}

const opened = new Map<Face, OpenedFace>()

/**
 * Makes the faces known to a document. pdfkit reads the file again for every document, and with it the tables for
 * kerning, which takes as long as writing a short quote; so what the first document opened is kept for those after it.
 */
export function registerFaces(doc: PDFKit.PDFDocument): void {
  for (const face of Object.keys(FILES) as Face[]) doc.registerFont(face, opened.get(face) ?? FILES[face])
}

export function selectFace(doc: PDFKit.PDFDocument, face: Face): void {
  doc.font(face)
  if (opened.has(face)) return
  const fresh = (doc as unknown as Holder)._font?.font
  if (fresh && typeof fresh.layout === 'function') opened.set(face, fresh as OpenedFace)
}
