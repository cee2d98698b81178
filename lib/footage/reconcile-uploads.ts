import { Op } from 'sequelize'
import { now } from '@/lib/clock'
import { inTransaction } from '@/lib/db'
import { enqueue } from '@/lib/jobs/queue'
import { log } from '@/lib/log'
import { services } from '@/lib/services'
import { Footage } from '@/models/footage'
import { encodeFootage, inspectFootage } from './jobs'
import { finishFootage, forgetUpload, uploadName } from './writes'

/** Work that has said nothing for this long has no job any more: progress is written twice a second while it has one. */
const silentMinutes = 15

/** Job body, every minute. Each part is safe to run at any time and beside itself. */
export async function reconcileFootage(): Promise<void> {
  await finishArrived()
  await forgetExpired()
  await askAgain()
}

/** All bytes there, but the web died before it could say so. */
async function finishArrived(): Promise<void> {
  for (const { id, bytes } of await Footage.findAll({ where: { state: 'receiving' } })) {
    const stored = await services().storage.stat(uploadName(id))
    if (stored?.bytes !== bytes) continue
    if (await finishFootage(id)) log.info({ footageId: id }, 'upload finished by the reconciler')
  }
}

async function forgetExpired(): Promise<void> {
  const expired = await Footage.findAll({ where: { state: 'receiving', expiresAt: { [Op.lt]: now() } } })
  for (const { id } of expired) await forgetUpload(id)
}

async function askAgain(): Promise<void> {
  const before = new Date(now().getTime() - silentMinutes * 60_000)
  const silent = { state: ['inspecting', 'encoding'], updatedAt: { [Op.lt]: before } }
  for (const footage of await Footage.findAll({ where: silent })) {
    await inTransaction(async (transaction) => {
      // Touched, so that it is asked for once and not every minute.
      await Footage.update({ updatedAt: now() }, { where: { id: footage.id }, transaction })
      const job = footage.state === 'encoding' ? encodeFootage : inspectFootage
      await enqueue(job, { footageId: footage.id }, { transaction, key: footage.id })
    })
  }
}
