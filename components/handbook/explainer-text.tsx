import Markdown, { type Components } from 'react-markdown'
import { weaveClaims } from '@/lib/handbook/rules'
import type { ClaimView } from '@/lib/handbook/views'

/** The page's own title is the only h1, and the text stands under it. */
const components: Components = { h1: 'h2' }

/**
 * An explainer's Markdown, set for reading; figures come from its claims. Raw HTML is left out, addresses that are not
 * http(s), mailto or of this page are emptied (react-markdown's own rule), pictures are not fetched from elsewhere.
 */
export function ExplainerText({ body, claims }: { body: string; claims: ClaimView[] }) {
  return (
    <div className="prose">
      <Markdown skipHtml disallowedElements={['img']} components={components}>
        {weaveClaims(body, claims)}
      </Markdown>
    </div>
  )
}
