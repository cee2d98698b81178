import { Button, ButtonLink } from '@/components/ui/button'
import { Select, type SelectGroup } from '@/components/ui/select'
import { crops, cropWord } from '@/lib/topics/crops'
import { topics } from '@/lib/topics/rules'
import { stageWord } from '@/lib/topics/stage-words'
import type { EpisodeFilter } from './filter-asked'

const cropOptions = crops.map((crop) => ({ value: crop, label: cropWord(crop) }))

/** Principal stages only: a two-digit code is what a chapter is filed under, not what one looks for first. */
const stageOptions: (SelectGroup | { value: string; label: string })[] = [
  { value: 'soil', label: stageWord('soil') },
  ...crops.map((crop) => ({
    label: cropWord(crop),
    options: topics.flatMap(({ code, crop: own, bbch, stage }) =>
      own === crop && bbch?.length === 1 && stage ? [{ value: code, label: stageWord(stage, crop) }] : [],
    ),
  })),
]

const optionsOf = (kind: 'job' | 'subject') =>
  topics.filter((topic) => topic.kind === kind).map(({ code, label }) => ({ value: code, label }))

type EpisodeFiltersProps = { years: number[]; filter: EpisodeFilter; action: string }

/** Narrows a list of episodes. A form that is sent by GET: the address says what is shown, and no script is needed. */
export function EpisodeFilters({ years, filter, action }: EpisodeFiltersProps) {
  const seasons = years.map((year) => ({ value: String(year), label: String(year) }))
  const narrowed = Object.values(filter).some(Boolean)
  return (
    <form action={action} method="get" aria-label="Narrow the list" className="sheet mb-5 p-4 md:px-5">
      <div className="grid grid-cols-2 gap-4 md:grid-cols-3 lg:grid-cols-5">
        <Select label="Season" name="season" empty="Any" options={seasons} defaultValue={filter.season ?? ''} />
        <Select label="Crop" name="crop" empty="Any" options={cropOptions} defaultValue={filter.crop ?? ''} />
        <Select label="Stage" name="stage" empty="Any" options={stageOptions} defaultValue={filter.stage ?? ''} />
        <Select label="Field job" name="job" empty="Any" options={optionsOf('job')} defaultValue={filter.job ?? ''} />
        <Select
          label="Subject"
          name="subject"
          empty="Any"
          options={optionsOf('subject')}
          defaultValue={filter.subject ?? ''}
        />
      </div>
      <div className="mt-4 flex flex-wrap gap-2.5">
        <Button type="submit" variant="line">
          Show these
        </Button>
        {narrowed && (
          <ButtonLink href={action} variant="quiet">
            Show all
          </ButtonLink>
        )}
      </div>
    </form>
  )
}
