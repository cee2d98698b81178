export type NavLink = {
  href: string
  label: string
  /** As `aria-current` has it: the page itself, or a page inside that part. */
  current?: 'page' | 'true'
}

type Place = { href: string; label: string; exact?: boolean }

function marked({ href, label, exact }: Place, pathname: string): NavLink {
  if (pathname === href) return { href, label, current: 'page' }
  return { href, label, current: !exact && pathname.startsWith(`${href}/`) ? 'true' : undefined }
}

/** The channel that an address lies in, on its public side or at its desk; null elsewhere. */
export function channelOf(pathname: string): string | null {
  const [, part, slug] = pathname.split('/')
  if (part !== 'channels' && part !== 'desk') return null
  // The handbook's desk belongs to no farm.
  return slug && slug !== 'handbook' ? decodeURIComponent(slug) : null
}

/** The bar's links: a farm's own parts inside a farm, the parts of the whole site elsewhere. */
export function siteLinks(pathname: string): NavLink[] {
  const channel = channelOf(pathname)
  const base = `/channels/${channel}`
  const places: Place[] = channel
    ? [
        { href: base, label: 'Season', exact: true },
        { href: `${base}/episodes`, label: 'Episodes' },
        { href: `${base}/questions`, label: 'Questions' },
      ]
    : [
        { href: '/', label: 'Farms', exact: true },
        { href: '/questions', label: 'Questions' },
      ]
  return [...places, { href: '/handbook', label: 'Handbook' }].map((place) => marked(place, pathname))
}

/** The desk bar's links for one channel. */
export function deskLinks(pathname: string, slug: string, people: boolean): NavLink[] {
  const base = `/desk/${slug}`
  const places: Place[] = [
    { href: base, label: 'Today', exact: true },
    { href: `${base}/episodes`, label: 'Episodes' },
    { href: `${base}/questions`, label: 'Question queue' },
    { href: `${base}/season`, label: 'Season' },
  ]
  if (people) places.push({ href: `${base}/people`, label: 'People' })
  return places.map((place) => marked(place, pathname))
}
