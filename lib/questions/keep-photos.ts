import { randomUUID } from 'node:crypto'
import type { Transaction } from 'sequelize'
import { services } from '@/lib/services'
import { QuestionPhoto } from '@/models/question-photo'
import type { DrawnPhoto } from './redraw-photos'

export const photoPath = (name: string) => `photos/${name}`

/**
 * Keeps photos with a question. The bytes come first and the row after: a row never names bytes that are not there,
 * and bytes that lost their transaction are named by nobody.
 */
export async function keepPhotos(questionId: string, photos: readonly DrawnPhoto[], transaction: Transaction) {
  for (const { bytes, width, height } of photos) {
    const name = `${randomUUID()}.webp`
    await services().storage.put(photoPath(name), bytes)
    await QuestionPhoto.create({ questionId, name, width, height }, { transaction })
  }
}
