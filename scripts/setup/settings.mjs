import { existsSync } from 'node:fs'
import path from 'node:path'
import { Trouble } from './trouble.mjs'

/** The project's folder. */
export const root = path.resolve(import.meta.dirname, '..', '..')

function portFrom(from, name, fallback) {
  const port = Number(from[name] || fallback)
  if (Number.isInteger(port) && port > 0 && port < 65536) return port
  throw new Trouble(`${name} must be a port number between 1 and 65535, not "${from[name]}".`)
}

/** Reads `.env` beside package.json; what the shell has set wins. */
export function loadEnvFile(folder = root) {
  const file = path.join(folder, '.env')
  if (existsSync(file)) process.loadEnvFile(file)
}

/**
 * What the commands themselves decide from the environment: ports, folders, and which stand-ins are ours to start.
 * An address that was given (DATABASE_URL, SMTP_URL, SEARCH_URL) means that a real service is there.
 */
export function settingsFrom(from, folder = root) {
  const port = portFrom(from, 'PORT', 3000)
  return {
    root: folder,
    dataDir: path.resolve(folder, from.DATA_DIR || '.data'),
    host: from.HOST || '127.0.0.1',
    port,
    baseUrl: (from.BASE_URL || `http://localhost:${port}`).replace(/\/+$/, ''),
    databasePort: portFrom(from, 'DATABASE_PORT', 5544),
    mailSmtpPort: portFrom(from, 'MAIL_SMTP_PORT', 2525),
    mailPagePort: portFrom(from, 'MAIL_PAGE_PORT', 2580),
    searchPort: portFrom(from, 'SEARCH_PORT', 7700),
    distDir: from.NEXT_DIST_DIR || '.next',
    owns: { database: !from.DATABASE_URL, mail: !from.SMTP_URL, search: !from.SEARCH_URL },
    demo: from.DEMO ? from.DEMO === 'yes' : !from.DATABASE_URL,
  }
}

/** The environment every part of the product gets; `url` is the database's address, `secrets` come from the data folder. */
export function environmentFor(settings, from, url, secrets) {
  const { baseUrl, dataDir, mailSmtpPort, mailPagePort, searchPort, distDir } = settings
  return {
    SEARCH_KEY: secrets.SEARCH_KEY,
    NEXTAUTH_SECRET: secrets.NEXTAUTH_SECRET,
    MEDIA_SECRET: secrets.MEDIA_SECRET,
    MEDIA_ROOT: path.join(dataDir, 'media'),
    SMTP_URL: `smtp://127.0.0.1:${mailSmtpPort}`,
    SEARCH_URL: `http://127.0.0.1:${searchPort}`,
    ...withoutEmpty(from),
    DATABASE_URL: url,
    BASE_URL: baseUrl,
    NEXTAUTH_URL: baseUrl,
    NEXT_DIST_DIR: distDir,
    NEXT_TELEMETRY_DISABLED: '1',
    MAIL_SMTP_PORT: String(mailSmtpPort),
    MAIL_PAGE_PORT: String(mailPagePort),
    SEARCH_PORT: String(searchPort),
    DATA_DIR: dataDir,
    MAIL_DIR: path.join(dataDir, 'mail'),
    SEARCH_DIR: path.join(dataDir, 'search'),
    // Marks everything we start, whatever becomes of us: see leftovers.mjs.
    TURNROW_HOME: dataDir,
  }
}

const withoutEmpty = (from) => Object.fromEntries(Object.entries(from).filter(([, value]) => value !== ''))
