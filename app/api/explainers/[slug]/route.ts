import { readExplainer } from '@/lib/handbook/reads'
import { explainerOutput, slugParams } from '@/lib/handbook/schema'
import { tagged } from '@/lib/http/answers'
import { endpoint } from '@/lib/http/endpoint'

export const GET = endpoint(
  { summary: 'An explainer with its claims and their sources', params: slugParams, output: explainerOutput },
  async ({ params }) => {
    const explainer = await readExplainer(params.slug)
    return tagged(explainer, explainer.edition)
  },
)
