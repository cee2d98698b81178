import { describe, expect, it } from 'vitest'
import { explainers } from '@/lib/handbook/content/explainers'
import { sources } from '@/lib/handbook/content/sources'
import { terms } from '@/lib/handbook/content/terms'
import { loadHandbook, type ShippedHandbook } from '@/lib/handbook/load-handbook'
import { readExplainer } from '@/lib/handbook/reads'
import { Claim } from '@/models/claim'
import { Explainer } from '@/models/explainer'
import { Source } from '@/models/source'
import { Term } from '@/models/term'
import { makeCaptions, makeChannel, makeEpisode, makeUser } from '../factories'
import { freshDatabase } from '../support/database'
import { waitingJobs } from '../support/jobs'

freshDatabase()

const shipped: ShippedHandbook = { sources, explainers, terms }

const term = (slug: string) => Term.findOne({ where: { slug }, rejectOnEmpty: true })
const explainer = (slug: string) => Explainer.findOne({ where: { slug }, rejectOnEmpty: true })

/** What would be shipped after somebody rewrote every definition and title. */
const rewritten: ShippedHandbook = {
  sources: sources.map((source) => ({ ...source, title: `${source.title}, second edition` })),
  explainers: explainers.map((each) => ({ ...each, title: `${each.title} Rewritten.` })),
  terms: terms.map((each) => ({ ...each, definition: `${each.definition} Rewritten.` })),
}

describe('loading the shipped handbook', () => {
  it('puts everything in, and tells search and the hearing of terms', async () => {
    const episode = await makeEpisode(await makeChannel())
    await makeCaptions(episode, [[0, 1000, 'A crown.']])
    expect(await loadHandbook()).toEqual({ terms: terms.length, explainers: explainers.length })
    expect(await waitingJobs('search.refresh')).toHaveLength(terms.length + explainers.length)
    expect((await waitingJobs('handbook.hear')).map(({ data }) => data)).toEqual([{ episodeId: episode.id }])
  })

  it('changes nothing when it runs again', async () => {
    const ids = async () => (await Term.findAll({ order: ['slug'] })).map(({ id, updatedAt }) => [id, updatedAt])
    const before = await ids()
    const jobs = (await waitingJobs()).length
    expect(await loadHandbook()).toEqual({ terms: 0, explainers: 0 })
    expect(await ids()).toEqual(before)
    expect((await waitingJobs()).length).toBe(jobs)
    expect(await Claim.count()).toBe(explainers.flatMap(({ claims }) => claims).length)
  })

  it('renews what nobody touched and leaves alone what a person edited or checked', async () => {
    const adviser = await makeUser()
    await (await term('crown')).update({ definition: 'Ours.' })
    await (await explainer('heat-units')).update({ title: 'Our heat units' })
    const { id: explainerId } = await explainer('shrink')
    await Claim.update(
      { checkedBy: adviser.id, checkedByName: adviser.name, checkedOn: '2026-12-01', verdict: 'differs' },
      { where: { explainerId, key: 'example-shrink' } },
    )
    await Source.update({ title: 'Mended title' }, { where: { key: 'nch-61' } })

    await loadHandbook(rewritten)

    expect((await term('crown')).definition).toBe('Ours.')
    expect((await term('stand')).definition).toMatch(/Rewritten\.$/)
    expect((await explainer('heat-units')).title).toBe('Our heat units')
    expect((await explainer('shrink')).title).not.toMatch(/Rewritten\.$/)
    expect((await explainer('counting-a-stand')).title).toMatch(/Rewritten\.$/)
    expect((await explainer('counting-a-stand')).edition).toBe(2)
    expect((await Source.findOne({ where: { key: 'nch-61' } }))?.title).toBe('Mended title')
    expect((await Source.findOne({ where: { key: 'psu-wheat-stand' } }))?.title).toMatch(/second edition$/)
  })

  it('lets an explainer fall due when its text or a figure changed after the check', async () => {
    await loadHandbook(shipped)
    expect((await readExplainer('counting-a-stand')).state).toBe('checked')
    const { id: explainerId } = await explainer('counting-a-stand')
    await Claim.update({ low: 22, high: 22 }, { where: { explainerId, key: 'row-stand' } })
    expect((await readExplainer('counting-a-stand')).state).toBe('due')
    expect((await readExplainer('heat-units')).state).toBe('due')
  })
})
