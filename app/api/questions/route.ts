import { created } from '@/lib/http/answers'
import { endpoint } from '@/lib/http/endpoint'
import { readAsking } from '@/lib/questions/read-asking'
import { readQuestions } from '@/lib/questions/reads'
import { askForm, questionOutput, questionPage, questionsQuery } from '@/lib/questions/schema'
import { askQuestion } from '@/lib/questions/writes'

export const GET = endpoint(
  { summary: 'Questions, newest first or in the order of the queue', query: questionsQuery, output: questionPage },
  ({ actor, query }) => readQuestions(actor, query),
)

export const POST = endpoint(
  { summary: 'Ask a question', input: askForm, output: questionOutput, creates: true, read: readAsking },
  async ({ actor, input: { input, photos } }) => {
    const question = await askQuestion(actor, input, photos)
    return created(question, { location: `/api/questions/${question.id}`, edition: question.edition })
  },
)
