import AxeBuilder from '@axe-core/playwright'
import { expect, test, type APIRequestContext, type Page } from '@playwright/test'

const address = '/channels/alder-fork/episodes/is-this-wheat-stand-worth-keeping'

type Episode = {
  title: string
  duration: number
  chapters: { start: number; end: number; title: string }[]
  questions: { title: string; followUp: { number: number; url: string; start: number } | null }[]
}

/** What the API says about the episode, so that no test knows the seconds of the demo by heart. */
async function readEpisode(request: APIRequestContext): Promise<Episode> {
  const list = await (await request.get('/api/channels/alder-fork/episodes')).json()
  const line = list.items.find((item: { url: string }) => item.url === address)
  return (await request.get(`/api/episodes/${line.id}`)).json()
}

const row = (page: Page) => page.getByRole('slider', { name: 'Place in the film' })
const spoken = (page: Page) => page.locator('#panel-spoken')
const filmAt = (page: Page) => page.locator('video').evaluate((film: HTMLVideoElement) => film.currentTime)
const chapterOf = (episode: Episode, at: number) => {
  const chapter = episode.chapters[at]
  if (!chapter) throw new Error(`the demo episode has no chapter ${at}`)
  return chapter
}

/** Opens the episode and waits until the page answers: its own controls come with its script. */
async function open(page: Page, query = '') {
  await page.goto(`${address}${query}`)
  await expect(page.getByRole('button', { name: 'Play', exact: true })).toBeVisible()
}

/** Everything that the browser complains about; a test that provokes a failure empties it. */
let complaints: string[] = []
test.beforeEach(({ page }) => {
  complaints = []
  page.on('console', (message) => message.type() === 'error' && complaints.push(message.text()))
  page.on('pageerror', (error) => complaints.push(error.message))
})
test.afterEach(() => expect(complaints).toEqual([]))

test('plays the film over HLS and says so in words', async ({ page }) => {
  const asked: string[] = []
  page.on('request', (request) => asked.push(new URL(request.url()).pathname))
  await open(page)
  expect(asked.some((path) => path.endsWith('.m3u8'))).toBe(false)
  await page.getByRole('button', { name: 'Play', exact: true }).click()
  await expect(page.getByRole('button', { name: 'Pause', exact: true })).toBeVisible()
  await expect.poll(() => filmAt(page)).toBeGreaterThan(1)
  expect(asked.some((path) => path.endsWith('master.m3u8'))).toBe(true)
  expect(asked.some((path) => path.endsWith('.m4s'))).toBe(true)
  await page.getByRole('button', { name: 'Pause', exact: true }).click()
  await expect(page.getByRole('button', { name: 'Play', exact: true })).toBeVisible()
})

test('seeks by the keyboard alone, and names the place and the chapter', async ({ page, request }) => {
  const episode = await readEpisode(request)
  await open(page)
  await row(page).focus()
  await page.keyboard.press('PageDown')
  const second = chapterOf(episode, 1)
  await expect(row(page)).toHaveAttribute('aria-valuetext', new RegExp(`of .+, ${second.title.replace('?', '\\?')}$`))
  await expect.poll(() => filmAt(page)).toBeCloseTo(second.start, 0)
  await page.keyboard.press('ArrowRight')
  await expect.poll(() => filmAt(page)).toBeCloseTo(second.start + 5, 0)
  await page.keyboard.press('Home')
  await expect(row(page)).toHaveAttribute('aria-valuenow', '0')
  await page.keyboard.press('End')
  await expect(row(page)).toHaveAttribute('aria-valuenow', String(Math.floor(episode.duration)))
})

