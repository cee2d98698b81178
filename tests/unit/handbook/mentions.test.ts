import { describe, expect, it } from 'vitest'
import { terms } from '@/lib/handbook/content/terms'
import { markTerms } from '@/lib/handbook/rules'

/** Marks one sentence said in a chapter on `crop`, and gives back what was marked as "words → slug". */
function marked(text: string, crop: string | null = null): string[] {
  const [mentions = []] = markTerms([{ start: 0, end: 4, text }], [{ start: 0, topics: [{ crop }] }], terms)
  return mentions.map(({ from, to, slug }) => `${text.slice(from, to)} → ${slug}`)
}

describe('a term in what is said', () => {
  it.each([
    // Inflections, case, hyphens, possessives.
    ['The wheat was barely tillering.', ['tillering → tillering']],
    ['It tillered well, and the tillers live.', ['tillered → tillering']],
    ['Tillers first.', ['Tillers → tillering']],
    ['Past the headland, toss the hoop.', ['headland → headland']],
    ['Both headlands are packed.', ['headlands → headland']],
    ['The headland’s clods are hard.', ['headland → headland', 'clods → clod']],
    ['A plant is one CROWN, not one stem.', ['CROWN → crown']],
    ['We drilled on Monday.', ['drilled → drill']],
    ['Drilling into dust.', ['Drilling → drill']],
    ['It emerged in nine days.', ['emerged → emergence']],
    ['We no-till the beans.', ['no-till → no-till']],
    ['We no till the beans.', ['no till → no-till']],
    ['The seed-bed is fine.', ['seed-bed → seedbed']],
    ['Two flag leaves out.', ['flag leaves → flag-leaf']],
    ['It was irrigated twice.', ['irrigated → irrigation']],
    ['Do not let it lodge.', ['lodge → lodging']],
    // Synonyms and regional names.
    ['At PI the ring is green.', ['PI → panicle-initiation']],
    ['A hardpan stops roots.', ['hardpan → plow-pan']],
    ['The plough pan is six inches down.', ['plough pan → plow-pan']],
    ['Add the heat units up.', ['heat units → growing-degree-day']],
    ['That is 120 GDDs.', ['GDDs → growing-degree-day']],
    ['Chisel ploughs run deep.', ['Chisel ploughs → chisel-plow']],
    ['The power take-off is live.', ['power take-off → pto']],
    ['A combine harvester is coming.', ['combine harvester → combine']],
    ['Walk the bund.', ['bund → levee']],
    ['Soak it until it is pre-germinated.', ['pre-germinated → pre-germinated-seed']],
    ['We puddle the soil so that it seals.', ['puddle the soil → puddling']],
    ['The seed leaves are open.', ['seed leaves → cotyledon']],
    // The longest form wins.
    ['It is at field capacity.', ['field capacity → field-capacity']],
    ['The drain tile and the grain drill.', ['drain tile → tile', 'grain drill → drill']],
    ['The permanent wilting point is lower.', ['permanent wilting point → wilting-point']],
    ['Available water capacity is small.', ['Available water capacity → available-water']],
    ['Check the PTO shaft.', ['PTO shaft → pto']],
    ['The plant population is thin.', ['plant population → stand']],
    // Word boundaries and punctuation.
    ['A crownless weed, uncrowned.', []],
    ['In the field, capacity is not the word.', []],
    ['Flag. Leaf. Nothing.', []],
    ['Standing water.', []],
    ['', []],
    ['…, — !', []],
    // Unicode: composed and decomposed, and letters that only look alike.
    ['“Crusted” ground — tilth gone.', ['Crusted → crust', 'tilth → tilth']],
    ['El surco, der Boden, tilth.', ['tilth → tilth']],
    ['сrown with a Cyrillic first letter', []],
  ])('“%s”', (text, expected) => expect(marked(text)).toEqual(expected))

  it('keeps offsets right behind characters of two code units and combining accents', () => {
    const text = '🌾🌾 cafe\u0301 headland'
    const [[mention] = []] = markTerms([{ start: 0, end: 4, text }], [], terms)
    expect(mention && text.slice(mention.from, mention.to)).toBe('headland')
  })
})

