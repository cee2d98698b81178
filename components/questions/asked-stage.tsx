import { StageTag } from '@/components/ui/tag'
import type { QuestionView } from '@/lib/questions/views'
import { cropWord } from '@/lib/topics/crops'
import { topicByCode } from '@/lib/topics/rules'

/** The stage a question is about: pattern and word in lists, the whole label where there is room. */
export function AskedStage({ question, whole }: { question: Pick<QuestionView, 'crop' | 'stage'>; whole?: boolean }) {
  const { crop, stage } = question
  const topic = stage ? topicByCode(stage) : null
  if (!topic?.stage) return crop ? <span>{cropWord(crop)}</span> : null
  const bbch = topic.bbch ? ` (BBCH ${topic.bbch})` : ''
  return <StageTag stage={topic.stage} crop={topic.crop ?? crop} word={whole ? `${topic.label}${bbch}` : undefined} />
}
