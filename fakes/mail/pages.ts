import type { Letter } from './letter'
import { escaped, linked, received } from './text'

/** The frame of every page; it says first of all that no letter leaves this machine. */
function page(title: string, body: string): string {
  return `<!doctype html>
<html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width,initial-scale=1">
<title>${escaped(title)}</title><link rel="stylesheet" href="/style.css"></head>
<body><header><b>Stand-in mailbox</b>
<p>Every letter that Turnrow sends while it runs with its stand-ins lands here, whoever it is for. Nothing leaves this machine.</p></header>
<main>${body}</main></body></html>`
}

function row(letter: Letter): string {
  const copies = letter.copies > 1 ? ` · came ${letter.copies} times` : ''
  return `<li><a href="/letters/${letter.id}"><strong>${escaped(letter.subject || 'Without a subject')}</strong>
<span>${received(letter.receivedAt)}</span><span>to ${escaped(letter.to)}${copies}</span></a></li>`
}

function nothingHere(to: string): string {
  const whom = to ? `for ${escaped(to)} ` : ''
  return `<p class="none">No letter ${whom}yet. Ask for a sign-in link, or publish an episode that answers a question, and it will be listed here.</p>`
}

/** All letters, newest first, or those of one address. */
export function listPage(letters: Letter[], to: string): string {
  const heading = to ? `Letters to ${to}` : 'Letters'
  const list = letters.length > 0 ? `<ol>${letters.map(row).join('')}</ol>` : nothingHere(to)
  return page(
    heading,
    `<h1>${escaped(heading)}</h1>
<form class="find" method="get" action="/"><label>Only letters to this address
<input type="email" name="to" value="${escaped(to)}" autocomplete="off"></label><button>Show</button></form>
<div class="sheet">${list}</div>`,
  )
}

function facts(letter: Letter): string {
  const attached = letter.attachments.map(({ filename, bytes }) => `${filename} (${bytes} bytes)`).join(', ')
  const rows = [
    ['From', letter.from],
    ['To', letter.to],
    ['Received', received(letter.receivedAt)],
    ...(letter.copies > 1 ? [['Copies', `came ${letter.copies} times, kept once`]] : []),
    ...(attached ? [['Attached', attached]] : []),
  ]
  return `<dl>${rows.map(([name = '', value = '']) => `<dt>${name}</dt><dd>${escaped(value)}</dd>`).join('')}</dl>`
}

function headerLines(letter: Letter): string {
  return Object.entries(letter.headers)
    .flatMap(([name, value]) => [value].flat().map((line) => `${name}: ${line}`))
    .join('\n')
}

/** One letter: its words with links, its HTML in a frame that can run nothing and fetch nothing, its header lines. */
export function letterPage(letter: Letter): string {
  const asHtml = letter.html
    ? `<h2>As formatted</h2><iframe title="The letter as formatted" sandbox="allow-popups allow-popups-to-escape-sandbox" src="/letters/${letter.id}/formatted"></iframe>`
    : ''
  return page(
    letter.subject || 'Without a subject',
    `<p><a href="/">All letters</a> · <a href="/?to=${encodeURIComponent(letter.to)}">Letters to ${escaped(letter.to)}</a></p>
<h1>${escaped(letter.subject || 'Without a subject')}</h1>
<article class="sheet">${facts(letter)}<p class="words">${linked(letter.text)}</p>${asHtml}</article>
<details class="sheet"><summary class="none">Header lines as received</summary><pre class="lines">${escaped(headerLines(letter))}</pre></details>`,
  )
}

/** What stands where no letter does. */
export function missingPage(): string {
  return page(
    'No such letter',
    '<h1>No such letter</h1><p>It may have been cleared. <a href="/">See all letters</a>.</p>',
  )
}
