import { z } from 'zod'
import { line, paragraph } from '@/lib/episodes/schema'
import { pageQuery } from '@/lib/http/paging'
import { address } from '@/lib/people/schema'

const isTimeZone = (zone: string) => {
  try {
    return Boolean(new Intl.DateTimeFormat('en', { timeZone: zone }))
  } catch {
    return false
  }
}

export const channelInput = z.object({
  name: line(80),
  blurb: paragraph(400).default(''),
  timeZone: z.string().max(60).refine(isTimeZone, 'a time zone such as America/Chicago').default('UTC'),
  /** who is asked, by letter, to be its owner */
  owner: address,
})
export type ChannelInput = z.infer<typeof channelInput>

export const peopleQuery = pageQuery.extend({ q: z.string().trim().max(80).optional() })
export type PeopleQuery = z.infer<typeof peopleQuery>

export const personPatch = z.object({ disabled: z.boolean(), isAdmin: z.boolean() }).partial().strict()
export type PersonPatch = z.infer<typeof personPatch>
