import { bbch, notYetHeldAgainst, termsOf } from '../term'

/** Parts of a plant and its first days, as they are named on camera. */
export const plantPartTerms = termsOf('Planting and growth', [
  {
    slug: 'germination',
    label: 'germination',
    definition: 'A seed taking up water and putting out its root; also the share of seeds that do so in a test.',
    inflections: ['germinate', 'germinates', 'germinated', 'germinating'],
    spanish: 'germinación',
    sourceNote: notYetHeldAgainst('the ISTA rules'),
    explainer: 'counting-a-stand',
  },
  {
    slug: 'pre-germinated-seed',
    label: 'pre-germinated seed',
    definition:
      'Seed soaked and drained until it has just sprouted, so that it starts at once when sown, as into a flood.',
    synonyms: ['pre-germinated', 'presoaked seed', 'sprouted seed'],
    sourceNote: notYetHeldAgainst('the Arkansas rice handbook'),
  },
  {
    slug: 'cotyledon',
    label: 'cotyledon',
    definition: 'A seed leaf: it was folded in the seed, feeds the seedling first, and falls off later.',
    synonyms: ['seed leaf'],
    inflections: ['seed leaves'],
    spanish: 'cotiledón',
    sourceNote: bbch,
  },
  {
    slug: 'node',
    label: 'node',
    definition: 'The joint of a stem that a leaf grows from. In cereals a hard ring that the thumb can feel.',
    context: { notNear: ['network', 'server'] },
    spanish: 'nudo',
    sourceNote: bbch,
  },
  {
    slug: 'whorl',
    label: 'whorl',
    definition: 'The rolled leaves in the middle of a young grass plant that have not come out yet.',
    spanish: 'cogollo',
    sourceNote: notYetHeldAgainst('Iowa State PMR 1009'),
  },
  {
    slug: 'panicle',
    label: 'panicle',
    definition: 'A branched head, as of rice or oats.',
    spanish: 'panícula',
    sourceNote: bbch,
  },
])
