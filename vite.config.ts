import vue from '@vitejs/plugin-vue'
import Components from 'unplugin-vue-components/vite'
import { fileURLToPath } from 'node:url'
import { defineConfig } from 'vitest/config'

const kebab = (name: string) => name.replace(/\B([A-Z])/g, '-$1').toLowerCase()

/**
 * Element Plus by deep path: the stock resolver pulls the whole library into one chunk.
 * Sub-components live in their parent's folder, so the parent is named for those in use.
 */
const parents: Record<string, string> = {
  ElOption: 'select',
  ElOptionGroup: 'select',
  ElTableColumn: 'table',
  ElFormItem: 'form',
  ElRadioGroup: 'radio',
  ElRadioButton: 'radio',
  ElCheckboxGroup: 'checkbox',
  ElDropdownMenu: 'dropdown',
  ElDropdownItem: 'dropdown',
}

function elementPlusResolver(name: string) {
  if (!/^El[A-Z]/.test(name)) return undefined
  const folder = parents[name] ?? kebab(name.slice(2))
  return { name, from: `element-plus/es/components/${folder}/index.mjs` }
}

const at = (path: string) => fileURLToPath(new URL(path, import.meta.url))

export default defineConfig({
  root: at('./web'),
  plugins: [
    vue(),
    Components({ dts: false, dirs: [], resolvers: [{ type: 'component', resolve: elementPlusResolver }] }),
  ],
  build: { outDir: at('./web/dist'), emptyOutDir: true, manifest: true, target: 'es2023' },
  server: { proxy: { '/api': 'http://localhost:4600', '/healthz': 'http://localhost:4600' } },
  test: {
    reporters: ['default', at('./tests/support/closing-line.ts')],
    projects: [
      {
        extends: true,
        test: {
          name: 'node',
          root: at('.'),
          environment: 'node',
          include: ['tests/{unit,validation,arch}/**/*.test.ts'],
        },
      },
      {
        extends: true,
        test: {
          name: 'integration',
          root: at('.'),
          environment: 'node',
          include: ['tests/integration/**/*.test.ts'],
          testTimeout: 20_000,
          hookTimeout: 30_000,
        },
      },
      {
        extends: true,
        test: {
          name: 'component',
          root: at('.'),
          environment: 'happy-dom',
          include: ['tests/component/**/*.test.ts'],
          server: { deps: { inline: ['element-plus'] } },
        },
      },
      {
        extends: true,
        test: {
          name: 'e2e',
          root: at('.'),
          environment: 'node',
          include: ['tests/e2e/**/*.test.ts'],
          testTimeout: 120_000,
          hookTimeout: 60_000,
          fileParallelism: false,
        },
      },
    ],
  },
})
