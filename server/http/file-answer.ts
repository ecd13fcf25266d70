import type { Response } from 'express'

export interface FileAnswer {
  contentType: string
  fileName: string
  body: Buffer | string
  /** Shown by the browser itself rather than saved. */
  inline?: true
}

/** `filename*` of RFC 6266 carries any name; the plain one is for old readers. */
export function sendFile(res: Response, { contentType, fileName, body, inline }: FileAnswer): void {
  const plain = fileName.replaceAll(/[^\w.-]/g, '_')
  const kind = inline ? 'inline' : 'attachment'
  res.set(
    'Content-Disposition',
    `${kind}; filename="${plain}"; filename*=UTF-8''${encodeURIComponent(fileName)}`,
  )
  res.type(contentType).send(body)
}
