/** The id of every page's main part. */
export const contentId = 'content'

/** The first stop of the Tab key: past the bars. */
export function SkipLink() {
  return (
    <a
      href={`#${contentId}`}
      className="skip-link sr-only focus:not-sr-only focus:absolute focus:top-1 focus:left-1 focus:z-50 focus:border-[1.5px] focus:border-ink focus:bg-sheet focus:px-4 focus:py-2.5 focus:text-ink"
    >
      To the content
    </a>
  )
}
