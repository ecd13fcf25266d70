import express, { Router } from 'express'
import { existsSync } from 'node:fs'
import { join } from 'node:path'

/** The built pages. Files with a hash in their name may be kept for ever; the page that names them never. */
export function pages(folder: string): Router {
  const router = Router()
  if (!existsSync(join(folder, 'index.html'))) return router
  router.use('/.vite', (_req, res) => void res.sendStatus(404))
  router.use(
    '/assets',
    express.static(join(folder, 'assets'), { immutable: true, maxAge: '1y', index: false }),
  )
  router.use('/assets', (_req, res) => void res.sendStatus(404))
  router.use(express.static(folder, { index: false, maxAge: '1h' }))
  router.get('/{*page}', (req, res, next) => {
    if (req.path.startsWith('/api/')) return next()
    res.set('Cache-Control', 'no-cache')
    return res.sendFile(join(folder, 'index.html'))
  })
  return router
}
