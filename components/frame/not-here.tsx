import { ButtonLink } from '@/components/ui/button'
import { PageHead } from './page-head'
import { SearchForm } from './search-form'

/** Nothing at this address, or nothing that this person may see: the two are told in the same words on purpose. */
export function NotHere({ signedIn }: { signedIn: boolean }) {
  return (
    <div className="page">
      <PageHead
        eyebrow="Not found"
        title="Nothing is open to you at this address"
        lead={`It leads nowhere, or to something private. It may have been withdrawn by its farm, or the link may have lost its end.${signedIn ? '' : ' If it is your own, sign in and try again.'}`}
        actions={
          <>
            {!signedIn && (
              <ButtonLink href="/sign-in" variant="line">
                Sign in
              </ButtonLink>
            )}
            <ButtonLink href="/">See the farms</ButtonLink>
          </>
        }
      />
      <div className="on-dark mt-2 max-w-measure bg-loam p-4">
        <SearchForm withButton />
      </div>
    </div>
  )
}
