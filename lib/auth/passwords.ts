import { hash, verify } from '@node-rs/argon2'

/** OWASP Password Storage: Argon2id, 19 MiB, 2 passes, 1 lane. */
const COST = { memoryCost: 19_456, timeCost: 2, parallelism: 1 }

/** Composed and decomposed letters look alike on a keyboard; both must open the same door. */
const normal = (password: string) => password.normalize('NFKC')

export const hashPassword = (password: string): Promise<string> => hash(normal(password), COST)

let decoy: Promise<string> | undefined

/** Checks a password. Without a stored hash it takes as long and says no, so that addresses cannot be guessed by the clock. */
export async function passwordFits(stored: string | null | undefined, password: string): Promise<boolean> {
  const against = stored ?? (await (decoy ??= hash('nobody has this password', COST)))
  const fits = await verify(against, normal(password)).catch(() => false)
  return fits && Boolean(stored)
}
