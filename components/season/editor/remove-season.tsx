'use client'

import { useRouter } from 'next/navigation'
import { useState } from 'react'
import { Button } from '@/components/ui/button'
import { Dialog } from '@/components/ui/dialog'
import { Notice } from '@/components/ui/notice'
import { ApiProblem } from '@/lib/http/client'
import { useDeleteSeason } from '@/lib/seasons/hooks'

type RemoveSeasonProps = { channel: string; year: number; edition: number }

/** Takes a season off the board, after one more look. */
export function RemoveSeason({ channel, year, edition }: RemoveSeasonProps) {
  const router = useRouter()
  const remove = useDeleteSeason(channel, year)
  const [open, setOpen] = useState(false)
  const confirm = () =>
    remove.mutate(edition, {
      onSuccess: () => {
        setOpen(false)
        router.push(`/desk/${channel}/season`)
        router.refresh()
      },
    })
  return (
    <Dialog
      open={open}
      onOpenChange={setOpen}
      trigger={<Button variant="quiet">Take the {year} season off the board</Button>}
      title={`Take the ${year} season off the board?`}
      description="Its lanes and the days of their stages are gone for good. Episodes stay; a season with episodes filed under it cannot be taken off."
      closeLabel="Keep it"
    >
      {remove.isError && (
        <Notice tone="failed" title="The season is still there" className="mb-4">
          {remove.error instanceof ApiProblem ? remove.error.detail : 'It did not come through. Try again.'}
        </Notice>
      )}
      <Button onClick={confirm} busy={remove.isPending && 'Taking it off'}>
        Take it off
      </Button>
    </Dialog>
  )
}
