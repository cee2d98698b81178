import type { ComponentProps } from 'react'
import { Select } from '@/components/ui/select'
import { crops, cropWord } from '@/lib/topics/crops'
import { topicByCode, topics } from '@/lib/topics/rules'

const principal = topics.filter(({ kind, bbch }) => kind === 'stage' && bbch?.length === 1)

const groups = crops.map((crop) => ({
  label: cropWord(crop),
  options: [
    { value: crop, label: `${cropWord(crop)}, any stage` },
    ...principal.filter((topic) => topic.crop === crop).map(({ code, label }) => ({ value: code, label })),
  ],
}))

/** The chapter may be filed under a two-digit stage, which then stands first. */
function fromChapter(code: string | null) {
  const topic = code ? topicByCode(code) : null
  if (!topic || topic.bbch?.length !== 2) return []
  return [{ value: topic.code, label: `${topic.label} (BBCH ${topic.bbch})` }]
}

type Props = Omit<ComponentProps<typeof Select>, 'options' | 'label'> & { filledIn: string | null }

/** Crop and stage in one choice. */
export function AboutChoice({ filledIn, ...rest }: Props) {
  return (
    <Select
      {...rest}
      name="about"
      label="Crop and stage"
      empty="No one crop"
      options={[...fromChapter(filledIn), { value: 'soil', label: 'Soil and seedbed, before sowing' }, ...groups]}
    />
  )
}
