/**
 * Makes a fresh clone ready, with Node.js built-ins alone, since it runs before anything is installed:
 * packages when the lock file or Node.js changed, the build when a source is newer, Chromium for the browser tests.
 * Usage: node server/setup/prepare.mjs start|dev|test
 */
import { execFileSync } from 'node:child_process'
import { createHash } from 'node:crypto'
import { existsSync, mkdirSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'

const root = fileURLToPath(new URL('../..', import.meta.url))
const purpose = process.argv[2] ?? 'start'
const stampFile = join(root, 'node_modules/.cache/plumbrule/install')

function run(command, args, env = {}) {
  execFileSync(command, args, {
    cwd: root,
    stdio: ['ignore', 'inherit', 'inherit'],
    env: { ...process.env, ...env },
  })
}

function stop(message) {
  process.stderr.write(`\n${message}\n`)
  process.exit(1)
}

function checkNode() {
  const [major = 0, minor = 0] = process.versions.node.split('.').map(Number)
  if (major !== 20 || minor < 19)
    stop(`Plumbrule runs on Node.js 20.19 or a later 20; this is ${process.version}.`)
}

function installPackages() {
  const lock = readFileSync(join(root, 'package-lock.json'))
  const wanted = createHash('sha256').update(lock).update(process.version).update(process.arch).digest('hex')
  if (existsSync(stampFile) && readFileSync(stampFile, 'utf8') === wanted) return
  process.stdout.write('Installing packages (about two minutes the first time; the database is compiled)…\n')
  try {
    // SQLite itself is C and is worth optimising; its C++ binding is thin.
    run('npm', ['ci', '--include=dev', '--no-audit', '--no-fund'], { CFLAGS: '-O2', CXXFLAGS: '-O1' })
  } catch {
    stop(
      'npm ci failed. The database needs python3, make and g++ to compile; the lines above say what is missing.',
    )
  }
  mkdirSync(join(root, 'node_modules/.cache/plumbrule'), { recursive: true })
  writeFileSync(stampFile, wanted)
}

function newest(path) {
  const stat = statSync(path)
  if (!stat.isDirectory()) return stat.mtimeMs
  return readdirSync(path)
    .filter((name) => name !== 'dist' && name !== 'node_modules')
    .reduce((latest, name) => Math.max(latest, newest(join(path, name))), stat.mtimeMs)
}

function build() {
  const built = join(root, 'server/dist/built')
  const sources = ['web', 'server', 'shared', 'migrations', 'seeds', 'vite.config.ts', 'package-lock.json']
  const latest = Math.max(...sources.map((name) => newest(join(root, name))))
  if (existsSync(built) && statSync(built).mtimeMs > latest) return
  process.stdout.write('Building…\n')
  run(process.execPath, ['server/setup/build.mjs'])
}

function installChromium() {
  const chromium = process.env.CHROMIUM ?? '/usr/bin/chromium'
  const missing = [
    ...(existsSync(chromium) ? [] : ['chromium']),
    ...(existsSync('/usr/bin/pdftotext') ? [] : ['poppler-utils']),
  ]
  if (missing.length === 0) return
  const hint = `The browser tests need ${missing.join(' and ')}. Install it, or set CHROMIUM=/path/to/chromium.`
  if (process.getuid?.() !== 0 || !existsSync('/usr/bin/apt-get')) stop(hint)
  const apt = ['-o', 'DPkg::Lock::Timeout=300', '-q', '-y']
  try {
    run('apt-get', [...apt, 'update'])
    run('apt-get', [...apt, '--no-install-recommends', 'install', ...missing], {
      DEBIAN_FRONTEND: 'noninteractive',
    })
  } catch {
    stop(hint)
  }
}

checkNode()
installPackages()
if (purpose !== 'dev') build()
if (purpose === 'test') installChromium()
