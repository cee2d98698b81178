import type { ReactNode } from 'react'

type PageHeadProps = {
  title: ReactNode
  /** Where this stands: farm, season, number, date. */
  eyebrow?: ReactNode
  /** One or two plain sentences under the title. */
  lead?: ReactNode
  /** The page's own actions, the main one last. */
  actions?: ReactNode
}

/** The head of a page: where it stands, its title, what can be done. */
export function PageHead({ title, eyebrow, lead, actions }: PageHeadProps) {
  return (
    <div className="flex flex-wrap items-end justify-between gap-x-8 gap-y-4 pt-5 pb-4 md:pt-7 md:pb-5">
      <div className="max-w-measure min-w-0">
        {eyebrow && <p className="eyebrow mb-1.5">{eyebrow}</p>}
        <h1>{title}</h1>
        {lead && <div className="mt-2.5 text-ink-2">{lead}</div>}
      </div>
      {actions && <div className="no-print flex flex-wrap items-center gap-2.5">{actions}</div>}
    </div>
  )
}
