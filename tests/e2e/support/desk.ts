import { expect, type Page } from '@playwright/test'
import { demoPassword } from '@/lib/demo/story/people'
import { topicByCode } from '@/lib/topics/rules'
import { writeTime } from '@/lib/times/parse'
import type { Clip } from './clips'

/** On a slow machine the worker may have the demo's own films before this one. */
const filmTimeout = 10 * 60_000

export async function signIn(page: Page, email: string, next: string): Promise<void> {
  await page.goto(`/sign-in?callbackUrl=${encodeURIComponent(next)}`)
  await page.getByLabel('E-mail address').fill(email)
  await page.getByLabel('Password').fill(demoPassword)
  await page.getByRole('main').getByRole('button', { name: 'Sign in', exact: true }).click()
  await page.waitForURL((url) => url.pathname === next, { timeout: 60_000 })
}

/** Begins an episode at the desk of the demo's farm. Returns the address of its footage step. */
export async function beginEpisode(page: Page, title: string): Promise<string> {
  await page.goto('/desk/alder-fork/episodes')
  await page.getByLabel('Working title').fill(title)
  await page.getByLabel('Filmed on').fill('2026-11-28')
  await page.getByRole('button', { name: 'New episode' }).click()
  await page.waitForURL(/\/episodes\/[^/]+\/footage$/, { timeout: 60_000 })
  return new URL(page.url()).pathname
}

export const step = (page: Page, name: string) =>
  page.getByRole('navigation', { name: 'Steps of this episode' }).getByRole('link', { name: new RegExp(`^${name}`) })

export async function goToStep(page: Page, name: string): Promise<void> {
  await step(page, name).click()
  await expect(step(page, name)).toHaveAttribute('aria-current', 'step', { timeout: 60_000 })
}

/** Sends the film from the browser and waits until the worker has made all of its sizes. */
export async function sendFilm(page: Page, clip: Clip): Promise<void> {
  await page.getByLabel('Choose a film').setInputFiles(clip.path)
  await expect(page.getByText('The film is ready.')).toBeVisible({ timeout: filmTimeout })
}

/** Sets the clip's chapters: each is started, given its second and title, and filed. */
export async function setChapters(page: Page, { chapters, sheet }: Clip): Promise<void> {
  await goToStep(page, 'Chapters')
  for (const [index, chapter] of chapters.entries()) {
    await page.getByRole('button', { name: 'Start a chapter here' }).click()
    // A new one stands where the film stands, at the start, before those that were moved on from there.
    const row = page.getByRole('list', { name: 'Chapters' }).getByRole('listitem', { name: `Chapter ${index + 1}` })
    await row.getByLabel('Starts').fill(writeTime((sheet.chapters[index]?.startMs ?? 0) / 1000))
    await row.getByLabel('Title').fill(chapter.title)
    // It takes over the topics of the chapter it is cut from.
    const chips = row.getByRole('list', { name: 'Topics, chosen' }).getByRole('button')
    while ((await chips.count()) > 0) await chips.first().click()
    for (const code of chapter.topics) await fileUnder(page, index + 1, code)
  }
  await page.getByRole('button', { name: 'Save chapters' }).click()
  await expect(step(page, 'Chapters')).toContainText(`${chapters.length} set and filed`)
}

async function fileUnder(page: Page, number: number, code: string): Promise<void> {
  const label = topicByCode(code)?.label ?? code
  const row = page.getByRole('listitem', { name: `Chapter ${number}` })
  await row.getByRole('combobox', { name: 'Topics' }).fill(label.replace(':', ''))
  // "Harvest" must not take "Wheat: harvested BBCH 99", which stands above it.
  await row.getByRole('option', { name: new RegExp(`^${label}( BBCH \\d+)?$`) }).click()
  await expect(row.getByRole('button', { name: `Remove ${label}` })).toBeVisible()
  await row.getByRole('combobox', { name: 'Topics' }).press('Escape')
}

export async function bringCaptions(page: Page, name: string, text: string): Promise<void> {
  await page.getByLabel('Caption file').setInputFiles({ name, mimeType: 'text/vtt', buffer: Buffer.from(text) })
  await page.getByRole('button', { name: 'Bring this file' }).click()
}

/** Publishes from the last step. */
export async function publish(page: Page): Promise<void> {
  await goToStep(page, 'Publish')
  await page.getByRole('button', { name: 'Publish now' }).click()
  await expect(page.getByText(/^Published since/)).toBeVisible({ timeout: 60_000 })
}
