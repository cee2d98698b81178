import { cautions } from '@/lib/topics/cautions'
import type { ExplainerEntry } from '../../entries'
import { opened, range, value } from '../claim'

const body = `
A stand is the plants that are there, not the seed that was sown and not the leaves you see from the road. Frost browns the tips of wheat that is perfectly alive. Before you decide whether a field stays, count it.

## What counts as one

A plant is one **crown**: the short stem at the surface that leaves, tillers and roots all grow from. A plant with four tillers is still one plant. Where winter may have killed some, dig a few and slice them lengthwise. A crown that is white to light green inside is alive. One that is tan and soft is not coming back, however green a leaf above it looks.

## Two ways to count

**By the row.** Lay a yardstick along a row and count the plants beside it. Do that in many places, good and bad, chosen before you look. Multiply the average by four and divide by the row width in inches. That gives plants per square foot. The published example has {{claim:row-count}} in rows {{claim:row-width}} apart, which comes to {{claim:row-stand}}.

**By the hoop.** Throw a hoop of known size over your shoulder and count inside it where it lands. It is the better way where seed was broadcast or rows cannot be told apart. Bring the count to a square foot by the area of the hoop.

Keep the bad throws in. An average of the good ones is a wish.

## What is enough

One handbook calls {{claim:adequate}} adequate for full yield in wheat, and says to think about another crop below {{claim:replant}}. Another puts the best stand above {{claim:optimum-prairie}}, yet found that {{claim:thin-stand}} still gave almost {{claim:thin-yield}} where the plants were spread evenly and looked after, because wheat tillers into gaps. So a thin even stand may be worth more than a thick one with holes, and the two publications do not contradict each other: one says what full yield asks, the other what a thin field can still bring.

Bare patches are a different question. One bare patch is a wet spot. Bare patches in every throw are a stand problem.

## From a stand to a bag

The count you want decides what you sow. Multiply the plants wanted on a square foot by the weight of a thousand kernels in grams, and divide by the share that will live and by ten. The answer is pounds an acre. The share that lives is germination less what dies on the way up; do not take germination off twice.

A published example for wheat: {{claim:target}}, kernels at {{claim:kernel-weight}}, {{claim:survival}} living, comes to {{claim:rate}}. Seed of another size changes the answer in proportion, which is why a fixed rate in pounds is wrong in most years. The division by ten is a rule of thumb that comes out a little high.

Then set the drill, catch what it drops over a measured length, and weigh it.
`

const pesticides = cautions.find(({ key }) => key === 'pesticides')

/** Figures of the handbook chapter on planting, and of extension pages on stands. */
export const countingAStand: ExplainerEntry = {
  slug: 'counting-a-stand',
  title: 'Counting a stand',
  summary: 'What one plant is, two ways to count, what is enough, and how a count becomes a weight of seed.',
  body: body.trim(),
  caution: pesticides
    ? `Before you walk a sprayed field or handle treated seed: ${pesticides.text} (${pesticides.citation})`
    : null,
  claims: [
    opened('psu-wheat-stand', {
      key: 'row-count',
      statement: 'Plants counted in three feet of row in the published example.',
      quantity: 'plants in 3 ft of row',
      ...value(40, 'plants'),
      locator: 'Second paragraph',
    }),
    opened('psu-wheat-stand', {
      key: 'row-width',
      statement: 'Row width in the published example.',
      quantity: 'row width',
      ...value(7, 'in'),
      locator: 'Second paragraph',
    }),
    opened('psu-wheat-stand', {
      key: 'row-stand',
      statement: 'The stand that follows: count times four over row width, rounded.',
      quantity: 'stand',
      ...value(23, 'plants/ft²'),
      locator: 'Second paragraph',
    }),
    opened('psu-wheat-stand', {
      key: 'adequate',
      statement: 'Stand called adequate for the highest yield of wheat.',
      quantity: 'stand',
      ...range(20, 30, 'plants/ft²'),
      locator: 'Second paragraph',
    }),
    opened('psu-wheat-stand', {
      key: 'replant',
      statement: 'Stand below which another crop should be considered.',
      quantity: 'stand',
      ...range(12, 14, 'plants/ft²'),
      locator: 'Below the table',
    }),
    opened('growwinterwheat-spring', {
      key: 'optimum-prairie',
      statement: 'Stand above which winter wheat is at its best.',
      quantity: 'stand',
      ...value(20, 'plants/ft²'),
      locator: 'Spring stand assessment',
    }),
    opened('growwinterwheat-spring', {
      key: 'thin-stand',
      statement: 'A thin stand that could still yield well if managed for it.',
      quantity: 'stand',
      ...value(8, 'plants/ft²'),
      locator: 'Spring stand assessment',
    }),
    opened('growwinterwheat-spring', {
      key: 'thin-yield',
      statement: 'What that thin stand could almost yield.',
      quantity: 'yield',
      ...value(50, 'bu/ac'),
      locator: 'Spring stand assessment',
    }),
    opened('umn-winter-wheat-stand', {
      key: 'crown-colour',
      statement: 'A crown white or yellow to light green inside is healthy; tan to brown and soft, it did not survive.',
      locator: 'Paragraph on digging seedlings',
    }),
    opened('seeding-by-kernel-weight', {
      key: 'target',
      statement: 'Stand wanted in the published example for wheat.',
      quantity: 'stand',
      ...value(30, 'plants/ft²'),
      locator: 'Wheat, example 1',
    }),
    opened('seeding-by-kernel-weight', {
      key: 'kernel-weight',
      statement: 'Weight of a thousand kernels in that example.',
      quantity: 'thousand-kernel weight',
      ...value(38, 'g'),
      locator: 'Wheat, example 1',
    }),
    opened('seeding-by-kernel-weight', {
      key: 'survival',
      statement: 'Share of seeds that live in that example: germination 97 less 3 lost as seedlings.',
      quantity: 'survival',
      ...value(94, '%'),
      locator: 'Wheat, example 1',
    }),
    opened('seeding-by-kernel-weight', {
      key: 'rate',
      statement: 'Seeding rate that follows by the rule of thumb.',
      quantity: 'seeding rate',
      ...value(121, 'lb/ac'),
      locator: 'Wheat, example 1, 38 g',
    }),
  ],
}
