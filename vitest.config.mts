import { fileURLToPath } from 'node:url'
import { defineConfig } from 'vitest/config'

const root = (path: string) => fileURLToPath(new URL(path, import.meta.url))

const resolve = {
  alias: [
    // Throws outside Next's bundler; here it stands for nothing.
    { find: /^server-only$/, replacement: root('./tests/support/server-only.ts') },
    { find: /^@\//, replacement: root('./') },
  ],
}

const files = (folder: string) => [`tests/${folder}/**/*.test.{ts,tsx,mjs}`]

export default defineConfig({
  test: {
    // A forgotten `.only` would let the rest pass unseen.
    allowOnly: false,
    projects: [
      // Long ropes throughout: a busy machine is not a failure.
      { resolve, test: { name: 'unit', include: files('unit'), testTimeout: 60_000, hookTimeout: 60_000 } },
      {
        resolve,
        test: {
          name: 'service',
          env: { LOG_LEVEL: 'silent' },
          include: files('service'),
          globalSetup: ['tests/support/global-database.ts'],
          testTimeout: 120_000,
          hookTimeout: 120_000,
        },
      },
      { resolve, test: { name: 'media', include: files('media'), testTimeout: 180_000, hookTimeout: 180_000 } },
    ],
  },
})
