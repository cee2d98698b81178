'use client'

import { useRouter } from 'next/navigation'
import { useEffect } from 'react'
import { Progress } from '@/components/ui/progress'
import type { FootageView } from '@/lib/footage/views'

/** Often enough to be watched, seldom enough for a poor line. */
const lookAgainMs = 5000

/** Where the picture will be while there is none: what is being made of the footage, and how far that is. */
export function FilmPlace({ footage }: { footage: FootageView | null }) {
  const router = useRouter()
  const beingMade = footage !== null && footage.state !== 'failed' && footage.state !== 'ready'
  useEffect(() => {
    if (!beingMade) return
    const again = setInterval(() => document.visibilityState === 'visible' && router.refresh(), lookAgainMs)
    return () => clearInterval(again)
  }, [beingMade, router])
  return (
    <div className="grid aspect-video min-h-56 w-full place-items-center border border-rule bg-mist p-4">
      <div className="w-full max-w-md border border-rule bg-sheet p-4">
        {beingMade ? (
          <Progress
            value={footage.state === 'receiving' ? null : footage.progress}
            label={makingWords[footage.state] ?? 'The film is being made'}
            detail={footage.step ?? 'The text beside it can be read already.'}
          />
        ) : (
          <>
            <p className="font-semibold">{footage ? 'No film could be made of this footage' : 'No film yet'}</p>
            <p className="mt-1 text-sm text-ink-2">
              {footage?.error?.detail ?? 'The picture will be here once footage is added at the desk.'}
            </p>
          </>
        )}
      </div>
    </div>
  )
}

const makingWords: Partial<Record<FootageView['state'], string>> = {
  receiving: 'The footage is still coming in',
  inspecting: 'The footage is being looked over',
  encoding: 'The film is being made',
}
