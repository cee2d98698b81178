const seconds = (since) => `${((performance.now() - since) / 1000).toFixed(1)} s`
const quiet = 10_000

/** The last thing a program said, short enough for the end of a line. */
const tail = (text) =>
  text
    .replace(/\s+$/, '')
    .split(/[\r\n]/)
    .at(-1)
    ?.trim()
    .slice(0, 90) ?? ''

/**
 * Tells what is being done and how long it took. `work` gets `say`, to which a program's output may be fed:
 * its last line is shown every ten seconds, so that a slow step is never taken for a hung one.
 */
export async function step(title, work) {
  const since = performance.now()
  let detail = 'at work'
  console.log(`· ${title}`)
  const pulse = setInterval(() => console.log(`  … ${title.split(':')[0]}, ${seconds(since)}: ${detail}`), quiet)
  try {
    const answer = await work((text) => (detail = tail(text) || detail))
    console.log(`✓ ${title} (${seconds(since)})`)
    return answer
  } catch (error) {
    console.log(`✗ ${title} (${seconds(since)})`)
    throw error
  } finally {
    clearInterval(pulse)
  }
}
