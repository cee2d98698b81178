import { Button } from '@/components/ui/button'
import { Select } from '@/components/ui/select'
import { questionStates, stateWord } from '@/lib/questions/rules'
import { crops, cropWord } from '@/lib/topics/crops'

const states = [
  { value: 'open', label: 'Waiting for an answer' },
  ...questionStates.map((state) => ({ value: state, label: stateWord[state] })),
]

const sorts = [
  { value: 'urgency', label: 'Of use soon, to many' },
  { value: 'asking', label: 'Most people asking' },
  { value: 'newest', label: 'Newest' },
]

/** Sort and filters stand in the address, so that two people can look at the same queue. */
export function QueueFilters({ filter, action }: { filter: Record<string, string>; action: string }) {
  return (
    <form action={action} method="get" className="flex flex-wrap items-end gap-3">
      <Select label="Standing" name="state" defaultValue={filter.state} options={states} />
      <Select
        label="Crop"
        name="crop"
        empty="Any crop"
        defaultValue={filter.crop ?? ''}
        options={crops.map((crop) => ({ value: crop, label: cropWord(crop) }))}
      />
      <Select label="Order" name="sort" defaultValue={filter.sort} options={sorts} />
      <Button type="submit" variant="line">
        Show
      </Button>
    </form>
  )
}
