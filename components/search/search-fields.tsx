import { Button, ButtonLink } from '@/components/ui/button'
import { TextField } from '@/components/ui/field'
import { Select, type SelectGroup, type SelectOption } from '@/components/ui/select'
import { isNarrowed, searchHref } from '@/lib/search/address-rules'
import { cropChoices, plainChoices, stageChoices, topicChoices } from '@/lib/search/choice-rules'
import { LONGEST_QUERY, type SearchQuery, type SearchResult } from '@/lib/search/schema'

type Narrow = {
  name: keyof SearchQuery & string
  label: string
  empty: string
  options: (SelectOption | SelectGroup)[]
}

function narrowing(query: SearchQuery, facets: SearchResult['facets'] | null, names: Record<string, string>): Narrow[] {
  return [
    { name: 'crop', label: 'Crop', empty: 'Any crop', options: cropChoices(facets, query.crop) },
    { name: 'stage', label: 'Stage', empty: 'Any stage', options: stageChoices(facets, query) },
    { name: 'job', label: 'Field job', empty: 'Any job', options: topicChoices('job', facets, query.job) },
    {
      name: 'subject',
      label: 'Subject',
      empty: 'Any subject',
      options: topicChoices('subject', facets, query.subject),
    },
    { name: 'season', label: 'Season', empty: 'Any year', options: plainChoices(facets?.season, query.season) },
    {
      name: 'channel',
      label: 'Farm',
      empty: 'Any farm',
      options: plainChoices(facets?.channel, query.channel, (slug) => names[slug] ?? slug),
    },
  ]
}

type SearchFieldsProps = {
  query: SearchQuery
  /** How many there are of each choice; null while nothing was counted. */
  facets: SearchResult['facets'] | null
  channelNames: Record<string, string>
}

/** Words and choices. A form that is sent by GET: the address says what is shown, and no script is needed. */
export function SearchFields({ query, facets, channelNames }: SearchFieldsProps) {
  // Uncontrolled fields keep what was typed when the address changes under them; the key makes them anew.
  return (
    <form key={searchHref(query)} action="/search" method="get" role="search" className="sheet mb-5 p-4 md:px-5">
      {query.kind && <input type="hidden" name="kind" value={query.kind} />}
      <div className="flex flex-wrap items-end gap-x-3 gap-y-3">
        <TextField
          label="Words"
          type="search"
          name="q"
          maxLength={LONGEST_QUERY}
          defaultValue={query.q}
          autoComplete="off"
          className="grow basis-40"
        />
        <Button type="submit">Find</Button>
      </div>
      <div className="mt-4 grid grid-cols-2 gap-x-3 gap-y-3 md:grid-cols-3 xl:grid-cols-6">
        {narrowing(query, facets, channelNames).map(({ name, label, empty, options }) => (
          <Select
            key={name}
            name={name}
            label={label}
            empty={empty}
            options={options}
            defaultValue={query[name] ?? ''}
          />
        ))}
      </div>
      {isNarrowed(query) && (
        <ButtonLink href={searchHref({ q: query.q, limit: query.limit })} variant="quiet" className="mt-3 -ml-2">
          Take all choices back
        </ButtonLink>
      )}
    </form>
  )
}
