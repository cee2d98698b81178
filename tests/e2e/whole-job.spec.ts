import { expect, test, type BrowserContext, type Page } from '@playwright/test'
import { timeCode } from '@/lib/times/rules'
import { type Clip, removeClip, secondsOf, stubbleClip, volunteersClip } from './support/clips'
import { beginEpisode, bringCaptions, goToStep, publish, sendFilm, setChapters, signIn, step } from './support/desk'
import { lettersTo, theLetter } from './support/mailbox'

// The whole job in its order, each test going on where the last one stopped: a film goes in, a chaptered lesson comes
// out, a question comes back answered at its second, a student finds it, and what is withdrawn is gone.
test.describe.configure({ mode: 'serial' })
test.setTimeout(15 * 60_000)
// A press that never lands is told within the minute, not when the whole test is over.
test.use({ actionTimeout: 60_000, navigationTimeout: 60_000 })

const run = Date.now().toString(36)
const titles = { first: `After the combine ${run}`, second: `Volunteers and mats ${run}` }
const question = `How thick a mat can a drill ride over? ${run}`
const answer = 'If you cannot see the soil through it, spread it before you drill.'

const contexts: BrowserContext[] = []
const clips: Clip[] = []
let nell: Page
let june: Page
let anybody: Page
let first: Clip
let second: Clip
let watchUrl = ''
let firstDesk = ''
let secondDesk = ''

/** What the browsers complain about, but for the answers that a test asks for on purpose. */
const complaints: string[] = []
const provoked = /status of (404|422)/

async function person(contextOf: () => Promise<BrowserContext>): Promise<Page> {
  const context = await contextOf()
  contexts.push(context)
  const page = await context.newPage()
  page.on('pageerror', (error) => complaints.push(error.message))
  page.on('console', (message) => {
    if (message.type() === 'error' && !provoked.test(message.text())) complaints.push(message.text())
  })
  return page
}

test.beforeAll(async ({ browser }) => {
  const fresh = () => browser.newContext({ viewport: { width: 1280, height: 900 } })
  nell = await person(fresh)
  june = await person(fresh)
  anybody = await person(fresh)
  first = await stubbleClip()
  second = await volunteersClip()
  clips.push(first, second)
})
test.afterAll(async () => {
  for (const context of contexts) await context.close()
  for (const clip of clips) await removeClip(clip)
})
test.afterEach(() => expect(complaints).toEqual([]))

/** The place at which the film stands, in whole seconds, as the row says it. */
const place = (page: Page) =>
  page
    .getByRole('slider', { name: 'Place in the film' })
    .getAttribute('aria-valuenow')
    .then((value) => Number(value))

const expectPlace = async (page: Page, seconds: number) => {
  await expect.poll(() => place(page), { timeout: 60_000 }).toBeGreaterThanOrEqual(Math.floor(seconds))
  expect(await place(page)).toBeLessThanOrEqual(Math.ceil(seconds))
}

test('the owner signs in, begins an episode and sends a film, which the worker makes in several sizes', async () => {
  await signIn(nell, 'nell@alderfork.example', '/desk/alder-fork/episodes')
  firstDesk = await beginEpisode(nell, titles.first)
  await sendFilm(nell, first)
  const sizes = nell.getByRole('table', { name: 'Sizes that are ready' }).getByRole('row')
  expect(await sizes.count()).toBeGreaterThanOrEqual(3)
  await expect(step(nell, 'Footage')).toContainText(timeCode(first.sheet.durationMs / 1000))
})

test('the owner sets chapters and files them under a stage, jobs and the soil', async () => {
  await setChapters(nell, first)
  await nell.reload()
  await expect(step(nell, 'Chapters')).toContainText('2 set and filed')
})

test('a broken caption file is refused by its lines, and a sound one is taken', async () => {
  await goToStep(nell, 'Captions')
  await bringCaptions(nell, 'broken.vtt', 'WEBVTT\n\n00:00:01.000 -> 00:00:03.000\nThe arrow is too short\n')
  await expect(nell.getByText('Nothing was changed.')).toBeVisible()
  await expect(nell.getByText('line 3', { exact: true })).toBeVisible()
  await bringCaptions(nell, 'stubble.vtt', first.captions)
  await expect(nell.getByText(`${first.sheet.cues.length} lines read.`)).toBeVisible()
})

test('nothing is published before its cautions are confirmed, and then it is there for anybody', async () => {
  await goToStep(nell, 'Publish')
  await expect(nell.getByRole('button', { name: 'Publish now' })).toBeDisabled()
  const preview = await nell.getByRole('link', { name: 'See it as it will be' }).getAttribute('href')
  watchUrl = preview ?? ''
  await anybody.goto(watchUrl)
  await expect(anybody.getByRole('heading', { name: 'Nothing is open to you at this address' })).toBeVisible()
  await goToStep(nell, 'Walk-round')
  await nell.getByRole('button', { name: 'I have read them and they fit what is shown' }).click()
  await expect(nell.getByText('Confirmed.')).toBeVisible()
  await publish(nell)
  await anybody.goto(watchUrl)
  await expect(anybody.getByRole('heading', { level: 1, name: titles.first })).toBeVisible()
})

test('a viewer asks at the second she watches, with crop and stage filled in from the chapter', async () => {
  const at = Math.ceil(secondsOf(first, 'mat').start)
  const path = `${watchUrl}?t=${at}`
  await signIn(june, 'june@reader.example', watchUrl)
  await june.goto(path)
  await june.getByRole('link', { name: `Ask Nell at ${timeCode(at)}` }).click()
  await expect(june.getByLabel('Crop and stage')).toHaveValue('wheat-99')
  await june.getByLabel('Your question in one line').fill(question)
  await june.getByRole('button', { name: 'Send the question' }).click()
  await expect(june.getByRole('heading', { level: 1, name: question })).toBeVisible({ timeout: 60_000 })
  await expect(june.getByRole('link', { name: new RegExp(`at ${timeCode(at)}$`) })).toBeVisible()
})

