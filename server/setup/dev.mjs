/** `npm run dev`: the server under tsx, restarted on change, and Vite with hot reload in front of it. */
import { spawn } from 'node:child_process'
import { fileURLToPath } from 'node:url'

const root = fileURLToPath(new URL('../..', import.meta.url))
const bin = (name) => `${root}/node_modules/.bin/${name}`

const children = [
  spawn(bin('tsx'), ['watch', '--clear-screen=false', 'server/main.ts'], { cwd: root, stdio: 'inherit' }),
  spawn(bin('vite'), ['--config', 'vite.config.ts'], { cwd: root, stdio: 'inherit' }),
]

function stop(code = 0) {
  for (const child of children) child.kill('SIGTERM')
  process.exitCode = code
}

for (const signal of ['SIGINT', 'SIGTERM']) process.on(signal, () => stop())
for (const child of children) child.on('exit', (code) => stop(code ?? 0))
