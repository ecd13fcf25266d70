import { cruise, type ICruiseResult } from 'dependency-cruiser'
import { execFileSync } from 'node:child_process'
import { readFileSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import { beforeAll, describe, expect, it } from 'vitest'
import { RULES } from './rules.ts'

const root = fileURLToPath(new URL('../..', import.meta.url))
const tracked = execFileSync('git', ['ls-files', '--cached', '--others', '--exclude-standard'], {
  cwd: root,
  encoding: 'utf8',
})
  .split('\n')
  .filter(Boolean)

async function violationsIn(paths: string[], baseDir: string): Promise<string[]> {
  const result = await cruise(
    paths,
    {
      ruleSet: { forbidden: RULES },
      validate: true,
      baseDir,
      doNotFollow: { path: 'node_modules' },
      // What was built is the same code again, cut otherwise.
      exclude: { path: '^(web|server)/dist/' },
      tsPreCompilationDeps: true,
    },
    {
      extensions: ['.ts', '.vue', '.js', '.mjs', '.json'],
      conditionNames: ['import', 'node', 'default', 'types'],
      exportsFields: ['exports'],
    },
  )
  const output = result.output as ICruiseResult
  return output.summary.violations.map((found) => `${found.rule.name}: ${found.from} → ${found.to}`)
}

describe('the direction of imports', () => {
  let found: string[] = []
  beforeAll(async () => {
    found = await violationsIn(['shared', 'server', 'web', 'migrations', 'seeds'], root)
  }, 60_000)

  it('holds everywhere', () => {
    expect(found).toEqual([])
  })

  it('is really looked at: a tree that breaks rules is caught', async () => {
    const wrong = await violationsIn(
      ['shared', 'web', 'server'],
      fileURLToPath(new URL('./broken-house', import.meta.url)),
    )
    const names = new Set(wrong.map((line) => line.split(':')[0]))
    expect([...names].sort()).toEqual([
      'components-only-show',
      'modules-are-entered-by-their-service',
      'shared-does-no-input-or-output',
      'shared-stands-alone',
      'units-imports-only-what-is-lower',
      'web-and-server-never-meet',
    ])
  }, 60_000)
})

describe('the house', () => {
  it('has nothing at the top that the plan does not have', () => {
    const top = new Set(tracked.map((file) => file.split('/')[0]))
    const allowed = new Set([
      ...[
        'README.md',
        'DEVELOPERS.md',
        'package.json',
        'package-lock.json',
        'vite.config.ts',
        'tsconfig.json',
      ],
      ...['web', 'server', 'shared', 'migrations', 'seeds', 'tests', '.ci', '.gitignore'],
    ])
    expect([...top].filter((entry) => !allowed.has(entry ?? ''))).toEqual([])
  })

  it('keeps files to one job: none over 300 lines, data tables apart', () => {
    // A table is read by looking up a row, however long it is.
    const tables = new Set(['shared/contracts/operations.ts'])
    const long = tracked
      .filter(
        (file) =>
          /^(web|server|shared|migrations|tests)\/.*\.(ts|vue|css)$/.test(file) &&
          !/\/data\//.test(file) &&
          !tables.has(file),
      )
      .filter((file) => readFileSync(`${root}/${file}`, 'utf8').split('\n').length > 301)
    expect(long).toEqual([])
  })

  it('names files in kebab-case and components in PascalCase', () => {
    const code = tracked.filter((file) =>
      /^(web|server|shared|migrations|seeds|tests)\/.*\.(ts|vue)$/.test(file),
    )
    const wrong = code.filter((file) => {
      const name = file.split('/').at(-1) ?? ''
      if (name === 'App.vue') return false
      if (file.endsWith('.vue')) return !/^[A-Z][A-Za-z0-9]+\.vue$/.test(name)
      return !/^(use[A-Z][A-Za-z]+|[a-z0-9]+(-[a-z0-9]+)*)(\.[a-z]+)*\.ts$/.test(name)
    })
    expect(wrong).toEqual([])
  })

  it('imports by name: no default exports but where a framework asks for one', () => {
    const wrong = tracked
      .filter(
        (file) => /^(web|server|shared|migrations|seeds)\/.*\.ts$/.test(file) && !file.endsWith('.worker.ts'),
      )
      .filter((file) => /^export default/m.test(readFileSync(`${root}/${file}`, 'utf8')))
    expect(wrong).toEqual([])
  })
})

describe('packages', () => {
  const lock = JSON.parse(readFileSync(`${root}/package-lock.json`, 'utf8')) as {
    packages: Record<string, { version?: string }>
  }
  const pkg = JSON.parse(readFileSync(`${root}/package.json`, 'utf8')) as Record<
    string,
    Record<string, string>
  >

  it('are pinned to exact versions', () => {
    const versions = Object.entries({ ...pkg.dependencies, ...pkg.devDependencies })
    expect(versions.filter(([, version]) => !/^\d+\.\d+\.\d+$/.test(version))).toEqual([])
  })

  it('with known holes stay above their floors', () => {
    // Advisories known to the trade when written: nodemailer up to 9 (address parsing, several), multer below 2.3.
    const floors: Record<string, number> = { nodemailer: 10 }
    for (const [name, floor] of Object.entries(floors)) {
      const version = lock.packages[`node_modules/${name}`]?.version ?? '0'
      expect(Number(version.split('.')[0]), name).toBeGreaterThanOrEqual(floor)
    }
  })
})