test('the owner queues the question and books it for a second episode', async () => {
  secondDesk = await beginEpisode(nell, titles.second)
  await nell.goto('/desk/alder-fork/questions')
  await nell.getByRole('link', { name: question }).click()
  await expect(nell.getByRole('heading', { name: question })).toBeVisible()
  await nell.getByRole('button', { name: 'Put in the queue' }).click()
  await expect(nell.getByRole('article', { name: question }).getByText('In the queue').first()).toBeVisible()
  const label = await nell.getByLabel('Answer it in').getByRole('option', { name: titles.second }).textContent()
  await nell.getByLabel('Answer it in').selectOption({ label: label ?? '' })
  await nell.getByRole('button', { name: /^Book for episode/ }).click()
  await expect(nell.getByRole('link', { name: /^Give its answer on episode/ })).toBeVisible()
})

test('the second episode is made, and answers with a range and a few words', async () => {
  await nell.goto(secondDesk)
  await sendFilm(nell, second)
  await setChapters(nell, second)
  await goToStep(nell, 'Captions')
  await bringCaptions(nell, 'volunteers.vtt', second.captions)
  await expect(nell.getByText(`${second.sheet.cues.length} lines read.`)).toBeVisible()
  await nell.goto(secondDesk.replace(/footage$/, 'answers'))
  const form = nell.getByRole('form', { name: question })
  await form.getByLabel('Answer starts').fill(String(secondsOf(second, 'question').start))
  await form.getByLabel('Answer ends').fill(String(secondsOf(second, 'answer').end))
  await form.getByLabel('The answer in a few words').fill(answer)
  await form.getByRole('button', { name: 'Save the answer' }).click()
  await expect(form.getByText('Saved.')).toBeVisible()
  expect((await lettersTo('june@reader.example')).filter(({ subject }) => subject.includes(question))).toEqual([])
  await publish(nell)
})

test('the letter opens the follow-up at the very second, and both ends show the turn', async () => {
  const letter = await theLetter('june@reader.example', question)
  const { start } = secondsOf(second, 'question')
  expect(letter.text).toContain(answer)
  const link = letter.text.match(/https?:\S+\?t=[\d.]+/)?.[0] ?? ''
  expect(Number(new URL(link).searchParams.get('t'))).toBeCloseTo(start, 1)
  await june.goto(link)
  await expect(june.getByRole('heading', { level: 1, name: titles.second })).toBeVisible()
  await expectPlace(june, start)

  await anybody.goto(letter.text.match(/https?:\S+\/questions\/\S+/)?.[0] ?? '')
  await expect(anybody.getByText(answer).first()).toBeVisible()
  const turn = anybody.getByRole('link', { name: new RegExp(`${titles.second} at ${timeCode(start)}`) })
  await turn.click()
  await expectPlace(anybody, start)
  await anybody.goto(watchUrl)
  const pin = anybody.getByRole('button', { name: /^Question at .+ Answered in/ })
  await expect(pin).toHaveCount(1)
})

const search = () => anybody.getByRole('main').getByRole('search')
/** What was found in the first episode, as links that name their second. */
const found = () =>
  anybody
    .getByRole('main')
    .getByRole('listitem')
    .filter({ hasText: titles.first })
    .getByRole('link', { name: /opens at/ })

/** The index follows a little later; a visitor would press Find again. */
const findUntilThere = () =>
  expect(async () => {
    await search().getByRole('button', { name: 'Find' }).click()
    await expect(found().first()).toBeVisible({ timeout: 5_000 })
  }).toPass({ timeout: 120_000 })

test('a student finds the passage by its words and lands on its second', async () => {
  await anybody.goto('/search')
  await search().getByLabel('Words').fill('residue windrow')
  await findUntilThere()
  await found().first().click()
  await expect(anybody.getByRole('heading', { level: 1, name: titles.first })).toBeVisible()
  expect(await place(anybody)).toBeLessThanOrEqual(Math.ceil(secondsOf(first, 'windrow').start))
})

test('a student finds the passage by crop and stage, and lands on the start of its chapter', async () => {
  await anybody.goto('/search')
  await search().getByLabel('Crop', { exact: true }).selectOption('wheat')
  await search().getByRole('button', { name: 'Find' }).click()
  await expect(anybody).toHaveURL(/crop=wheat/)
  await search().getByLabel('Stage', { exact: true }).selectOption('wheat-99')
  await findUntilThere()
  const chapter = first.chapters[0]?.title ?? ''
  await found().filter({ hasText: chapter }).first().click()
  await expect(anybody.getByRole('heading', { level: 1, name: titles.first })).toBeVisible()
  await expectPlace(anybody, 0)
})

test('what is withdrawn is gone from its address and from the search at once', async () => {
  await nell.goto(firstDesk.replace(/footage$/, 'publish'))
  await nell.getByRole('button', { name: 'Withdraw' }).click()
  await expect(nell.getByText('Withdrawn. Nobody outside this desk can see it.')).toBeVisible()
  await anybody.goto(watchUrl)
  await expect(anybody.getByRole('heading', { name: 'Nothing is open to you at this address' })).toBeVisible()
  await anybody.goto('/search?q=residue+windrow')
  await expect(search()).toBeVisible()
  await expect(found()).toHaveCount(0)
})
