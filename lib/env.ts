import { z } from 'zod'

const schema = z.object({
  BASE_URL: z.url().default('http://localhost:3000'),
  DATABASE_URL: z.url(),
  NEXTAUTH_SECRET: z.string().min(32, 'at least 32 characters'),
  MEDIA_SECRET: z.string().min(32, 'at least 32 characters'),
  SMTP_URL: z.url().default('smtp://127.0.0.1:2525'),
  MAIL_FROM: z.string().default('Turnrow <letters@turnrow.example>'),
  SEARCH_URL: z.url().default('http://127.0.0.1:7700'),
  SEARCH_KEY: z.string().default('turnrow-local-search-key'),
  MEDIA_ROOT: z.string().default('.data/media'),
  FOOTAGE_MAX_BYTES: z.coerce
    .number()
    .int()
    .positive()
    .default(40 * 1024 ** 3),
  FOOTAGE_MAX_SECONDS: z.coerce
    .number()
    .int()
    .positive()
    .default(6 * 3600),
  LOG_LEVEL: z.enum(['trace', 'debug', 'info', 'warn', 'error', 'silent']).default('info'),
  NODE_ENV: z.enum(['development', 'production', 'test']).default('development'),
})

export type Env = z.infer<typeof schema>

let known: Env | undefined

/**
 * The settings of this process, checked once.
 * Lazy on purpose: `next build` loads every module without any setting present.
 * @throws Error that names each wrong variable.
 */
export function env(): Env {
  if (known) return known
  const read = schema.safeParse(process.env)
  if (!read.success) {
    const wrong = read.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`)
    throw new Error(`Settings are missing or wrong. See .env.example.\n  ${wrong.join('\n  ')}`)
  }
  return (known = read.data)
}
