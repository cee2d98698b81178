import { asabe, notYetHeldAgainst, termsOf } from '../term'

const grain =
  'grain elevator ticket corn maize wheat beans soybeans rice bushel bushels points dry dried drying drier percent load weigh weight'.split(
    ' ',
  )
const fgis = notYetHeldAgainst('the USDA FGIS handbooks')

export const harvestTerms = termsOf('Harvest and storage', [
  {
    slug: 'combine',
    label: 'combine',
    definition: 'The machine that cuts a crop, threshes it and cleans the grain in one pass.',
    inflections: ['combined', 'combining'],
    regional: [{ place: 'UK', name: 'combine harvester' }],
    context: { notNear: ['ingredients', 'totals', 'figures', 'results', 'both'] },
    spanish: 'cosechadora',
    sourceNote: asabe('S343'),
  },
  {
    slug: 'header',
    label: 'header',
    definition: 'The cutting front of a combine. In Australia the word means the whole machine.',
    context: {
      near: ['combine', 'combines', 'cut', 'cutting', 'reel', 'auger', 'knife', 'crop', 'harvest', 'beans', 'wheat'],
    },
    sourceNote: asabe('S343'),
  },
  {
    slug: 'test-weight',
    label: 'test weight',
    definition: 'How heavy a bushel measured by volume is. Shrivelled or sprouted grain is light.',
    synonyms: ['bushel weight'],
    regional: [
      { place: 'UK', name: 'specific weight' },
      { place: 'Europe', name: 'hectolitre weight' },
    ],
    spanish: 'peso hectolítrico',
    sourceNote: fgis,
    explainer: 'shrink',
  },
  {
    slug: 'moisture-content',
    label: 'moisture content',
    definition: 'Water as a share of the whole weight of grain (wet basis), which is how it is bought and sold.',
    synonyms: ['wet basis', 'grain moisture'],
    spanish: 'contenido de humedad',
    sourceNote: asabe('S352'),
    explainer: 'shrink',
  },
  {
    slug: 'shrink',
    label: 'shrink',
    definition: 'The weight that grain loses in drying, and what is lost in handling with it.',
    synonyms: ['pencil shrink', 'water shrink', 'moisture shrink'],
    inflections: ['shrinkage'],
    context: { near: grain, notNear: ['wrap', 'clay', 'soil', 'crack', 'cracks', 'swell', 'swells'] },
    spanish: 'merma',
    sourceNote: notYetHeldAgainst('the National Corn Handbook, NCH-61'),
    explainer: 'shrink',
  },
  {
    slug: 'dockage',
    label: 'dockage',
    definition: 'What is not the grain sold and can be cleaned out, taken off the weight that is paid for.',
    sourceNote: fgis,
  },
  {
    slug: 'shatter',
    label: 'shatter',
    definition: 'Grain falling out of the head or pod before or as it is cut.',
    inflections: ['shattered', 'shattering', 'shatters'],
    context: {
      near: [
        'combine',
        'ripe',
        'kernel',
        'kernels',
        'grain',
        'pod',
        'pods',
        'head',
        'heads',
        'seed',
        'seeds',
        'bean',
        'beans',
        'wheat',
        'loss',
        'losses',
      ],
    },
    spanish: 'desgrane',
    sourceNote: notYetHeldAgainst('an extension handbook'),
  },
])
