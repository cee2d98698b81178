import type { Speaker } from './types'

/** One password for every demo sign-in, printed by the start command; real installations never run the seed. */
export const demoPassword = 'turnrow-demo-2026'

type Member = { channel: string; role: 'owner' | 'editor' | 'adviser' }
export type StoryPerson = {
  key: string
  name: string
  email: string
  isAdmin?: true
  member?: Member
  signsIn: boolean
}

/** Invented people. Those who sign in are the ones listed for the visitor; the rest only ask. */
export const people: StoryPerson[] = [
  {
    key: 'nell',
    name: 'Nell Okafor-Byrne',
    email: 'nell@alderfork.example',
    member: { channel: 'alder-fork', role: 'owner' },
    signsIn: true,
  },
  {
    key: 'tomasz',
    name: 'Tomasz Reyl',
    email: 'tomasz@alderfork.example',
    member: { channel: 'alder-fork', role: 'editor' },
    signsIn: true,
  },
  {
    key: 'imani',
    name: 'Dr Imani Castellan',
    email: 'imani@alderfork.example',
    member: { channel: 'alder-fork', role: 'adviser' },
    signsIn: true,
  },
  {
    key: 'sunniva',
    name: 'Sunniva Palit',
    email: 'sunniva@terracenine.example',
    member: { channel: 'terrace-nine', role: 'owner' },
    signsIn: true,
  },
  { key: 'june', name: 'June Abara', email: 'june@reader.example', signsIn: true },
  { key: 'admin', name: 'Wren Halloway', email: 'admin@turnrow.example', isAdmin: true, signsIn: true },
  { key: 'osei', name: 'Osei Brandvold', email: 'osei@reader.example', signsIn: false },
  { key: 'pilar', name: 'Pilar Nakagawa', email: 'pilar@reader.example', signsIn: false },
  { key: 'dov', name: 'Dov Lindqvist', email: 'dov@reader.example', signsIn: false },
  { key: 'marisol', name: 'Marisol Ekwueme', email: 'marisol@reader.example', signsIn: false },
]

/** How each speaker sounds: one of Debian's flite voices, its pitch shifted and its pace stretched. */
export const voices: Record<Speaker, { voice: string; pitch: number; pace: number }> = {
  nell: { voice: 'slt', pitch: 1, pace: 1.04 },
  tomasz: { voice: 'rms', pitch: 1, pace: 1 },
  imani: { voice: 'slt', pitch: 0.82, pace: 1.1 },
  sunniva: { voice: 'slt', pitch: 1.14, pace: 1.08 },
}
