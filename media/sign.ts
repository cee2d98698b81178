import { createHmac, timingSafeEqual } from 'node:crypto'

/**
 * A token for everything under one folder, to be put INTO the path: relative addresses in a playlist then keep it, which a
 * query would not. Form: `<expiry, seconds base 36>.<HMAC-SHA256, base64url>`.
 */
export function signFolder(folder: string, expiresAt: Date, secret: string): string {
  const expiry = Math.floor(expiresAt.getTime() / 1000).toString(36)
  return `${expiry}.${digest(folder, expiry, secret)}`
}

/** True when the token was made for this very folder and has not run out. */
export function opensFolder(token: string, folder: string, at: Date, secret: string): boolean {
  const [expiry = '', given = '', ...rest] = token.split('.')
  if (rest.length > 0 || !/^[0-9a-z]{1,10}$/.test(expiry)) return false
  const expected = Buffer.from(digest(folder, expiry, secret))
  const offered = Buffer.from(given)
  if (expected.length !== offered.length || !timingSafeEqual(expected, offered)) return false
  return Number.parseInt(expiry, 36) * 1000 > at.getTime()
}

/** The purpose is part of what is signed, so that no other token made with the same secret opens a film. */
const digest = (folder: string, expiry: string, secret: string) =>
  createHmac('sha256', secret).update(`turnrow media folder\n${folder}\n${expiry}`).digest('base64url')
