'use client'

import Link from 'next/link'
import { Button } from '@/components/ui/button'
import { useHydrated } from '@/components/ui/use-hydrated'
import { useDeskMove } from '@/lib/questions/hooks'
import { stateWord } from '@/lib/questions/rules'
import type { LikenessView } from '@/lib/questions/views'

/** Questions that sound the same; this one can be joined to any of them. */
export function SameQuestion({ id, alike }: { id: string; alike: LikenessView[] }) {
  const join = useDeskMove(id)
  const hydrated = useHydrated()
  if (alike.length === 0) return null
  return (
    <section aria-labelledby="same" className="border-t border-rule-2 pt-3">
      <h3 id="same">Sounds like the same question</h3>
      <ul className="ruled mt-1">
        {alike.map((other) => (
          <li key={other.url} className="flex flex-wrap items-center justify-between gap-x-4 py-2">
            <span>
              <Link href={`?question=${other.id}`} scroll={false}>
                {other.title}
              </Link>{' '}
              <span className="text-sm text-ink-3">
                {other.asking} asking · {other.state && stateWord[other.state]}
              </span>
            </span>
            <Button
              variant="quiet"
              disabled={!hydrated}
              busy={join.isPending && 'Joining'}
              onClick={() => join.mutate({ move: 'join', body: { into: other.id } })}
            >
              Join to this one
            </Button>
          </li>
        ))}
      </ul>
      {join.error && <p className="text-sm font-semibold text-fault">{join.error.detail}</p>}
    </section>
  )
}
