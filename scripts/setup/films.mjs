import { setTimeout as sleep } from 'node:timers/promises'
import { Trouble } from './trouble.mjs'

const patienceMinutes = 15

async function ask(url) {
  const answer = await fetch(url, { signal: AbortSignal.timeout(20_000) })
  if (!answer.ok) throw new Trouble(`${url} answered ${answer.status}.`)
  return answer.json()
}

/** How many published episodes there are, and the titles of those whose film cannot be watched yet. */
async function lookAtFilms(baseUrl) {
  const { items: channels } = await ask(`${baseUrl}/api/channels`)
  const lists = channels.map(({ slug }) => ask(`${baseUrl}/api/channels/${slug}/episodes?limit=100`))
  const lines = (await Promise.all(lists)).flatMap(({ items }) => items)
  const episodes = await Promise.all(lines.map(({ id }) => ask(`${baseUrl}/api/episodes/${id}`)))
  return { all: episodes.length, waiting: episodes.filter(({ film }) => !film).map(({ title }) => title) }
}

/**
 * Waits until the worker has drawn and encoded every published film, however slow the machine, as long as they keep
 * coming. Throws Trouble with the titles that never came.
 */
export async function waitForFilms(house, baseUrl, say) {
  let [left, since] = [Infinity, performance.now()]
  while (!house.stopping) {
    const { all, waiting } = await lookAtFilms(baseUrl)
    if (waiting.length === 0) return
    if (waiting.length < left) [left, since] = [waiting.length, performance.now()]
    if (performance.now() - since > patienceMinutes * 60_000)
      throw new Trouble(`For ${patienceMinutes} minutes no film came for: ${waiting.join(', ')}.`)
    say(`${all - waiting.length} of ${all} films`)
    await sleep(1000)
  }
}
