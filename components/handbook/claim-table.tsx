import { classNames } from '@/components/ui/class-names'
import { fullDay } from '@/lib/dates/rules'
import { claimAnchor, claimWords, figure } from '@/lib/handbook/rules'
import type { ClaimView } from '@/lib/handbook/views'
import { SourceWords } from './source-words'

/** Every checkable statement of an explainer as a ruled note: its figure, where it is from, and who found what, when. */
export function ClaimTable({ claims }: { claims: ClaimView[] }) {
  return (
    <ul className="ruled">
      {claims.map((claim) => (
        <ClaimNote key={claim.key} claim={claim} />
      ))}
    </ul>
  )
}

function ClaimNote({ claim }: { claim: ClaimView }) {
  const value = figure(claim)
  return (
    <li id={claimAnchor(claim.key)} className="scroll-mt-4 px-3 py-3.5 target:bg-mist">
      {value && (
        <p className="mb-1 flex flex-wrap items-baseline gap-x-2.5">
          <span className="figure text-xl">{value}</span>
          {claim.quantity && <span className="text-xs text-ink-3">{claim.quantity}</span>}
        </p>
      )}
      <p className="text-sm">{claim.statement}</p>
      <ClaimSource claim={claim} />
      <p className={classNames('mt-1 text-sm', claim.verdict === 'agrees' ? 'text-act' : 'text-ink-2 italic')}>
        {claimWords(claim)}
        {claim.checkedOn && (
          <>
            {`. Held against it ${claim.checkedBy ? `by ${claim.checkedBy} ` : ''}on `}
            <time dateTime={claim.checkedOn}>{fullDay(claim.checkedOn)}</time>
          </>
        )}
      </p>
      {claim.note && <p className="mt-1 text-sm text-ink-2">{claim.note}</p>}
    </li>
  )
}

function ClaimSource({ claim: { source, locator, verdict } }: { claim: ClaimView }) {
  if (!source) return null
  return (
    <p className="mt-1 text-sm wrap-anywhere text-ink-2">
      {/* Without a verdict the source is where to look, not what it was held against. */}
      {verdict ? '' : 'To be held against: '}
      <SourceWords source={source} />
      {locator && ` · ${locator}`}
    </p>
  )
}
