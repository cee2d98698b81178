'use client'

import Link from 'next/link'
import { useDeferredValue } from 'react'
import { TimeCode } from '@/components/ui/time-code'
import { useAlike } from '@/lib/questions/hooks'
import { stateWord } from '@/lib/questions/rules'
import type { LikenessView } from '@/lib/questions/views'
import { AskingToo } from './asking-too'

function Passages({ passages }: { passages: LikenessView[] }) {
  if (passages.length === 0) return null
  return (
    <section aria-labelledby="on-film">
      <h2 id="on-film">Already on film</h2>
      <ul className="ruled mt-2">
        {passages.map(({ url, title, snippet, start }) => (
          <li key={url} className="py-2.5">
            <Link href={url} target="_blank">
              {title}
              {start !== undefined && (
                <>
                  {' at '}
                  <TimeCode seconds={start} />
                </>
              )}
            </Link>
            {snippet && <p className="text-sm text-ink-2">{snippet}</p>}
          </li>
        ))}
      </ul>
    </section>
  )
}

function Questions({ questions, signedIn }: { questions: LikenessView[]; signedIn: boolean }) {
  if (questions.length === 0) return null
  return (
    <section aria-labelledby="asked-before">
      <h2 id="asked-before">Asked before</h2>
      <ul className="ruled mt-2">
        {questions.map(({ id = '', url, title, state = 'new', asking = 0 }) => (
          <li key={id} className="py-2.5">
            <Link href={url} target="_blank">
              {title}
            </Link>
            <p className="text-sm text-ink-3">
              {stateWord[state]} · {asking} asking
            </p>
            {signedIn && state !== 'answered' && <AskingToo id={id} />}
          </li>
        ))}
      </ul>
    </section>
  )
}

/** What looks like the question that is being written. Without an answer from the server it is simply not there. */
export function AlikeList({ channel, text, signedIn }: { channel: string; text: string; signedIn: boolean }) {
  // Typing goes first; the look-up follows when there is time.
  const { data = [] } = useAlike(channel, useDeferredValue(text))
  const passages = data.filter(({ kind }) => kind === 'passage')
  const questions = data.filter(({ kind }) => kind === 'question')
  return (
    <div className="grid content-start gap-6" aria-live="polite">
      <Passages passages={passages} />
      <Questions questions={questions} signedIn={signedIn} />
    </div>
  )
}
