import type { ExplainerEntry } from '../../entries'
import { opened, range, value } from '../claim'

const body = `
A crop does not read the calendar. It comes on with warmth, slowly in a cold spring and fast in a hot one. Add up the warmth of each day and the sum says far better than the date how far a field has come. That sum is counted in **growing degree days**, also called heat units.

## One day, worked by hand

Take the day’s high and low, average them, and subtract the temperature below which the crop stands still. For maize in the United States that base is {{claim:corn-base}}, and there is a ceiling as well: warmth above {{claim:corn-ceiling}} no longer speeds the plant up. So before you average, raise a low that is under the base up to the base, and pull a high that is over the ceiling down to the ceiling. A day never counts as less than nothing.

In the published example a high of {{claim:example-high}} and a low of {{claim:example-low}} give {{claim:example-day}}. A newspaper column works three spring days in a row, two of them with nights below the base, and gets {{claim:three-days}} for the three together. If your sum comes out lower you have forgotten to lift the nights.

## From a sum to a leaf

Maize needs {{claim:emergence}} from planting to come up. From there to the tenth leaf a new collar shows about every {{claim:collar-early}}, and after the tenth about every {{claim:collar-late}}. Count collars, not leaf tips: a leaf is counted when the pale band at the base of its blade can be seen.

An example from an extension letter: a field has had {{claim:worked-sum}} since planting. Take off {{claim:worked-emergence}} for coming up, divide the rest by the warmth of one collar, and you get {{claim:worked-leaves}}. That is how far the crop had come, and hail damage can be judged by it even when the leaves are in shreds.

While the growing point is still below ground, soil temperature tells more than air temperature, and cold wet ground holds the crop back behind what the sum says.

## Wheat keeps another count

Wheat grows at temperatures that stop maize, so its base is {{claim:wheat-base}}. Half the seedlings are expected up after {{claim:wheat-emergence}}, and the first tillers about {{claim:wheat-tillers}} after that. Where the base is another one, the numbers are others too. Never carry a sum from one count into the other.

## Say which way you counted

There are two honest ways to apply the floor: average first and then lift the day to the base, or lift each temperature and then average. They part company whenever a night drops below the base. On wheat, with freezing as the base, sums made in the two ways differed by as much as {{claim:method-gap}}. Say which way you used, from which day, and in which degrees, or nobody can use your number.
`

/** Figures of the handbook chapter on heat and crop stage. */
export const heatUnits: ExplainerEntry = {
  slug: 'heat-units',
  title: 'Heat units and where the crop is',
  summary: 'How a day’s warmth is counted, what the sum says about leaves, and why two people get two answers.',
  body: body.trim(),
  caution: null,
  claims: [
    opened('purdue-heat-units', {
      key: 'corn-base',
      statement: 'Base temperature of the modified count for maize; lower night temperatures are set to it.',
      quantity: 'base temperature',
      ...value(50, '°F'),
      locator: 'Paragraph on the modified method',
    }),
    opened('purdue-heat-units', {
      key: 'corn-ceiling',
      statement: 'Ceiling of the modified count for maize; higher day temperatures are set to it.',
      quantity: 'ceiling temperature',
      ...value(86, '°F'),
      locator: 'Paragraph on the modified method',
    }),
    opened('purdue-heat-units', {
      key: 'example-high',
      statement: 'High of the day in the first published example.',
      quantity: 'daily maximum',
      ...value(80, '°F'),
      locator: 'Example 1',
    }),
    opened('purdue-heat-units', {
      key: 'example-low',
      statement: 'Low of the day in the first published example.',
      quantity: 'daily minimum',
      ...value(55, '°F'),
      locator: 'Example 1',
    }),
    opened('purdue-heat-units', {
      key: 'example-day',
      statement: 'Growing degree days of that day.',
      quantity: 'heat of one day',
      ...value(17.5, 'GDD (°F)'),
      locator: 'Example 1',
    }),
    opened('waushara-gdd-2018', {
      key: 'three-days',
      statement: 'Sum of three days with highs of 90, 72 and 63 °F and lows of 65, 46 and 42 °F.',
      quantity: 'heat of three days',
      ...value(43, 'GDD (°F)'),
      locator: 'Items 1 to 4',
    }),
    opened('purdue-leaf-stage', {
      key: 'emergence',
      statement: 'Warmth that maize needs from planting to emergence.',
      quantity: 'planting to emergence',
      ...range(100, 120, 'GDD (°F)'),
      locator: 'Predicting corn phenology',
    }),
    opened('purdue-leaf-stage', {
      key: 'collar-early',
      statement: 'Warmth between one leaf collar and the next, from emergence to the tenth collar.',
      quantity: 'heat per collar',
      ...value(82, 'GDD (°F)'),
      locator: 'Predicting corn phenology',
    }),
    opened('purdue-leaf-stage', {
      key: 'collar-late',
      statement: 'Warmth between one leaf collar and the next, after the tenth.',
      quantity: 'heat per collar',
      ...value(50, 'GDD (°F)'),
      locator: 'Predicting corn phenology',
    }),
    opened('osu-corn-2018-15', {
      key: 'worked-sum',
      statement: 'Warmth since planting in the worked example.',
      quantity: 'heat since planting',
      ...value(785, 'GDD (°F)'),
      locator: 'Example after Nielsen 2014',
    }),
    opened('osu-corn-2018-15', {
      key: 'worked-emergence',
      statement: 'Warmth taken off for emergence in the worked example.',
      quantity: 'planting to emergence',
      ...value(120, 'GDD (°F)'),
      locator: 'Example after Nielsen 2014',
    }),
    opened('osu-corn-2018-15', {
      key: 'worked-leaves',
      statement: 'Leaf collars that follow, at 82 GDD (°F) each.',
      quantity: 'leaf stage',
      ...value(8.1, 'collars'),
      locator: 'Example after Nielsen 2014',
    }),
    opened('ksu-wheat-development', {
      key: 'wheat-base',
      statement: 'Base temperature usually used for wheat.',
      quantity: 'base temperature',
      ...value(32, '°F'),
      locator: 'First paragraph',
    }),
    opened('ksu-wheat-development', {
      key: 'wheat-emergence',
      statement: 'Warmth from planting until half the wheat seedlings are up, given water.',
      quantity: 'planting to emergence',
      ...value(270, 'GDD (°F)'),
      locator: 'Paragraph on predicting stages',
    }),
    opened('ksu-wheat-development', {
      key: 'wheat-tillers',
      statement: 'Warmth from emergence to the first tillers.',
      quantity: 'emergence to tillering',
      ...value(540, 'GDD (°F)'),
      locator: 'Paragraph on predicting stages',
    }),
    opened('mcmaster-wilhelm-1997', {
      key: 'method-gap',
      statement:
        'Largest difference between the two ways of applying a base of 0 °C to wheat in the authors’ comparison.',
      quantity: 'difference between methods',
      ...value(83, '%'),
      locator: 'Abstract',
    }),
  ],
}
