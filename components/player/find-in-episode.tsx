'use client'

import { useDeferredValue, useId, useMemo, useState } from 'react'
import type { Sentence } from '@/lib/captions/rules'
import { timeCode } from '@/lib/times/rules'
import { placesOf } from './find-rules'
import { TimeLink } from './time-link'

/** More than this nobody reads through; a longer word finds less. */
const mostShown = 40

type FindInEpisodeProps = { sentences: Sentence[]; onGo: () => void }

/** Finds words in what is said; each place opens at its second. */
export function FindInEpisode({ sentences, onGo }: FindInEpisodeProps) {
  const [query, setQuery] = useState('')
  const asked = useDeferredValue(query)
  const places = useMemo(() => placesOf(sentences, asked), [sentences, asked])
  const field = useId()
  const shown = places.slice(0, mostShown)
  return (
    <div role="search" className="border-b border-rule px-4 py-3 lg:px-5.5 print:hidden">
      <label htmlFor={field} className="block text-sm font-semibold">
        Words said in this episode
      </label>
      <input
        id={field}
        type="search"
        autoFocus
        autoComplete="off"
        value={query}
        onChange={(event) => setQuery(event.target.value)}
        className="mt-1 min-h-11 w-full border-[1.5px] border-edge bg-sheet px-3"
      />
      <p role="status" className="mt-1.5 text-sm text-ink-3">
        {countWords(asked, places.length)}
      </p>
      {shown.length > 0 && (
        <ul className="ruled max-h-60 overflow-y-auto">
          {shown.map(({ sentence, from, to }) => {
            const said = sentences[sentence]
            if (!said) return null
            return (
              <li key={`${sentence}-${from}`}>
                <TimeLink at={said.start} onGo={onGo} className="flex gap-3 py-2 text-ink no-underline hover:underline">
                  <span className="font-mono text-sm text-ink-3 tabular-nums">{timeCode(said.start)}</span>
                  <span className="min-w-0 text-sm">
                    {said.text.slice(0, from)}
                    <mark className="bg-act-tint font-semibold text-ink">{said.text.slice(from, to)}</mark>
                    {said.text.slice(to)}
                  </span>
                </TimeLink>
              </li>
            )
          })}
        </ul>
      )}
    </div>
  )
}

function countWords(query: string, count: number): string {
  if (query.trim() === '') return 'Type a word to see where it is said.'
  if (count === 0) return 'Not said in this episode.'
  if (count > mostShown) return `${count} places; the first ${mostShown} are listed.`
  return count === 1 ? '1 place' : `${count} places`
}
