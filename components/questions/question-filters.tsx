import { Button } from '@/components/ui/button'
import { Select } from '@/components/ui/select'
import { crops, cropWord } from '@/lib/topics/crops'
import type { StateOffered } from './list-asked'

const states: { value: StateOffered; label: string }[] = [
  { value: 'waiting', label: 'Waiting for an answer' },
  { value: 'answered', label: 'Answered' },
  { value: 'all', label: 'All' },
]

type Props = {
  /** Left out on a channel's own page. */
  channels?: { slug: string; name: string }[]
  filter: Record<string, string>
  action: string
}

/** A plain form by GET: a narrowed list has an address that can be kept and sent. */
export function QuestionFilters({ channels, filter, action }: Props) {
  return (
    <form action={action} method="get" className="mb-5 flex flex-wrap items-end gap-3">
      {channels && (
        <Select
          label="Farm"
          name="channel"
          empty="Every farm"
          defaultValue={filter.channel ?? ''}
          options={channels.map(({ slug, name }) => ({ value: slug, label: name }))}
        />
      )}
      <Select label="Standing" name="state" defaultValue={filter.state} options={states} />
      <Select
        label="Crop"
        name="crop"
        empty="Any crop"
        defaultValue={filter.crop ?? ''}
        options={crops.map((crop) => ({ value: crop, label: cropWord(crop) }))}
      />
      <Button type="submit" variant="line">
        Show
      </Button>
    </form>
  )
}
