import type { NextConfig } from 'next'

/** Headers that every answer carries; media, embeds and pages narrow or widen them where they are served. */
const everywhere = [
  { key: 'X-Content-Type-Options', value: 'nosniff' },
  { key: 'Referrer-Policy', value: 'strict-origin-when-cross-origin' },
  { key: 'Cross-Origin-Opener-Policy', value: 'same-origin' },
  { key: 'Permissions-Policy', value: 'camera=(), microphone=(), geolocation=()' },
]

const config: NextConfig = {
  poweredByHeader: false,
  // Tests build beside a running copy, so the folder can be named from outside.
  distDir: process.env.NEXT_DIST_DIR ?? '.next',
  // `npm test` checks all types in a step of its own; a slip in a test must not keep the product from starting.
  typescript: { ignoreBuildErrors: true },
  // Sequelize asks for drivers by name at run time; bundled, it asks for pg-hstore and fails.
  serverExternalPackages: ['sequelize', 'pg-boss', 'fluent-ffmpeg', '@tus/server', '@tus/file-store', 'multer'],
  headers: async () => [{ source: '/:path*', headers: everywhere }],
  agentRules: false,
}

export default config