test('opens a link to a second at that second, with its sentence ruled', async ({ page, request }) => {
  const { start } = chapterOf(await readEpisode(request), 1)
  await open(page, `?t=${start + 1}`)
  await expect(row(page)).toHaveAttribute('aria-valuenow', String(Math.floor(start + 1)))
  await expect.poll(() => filmAt(page)).toBeCloseTo(start + 1, 0)
  await expect(spoken(page).locator('[data-now]')).toBeInViewport()
  await expect(page.getByRole('link', { name: /^Ask Nell at \d+:\d\d$/ }).first()).toHaveAttribute(
    'href',
    new RegExp(`episode=.+&t=${Math.floor(start + 1)}$`),
  )
})

test('rules the sentence that is spoken, and seeks to a sentence that is clicked', async ({ page }) => {
  await open(page)
  const sentence = spoken(page).locator('[data-start]', { hasText: 'Count before you worry' })
  await sentence.click()
  await expect(sentence).toHaveAttribute('data-now', '')
  const start = Number(await sentence.getAttribute('data-start'))
  await expect.poll(() => filmAt(page)).toBeCloseTo(start, 0)
  await page.getByRole('button', { name: 'Play', exact: true }).click()
  await expect(sentence).not.toHaveAttribute('data-now', '', { timeout: 30_000 })
  await expect(spoken(page).locator('[data-now]')).toHaveCount(1)
})

test('leaves a reader alone who scrolls away, and follows again when asked', async ({ page, request }) => {
  const last = (await readEpisode(request)).chapters.length - 1
  await page.setViewportSize({ width: 1280, height: 700 })
  await open(page)
  await spoken(page).locator('p').first().hover()
  await page.mouse.wheel(0, 120)
  const follow = page.getByRole('button', { name: 'Follow the picture' })
  await expect(follow).toBeVisible()
  await page
    .getByRole('button', { name: chapterOf(await readEpisode(request), last).title })
    .first()
    .click()
  await follow.click()
  await expect(follow).toBeHidden()
  await expect(spoken(page).locator('[data-now]')).toBeInViewport()
})

test('opens the sheet of a term and gives the focus back', async ({ page }) => {
  await open(page)
  const term = spoken(page).locator('a[aria-haspopup="dialog"]').first()
  await term.focus()
  await page.keyboard.press('Enter')
  const sheet = page.getByRole('dialog')
  await expect(sheet).toBeVisible()
  await expect(sheet.getByRole('link', { name: 'Where it is said' })).toBeVisible()
  await page.keyboard.press('Escape')
  await expect(sheet).toBeHidden()
  await expect(term).toBeFocused()
})

test('turns from a question on the row to the second that answers it', async ({ page, request }) => {
  const question = (await readEpisode(request)).questions.find((one) => one.followUp)
  if (!question?.followUp) throw new Error('the demo episode has no answered question')
  await open(page)
  await page.getByRole('button', { name: new RegExp(`^Question at .*${question.title.replace('?', '\\?')}`) }).click()
  const turn = page.getByLabel('Chapters, readings and questions').getByRole('link')
  await expect(turn).toHaveAttribute('href', question.followUp.url)
  await turn.click()
  await expect(page).toHaveURL(new RegExp(`\\?t=${question.followUp.start}$`))
  await expect(row(page)).toHaveAttribute('aria-valuenow', String(Math.floor(question.followUp.start)))
  await expect(page.getByRole('heading', { name: 'This episode answers' })).toBeVisible()
})

test('finds words that are said and opens them', async ({ page }) => {
  await open(page)
  await page.getByRole('button', { name: 'Find in this episode' }).click()
  await page.getByLabel('Words said in this episode').fill('BROWN')
  const found = spoken(page).getByRole('search')
  await expect(found.getByRole('status')).toHaveText(/^\d+ places?$/)
  await found.getByRole('link').first().click()
  await expect(spoken(page).locator('[data-now]')).toContainText(/brown/i)
})