describe('meanings told apart', () => {
  it.each([
    // check: the basin of a rice field, not the verb.
    ['Fill the top check first, then open the gate to the next.', 'rice', ['check → check', 'gate → gate']],
    ['Water stands evenly over each check.', 'rice', ['check → check']],
    ['Check the water before you leave.', 'rice', []],
    ['Put the check in the bank.', null, []],
    ['The upper check drained overnight.', 'wheat', []],
    // drill: the machine, not the tool.
    ['The drill runs at an inch and a half.', 'wheat', ['drill → drill']],
    ['Drill a hole through the plate.', null, []],
    // stand: the plants, not standing.
    ['Bare patches are a stand problem.', 'wheat', ['stand → stand']],
    ['Stand back from the shaft.', null, []],
    ['Put it on the jack stand.', null, []],
    // boot and heading: the stage, not the footwear or the direction.
    ['It is in the boot, the head has not shown.', 'wheat', ['boot → boot']],
    ['The boot is muddy and rubber wears.', 'wheat', []],
    ['Half the ears are out, heading is early.', 'wheat', ['heading → heading']],
    ['We are heading for town.', 'wheat', []],
    // combine, crust, shrink, residue, tile, gate, volunteer, collar.
    ['The combine is ready.', null, ['combine → combine']],
    ['Combine both figures.', null, []],
    ['Rain made a crust.', null, ['crust → crust']],
    ['Good bread has a crust.', null, []],
    ['The elevator takes shrink off the ticket.', null, ['shrink → shrink']],
    ['Clay will shrink and crack.', null, []],
    ['Residue keeps it wet.', null, ['Residue → residue']],
    ['Rinse the chemical residue out.', null, []],
    ['Left late, it will shatter before the combine.', 'wheat', ['shatter → shatter', 'combine → combine']],
    ['Drop it and the glass will shatter.', null, []],
    ['Tile runs under here.', null, ['Tile → tile']],
    ['The roof tile fell.', null, []],
    ['Close the gate behind the cattle, the road is near.', null, []],
    ['Volunteer wheat in the beans.', null, ['Volunteer → volunteer']],
    ['She will volunteer at the school.', null, []],
    ['Count the collars on each leaf.', 'maize', ['collars → collar']],
    ['The shaft collar slipped.', 'maize', []],
    // Abbreviations count as written; "et" and "pi" are other words.
    ['ET was a quarter inch.', null, ['ET → evapotranspiration']],
    ['et cetera, a piece of pi', null, []],
    // corn is maize where the chapter is on maize, any cereal elsewhere.
    ['The corn is up.', 'maize', ['corn → maize']],
    ['The corn is up.', 'wheat', []],
  ])('“%s” (%s)', (text, crop, expected) => expect(marked(text, crop)).toEqual(expected))
})

describe('over chapters and cues', () => {
  const cues = [
    { start: 1, end: 4, text: 'The crown lives. The crown is white.' },
    { start: 5, end: 7, text: 'Another crown, at field' },
    { start: 7.9, end: 11, text: 'capacity. A crown.' },
    { start: 12, end: 13, text: 'Crown again.' },
  ]
  const chapters = [
    { start: 0, topics: [] },
    { start: 8, topics: [{ crop: 'wheat' }] },
  ]

  it('marks a term once in each chapter, at its first place', () => {
    const found = markTerms(cues, chapters, terms)
    expect(found.map((each) => each.map(({ from, slug }) => [from, slug]))).toEqual([
      [[4, 'crown']],
      [],
      [[12, 'crown']],
      [],
    ])
  })

  it('gives a cue before the first chapter a stretch of its own', () => {
    const found = markTerms(cues.slice(0, 2), [{ start: 3, topics: [] }], terms)
    expect(found.map((each) => each.length)).toEqual([1, 1])
  })

  it('reads the neighbouring cues of the chapter for what tells meanings apart, not those of another chapter', () => {
    const said = [
      { start: 0, end: 2, text: 'Water the terrace.' },
      { start: 2, end: 4, text: 'Each check holds it.' },
    ]
    expect(markTerms(said, [{ start: 0, topics: [{ crop: 'rice' }] }], terms)[1]).toHaveLength(1)
    const apart = [
      { start: 0, topics: [] },
      { start: 2, topics: [{ crop: 'rice' }] },
    ]
    expect(markTerms(said, apart, terms)[1]).toHaveLength(0)
  })

  it('says nothing where nothing is said, and answers one list per cue', () => {
    expect(markTerms([], [], terms)).toEqual([])
    expect(markTerms(cues, [], [])).toEqual([[], [], [], []])
  })

  it('reads a cue of a hundred and fifty thousand words to its end', () => {
    // One long cue once overflowed the stack.
    const text = `${'word '.repeat(150_000)}crown`
    const [mentions = []] = markTerms([{ start: 0, end: 4, text }], [], terms)
    expect(mentions).toEqual([{ from: text.length - 5, to: text.length, slug: 'crown' }])
  })
})
