/** Something the person at the keyboard can act on: its message is the one sentence they are shown. */
export class Trouble extends Error {}

/** The sentence for any failure; what we did not foresee keeps its stack, because only that helps then. */
export function sentenceFor(error) {
  if (error instanceof Trouble) return error.message
  if (error?.code === 'ENOSPC')
    return `The disk is full: ${error.path ?? 'nothing more can be written'}. Make room and start again.`
  if (error?.code === 'EACCES' || error?.code === 'EPERM')
    return `The right to use ${error.path ?? 'a file'} is missing. Start as the owner of this folder.`
  return error?.stack ?? String(error)
}
