const entities: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' }

/** Text for an HTML element or a quoted attribute. */
export function escaped(text: string): string {
  return text.replace(/[&<>"']/g, (character) => entities[character] ?? character)
}

/** Plain text with its http(s) addresses as links; a full stop or bracket after an address is not part of it. */
export function linked(text: string): string {
  return text
    .split(/(https?:\/\/[^\s<>"']+)/g)
    .map((part, index) => {
      if (index % 2 === 0) return escaped(part)
      const after = /[.,;:!?)\]]+$/.exec(part)?.[0] ?? ''
      const address = escaped(part.slice(0, part.length - after.length))
      return `<a href="${address}" rel="noreferrer">${address}</a>${escaped(after)}`
    })
    .join('')
}

/** `1 Dec 2026, 11:20:45 UTC`: one zone for everybody, since a stand-in knows nobody's. */
export function received(iso: string): string {
  const date = new Date(iso)
  const day = date.toLocaleDateString('en-GB', { day: 'numeric', month: 'short', year: 'numeric', timeZone: 'UTC' })
  return `${day}, ${date.toLocaleTimeString('en-GB', { timeZone: 'UTC' })} UTC`
}
