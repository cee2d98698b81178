const people = [
  ['nell@alderfork.example', 'owner of Alder Fork Farm'],
  ['tomasz@alderfork.example', 'editor there'],
  ['imani@alderfork.example', 'adviser there'],
  ['sunniva@terracenine.example', 'owner of Terrace Nine'],
  ['june@reader.example', 'viewer'],
  ['admin@turnrow.example', 'site admin'],
]

/** What the person at the keyboard needs once everything is up. */
export function welcome({ baseUrl, owns, mailPagePort, demo, isNew, dataDir }, seconds) {
  const signIns = [
    '',
    'Demo sign-ins, password turnrow-demo-2026:',
    ...people.map(([who, role]) => `  ${who.padEnd(30)} ${role}`),
  ]
  return [
    '',
    `Turnrow is ready at ${baseUrl} (after ${seconds} s)`,
    ...(owns.mail ? [`Letters it sends are at http://localhost:${mailPagePort}`] : []),
    ...(isNew ? ['The worker is drawing the films of the demo; they come in one by one.'] : []),
    `Logs are in ${dataDir}/logs`,
    ...(demo ? signIns : []),
    '',
    'Ctrl-C stops everything.',
  ].join('\n')
}
