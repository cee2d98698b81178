/** People of the demo who can be heard on camera. */
export type Speaker = 'nell' | 'tomasz' | 'imani' | 'sunniva'

/** A measurement said on camera, in the words of product.md. */
export type StoryReading = { quantity: string; value: number; unit: string; note?: string }

/** One spoken sentence. Each of its phrases becomes one stretch of sound and one cue, so the two cannot drift apart. */
export type Line = {
  /** The caption; ` | ` parts phrases where one cue would be too long to read. */
  text: string
  /** Only where the synthesiser would misread the caption: the same words, spelled for the ear. */
  voiced?: string
  /** Who speaks; the channel's owner when left out. */
  by?: Speaker
  /** A name by which questions and answers find this sentence. */
  key?: string
  reading?: StoryReading
  /** Silence after the sentence, milliseconds. */
  rest?: number
}

export type StoryChapter = { title: string; topics: string[]; scene: string; lines: Line[] }

export type StoryEpisode = {
  /** Names the film file and anchors questions; never shown. */
  key: string
  channel: string
  number: number
  title: string
  slug: string
  summary: string
  season: string
  /** Day of filming and day of publication, yyyy-mm-dd. */
  filmedOn: string
  publishedOn: string | null
  state: 'draft' | 'published' | 'withdrawn'
  /** Empty where there is no footage yet. */
  chapters: StoryChapter[]
}

/** A moment in an episode, by the sentence that is being said. */
export type Moment = { episode: string; line: string }

export type StoryQuestion = {
  key: string
  channel: string
  title: string
  body: string
  /** Index into the askers; further ones are asking too. */
  asker: string
  alsoAsking: string[]
  askedOn: string
  at: Moment | null
  crop: 'wheat' | 'maize' | 'soybean' | 'rice' | null
  stage: string | null
  state: 'new' | 'queued' | 'booked' | 'answered' | 'set-aside' | 'joined'
  /** set-aside: why. */
  reason?: string
  /** joined: into which question. */
  into?: string
  /** booked: for which episode. */
  bookedFor?: string
  /** answered: from the first sentence to the last, with the written answer. */
  answer?: { episode: string; from: string; to: string; text: string }
}

export type StagePeriod = { stage: string; from: string; to: string }
export type StoryPlanting = {
  channel: string
  season: string
  crop: 'wheat' | 'maize' | 'soybean' | 'rice'
  field: string
  acres: number
  plantedOn: string | null
  periods: StagePeriod[]
}
