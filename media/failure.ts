/**
 * Why work on a film stopped. The class decides what happens next: `invalid` and `limit` are for the owner to act on and are
 * never tried again; `interrupted` and `disk-full` are ours and are tried again; `cancelled` was asked for.
 */
export type FailureClass = 'invalid' | 'limit' | 'interrupted' | 'disk-full' | 'cancelled'

export class MediaFailure extends Error {
  override readonly name = 'MediaFailure'

  /** `code` is stable and short, `reason` is a sentence for the owner, `technical` is for the log alone. */
  constructor(
    readonly kind: FailureClass,
    readonly code: string,
    readonly reason: string,
    readonly technical: string = '',
  ) {
    super(technical ? `${code}: ${technical}` : code)
  }

  /** True where another try of the same bytes can end no other way. */
  get isPermanent(): boolean {
    return this.kind === 'invalid' || this.kind === 'limit'
  }
}

const full = /No space left on device|ENOSPC|Disk quota exceeded/i
const tooBig = /Cannot allocate memory|File size limit exceeded|exited with code 15[23]|SIGXFSZ|SIGXCPU/i
const killed = /killed with signal|exited with code (13[0-9]|14[0-3])/i

/** Reads what ffmpeg left behind (exit line and last words on stderr) into a failure. What names no other cause is the film's fault. */
export function failureOf(exit: string, lastWords: string): MediaFailure {
  const technical = `${exit}\n${lastWords}`.trim().slice(-2000)
  if (full.test(technical)) return diskFull(technical)
  if (tooBig.test(technical)) {
    return new MediaFailure(
      'limit',
      'too-heavy',
      'Working on this film took more memory, time or room than one film may. Export it at 1080p and send it again.',
      technical,
    )
  }
  if (killed.test(exit)) {
    return new MediaFailure(
      'interrupted',
      'interrupted',
      'Work on this film was interrupted. It will be tried again.',
      technical,
    )
  }
  return new MediaFailure(
    'invalid',
    'unreadable',
    'The picture in this file could not be read to its end. Copy it from the camera again, or export it as MP4, and send that.',
    technical,
  )
}

export function diskFull(technical: string): MediaFailure {
  return new MediaFailure(
    'disk-full',
    'disk-full',
    'There is no room left to work on this film. What you sent is safe; work goes on when there is room.',
    technical,
  )
}

export function cancelled(): MediaFailure {
  return new MediaFailure('cancelled', 'cancelled', 'Work on this film was stopped.')
}
