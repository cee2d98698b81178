/** Encodes one film in a process of its own, so that a test can kill it. Arguments: source, folder. */
import { encodeFilm } from '@/media/encode'
import { inspectFilm } from '@/media/inspect'

async function main(source: string, folder: string): Promise<void> {
  const found = await inspectFilm(source)
  if (!found.ok) throw new Error(found.reason)
  process.stdout.write('begun\n')
  await encodeFilm({
    source,
    film: found.film,
    folder,
    language: 'en',
    onProgress: (done) => process.stdout.write(`${done}\n`),
  })
}

const [source = '', folder = ''] = process.argv.slice(2)
void main(source, folder)
