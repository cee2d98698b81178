import type { Transaction } from 'sequelize'
import { db } from '@/lib/db'

const INDEX_LOCK = 727_003

/**
 * Held to the end of the transaction. A rebuild holds it alone: a change written into the old index while the new one
 * is being filled would be lost with the swap.
 */
export async function lockIndex(how: 'shared' | 'alone', transaction: Transaction): Promise<void> {
  const call = how === 'alone' ? 'pg_advisory_xact_lock' : 'pg_advisory_xact_lock_shared'
  // The search is waited for while the lock is held, and a rebuild can take its time.
  await db().query(`set local idle_in_transaction_session_timeout = '10min'`, { transaction })
  await db().query(`select ${call}($1)`, { bind: [INDEX_LOCK], transaction })
}

/**
 * Held to the end of the transaction. Two refreshes of one thing follow each other, so that the one which read the
 * older state cannot write last.
 */
export async function lockSource(source: string, transaction: Transaction): Promise<void> {
  await db().query(`select pg_advisory_xact_lock($1, hashtext($2))`, { bind: [INDEX_LOCK, source], transaction })
}
