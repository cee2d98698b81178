import { cautions } from '@/lib/topics/cautions'
import type { ExplainerEntry } from '../../entries'
import { opened, range, value } from '../claim'

const body = `
You haul wet grain, and the ticket pays for dry. The weight between the two is **shrink**. Most of it is water that the drier drives off. The rest is what is lost in moving grain about: dust, hulls, broken kernels.

## Why points are not percent

Moisture is counted on the whole weight, water included. That is called wet basis, and it is why taking off ten points of moisture takes off more than a tenth of the weight. The dry part of the grain stays what it was. It just becomes a larger share of a smaller load.

So the weight that is left is the dry share before over the dry share after, and the loss is one less that:

> water shrink = one − (dry share of the wet grain ÷ dry share of the dried grain)

Corn is commonly sold at {{claim:market-moisture}} moisture. In a published example it comes in at {{claim:wet-in}} and is dried to that. The loss is {{claim:example-shrink}} of the wet weight. Count the points of moisture that were removed: the loss is well above as many percent.

There is a short cut. For a given dry moisture, each point removed costs the same share of the weight: {{claim:factor-market}} a point down to the usual market moisture, {{claim:factor-fifteen}} a point down to {{claim:moisture-fifteen}}, and {{claim:factor-twelve}} down to {{claim:moisture-twelve}}. The factor is a hundred over the dry share at the end. The drier you finish, the dearer each point.

## What a buyer takes off

There is no standard method for the shrink that is penciled on a ticket. Many buyers use one round figure for water and handling together, from {{claim:buyer-low}} for each point. Measured handling losses alone ran from {{claim:handling}}, and less than {{claim:handling-fair}} is called reasonable. Ask for the figure before harvest, work your own load with the short cut, and you know what the difference costs you.

Multiply wet bushels by the shrink, never dry ones. And do the sum on weight: a bushel on a ticket is a weight, {{claim:bushel-corn}} for corn whatever its moisture. At market moisture that bushel is {{claim:bushel-water}} of water.

## How dry is dry enough

Drying further than you need loses weight you could have sold, and burns gas. Grain kept longer has to be drier. One extension column gives {{claim:market-moisture}} for keeping up to half a year, {{claim:keep-year}} up to a year, and {{claim:keep-longer}} beyond that.

A worked load beats any table. Weigh, test, write both down, and do the same again when it leaves the bin.
`

const bin = cautions.find(({ key }) => key === 'grain-bin')

/** Figures of the handbook chapter on harvest and storing. */
export const shrink: ExplainerEntry = {
  slug: 'shrink',
  title: 'Shrink: what drying takes off the ticket',
  summary:
    'Why ten points of moisture are more than a tenth of the weight, the short cut, and what buyers take off besides.',
  body: body.trim(),
  caution: bin ? `Before you check grain in a bin: ${bin.text} (${bin.citation})` : null,
  claims: [
    opened('sdsu-shrink-2019', {
      key: 'market-moisture',
      statement: 'Standard moisture at which corn is marketed, and enough to keep it up to six months.',
      quantity: 'moisture, wet basis',
      ...value(15.5, '%'),
      locator: 'First paragraphs',
    }),
    opened('sdsu-shrink-2019', {
      key: 'wet-in',
      statement: 'Moisture before drying in the published example.',
      quantity: 'moisture, wet basis',
      ...value(25, '%'),
      locator: 'Moisture shrink, example',
    }),
    opened('sdsu-shrink-2019', {
      key: 'example-shrink',
      statement: 'Weight lost as water in that example, as a share of the wet weight.',
      quantity: 'water shrink',
      ...value(11.24, '%'),
      locator: 'Moisture shrink, example',
    }),
    opened('sdsu-understanding-shrink-2014', {
      key: 'factor-market',
      statement: 'Weight lost for each point removed when drying to 15.5 % moisture.',
      quantity: 'shrink factor',
      ...value(1.183, '%'),
      locator: 'Table 1',
    }),
    opened('sdsu-understanding-shrink-2014', {
      key: 'factor-fifteen',
      statement: 'Weight lost for each point removed when drying to 15 % moisture.',
      quantity: 'shrink factor',
      ...value(1.176, '%'),
      locator: 'Table 1',
    }),
    opened('sdsu-understanding-shrink-2014', {
      key: 'moisture-fifteen',
      statement: 'A final moisture of the table.',
      quantity: 'moisture, wet basis',
      ...value(15, '%'),
      locator: 'Table 1',
    }),
    opened('nch-61', {
      key: 'factor-twelve',
      statement: 'Weight lost for each point removed when drying to 12 % moisture.',
      quantity: 'shrink factor',
      ...value(1.136, '%'),
      locator: 'Water shrink, example',
    }),
    opened('nch-61', {
      key: 'moisture-twelve',
      statement: 'Final moisture of the handbook’s example.',
      quantity: 'moisture, wet basis',
      ...value(12, '%'),
      locator: 'Water shrink, example',
    }),
    opened('nch-61', {
      key: 'no-standard',
      statement: 'There is no standard method for pencil shrink.',
      locator: 'Introduction',
    }),
    opened('sdsu-shrink-2019', {
      key: 'buyer-low',
      statement: 'Constant shrink factor that grain buyers generally use for water and handling together.',
      quantity: 'shrink factor per point',
      ...range(1.2, 1.5, '%'),
      locator: 'Total shrink',
    }),
    opened('sdsu-shrink-2019', {
      key: 'handling',
      statement: 'Range of handling losses alone.',
      quantity: 'handling loss',
      ...range(0.22, 1.71, '%'),
      locator: 'Total shrink',
    }),
    opened('sdsu-shrink-2019', {
      key: 'handling-fair',
      statement: 'Handling loss below which research calls it reasonable.',
      quantity: 'handling loss',
      ...value(1, '%'),
      locator: 'Total shrink',
    }),
    opened('sdsu-shrink-2019', {
      key: 'bushel-corn',
      statement: 'Weight of a bushel of corn in trade.',
      quantity: 'bushel weight',
      ...value(56, 'lb'),
      locator: 'First paragraph',
    }),
    opened('sdsu-shrink-2019', {
      key: 'bushel-water',
      statement: 'Water in a bushel of corn at 15.5 % moisture.',
      quantity: 'water in a bushel',
      ...value(8.7, 'lb'),
      locator: 'First paragraph',
    }),
    opened('sdsu-shrink-2019', {
      key: 'keep-year',
      statement: 'Moisture at which corn keeps up to a year.',
      quantity: 'moisture, wet basis',
      ...value(14, '%'),
      locator: 'Second paragraph',
    }),
    opened('sdsu-shrink-2019', {
      key: 'keep-longer',
      statement: 'Moisture at which corn keeps more than a year.',
      quantity: 'moisture, wet basis',
      ...value(13, '%'),
      locator: 'Second paragraph',
    }),
  ],
}
