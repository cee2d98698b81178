import { inTransaction } from '@/lib/db'
import { env } from '@/lib/env'
import { enqueue } from '@/lib/jobs/queue'
import { services } from '@/lib/services'
import { inspectFilm, type Film } from '@/media/inspect'
import { Footage } from '@/models/footage'
import { beginAttempt, failFootage, settleFailure } from './attempts'
import { encodeFootage } from './jobs'
import { uploadName } from './writes'

/** Job body: a received file becomes a film to encode, or a refusal that says what to do. */
export async function inspectFootageById({ footageId }: { footageId: string }): Promise<void> {
  const footage = await beginAttempt(footageId, 'inspecting')
  if (!footage) return
  try {
    const path = services().storage.localPath(uploadName(footageId))
    const found = await inspectFilm(path, { durationS: env().FOOTAGE_MAX_SECONDS })
    if (found.ok) await goOnToEncoding(footageId, found.film)
    else await failFootage(footage, 'inspecting', found)
  } catch (failure) {
    await settleFailure(footage, 'inspecting', failure)
  }
}

const goOnToEncoding = (footageId: string, film: Film) =>
  inTransaction(async (transaction) => {
    const [changed] = await Footage.update(
      { state: 'encoding', step: null, progress: 0, attempt: 0, film: { ...film, preview: null } },
      { where: { id: footageId, state: 'inspecting' }, transaction },
    )
    if (changed > 0) await enqueue(encodeFootage, { footageId }, { transaction, key: footageId })
  })
