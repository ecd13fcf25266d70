/** Builds what `npm start` runs: the server and each of its workers by esbuild, the pages by Vite. */
import { build as bundle } from 'esbuild'
import { readdirSync, rmSync, writeFileSync } from 'node:fs'
import { basename } from 'node:path'
import { fileURLToPath } from 'node:url'
import { build as buildPages } from 'vite'

const root = fileURLToPath(new URL('../..', import.meta.url))
const out = `${root}/server/dist`

const workers = readdirSync(`${root}/server`, { recursive: true })
  .filter((file) => file.endsWith('.worker.ts') && !file.startsWith('dist'))
  .map((file) => ({ in: `${root}/server/${file}`, out: basename(file, '.ts') }))

rmSync(out, { recursive: true, force: true })
await bundle({
  entryPoints: [{ in: `${root}/server/main.ts`, out: 'main' }, ...workers],
  outdir: out,
  bundle: true,
  splitting: true,
  platform: 'node',
  format: 'esm',
  target: 'node20',
  packages: 'external',
  sourcemap: true,
  logLevel: 'warning',
})
await buildPages({ root: `${root}/web`, configFile: `${root}/vite.config.ts`, logLevel: 'warn' })
writeFileSync(`${out}/built`, new Date().toISOString())
