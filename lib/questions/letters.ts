import { timeCode } from '@/lib/times/rules'

/** A letter's words; who gets it and under which key is the business of whoever posts it. */
export type LetterWords = { subject: string; text: string; html: string }

/** Text of people into HTML of ours. */
const escaped = (text: string) => text.replace(/[&<>"']/g, (sign) => `&#${sign.charCodeAt(0)};`)

type Paragraph = string | { link: string; words: string }

const asText = (paragraph: Paragraph) =>
  typeof paragraph === 'string' ? paragraph : `${paragraph.words}:\n${paragraph.link}`

const asHtml = (paragraph: Paragraph) =>
  typeof paragraph === 'string'
    ? `<p style="white-space:pre-line">${escaped(paragraph)}</p>`
    : `<p><a href="${escaped(paragraph.link)}">${escaped(paragraph.words)}</a></p>`

const letter = (subject: string, paragraphs: Paragraph[]): LetterWords => ({
  subject,
  text: `${paragraphs.map(asText).join('\n\n')}\n`,
  html: `<!doctype html><html lang="en"><body style="font:17px/1.5 sans-serif;color:#1b1a17;max-width:38em">${paragraphs
    .map(asHtml)
    .join('')}</body></html>`,
})

type Answered = {
  name: string
  /** the question in the words of whoever gets the letter */
  asked: string
  askedIt: boolean
  title: string
  channel: string
  episode: { number: number; title: string }
  /** seconds of the episode */
  start: number
  text: string
  watchUrl: string
  questionUrl: string
}

/** "Your question came back": where it is answered, to the second. */
export function answeredLetter(about: Answered): LetterWords {
  const { name, asked, askedIt, title, channel, episode, start, text, watchUrl, questionUrl } = about
  const joined = asked === title ? [] : [`It went together with the question “${title}”.`]
  const at = timeCode(start)
  return letter(`Answered at ${at}: ${asked}`, [
    `Hello ${name},`,
    `${askedIt ? 'You asked' : 'You are also asking'}: “${asked}”`,
    ...joined,
    `${channel} answers it in episode ${episode.number}, “${episode.title}”, at ${at}.`,
    { link: watchUrl, words: `Watch the answer at ${at}` },
    `In short: ${text}`,
    { link: questionUrl, words: 'Say whether that answers it, or what is still missing' },
    'You get this letter because you are asking this question on Turnrow. On its page you can stop asking.',
  ])
}

type AsksDetail = { name: string; title: string; channel: string; message: string; questionUrl: string }

/** The desk needs to know more before it can answer. */
export const detailLetter = ({ name, title, channel, message, questionUrl }: AsksDetail): LetterWords =>
  letter(`${channel} asks about your question: ${title}`, [
    `Hello ${name},`,
    `You asked: “${title}”`,
    `Before it can be answered, ${channel} would like to know:`,
    message,
    { link: questionUrl, words: 'Your question' },
  ])

type ForAdviser = { name: string; title: string; body: string; channel: string; note: string; deskUrl: string }

/** The desk would like an adviser's word on a question. */
export const adviserLetter = ({ name, title, body, channel, note, deskUrl }: ForAdviser): LetterWords =>
  letter(`For your advice: ${title}`, [
    `Hello ${name},`,
    `${channel} asks for your advice on a viewer’s question: “${title}”`,
    ...(body ? [body] : []),
    ...(note ? [`The desk adds: ${note}`] : []),
    { link: deskUrl, words: 'The question at the desk' },
  ])