test('lets captions, speed and picture be chosen from lists', async ({ page }) => {
  await open(page)
  await page.getByLabel('Speed').selectOption('1.5')
  await page.getByLabel('Captions').selectOption('off')
  await page.getByLabel('Picture and data').selectOption('240')
  const film = page.locator('video')
  await expect.poll(() => film.evaluate((video: HTMLVideoElement) => video.playbackRate)).toBe(1.5)
  await expect
    .poll(() => film.evaluate((video: HTMLVideoElement) => [...video.textTracks].map((track) => track.mode)))
    .not.toContain('showing')
  await page.reload()
  await expect(page.getByLabel('Captions')).toHaveValue('off')
  await expect(page.getByLabel('Picture and data')).toHaveValue('240')
})

test('keeps the text usable when the film does not come through', async ({ page }) => {
  await page.route(/\/media\//, (route) => route.abort())
  await open(page)
  await page.getByRole('button', { name: 'Play', exact: true }).click()
  await expect(page.getByText('The film does not come through')).toBeVisible({ timeout: 60_000 })
  const sentence = spoken(page).locator('[data-start]', { hasText: 'Count before you worry' })
  await sentence.click()
  await expect(sentence).toHaveAttribute('data-now', '')
  expect(complaints.every((words) => words.includes('net::ERR_FAILED'))).toBe(true)
  complaints = []
})

test('answers with 404 for an episode that is not there', async ({ request }) => {
  expect((await request.get('/channels/alder-fork/episodes/no-such-episode')).status()).toBe(404)
})

test.describe('without JavaScript', () => {
  test.use({ javaScriptEnabled: false })

  test('there is the browser’s own player with captions, and the text with its links', async ({ page }) => {
    await page.goto(`${address}?t=10`)
    const film = page.locator('video')
    await expect(film).toBeVisible()
    await expect(film).toHaveAttribute('controls', '')
    await expect(film.locator('source')).toHaveAttribute('src', /plain\.mp4#t=10$/)
    await expect(film.locator('track[kind="captions"]').first()).toHaveAttribute('srclang', 'en')
    await expect(spoken(page)).toContainText('Count before you worry.')
    await expect(spoken(page).locator('a[href^="?t="]').first()).toBeVisible()
    await expect(page.locator('#panel-readings')).toBeVisible()
  })
})

test.describe('on a phone', () => {
  test.use({ viewport: { width: 360, height: 800 } })

  test('keeps the picture in view over tabs that work from the keyboard', async ({ page }) => {
    await open(page)
    await page.getByRole('tab', { name: /^As spoken/ }).focus()
    await page.keyboard.press('ArrowRight')
    await expect(page.getByRole('tabpanel', { name: /^Readings \d+$/ })).toBeVisible()
    await expect(spoken(page)).toBeHidden()
    await page.keyboard.press('Home')
    await expect(spoken(page)).toBeVisible()
    await page.evaluate(() => window.scrollTo(0, document.body.scrollHeight))
    await spoken(page).locator('p').last().scrollIntoViewIfNeeded()
    await expect(page.locator('video')).toBeInViewport()
  })

  for (const [width, height] of [
    [360, 800],
    [320, 256],
    [768, 1024],
  ] as const) {
    test(`scrolls one way only at ${width} by ${height}`, async ({ page }) => {
      await page.setViewportSize({ width, height })
      await open(page)
      expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(width)
    })
  }
})

for (const [scheme, width] of [
  ['light', 1280],
  ['dark', 1280],
  ['light', 360],
  ['dark', 360],
] as const) {
  test(`has nothing for axe to find, ${scheme} at ${width}`, async ({ page }) => {
    await page.emulateMedia({ colorScheme: scheme, reducedMotion: 'reduce' })
    await page.setViewportSize({ width, height: 900 })
    await open(page, '?t=12')
    await page.getByRole('button', { name: 'More' }).click()
    const { violations } = await new AxeBuilder({ page })
      .withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'])
      .analyze()
    expect(violations.map(({ id, nodes }) => `${id}: ${nodes.map((node) => node.target).join(', ')}`)).toEqual([])
  })
}
