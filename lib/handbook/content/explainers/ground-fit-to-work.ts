import type { ExplainerEntry } from '../../entries'
import { opened, range, remembered, transcribed, value } from '../claim'

const body = `
A field looks dry before it is fit. Sun and wind take the shine off the top in a day while the layer that will carry the wheel and meet the tool is still soft. So the question is never “is it dry?” but “is it dry enough, as deep as I mean to work?”

## What the plastic limit says

Take a wet lump of soil and roll it between your palms. If it makes a long thread it is plastic: pressed, it flows, and it keeps the shape of whatever pressed it. Go on letting it dry and there comes a point at which a thread {{claim:thread-width}} thick falls to crumbs instead. That water content is the **plastic limit**. Wetter than that, a wheel or a tool smears the soil and closes its pores. Drier than that, it breaks along its own cracks and comes apart into crumbs. Driving on ground that is wetter than the plastic limit is what packs it.

The best crumb comes a little below the limit. For several soils the water content at which working gives the most small crumbs was found at about {{claim:optimum-share}} times the plastic limit; for one red tropical sandy loam it was {{claim:optimum-share-laterite}} times. Many sandy soils have no plastic limit at all, and then the ball test below has to do.

## Why a wet spring may never come right by itself

Drainage stops at field capacity. If a soil holds more at field capacity than its plastic limit, it will not drain to a fit state however long you wait. Only evaporation, or a crop drinking, takes it the rest of the way. Heavy clay bottoms are often like that. It is why they are worked in the fall, or not at all.

## The hand test

1. Dig to the depth you will work, in three or more places, the low ones included.
2. Squeeze a handful into a ball. Then push it out between thumb and finger.
3. If it ribbons, or rolls into a thread, stay off. If the ball breaks under a bounce, and the thread falls apart at once, the layer is fit.

The feel can also be read as water. On loam and silt loam, which hold {{claim:available-loam}} of available water, a weak rough ball that leaves no stain is down by {{claim:depleted-loam}}. Ribbons and heavy finger marks mean that almost nothing has been used. With practice the reading is good to about {{claim:feel-accuracy}}.

## Weight goes deeper than looks

Pressure in the top few inches follows the tire. What reaches the subsoil follows the load on the axle, and no tire spreads that away. Advice is to stay under {{claim:axle-load-limit}}, and better under {{claim:axle-load-better}}. A loaded cart on damp ground can do harm where no tool will reach it again.

When in doubt, wait a drying day and roll a thread again. The test costs a minute.
`

/** Figures of handbook chapters on moisture by feel and on workability. */
export const groundFitToWork: ExplainerEntry = {
  slug: 'ground-fit-to-work',
  title: 'Is the ground fit to work?',
  summary:
    'Why a dry surface says little, what the plastic limit is, and the test that takes a minute and a handful of soil.',
  body: body.trim(),
  caution: null,
  claims: [
    opened('osu-soil-health', {
      key: 'stay-off',
      statement: 'Driving on soil wetter than its plastic limit compacts it.',
      locator: 'Page on compaction',
    }),
    remembered('astm-d4318', {
      key: 'thread-width',
      statement: 'The thickness of the thread that just crumbles at the plastic limit.',
      quantity: 'thread diameter',
      ...value(3, 'mm'),
    }),
    transcribed('dexter-bird-2001', {
      key: 'optimum-share',
      statement:
        'For several soils, the water content at which tillage gives the most small crumbs, as a share of the plastic limit.',
      quantity: 'optimum water content ÷ plastic limit',
      ...value(0.9),
      locator: 'As told in an encyclopedia article on the optimum water content for tillage',
    }),
    transcribed('dexter-bird-2001', {
      key: 'optimum-share-laterite',
      statement: 'The same share for a lateritic sandy loam.',
      quantity: 'optimum water content ÷ plastic limit',
      ...value(0.77),
      locator: 'As told in the same article, which does not say whose measurement it was',
    }),
    opened('nrcs-feel-wy', {
      key: 'available-loam',
      statement: 'Available water capacity of sandy clay loam, loam and silt loam.',
      quantity: 'available water capacity',
      ...range(1.5, 2.1, 'in/ft'),
      locator: 'Head of the page',
    }),
    opened('nrcs-feel-wy', {
      key: 'depleted-loam',
      statement: 'Water missing from those soils when a quarter to a half of the available water is left.',
      quantity: 'depletion below field capacity',
      ...range(0.8, 1.6, 'in/ft'),
      locator: 'Row for 25–50 percent available',
    }),
    opened('nrcs-feel-mt', {
      key: 'feel-accuracy',
      statement: 'How closely an experienced hand estimates soil moisture.',
      quantity: 'accuracy',
      ...value(5, '%'),
      locator: 'Third paragraph',
    }),
    opened('psu-traffic', {
      key: 'axle-load-limit',
      statement: 'Axle load to stay below so that compaction does not reach deep.',
      quantity: 'axle load',
      ...value(10, 'short tons'),
      locator: 'Worksheet, axle load',
    }),
    opened('psu-traffic', {
      key: 'axle-load-better',
      statement: 'Axle load to prefer.',
      quantity: 'axle load',
      ...value(6, 'short tons'),
      locator: 'Worksheet, axle load',
    }),
  ],
}
